import { logOfSum } from "./logOfSum.ts";

/**
 * The natural logarithm ln x, the same bits on every engine.
 *
 * x = 2^e·(1 + f)/c with c from a table of 128 cells; ln x = e·ln 2 − ln c + f + (ln(1 + f) − f), the last
 * by Taylor's series. Error below 0.514 ulp (bounded by proof), subnormal arguments included. log(±0) = −∞,
 * log(∞) = ∞, log(1) = 0; NaN for NaN and below 0. After Tang 1990, ACM Trans. Math. Softw. 16, 378.
 */
export function log(x: number): number {
  if (!(x > 0 && x < Infinity)) return x === 0 ? -Infinity : x > 0 ? x : NaN;
  return logOfSum(x, 0);
}
