// Cuts a range of temperature where a state passes an end of the parameter's range: what remains holds whole branches.
import type { Range } from "../ground/range.ts";
import type { Sign } from "../search/enclosed.ts";
import type { DoubtKind } from "../search/enumeration.ts";

/** A stretch of temperature in which the balance at one end of the parameter's range passes zero, or may. */
export interface Crossing {
  /** The end of the parameter's range: 0 or 1. */
  readonly end: 0 | 1;
  readonly at: number;
  readonly bracket: Range;
  /** Why it is not known to be one zero; `level` where both ends of the parameter's range pass zero together. */
  readonly doubt: DoubtKind | "level" | null;
}

/** Where a run ends. */
export interface RunEnd {
  readonly kind: "between" | "within" | "leap" | "undecided";
  /** Which end of the parameter's range, for `between`. */
  readonly end: 0 | 1;
  readonly at: number;
  readonly bracket: Range;
}

/** Temperatures each of which is balanced at one parameter of the range. */
export interface Run {
  readonly from: RunEnd;
  readonly to: RunEnd;
}

/** Signs of the balance at a temperature for both ends of the parameter's range. */
export type SignsAt = (temperature: number) => readonly [Sign, Sign];

/**
 * The runs of a balance that only rises or only falls with the parameter: between two crossings its signs at both ends of
 * the parameter's range are constant; where they differ there is one balanced parameter for each temperature, where they agree
 * there is none. Stretches without known signs are returned as `unknown`.
 */
export function runsOf(
  crossings: readonly Crossing[],
  within: Range,
  signsAt: SignsAt,
): { readonly runs: Run[]; readonly unknown: Range[] } {
  const runs: Run[] = [];
  const unknown: Range[] = [];
  let from: RunEnd | undefined;
  const close = (to: RunEnd) => {
    if (from) runs.push({ from, to });
    from = undefined;
  };
  const edge = (end: 0 | 1): RunEnd => {
    const at = within[end];
    return { kind: "within", end, at, bracket: [at, at] };
  };
  let last: Crossing | undefined;
  for (const crossing of [...crossings, undefined]) {
    const [before, after] = [last ? runEnd(last, 0) : edge(0), last ? runEnd(last, 1) : edge(0)];
    const next = crossing?.bracket ?? edge(1).bracket;
    const stretch: Range = [before.bracket[1], next[0]];
    const inside = stretch[0] < stretch[1] ? insideOf(stretch, signsAt) : undefined;
    if (inside === true) from ??= after;
    else if (inside === false) close(before);
    else if (stretch[0] < stretch[1]) {
      close(before);
      unknown.push(stretch);
    }
    last = crossing ?? last;
  }
  close(last && last.bracket[1] >= within[1] ? runEnd(last, 0) : edge(1));
  return { runs, unknown };
}

/** The end of a run at a crossing; where that is in doubt, at the side of its bracket that is the run's: 0, below, or 1, above. */
function runEnd({ end, at, bracket, doubt }: Crossing, side: 0 | 1): RunEnd {
  if (doubt === null) return { kind: "between", end, at, bracket };
  return { kind: doubt === "jump" ? "leap" : "undecided", end, at: bracket[side], bracket };
}

/** Whether a parameter of the range balances each temperature of a stretch; undefined where signs are not proved. */
function insideOf([low, high]: Range, signsAt: SignsAt): boolean | undefined {
  for (const share of [0.5, 0.371, 0.629, 0, 1]) {
    const [a, b] = signsAt(low + (high - low) * share);
    if (a !== 0 && b !== 0) return a !== b;
  }
  return undefined;
}

/** Crossings by rising temperature; those that touch are one in doubt. */
export function mergedCrossings(crossings: readonly Crossing[]): Crossing[] {
  const merged: Crossing[] = [];
  for (const next of [...crossings].sort((a, b) => a.bracket[0] - b.bracket[0])) {
    const last = merged.at(-1);
    if (!last || next.bracket[0] > last.bracket[1]) {
      merged.push(next);
      continue;
    }
    const stopped = last.doubt === "effort" || next.doubt === "effort";
    const level = last.end !== next.end || last.doubt === "level";
    const doubt = stopped ? "effort" : level ? "level" : (next.doubt ?? last.doubt ?? "fold");
    const bracket: Range = [last.bracket[0], Math.max(last.bracket[1], next.bracket[1])];
    merged[merged.length - 1] = { end: last.end, at: last.at, bracket, doubt };
  }
  return merged;
}
