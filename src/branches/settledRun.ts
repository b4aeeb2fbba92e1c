// A narrow place on an end of a run belongs to that end: it lies between no two branches.
import type { Range } from "../ground/range.ts";
import { CORNER_WIDTH, type Critical, leaps } from "./criticals.ts";
import type { Run, RunEnd } from "./runs.ts";

/** A run, and the critical places between its branches. */
export interface SettledRun {
  readonly run: Run;
  readonly inside: readonly Critical[];
}

/** Takes the critical places on the ends of a run from the list: the run ends before them, in a leap or undecided. */
export function settledRun(run: Run, list: readonly Critical[]): SettledRun {
  const isOn = (end: RunEnd) => (c: Critical) =>
    end.kind !== "between" && !c.decided && isNarrow(c) && touch(c.bracket, end.bracket);
  const first = list.filter(isOn(run.from));
  const last = list.filter((c) => !first.includes(c) && isOn(run.to)(c));
  const inside = list.filter((c) => !first.includes(c) && !last.includes(c));
  return { run: { from: endAt(run.from, first, 1), to: endAt(run.to, last, 0) }, inside };
}

/** Whether a crossing in doubt is a leap that is told with the curve. */
export const isToldAs = (list: readonly Critical[], bracket: Range): boolean =>
  list.some((c) => leaps(c) && isNarrow(c) && touch(c.bracket, bracket));

function endAt(end: RunEnd, on: readonly Critical[], inner: 0 | 1): RunEnd {
  if (on.length === 0) return end;
  const brackets = [end.bracket, ...on.map((c) => c.bracket)];
  const bracket: Range = [
    Math.min(...brackets.map(([low]) => low)),
    Math.max(...brackets.map(([, high]) => high)),
  ];
  const kind = end.kind === "leap" || on.some(leaps) ? "leap" : "undecided";
  return { ...end, kind, at: bracket[inner], bracket };
}

const isNarrow = ({ bracket: [low, high] }: Critical): boolean => high - low < CORNER_WIDTH;
const touch = (a: Range, b: Range): boolean => a[0] <= b[1] && b[0] <= a[1];
