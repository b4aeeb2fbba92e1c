// The least and the greatest product or quotient of two enclosures, errors aside.
import { type Ends, isPoint, signOf } from "./enclosure.ts";
import type { EnclosureWriter } from "./enclosureWriter.ts";

/** The least and the greatest of some numbers, as registers. */
interface Extremes {
  readonly lo: number;
  readonly hi: number;
}
type Two = (x: number, y: number) => number;

/**
 * Of a·b, or a/b, over the ends of a and b. Signs that are known for good choose the ends here; the sign of a point chooses
 * them at run time; only two intervals of unknown sign need all four products.
 */
export function extremes(w: EnclosureWriter, op: "mul" | "div", a: Ends, b: Ends): Extremes {
  const f: Two = (x, y) => w.step(op, x, y);
  if (signOf(b) || isPoint(a)) return fromFirst(w, f, a, b);
  if (signOf(a) || isPoint(b)) return fromFirst(w, (y, x) => f(x, y), b, a);
  const p = f(a.lo, b.lo);
  const q = f(a.lo, b.hi);
  const r = f(a.hi, b.lo);
  const s = f(a.hi, b.hi);
  return {
    lo: w.least(w.least(p, q), w.least(r, s)),
    hi: w.greatest(w.greatest(p, q), w.greatest(r, s)),
  };
}

/** b with its ends in the order of their reciprocals, so that a/b has its extremes where a·(1/b) has. */
export const reciprocalOrder = ({ lo, hi, within }: Ends): Ends => ({ lo: hi, hi: lo, within });

/** Of a². */
export function extremesOfSquare(w: EnclosureWriter, a: Ends): Extremes {
  const low = w.mul(a.lo, a.lo);
  const high = w.mul(a.hi, a.hi);
  const sign = signOf(a);
  if (sign || isPoint(a)) return sign < 0 ? { lo: high, hi: low } : { lo: low, hi: high };
  const zero = w.literal(0);
  return {
    lo: w.pick(zero, a.lo, low, w.pick(a.hi, zero, high, zero)),
    hi: w.greatest(low, high),
  };
}

/** Where b keeps its sign or a is a point, the end of a is known and its sign chooses the end of b. */
function fromFirst(w: EnclosureWriter, f: Two, a: Ends, b: Ends): Extremes {
  const sign = signOf(a);
  const falls = signOf(b) < 0;
  const near = falls ? a.hi : a.lo;
  const far = falls ? a.lo : a.hi;
  const choose = (x: number, ifBelow: number, ifAbove: number) =>
    sign ? (sign < 0 ? ifBelow : ifAbove) : w.pick(x, w.literal(0), ifBelow, ifAbove);
  return { lo: f(near, choose(near, b.hi, b.lo)), hi: f(far, choose(far, b.lo, b.hi)) };
}
