// What the proved search is given: enclosures of a function of one unknown.

/**
 * A function as enclosures. Each bound comes as (lo, hi, err): the truth lies in [lo − err, hi + err].
 *
 * Over a box [a, b], finite numbers are a promise. Value: the function is defined everywhere in the box. Slope: it is
 * continuous there, and every difference quotient lies in the enclosure; so a kink counts with both its slopes, and a
 * leap has no finite slope. Curvature: the same of the slope; so a kink has no finite curvature.
 * NaN and infinity promise nothing.
 */
export interface Enclosed {
  /** Writes value, slope and curvature for x in [a, b]: 9 numbers. */
  box(a: number, b: number, out: Float64Array): void;
  /** Writes value and slope at x: 6 numbers. Where boxes on both sides of x have curvatures, the slope is the one they share. */
  point(x: number, out: Float64Array): void;
}

/** A proved sign; 0: not proved. */
export type Sign = 1 | -1 | 0;

/** Whether both bounds are finite and in order; false for NaN. */
export const bounded = (low: number, high: number): boolean =>
  low > Number.NEGATIVE_INFINITY && low <= high && high < Number.POSITIVE_INFINITY;

/** The sign of everything in [lo − err, hi + err]. */
export function signOf(lo: number, hi: number, err: number): Sign {
  // a difference of doubles has the sign of the exact difference, so nothing needs rounding here
  const low = lo - err;
  const high = hi + err;
  if (!bounded(low, high)) return 0;
  return low > 0 ? 1 : high < 0 ? -1 : 0;
}

/** Two units of roundoff: more than a sum of two doubles can be wrong by, relative to itself. */
const ROUNDING = 2.3e-16;
/** More than what gradual underflow can lose. */
const TINY = 1e-300;

/** A bound moved outwards by more than the rounding of the sum that made it. */
export const below = (x: number): number => x - Math.abs(x) * ROUNDING - TINY;
export const above = (x: number): number => x + Math.abs(x) * ROUNDING + TINY;
