// Where the curve p(T) turns back at values of the second given: folds, and corners at kinks of a law. Proved.
import type { Range } from "../ground/range.ts";
import { inputsOf } from "../loop/inputs.ts";
import { kept } from "../loop/kept.ts";
import type { Loop } from "../loop/types.ts";
import type { Sign } from "../search/enclosed.ts";
import { enumerateZeros } from "../search/enumerateZeros.ts";
import type { DoubtKind, Enumeration } from "../search/enumeration.ts";
import { signOfRange } from "../search/interval.ts";
import { enclosedBalance } from "../states/enclosedBalance.ts";
import { enumerateBalance } from "../states/provedSearch.ts";
import { type FoldedLoop, foldedLoop } from "./foldedLoop.ts";
import { type KinkPlace, leapAt, together } from "./kinkLeap.ts";
import { type KinkSides, kinkSides } from "./kinkSides.ts";
import { planeReader } from "./planeReader.ts";
import { signOnParts } from "./signOnParts.ts";
import { middleOf } from "./stretch.ts";
import { placedKinks } from "./withoutKinks.ts";

/** A place at which the curve turns: λ passes zero there, or leaps through it. One for every second given that was asked for. */
export interface Turn {
  readonly kind: "fold" | "corner";
  readonly temperature: number;
  readonly bracket: Range;
  /** 1: λ rises through zero; −1: it falls. */
  readonly direction: 1 | -1;
}

/** Why they are not told: a doubt about λ, or a kink at which its signs are not known. */
export type TurnDoubt = DoubtKind | "kink";

/** All of them by rising temperature, or why that is not known. */
export interface Turns {
  readonly turns: readonly Turn[];
  readonly doubt?: TurnDoubt;
  readonly boxes: number;
  readonly points: number;
}

/** A loop that is a straight line in the first given, along its curve p(T). */
export interface TurnReader extends FoldedLoop {
  /** The place of the second given among the givens. */
  readonly place: number;
  readonly sides: KinkSides;
  set(givens: readonly number[]): void;
  /** The turns in a range of temperature that are there for all of some values of the second given. */
  turnsIn(within: Range, parameters: Range, effort: number): Turns;
  /** The sign of b = ∂N/∂p; 0 where it is not proved to be one. */
  answerIn(within: Range, parameters: Range): Sign;
}

/** Boxes that finding the place of one kink may cost. */
const KINK_EFFORT = 60;

/** The reader of a loop; `places` are those of both givens, with a space between. Undefined where it has no kinks or no straight line. */
export const turnReader = /* @__PURE__ */ kept((loop, places): TurnReader | undefined => {
  const [first, place] = places.split(" ").map(Number) as [number, number];
  const along = loop.givens[first]?.name as string;
  const found = foldedLoop(loop, along);
  return found && placedKinks(loop).length > 0 ? readerOf(loop, { ...found, along, place }) : undefined;
});

interface Found extends FoldedLoop {
  readonly along: string;
  readonly place: number;
}

function readerOf(loop: Loop, { along, place, ...found }: Found): TurnReader {
  const balance = enclosedBalance(
    found.folded,
    new Set([inputsOf(loop)[loop.variables.length + place] as number]),
  );
  const sides = kinkSides(loop, along, place);
  const answer = planeReader(loop, [place], [found.answer]);
  let set: readonly number[] = [];
  const answerIn: TurnReader["answerIn"] = (within, parameters) =>
    signOnParts(within, (part) => signOfRange(answer.over(part, parameters)[0] as Range));
  return {
    ...found,
    ...{ place, sides, answerIn },
    set(givens) {
      set = givens;
      answer.set(givens);
    },
    turnsIn(within, parameters, effort) {
      const cost = { boxes: 0, points: 0 };
      const spend = <T extends Enumeration>(found: T): T => {
        cost.boxes += found.boxes;
        cost.points += found.points;
        return found;
      };
      const [low, high] = parameters.map((q) => set.map((v, i) => (i === place ? q : v))) as [
        number[],
        number[],
      ];
      sides.set(low, high);
      balance.set(low, high);
      const open = (doubt: TurnDoubt): Turns => ({ turns: [], doubt, ...cost });
      if (answerIn(within, parameters) === 0) return open("undefined");
      const places: KinkPlace[] = [];
      let lostKinks = false;
      for (const [kink, { ends }] of sides.kinks.entries()) {
        const { zeros, undecided } = spend(enumerateZeros(ends, within, { effort: KINK_EFFORT }));
        // what is not known of a kink is left to the search between those that are
        lostKinks ||= undecided.length > 0;
        places.push(...zeros.map(({ bracket, direction }) => ({ kink, bracket, direction })));
      }
      const turns: Turn[] = [];
      let from = within[0];
      for (const group of [...together(places), undefined]) {
        const to = group ? group.bracket[0] : within[1];
        if (from < to) {
          const { zeros, undecided } = spend(
            enumerateBalance(balance, [from, to], Math.max(1, effort - cost.boxes)),
          );
          const kind = undecided[0]?.kind;
          if (kind) return open(kind === "jump" && lostKinks ? "kink" : kind);
          turns.push(
            ...zeros.map(
              ({ at, bracket, direction }): Turn => ({ kind: "fold", temperature: at, bracket, direction }),
            ),
          );
        }
        if (!group) break;
        const direction = leapAt(sides, group, parameters);
        if (direction === undefined) return open("kink");
        const { bracket } = group;
        if (direction !== 0)
          turns.push({ kind: "corner", temperature: middleOf(bracket), bracket, direction });
        from = bracket[1];
      }
      return { turns, ...cost };
    },
  };
}
