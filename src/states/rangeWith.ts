// The range of temperature in which a state is followed.
import { fail } from "../ground/errors.ts";
import { checkedRange, holds, type Range, showRange } from "../ground/range.ts";
import type { Loop } from "../loop/types.ts";

/** Where nothing else is asked for, K: from the cold of space to molten rock. */
export const USUAL_WITHIN: Range = [2.7, 2000];

/** A range of temperature with the state in it. Throws `out-of-range` for one that the state is outside of. */
export function rangeWith(range: Range | undefined, loop: Loop, temperature: number): Range {
  if (range === undefined)
    return [Math.min(USUAL_WITHIN[0], temperature), Math.max(USUAL_WITHIN[1], temperature)];
  const checked = checkedRange(range, "within", "K", loop.variables[0]?.within);
  if (!holds(checked, temperature))
    fail("out-of-range", {
      path: "within",
      value: showRange(checked),
      allowed: `a range around the state, which is at ${temperature}`,
      unit: "K",
    });
  return checked;
}
