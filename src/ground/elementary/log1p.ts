import { anySumError } from "./errorFree.ts";
import { logOfSum } from "./logOfSum.ts";
import { logSeries } from "./logSeries.ts";

/** 2^-54: below it x²/2 is less than a quarter of the spacing of doubles at x. */
const TINY = 5.551115123125783e-17;

/**
 * ln(1 + x), accurate for small x too, the same bits on every engine.
 *
 * Taylor's series below 1/128, above it the logarithm of 1 + x and of what rounding took from that sum.
 * Error below 0.514 ulp (bounded by proof). log1p(±0) = ±0, log1p(−1) = −∞, log1p(∞) = ∞; NaN for NaN
 * and below −1.
 */
export function log1p(x: number): number {
  if (!(x > -1 && x < Infinity)) return x === -1 ? -Infinity : x > 0 ? x : NaN;
  const size = Math.abs(x);
  if (size < TINY) return x;
  if (size < 1 / 128) return x + logSeries(x);
  const sum = 1 + x;
  return logOfSum(sum, anySumError(1, x, sum));
}
