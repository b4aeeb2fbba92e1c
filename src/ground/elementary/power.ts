import { productError } from "./errorFree.ts";
import { expPair, expParts } from "./expPair.ts";
import { GREATEST, LEAST } from "./expReduction.ts";
import { logPair } from "./logPair.ts";
import { logParts } from "./logReduction.ts";
import { scale } from "./powersOfTwo.ts";

/**
 * base^exponent for a base of 0 or more and a real exponent, the same bits on every engine.
 *
 * e^(exponent · ln base) with the logarithm and the product in two doubles each. Error below 0.576 ulp,
 * below 0.79 ulp where the result is subnormal (bounded by proof); exact where the exact result is a
 * double. x^0 = 1, 0 and ∞ included; 0^y is 0 for y > 0 and ∞ for y < 0 (whatever the sign of that 0), ∞^y
 * the reverse; NaN for a NaN, for a base below 0, even with an integer exponent, and for 1^±∞.
 */
export function power(base: number, exponent: number): number {
  if (!(base >= 0) || Number.isNaN(exponent)) return NaN;
  if (exponent === 0) return 1;
  if (base === 0 || base === Infinity) return (base === 0) === exponent > 0 ? 0 : Infinity;
  const logarithm = logPair(base);
  const product = exponent * logarithm;
  if (product === 0) return 1;
  if (!(product >= LEAST && product <= GREATEST))
    return product < LEAST ? 0 : product > GREATEST ? Infinity : NaN;
  const tail = productError(exponent, logarithm, product) + exponent * (logParts[1] as number);
  const m = expPair(product, tail);
  return scale(expParts[0] as number, m);
}
