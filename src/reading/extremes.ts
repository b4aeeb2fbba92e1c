// The least and the greatest product or quotient of two enclosures, errors aside.
import { type Ends, isPoint, signOf } from "./enclosure.ts";
import type { EnclosureWriter } from "./enclosureWriter.ts";

type Two = (x: number, y: number) => number;

/**
 * [lo, hi] of f = a·b over the ends of a and b. Signs that are known for good choose the ends here; the sign of a point
 * chooses them at run time; only two intervals of unknown sign need all four products.
 */
export function extremes(w: EnclosureWriter, f: Two, a: Ends, b: Ends): [lo: number, hi: number] {
  if (signOf(b) || isPoint(a)) return fromFirst(w, f, a, b);
  if (signOf(a) || isPoint(b)) return fromFirst(w, (y, x) => f(x, y), b, a);
  const [p, q, r, s] = [f(a.lo, b.lo), f(a.lo, b.hi), f(a.hi, b.lo), f(a.hi, b.hi)];
  return [w.least(w.least(p, q), w.least(r, s)), w.greatest(w.greatest(p, q), w.greatest(r, s))];
}

/** b with its ends in the order of their reciprocals, so that a/b has its extremes where a·(1/b) has. */
export const reciprocalOrder = (b: Ends): Ends => ({ ...b, lo: b.hi, hi: b.lo });

/** [lo, hi] of a². */
export function extremesOfSquare(w: EnclosureWriter, a: Ends): [lo: number, hi: number] {
  const low = w.mul(a.lo, a.lo);
  const high = w.mul(a.hi, a.hi);
  const sign = signOf(a);
  if (sign || isPoint(a)) return sign < 0 ? [high, low] : [low, high];
  const zero = w.literal(0);
  return [w.pick(zero, a.lo, low, w.pick(a.hi, zero, high, zero)), w.greatest(low, high)];
}

/** Where b keeps its sign or a is a point, the end of a is known and its sign chooses the end of b. */
function fromFirst(w: EnclosureWriter, f: Two, a: Ends, b: Ends): [lo: number, hi: number] {
  const sign = signOf(a);
  const [near, far] = signOf(b) < 0 ? [a.hi, a.lo] : [a.lo, a.hi];
  const choose = (x: number, ifBelow: number, ifAbove: number) =>
    sign ? (sign < 0 ? ifBelow : ifAbove) : w.pick(x, w.literal(0), ifBelow, ifAbove);
  return [f(near, choose(near, b.hi, b.lo)), f(far, choose(far, b.lo, b.hi))];
}
