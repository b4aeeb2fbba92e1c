// The 128 cells of log's argument, each with a short reciprocal and its logarithm, computed on first use.
import { fillPowersOfTwo } from "./powersOfTwo.ts";

/** ln 2 to a multiple of 2^-42, so that its products with exponents are exact. */
export const LN2_HIGH = 0.6931471805598903;
/** ln 2 − LN2_HIGH. */
export const LN2_LOW = 5.497923018708371e-14;
/** From this cell on (arguments above about √2) the argument counts as half and the exponent as one more. */
export const HALVED = 53;
/** Added and taken away again, it rounds a number of size below 512 to a multiple of 2^-42. */
const ROUNDER_42 = 1536;

/** c: a multiple of 1/512, near the reciprocal of the middle of cell j, from 1 + j/128 to 1 + (j + 1)/128. */
export const reciprocal = /* @__PURE__ */ new Float64Array(128);
/** −ln c, or −ln 2c from cell HALVED on, to a multiple of 2^-42. */
export const logHigh = /* @__PURE__ */ new Float64Array(128);
/** What is missing from logHigh, to about 2^-74. */
export const logLow = /* @__PURE__ */ new Float64Array(128);

/**
 * Fills the cells from first towards end, away from the one whose c (or 2c) is 1: last is 512·c there. From
 * one cell to the next the logarithm grows by ln(a/b) = q + q³/12 + q⁵/80 + …, q = 2(a − b)/(a + b), for
 * the integers a and b that are 512·c of the two. The sum of the leading terms is kept exact.
 */
function walk(first: number, end: number, step: number, last: number): void {
  let high = 0;
  let low = 0;
  let a = last;
  for (let j = first; j !== end; j += step) {
    const b = j === first ? last : Math.round(512 / (1 + (j + 0.5) / 128));
    const q = (2 * (a - b)) / (a + b);
    const upper = q + ROUNDER_42 - ROUNDER_42;
    const lower = (2 * (a - b) - upper * (a + b)) / (a + b);
    const z = q * q;
    const series = (q * z * (1 + z * (12 / 80 + z * (12 / 448 + z * (12 / 2304 + z * (12 / 11264)))))) / 12;
    const carry = low + lower + series + ROUNDER_42 - ROUNDER_42;
    high += upper + carry;
    low = low - carry + lower + series;
    reciprocal[j] = b / 512;
    logHigh[j] = high;
    logLow[j] = low;
    a = b;
  }
}

/** Fills the table from both ends, so that the logarithms next to 0 are exactly 0. */
export function fillLogTable(): void {
  fillPowersOfTwo();
  walk(0, HALVED, 1, 512);
  walk(127, HALVED - 1, -1, 256);
}
