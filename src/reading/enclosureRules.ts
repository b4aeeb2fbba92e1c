// How each operation encloses its result. In the comments a = a' + x with a' between a.lo and a.hi and |x| <= a.err is a
// true value of a, and b = b' + y one of b. They are plain ASCII: bundlers keep comments inside of objects, and engines
// store a text with any other letter in twice the space.
import type { Op } from "../graph/op.ts";
import { encloseBranch } from "./encloseBranch.ts";
import { type Enclosure, ofSign, signOf } from "./enclosure.ts";
import type { EnclosureWriter } from "./enclosureWriter.ts";
import { extremes, extremesOfSquare, reciprocalOrder } from "./extremes.ts";

/** Encloses a node from its arguments; in a square they are one object. */
type Rule = (w: EnclosureWriter, ...args: [Enclosure, Enclosure, Enclosure, Enclosure]) => Enclosure;

const NOT_NEGATIVE = /* @__PURE__ */ ofSign(1);

/** One rule for each operation that can be enclosed; a missing one does not compile. */
export const ENCLOSE: Readonly<Record<Exclude<Op, "const" | "input" | "call">, Rule>> = {
  mean: (_, a) => a,
  neg: (w, { lo, hi, err, within }) => ({
    ...{ lo: w.neg(hi), hi: w.neg(lo), err },
    within: [-within[1], -within[0]],
  }),
  add: (w, a, b) =>
    w.roundedSum(w.add(a.lo, b.lo), w.add(a.hi, b.hi), w.sum(a.err, b.err), [
      a.within[0] + b.within[0],
      a.within[1] + b.within[1],
    ]),
  sub: (w, a, b) =>
    w.roundedSum(w.sub(a.lo, b.hi), w.sub(a.hi, b.lo), w.sum(a.err, b.err), [
      a.within[0] - b.within[1],
      a.within[1] - b.within[0],
    ]),
  // ab - a'b' = a'y + b'x + xy
  mul(w, a, b) {
    if (a === b) return square(w, a);
    const error = w.sum(w.times(w.sum(w.size(a), a.err), b.err), w.times(w.size(b), a.err));
    const { lo, hi } = extremes(w, "mul", a, b);
    return w.rounded(lo, hi, error, ofSign(signOf(a) * signOf(b)));
  },
  // a/b - a'/b' = x/b - (a'/b')(y/b), in an order in which nothing that underflows is divided by something small;
  // b must keep away from zero
  div(w, a, b) {
    const { lo, hi } = extremes(w, "div", a, reciprocalOrder(b));
    const within = ofSign(signOf(a) * signOf(b));
    const zero = w.literal(0);
    const above = w.less(b.lo, b.err);
    const below = w.less(w.neg(b.hi), b.err);
    const sign = signOf(b);
    const distance = sign > 0 ? above : sign < 0 ? below : w.pick(zero, b.lo, above, below);
    const error = w.sum(
      w.over(a.err, distance),
      w.times(w.size({ lo, hi, within }), w.over(b.err, distance)),
    );
    const declared = b.err === undefined && (b.within[0] > 0 || b.within[1] < 0);
    return w.rounded(lo, hi, declared ? error : w.provided(zero, distance, error), within);
  },
  // sqrt(a) - sqrt(a') = x / (sqrt(a) + sqrt(a')), no larger than x / sqrt(a'); a must not go below zero
  sqrt(w, a) {
    const lo = w.step("sqrt", a.lo);
    const hi = w.step("sqrt", a.hi);
    const zero = w.literal(0);
    let error: number | undefined;
    if (a.err !== undefined) error = w.provided(zero, w.less(a.lo, a.err), w.over(a.err, lo));
    else if (signOf(a) <= 0) error = w.pick(a.lo, zero, w.literal(NaN), zero);
    return w.rounded(lo, hi, error, NOT_NEGATIVE);
  },
  // e^a - e^a' = e^a'(e^x - 1), no larger than 1.06 e^a' |x| where |x| < 0.1
  exp: (w, a) =>
    w.approximate("exp", a, NOT_NEGATIVE, ({ hi }, err) =>
      err === undefined
        ? err
        : w.provided(w.widened(err) as number, w.literal(0.1), w.times(w.times(hi, w.literal(1.06)), err)),
    ),
  // ln a - ln a' is no larger than |x| / min(a, a'); a must stay above zero
  log: (w, a) =>
    w.approximate("log", a, ofSign(0), (_, err) => {
      const least = w.less(a.lo, err);
      return w.provided(w.literal(0), least, w.over(err, least));
    }),
  // no steeper than 1 - tanh(a')^2 + |x|, as its slope changes by less than |x|; 1e-15 is above the rounding of 1 - tanh^2
  tanh: (w, a) =>
    w.approximate("tanh", a, [signOf(a) > 0 ? 0 : -1, signOf(a) < 0 ? 0 : 1], (value, err) => {
      if (err === undefined) return err;
      const slope = w.sub(w.literal(1), extremesOfSquare(w, value).lo);
      return w.times(w.sum(w.sum(slope, w.literal(1e-15)), err), err);
    }),
  min: (w, a, b) => ({
    ...{ lo: w.least(a.lo, b.lo), hi: w.least(a.hi, b.hi), err: w.sum(a.err, b.err) },
    within: [Math.min(a.within[0], b.within[0]), Math.min(a.within[1], b.within[1])],
  }),
  max: (w, a, b) => ({
    ...{ lo: w.greatest(a.lo, b.lo), hi: w.greatest(a.hi, b.hi), err: w.sum(a.err, b.err) },
    within: [Math.max(a.within[0], b.within[0]), Math.max(a.within[1], b.within[1])],
  }),
  step: (w, a) => leap(w, a),
  pick: (w, ...args) => encloseBranch(w, true, args),
  jump: (w, ...args) => encloseBranch(w, false, args),
};

// 0 or 1 where the sign is proved, both where it is not; 1 at a difference that is exactly 0. A failure of a stays one, as its
// error has failed with it
function leap(w: EnclosureWriter, a: Enclosure): Enclosure {
  const zero = w.literal(0);
  const one = w.literal(1);
  const error = w.widened(a.err);
  const lo = error === undefined ? w.pick(a.lo, zero, zero, one) : w.pick(a.lo, error, zero, one);
  const hi = error === undefined ? w.pick(a.hi, zero, zero, one) : w.pick(a.hi, w.neg(error), zero, one);
  return { lo, hi, err: w.times(zero, error), within: [0, 1] };
}

// a² − a'² = 2a'α + α²
function square(w: EnclosureWriter, a: Enclosure): Enclosure {
  const error = w.times(w.sum(w.times(w.literal(2), w.size(a)), a.err), a.err);
  const most = Math.max(-a.within[0], a.within[1]);
  const { lo, hi } = extremesOfSquare(w, a);
  return w.rounded(lo, hi, error, [0, most * most]);
}
