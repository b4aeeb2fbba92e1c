// Parameters for which no state lies in the searched range of temperature.
import type { Range } from "../ground/range.ts";
import type { Sign } from "../search/enclosed.ts";
import type { Branch, Gap, UndecidedStretch } from "./diagram.ts";

/**
 * What is left of the parameter's range when that of every branch, and of all that is undecided, is taken away; `signAt` is the
 * sign of N anywhere there.
 */
export function gapsOf(
  { branches, undecided }: { branches: readonly Branch[]; undecided: readonly UndecidedStretch[] },
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
  const taken = [
    ...branches.map(({ low, high }): Range => [low.atBracket[0], high.atBracket[1]]),
    ...undecided.map(({ parameters }) => parameters),
  ];
  for (const [low, high] of taken.sort((a, b) => a[0] - b[0])) {
    add(covered, low);
    covered = Math.max(covered, high);
  }
  add(covered, between[1]);
  return gaps;
}
