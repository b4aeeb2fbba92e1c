// A small interval arithmetic with first and second derivatives, written for the tests of the search alone: every
// operation widens its bounds by several units in the last place. Slow and generous, independent of the library.
import type { Enclosed } from "../../src/search/enclosed.ts";

export type Span = readonly [number, number];
export interface Jet {
  readonly value: Span;
  readonly slope: Span;
  readonly bend: Span;
}

const WIDEN = 1e-15;
const NOTHING: Span = [Number.NaN, Number.NaN];
const wide = (lo: number, hi: number): Span => [
  lo - Math.abs(lo) * WIDEN - 1e-300,
  hi + Math.abs(hi) * WIDEN + 1e-300,
];
const exact = (x: number): Span => [x, x];

const plus = (a: Span, b: Span): Span => wide(a[0] + b[0], a[1] + b[1]);
const minus = (a: Span): Span => [-a[1], -a[0]];
export function times([a, b]: Span, [c, d]: Span): Span {
  const [p, q, r, s] = [a * c, a * d, b * c, b * d];
  return wide(Math.min(p, q, r, s), Math.max(p, q, r, s));
}
const square = (a: Span): Span =>
  a[0] > 0 || a[1] < 0
    ? times(a, a)
    : [0, wide(0, Math.max(a[0] * a[0], a[1] * a[1]))[1] + 0 * (a[0] + a[1])];
const inverse = (a: Span): Span => (a[0] > 0 || a[1] < 0 ? wide(1 / a[1], 1 / a[0]) : NOTHING);
const hull = (a: Span, b: Span): Span => [Math.min(a[0], b[0]), Math.max(a[1], b[1])];

export const constant = (x: number): Jet => ({ value: exact(x), slope: exact(0), bend: exact(0) });
export const add = (a: Jet, b: Jet): Jet => ({
  value: plus(a.value, b.value),
  slope: plus(a.slope, b.slope),
  bend: plus(a.bend, b.bend),
});
export const negate = (a: Jet): Jet => ({
  value: minus(a.value),
  slope: minus(a.slope),
  bend: minus(a.bend),
});
export const subtract = (a: Jet, b: Jet): Jet => add(a, negate(b));
export const scale = (k: number, a: Jet): Jet => multiply(constant(k), a);
export const shift = (a: Jet, k: number): Jet => add(a, constant(k));
export function multiply(a: Jet, b: Jet): Jet {
  const cross = times(a.slope, b.slope);
  return {
    value: times(a.value, b.value),
    slope: plus(times(a.slope, b.value), times(a.value, b.slope)),
    bend: plus(plus(times(a.bend, b.value), times(a.value, b.bend)), plus(cross, cross)),
  };
}

/** f(a) from the ranges of f, f′ and f″ over a's value. */
function chain(a: Jet, value: Span, first: Span, second: Span): Jet {
  return {
    value,
    slope: times(first, a.slope),
    bend: plus(times(second, square(a.slope)), times(first, a.bend)),
  };
}
export const squared = (a: Jet): Jet => chain(a, square(a.value), times([2, 2], a.value), exact(2));
export function reciprocal(a: Jet): Jet {
  const r = inverse(a.value);
  const r2 = times(r, r);
  return chain(a, r, minus(r2), times([2, 2], times(r2, r)));
}
export function root(a: Jet): Jet {
  if (!(a.value[0] >= 0)) return { value: NOTHING, slope: NOTHING, bend: NOTHING };
  const r = wide(Math.sqrt(a.value[0]), Math.sqrt(a.value[1]));
  const half = times([0.5, 0.5], inverse(r));
  return chain(a, r, half, times([-0.5, -0.5], times(half, inverse(a.value))));
}
/** The engine's tanh is off by up to three units in the last place; `wide` covers more. */
export function tanh(a: Jet): Jet {
  const t = wide(Math.tanh(a.value[0]), Math.tanh(a.value[1]));
  const first = plus([1, 1], minus(square(t)));
  return chain(a, t, first, times([-2, -2], times(t, first)));
}

/** The larger of two; where that is not known, both slopes count and the curvature is unknown. */
export function larger(a: Jet, b: Jet): Jet {
  if (a.value[0] > b.value[1]) return a;
  if (b.value[0] > a.value[1]) return b;
  const value: Span = [Math.max(a.value[0], b.value[0]), Math.max(a.value[1], b.value[1])];
  return { value, slope: hull(a.slope, b.slope), bend: NOTHING };
}
export const smaller = (a: Jet, b: Jet): Jet => negate(larger(negate(a), negate(b)));
export const magnitude = (a: Jet): Jet => larger(a, negate(a));
/** `below` where a < 0, else `from`: a leap has no slope. */
export function step(a: Jet, below: Jet, from: Jet): Jet {
  if (a.value[1] < 0) return below;
  if (a.value[0] >= 0) return from;
  return { value: hull(below.value, from.value), slope: NOTHING, bend: NOTHING };
}
/** Coefficients from the constant term upwards. */
export const polynomial =
  (coefficients: readonly number[]) =>
  (x: Jet): Jet =>
    coefficients.reduceRight((sum, c) => shift(multiply(sum, x), c), constant(0));

/** Reads a function of jets as enclosures; half of each widening is handed over as an error bound. */
export function enclosedBy(f: (x: Jet) => Jet): Enclosed {
  const write = (span: Span, out: Float64Array, at: number): void => {
    const err = Math.max(Math.abs(span[0]), Math.abs(span[1])) * 5e-16;
    out[at] = span[0] + err / 2;
    out[at + 1] = span[1] - err / 2;
    out[at + 2] = err;
  };
  const read = (a: number, b: number): Jet => f({ value: [a, b], slope: exact(1), bend: exact(0) });
  return {
    box(a, b, out) {
      const jet = read(a, b);
      write(jet.value, out, 0);
      write(jet.slope, out, 3);
      write(jet.bend, out, 6);
    },
    point(x, out) {
      const jet = read(x, x);
      write(jet.value, out, 0);
      write(jet.slope, out, 3);
    },
  };
}
