// Parameters for which no state lies in the searched range of temperature.
import type { Range } from "../ground/range.ts";
import type { Sign } from "../search/enclosed.ts";
import type { Branch, Gap } from "./diagram.ts";

/** What is left of the parameter's range when that of every branch is taken away; `signAt` is the sign of N anywhere there. */
export function gapsOf(
  branches: readonly Branch[],
  between: Range,
  signAt: (parameter: number) => Sign,
): Gap[] {
  const gaps: Gap[] = [];
  const add = (low: number, high: number) => {
    if (!(low < high)) return;
    const sign = signAt(low + (high - low) / 2);
    const too = sign === 0 ? null : sign > 0 ? "hot" : "cold";
    gaps.push(Object.freeze({ parameters: Object.freeze([low, high] as const), too }));
  };
  let covered = between[0];
  for (const { low, high } of [...branches].sort((a, b) => a.low.at - b.low.at)) {
    add(covered, low.atBracket[0]);
    covered = Math.max(covered, high.atBracket[1]);
  }
  add(covered, between[1]);
  return gaps;
}
