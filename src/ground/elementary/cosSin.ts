// Cosine and sine.
import { productError, sumError } from "./errorFree.ts";
import { FARTHEST, reduceTurns, turnParts } from "./quarterTurns.ts";

/** 2^-27: below it x³/6 is less than half the spacing of doubles at x. */
const TINY = 7.450580596923828e-9;

/**
 * The cosine of an angle in radians, the same bits on every engine, exactly even.
 *
 * x = k·π/2 + r with r in two doubles, then Taylor's series. Error below 0.8 ulp (bounded by proof).
 * |x| ≤ 10⁶; NaN beyond, for ±∞ and for NaN. cos(±0) = 1.
 */
export function cos(x: number): number {
  if (!(Math.abs(x) <= FARTHEST)) return NaN;
  return quarter(reduceTurns(x) + 1);
}

/**
 * The sine of an angle in radians, the same bits on every engine, exactly odd.
 *
 * Method, error and range as for cos. sin(±0) = ±0.
 */
export function sin(x: number): number {
  const size = Math.abs(x);
  if (!(size <= FARTHEST)) return NaN;
  return size < TINY ? x : quarter(reduceTurns(x));
}

/** sin(r + k·π/2), r being what reduceTurns left. */
function quarter(k: number): number {
  const r = turnParts[0] as number;
  const tail = turnParts[1] as number;
  const value = (k & 1) === 0 ? sinSeries(r, tail) : cosSeries(r, tail);
  return (k & 2) === 0 ? value : -value;
}

function sinSeries(r: number, tail: number): number {
  const z = r * r;
  const c13 = 1 / 6227020800 + z * (-1 / 1307674368000 + z * (1 / 355687428096000));
  const c7 = -1 / 5040 + z * (1 / 362880 + z * (-1 / 39916800 + z * c13));
  const cube = r * z;
  const small = cube * z * (1 / 120 + z * c7) + tail * (1 - z / 2);
  return r + (small - cube / 6);
}

function cosSeries(r: number, tail: number): number {
  const z = r * r;
  const half = z / 2;
  const c12 = 1 / 479001600 + z * (-1 / 87178291200 + z * (1 / 20922789888000));
  const c6 = -1 / 720 + z * (1 / 40320 + z * (-1 / 3628800 + z * c12));
  const fourth = z * z * (1 / 24 + z * c6);
  const near = 1 - half;
  return near + (sumError(1, -half, near) + (fourth - (productError(r, r, z) / 2 + r * tail)));
}
