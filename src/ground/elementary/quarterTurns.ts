// How cos and sin split their argument: x = k·π/2 + r.
import { anySumError, sumError } from "./errorFree.ts";
import { ROUNDER } from "./rounder.ts";

/** The greatest |x| that reduceTurns takes, rad. */
export const FARTHEST = 1e6;

/** 2/π. */
const PER_QUARTER = 0.6366197723675814;
/** π/2 in four parts, the first three of at most 33 bits, so that k times each is exact for |k| < 2^20. */
const QUARTER_1 = 1.5707963267341256;
const QUARTER_2 = 6.077100506303966e-11;
const QUARTER_3 = 2.0222662487111665e-21;
const QUARTER_4 = 8.4784276603689e-32;

/** Where reduceTurns leaves r, |r| ≤ π/4 or a hair more, and its rounding error. */
export const turnParts = /* @__PURE__ */ new Float64Array(2);

/** Leaves r = x − k·π/2 in turnParts and returns k modulo 4. For |x| ≤ FARTHEST. */
export function reduceTurns(x: number): number {
  const k = x * PER_QUARTER + ROUNDER - ROUNDER;
  const a = x - k * QUARTER_1;
  const b = k * QUARTER_2;
  const first = a - b;
  const c = k * QUARTER_3;
  const second = first - c;
  const rest = anySumError(a, -b, first) + anySumError(first, -c, second) - k * QUARTER_4;
  const r = second + rest;
  turnParts[0] = r;
  turnParts[1] = sumError(second, rest, r);
  return k & 3;
}
