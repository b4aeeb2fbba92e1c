// Arithmetic of a few intervals with outward rounding.
import type { Range } from "../ground/range.ts";
import { above, below } from "./enclosed.ts";

/** An interval in one of its three numbers (lo, hi, err) of an enclosure. */
export const rangeAt = (out: Float64Array, i: number): Range => [
  below((out[3 * i] as number) - (out[3 * i + 2] as number)),
  above((out[3 * i + 1] as number) + (out[3 * i + 2] as number)),
];

export const plus = (a: Range, b: Range): Range => [below(a[0] + b[0]), above(a[1] + b[1])];
export const minus = (a: Range): Range => [-a[1], -a[0]];

/** Products of corners; NaN where a bound is not a number. */
export const times = (a: Range, b: Range): Range => hull(a[0] * b[0], a[0] * b[1], a[1] * b[0], a[1] * b[1]);

/** NaN where the divisor may be zero. */
export const over = (a: Range, b: Range): Range =>
  b[0] > 0 || b[1] < 0 ? hull(a[0] / b[0], a[0] / b[1], a[1] / b[0], a[1] / b[1]) : [NaN, NaN];

/** What both have in common; in the wrong order where that is nothing. */
export const meet = (a: Range, b: Range): Range => [Math.max(a[0], b[0]), Math.min(a[1], b[1])];

/** The sign of all of it; 0 where it is not one. */
export const signOfRange = ([low, high]: Range): 1 | -1 | 0 => (low > 0 ? 1 : high < 0 ? -1 : 0);

function hull(a: number, b: number, c: number, d: number): Range {
  return [below(Math.min(a, b, c, d)), above(Math.max(a, b, c, d))];
}
