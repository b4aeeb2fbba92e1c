import { anySumError } from "./errorFree.ts";
import { expPair, expParts } from "./expPair.ts";
import { GREATEST } from "./expReduction.ts";
import { scale } from "./powersOfTwo.ts";

/** From here down e^x is less than half the spacing of doubles above −1. */
const SATURATED = -38.2;
/** 2^-54: below it x²/2 is less than a quarter of the spacing of doubles at x. */
const TINY = 5.551115123125783e-17;

/**
 * e^x − 1, accurate for small x too, the same bits on every engine.
 *
 * Taylor's series below 1/64, above it e^x in two doubles less 1. Error below 0.52 ulp (bounded by proof).
 * expm1(±0) = ±0, expm1(−∞) = −1, expm1(∞) = ∞, expm1(NaN) = NaN; ∞ above 709.782712893384.
 */
export function expm1(x: number): number {
  if (!(x >= SATURATED && x <= GREATEST)) return x < SATURATED ? -1 : x > GREATEST ? Infinity : NaN;
  const size = Math.abs(x);
  if (size < TINY) return x;
  return size < 1 / 64 ? series(x) : difference(x);
}

function series(x: number): number {
  const c5 = 1 / 120 + x * (1 / 720 + x * (1 / 5040 + x * (1 / 40320)));
  return x + x * x * (1 / 2 + x * (1 / 6 + x * (1 / 24 + x * c5)));
}

function difference(x: number): number {
  const m = expPair(x, 0);
  const high = scale(expParts[0] as number, m);
  const low = scale(expParts[1] as number, m);
  const above = high - 1;
  return above + (anySumError(high, -1, above) + low);
}
