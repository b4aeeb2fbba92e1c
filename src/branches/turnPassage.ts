// What happens to the turns of a curve p(T) in a narrow stretch of the second given, between two lists of them.
import type { Range } from "../ground/range.ts";
import type { Loop } from "../loop/types.ts";
import type { BranchEnd } from "./diagram.ts";
import { exitFinder } from "./exitFinder.ts";
import { foldFinder } from "./foldFinder.ts";
import { kinkExit } from "./kinkExit.ts";
import { kinkMeeting } from "./kinkMeeting.ts";
import type { MatchedTurns } from "./matchTurns.ts";
import type { Rest } from "./stretch.ts";
import type { Turn, TurnReader } from "./turns.ts";
import { kindsOf } from "./turnTiles.ts";

/** A stretch, and the turns at both of its ends. */
export interface TurnStretch {
  readonly parameters: Range;
  readonly before: readonly Turn[];
  readonly after: readonly Turn[];
  readonly matched: MatchedTurns;
}

/** The one place in a stretch at which turns end or begin; undefined where it is not proved that nothing else happens. */
export type TurnPassage = (stretch: TurnStretch) => BranchEnd | undefined;

/** Boxes that proving the rest may cost. */
const REST_EFFORT = 400;
/** How far boxes around a kink reach beyond what happens there, as a share of its size. */
const REACHES = [1, 8, 64];
/** The least size, as a share of the temperature. */
const LEAST = 1e-10;

/** Prepares the proofs for a reader whose givens are set. */
export function turnPassage(
  loop: Loop,
  reader: TurnReader,
  { within, givens }: { within: Range; givens: readonly number[] },
): TurnPassage {
  const foldsMeet = foldFinder(reader.folded, reader.place);
  const foldExit = exitFinder(reader.folded, reader.place);
  const cornerExit = kinkExit(loop, reader);
  /** True if the turns outside of a range of temperature are proved to have these kinds throughout. */
  const hasRest = (kinds: string, parameters: Range, [from, to]: Range): boolean => {
    const parts = [
      [within[0], from],
      [to, within[1]],
    ] as const;
    const found = parts
      .filter((part) => part[0] < part[1])
      .map((part) => reader.turnsIn(part, parameters, REST_EFFORT));
    return found.every((f) => f.doubt === undefined) && kindsOf(found.flatMap((f) => f.turns)) === kinds;
  };
  return ({ parameters, before, after, matched: { kept, lost, born, changed } }) => {
    const ended = [...lost.map((i) => before[i]), ...born.map((i) => after[i])] as Turn[];
    const others = kindsOf(kept.map(([i]) => before[i] as Turn));
    const rest: Rest = (_stretch, except) => hasRest(others, parameters, except);
    const stretch = { parameters, within, givens, others: kept.length, temperatures: [] };
    const [first, second] = ended;
    if (reader.answerIn(within, parameters) === 0) return undefined;
    if (first && !second && changed.length === 0) {
      const exit = first.kind === "fold" ? foldExit : cornerExit;
      return exit(stretch, first.temperature, rest);
    }
    if (first && second && ended.length === 2 && changed.length === 0) {
      const pair: Range = [first.temperature, second.temperature];
      if (first.kind === second.kind)
        return first.kind === "fold" ? foldsMeet(stretch, pair, rest) : undefined;
      return atKink(pair, "meet", lost.length > 0 ? "below" : "above");
    }
    const [change, another] = changed;
    if (!change || another || first) return undefined;
    const [turn, next] = [before[change[0]], after[change[1]]] as [Turn, Turn];
    const places = [turn.temperature, next.temperature];
    return atKink(
      [Math.min(...places), Math.max(...places)],
      "change",
      turn.kind === "fold" ? "below" : "above",
    );

    function atKink([low, high]: Range, kind: string, fold: string): BranchEnd | undefined {
      const size = Math.max(high - low, LEAST * high);
      for (const reach of REACHES) {
        const box: Range = [low - reach * size, high + reach * size];
        if (!(box[0] > within[0] && box[1] < within[1])) return undefined;
        const met = kinkMeeting(reader, { box, parameters, givens });
        if (met?.kind === kind && met.fold === fold && hasRest(others, parameters, box)) return met.end;
      }
      return undefined;
    }
  };
}
