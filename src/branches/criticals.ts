// Where λ passes zero along a curve: folds, corner folds, and what cannot be decided.
import type { Range } from "../ground/range.ts";
import { type Ends, type Sign, signOf } from "../search/enclosed.ts";
import { enumerateZeros } from "../search/enumerateZeros.ts";
import type { DoubtKind } from "../search/enumeration.ts";

/** A place on a curve between two branches. */
export interface Critical {
  /** `leap`: the curve leaps there, at a step of a law; its two branches end, but it is not decided whether they meet. */
  readonly kind: "fold" | "corner" | "leap" | DoubtKind;
  readonly decided: boolean;
  readonly temperature: number;
  readonly bracket: Range;
}

/** What was found and what it cost. */
export interface Criticals {
  readonly list: readonly Critical[];
  readonly boxes: number;
  readonly points: number;
}

/** Whether the curve leaps there, or may. */
export const leaps = ({ kind }: Critical): boolean => kind === "jump" || kind === "leap";

/** A sign change in a wider stretch, K, may be more than one corner. */
export const CORNER_WIDTH = 1e-6;
/** Boxes that finding the place of one kink may cost. */
const KINK_EFFORT = 60;

/** λ along a curve as a function of temperature, and what is zero at its kinks and leaps. */
export interface Feedback {
  readonly feedback: Ends;
  readonly kinks: readonly Ends[];
  /** Those of the kinks at which the curve itself leaps. */
  readonly leaps: readonly Ends[];
}

/** The critical places of a curve in a range of temperature, by rising temperature: zeros of λ, and kinks where its sign changes. */
export function criticalsOf(
  { feedback, kinks, leaps: places }: Feedback,
  range: Range,
  effort: number,
): Criticals {
  const cuts: number[] = [];
  const leapsAt: Range[] = [];
  for (const kink of kinks) {
    const { zeros, undecided } = enumerateZeros(kink, range, { effort: KINK_EFFORT });
    for (const { bracket } of zeros) cuts.push(...bracket);
    // one on an end of the range is not decided
    if (places.includes(kink))
      leapsAt.push(...zeros.map((z) => z.bracket), ...undecided.map((u) => u.interval));
  }
  // where the curve leaps λ has no value
  const leapsIn = ([low, high]: Range) =>
    high - low < CORNER_WIDTH && leapsAt.some(([a, b]) => a <= high && b >= low);
  const found = enumerateZeros(feedback, range, { effort, cuts });
  const list = [
    ...found.zeros.map(
      (z): Critical => ({ kind: "fold", decided: true, temperature: z.at, bracket: z.bracket }),
    ),
    ...found.undecided.map(({ kind, interval }): Critical => {
      const corner = kind === "jump" && changesSign(feedback, interval);
      const temperature = interval[0] + (interval[1] - interval[0]) / 2;
      const named = kind === "undefined" && leapsIn(interval) ? "leap" : kind;
      return { kind: corner ? "corner" : named, decided: corner, temperature, bracket: interval };
    }),
  ];
  list.sort((a, b) => a.temperature - b.temperature);
  return { list: joined(list), boxes: found.boxes, points: found.points };
}

/** Neighbours that touch are one; one of them that is flat makes it a continuum. */
function joined(list: readonly Critical[]): Critical[] {
  const apart: Critical[] = [];
  for (const next of list) {
    const last = apart.at(-1);
    if (!last || next.bracket[0] > last.bracket[1]) {
      apart.push(next);
      continue;
    }
    const bracket: Range = [last.bracket[0], Math.max(last.bracket[1], next.bracket[1])];
    const kind = [last, next].find((c) => c.kind === "flat")?.kind ?? last.kind;
    const temperature = bracket[0] + (bracket[1] - bracket[0]) / 2;
    apart[apart.length - 1] = { kind, decided: false, temperature, bracket };
  }
  return apart;
}

/** Whether λ is proved to have opposite signs at both ends: then the curve turns in between. */
function changesSign(feedback: Ends, [low, high]: Range): boolean {
  if (high - low > CORNER_WIDTH) return false;
  const before = signAt(feedback, low);
  return before !== 0 && before === -signAt(feedback, high);
}

/** The proved sign of a function at a place. */
export function signAt({ size, at, point }: Ends, x: number): Sign {
  const end = new Float64Array(size);
  end[0] = x;
  point(end);
  return signOf(end[at] as number, end[at + 1] as number, end[at + 2] as number);
}
