// How log splits its argument: x = 2^e·(1 + f)/c.
import { sumError } from "./errorFree.ts";
import { fillLogTable, HALVED, reciprocal } from "./logTable.ts";
import { powerOfTwo } from "./powersOfTwo.ts";

const LEAST_NORMAL = 2.2250738585072014e-308;
const TWO_TO_54 = 18014398509481984;
/** Added and taken away again, it keeps the bits of a number in [1, 2) down to 2^-26. */
const SPLITTER = 67108864;

const bits = /* @__PURE__ */ new DataView(/* @__PURE__ */ new ArrayBuffer(8));

/** Where reduceLog leaves f and its rounding error. */
export const logParts = /* @__PURE__ */ new Float64Array(2);

/**
 * x + tail = 2^e·(1 + logParts[0] + logParts[1])/c, where c is 2·reciprocal[j] from cell HALVED on; returns
 * 128e + j. For x > 0 and |tail| up to half an ulp of x; exact when the tail is 0.
 */
export function reduceLog(x: number, tail: number): number {
  if (reciprocal[0] === 0) fillLogTable();
  if (x < LEAST_NORMAL) return reduceLog(x * TWO_TO_54, 0) - 54 * 128;
  bits.setFloat64(0, x);
  const word = bits.getInt32(0);
  const e = (word >> 20) - 1023;
  const j = (word >> 13) & 127;
  const unit = powerOfTwo(-e);
  const c = reciprocal[j] as number;
  const m = x * unit;
  const upper = m + SPLITTER - SPLITTER;
  const lower = m - upper;
  const a = upper * c - 1;
  const b = (lower + tail * unit) * c;
  const f = a + b;
  logParts[0] = f;
  logParts[1] = sumError(a, b, f);
  return (j < HALVED ? e : e + 1) * 128 + j;
}
