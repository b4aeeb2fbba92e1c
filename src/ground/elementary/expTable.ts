// The 128 fractional powers of two behind exp, computed on first use.
import { type DoubleDouble, multiply, squareRoot } from "./doubleDouble.ts";
import { fillPowersOfTwo } from "./powersOfTwo.ts";

/** 2^(j/128) rounded to a double; zeros until filled. */
export const expHigh = /* @__PURE__ */ new Float64Array(128);
/** What is missing from expHigh. */
export const expLow = /* @__PURE__ */ new Float64Array(128);

/** Fills the table: 2^(1/2), 2^(1/4) … by square roots, the entries between them by products. */
export function fillExpTable(): void {
  fillPowersOfTwo();
  let root: DoubleDouble = [2, 0];
  expHigh[0] = 1;
  for (let stride = 64; stride >= 1; stride /= 2) {
    root = squareRoot(root);
    for (let j = 0; j < 128; j += 2 * stride) {
      const entry: DoubleDouble = [expHigh[j] as number, expLow[j] as number];
      [expHigh[j + stride], expLow[j + stride]] = multiply(entry, root);
    }
  }
}
