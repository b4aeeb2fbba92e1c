// The 128 cells of the argument of log, each with a short reciprocal and its logarithm, computed on first use.
import { add, type DoubleDouble, divide, multiply } from "./doubleDouble.ts";
import { fillPowersOfTwo } from "./powersOfTwo.ts";

/** ln 2 to a multiple of 2^-42, so that its products with exponents are exact. */
export const LN2_HIGH = 0.6931471805598903;
/** ln 2 − LN2_HIGH. */
export const LN2_LOW = 5.497923018708371e-14;
/** From this cell on (arguments above about √2) the argument counts as half and the exponent as one more. */
export const HALVED = 53;

/** c: about the reciprocal of the middle of cell j, which is [1 + j/128, 1 + (j + 1)/128); a multiple of 1/512. */
export const reciprocal = /* @__PURE__ */ new Float64Array(128);
/** −ln c, or −ln 2c from cell 53 on, to a multiple of 2^-42. */
export const logHigh = /* @__PURE__ */ new Float64Array(128);
/** What is missing from logHigh. */
export const logLow = /* @__PURE__ */ new Float64Array(128);

/** ln(a/b) for near integers: twice the series z + z³/3 + z⁵/5 + … in z = (a − b)/(a + b). */
function logRatio(a: number, b: number): DoubleDouble {
  const z = divide(a - b, a + b);
  const square = multiply(z, z);
  let sum: DoubleDouble = [0, 0];
  for (let n = 13; n >= 1; n -= 2) sum = add(multiply(sum, square), divide(2, n));
  return multiply(z, sum);
}

/** Fills the cells from first towards end, away from the one whose scaled reciprocal, last/512, is 1. */
function walk(first: number, end: number, step: number, last: number): void {
  let sum: DoubleDouble = [0, 0];
  let from = last;
  for (let j = first; j !== end; j += step) {
    const to = j === first ? last : Math.round(512 / (1 + (j + 0.5) / 128));
    sum = add(sum, logRatio(from, to));
    from = to;
    const high = sum[0] + 1536 - 1536;
    reciprocal[j] = to / 512;
    logHigh[j] = high;
    logLow[j] = sum[0] - high + sum[1];
  }
}

/** Fills the table from both ends, so that the logarithms next to 0 are exactly 0. */
export function fillLogTable(): void {
  fillPowersOfTwo();
  walk(0, HALVED, 1, 512);
  walk(127, HALVED - 1, -1, 256);
}
