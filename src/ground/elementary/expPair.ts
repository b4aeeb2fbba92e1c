// The exponential to about 67 bits, for the functions that are built on it.
import { productError, sumError } from "./errorFree.ts";
import { STEP_HIGH, STEP_LOW, STEPS } from "./expReduction.ts";
import { expHigh, expLow, fillExpTable } from "./expTable.ts";
import { ROUNDER } from "./rounder.ts";

/** Where expPair leaves the two parts of its result. */
export const expParts = /* @__PURE__ */ new Float64Array(2);

/**
 * e^(x + tail) = (expParts[0] + expParts[1])·2^m; returns m. For x in [LEAST, GREATEST] and
 * |tail| ≤ 2^-50·|x|. The sum of the parts lies in [0.99, 2.01] and is right to 2^-67 of itself.
 */
export function expPair(x: number, tail: number): number {
  if (expHigh[0] === 0) fillExpTable();
  const k = x * STEPS + ROUNDER - ROUNDER;
  const a = x - k * STEP_HIGH;
  const b = tail - k * STEP_LOW;
  const r = a + b;
  const rTail = sumError(a, b, r);
  const series = 1 / 2 + r * (1 / 6 + r * (1 / 24 + r * (1 / 120 + r * (1 / 720))));
  const p = rTail + r * r * series;
  const j = k & 127;
  const high = expHigh[j] as number;
  const low = expLow[j] as number;
  const first = high * r;
  const sum = high + first;
  const rest = sumError(high, first, sum) + (productError(high, r, first) + (low * (1 + r) + high * p));
  const upper = sum + rest;
  expParts[0] = upper;
  expParts[1] = sumError(sum, rest, upper);
  return k >> 7;
}
