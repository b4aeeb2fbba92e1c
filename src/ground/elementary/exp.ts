import { GREATEST, LEAST, STEP_HIGH, STEP_LOW, STEPS } from "./expReduction.ts";
import { expHigh, expLow, fillExpTable } from "./expTable.ts";
import { scale } from "./powersOfTwo.ts";
import { ROUNDER } from "./rounder.ts";

/**
 * The exponential function e^x, the same bits on every engine.
 *
 * x = (128m + j)(ln 2)/128 + r and e^x = 2^m · 2^(j/128) · e^r, the second factor from a table, the third
 * by Taylor's series. Error below 0.513 ulp, below 0.76 ulp where the result is subnormal (bounded by
 * proof). exp(±0) = 1, exp(−∞) = 0, exp(∞) = ∞, exp(NaN) = NaN; ∞ above 709.782712893384, 0 below
 * −745.1332191019411. After Tang 1989, ACM Trans. Math. Softw. 15, 144.
 */
export function exp(x: number): number {
  if (!(x >= LEAST && x <= GREATEST)) return x < LEAST ? 0 : x > GREATEST ? Infinity : NaN;
  if (expHigh[0] === 0) fillExpTable();
  const k = x * STEPS + ROUNDER - ROUNDER;
  const a = x - k * STEP_HIGH;
  const r = a - k * STEP_LOW;
  const p = r + r * r * (1 / 2 + r * (1 / 6 + r * (1 / 24 + r * (1 / 120))));
  const j = k & 127;
  const high = expHigh[j] as number;
  return scale(high + ((expLow[j] as number) + high * p), k >> 7);
}
