// Bounds of products and differences of numbers that are known within bounds; every result is moved outwards.
import type { Range } from "../ground/range.ts";
import { above, below } from "../search/enclosed.ts";

/** Bounds, or `null` where nothing is known. */
export type Bounds = Range | null;

const hull = (values: readonly number[]): Bounds =>
  values.every(Number.isFinite) ? [below(Math.min(...values)), above(Math.max(...values))] : null;

/** Bounds of x·y. */
export const productOf = (x: Bounds, y: Bounds): Bounds =>
  x && y && hull([x[0] * y[0], x[0] * y[1], x[1] * y[0], x[1] * y[1]]);

/** Bounds of x − y. */
export const differenceOf = (x: Bounds, y: Bounds): Bounds => x && y && hull([x[0] - y[1], x[1] - y[0]]);

/** Whether no number within the bounds is 0. */
export const excludesZero = ([low, high]: Range): boolean => low > 0 || high < 0;
