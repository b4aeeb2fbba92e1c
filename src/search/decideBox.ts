// Decides a box, if what was read over it allows.
import { leastBetween } from "./endpointForm.ts";
import { judgeValley } from "./judgeValley.ts";
import type { Place } from "./reader.ts";
import { addZero, type Search } from "./search.ts";

/**
 * Tries, over the box between two places that `reader.piece` was read over: the sign of the value; monotony with proved
 * signs at both ends; the end-point form; the sign of the curvature. True when the zeros of the box are known (and added).
 */
export function decideBox(search: Search, left: Place, right: Place): boolean {
  const { piece } = search.reader;
  if (piece.sign !== 0) return true;
  const s = left.sign;
  if (s === 0 || right.sign === 0 || !piece.continuous) return false;
  if (piece.slopeSign !== 0) {
    addZero(search, left, right, piece.slopeSign);
    return true;
  }
  if (s !== right.sign) {
    // strictly convex or concave: exactly one zero
    if (piece.bend !== 0) addZero(search, left, right, 0);
    return piece.bend !== 0;
  }
  const ends = s > 0 ? { left: left.low, right: right.low } : { left: -left.high, right: -right.high };
  const slopes =
    s > 0
      ? { fall: piece.slopeLow, rise: piece.slopeHigh }
      : { fall: -piece.slopeHigh, rise: -piece.slopeLow };
  if (leastBetween(ends, slopes, right.x - left.x) > 0) return true;
  if (piece.bend === s) judgeValley(search, left, right);
  return piece.bend !== 0;
}
