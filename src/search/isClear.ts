// Whether a function keeps away from zero between two places of one sign.
import type { Sign } from "./enclosed.ts";
import { leastBetween } from "./endpointForm.ts";
import type { Bounds, Place } from "./reader.ts";

/** The slope of s·f at least, and at most. */
export const fallOf = ({ slopeLow, slopeHigh }: Bounds, s: Sign): number => (s > 0 ? slopeLow : -slopeHigh);
export const riseOf = ({ slopeLow, slopeHigh }: Bounds, s: Sign): number => (s > 0 ? slopeHigh : -slopeLow);

const leastOf = ({ low, high }: Bounds, s: Sign): number => (s > 0 ? low : -high);

/** By the end-point form; the slope is at least that of `first` and at most that of `last`. */
export function isClear(left: Place, right: Place, first: Bounds, last: Bounds): boolean {
  const s = left.sign;
  return (
    leastBetween(
      { left: leastOf(left, s), right: leastOf(right, s) },
      { fall: fallOf(first, s), rise: riseOf(last, s) },
      right.x - left.x,
    ) > 0
  );
}
