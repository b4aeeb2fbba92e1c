// The 128 fractional powers of two behind exp, computed on first use.
import { type DoubleDouble, multiply, squareRoot } from "./doubleDouble.ts";
import { fillPowersOfTwo } from "./powersOfTwo.ts";

/** 2^(j/128) rounded to a double; zeros until filled. */
export const expHigh = /* @__PURE__ */ new Float64Array(128);
/** What is missing from expHigh. */
export const expLow = /* @__PURE__ */ new Float64Array(128);

function enter(j: number, value: DoubleDouble): void {
  expHigh[j] = value[0];
  expLow[j] = value[1];
}

function entry(j: number): DoubleDouble {
  return [expHigh[j] as number, expLow[j] as number];
}

/** Fills the table: 2^(1/2), 2^(1/4) … by square roots, the entries between them by products. */
export function fillExpTable(): void {
  fillPowersOfTwo();
  let root: DoubleDouble = [2, 0];
  enter(0, [1, 0]);
  for (let stride = 64; stride >= 1; stride /= 2) {
    root = squareRoot(root);
    for (let j = 0; j < 128; j += 2 * stride) enter(j + stride, multiply(entry(j), root));
  }
}
