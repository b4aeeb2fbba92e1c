// Refines a sign change to the precision of the arithmetic.

/** A sample of a function with its slope. */
interface Sample {
  readonly x: number;
  readonly value: number;
  readonly slope: number;
}

const MOST_STEPS = 120;

/** A refined sign change. */
export interface Refined {
  readonly at: number;
  readonly bracket: readonly [number, number];
  /** True where the function is positive below. */
  readonly falling: boolean;
  /** True where the function does not come near zero: a pole or a step. */
  readonly jump: boolean;
}

/** At a continuous zero the ends of the tightest bracket are smaller than this share of the ends of the first. */
const CONTINUOUS = 1e-6;

/**
 * Newton's method kept inside a shrinking bracket: a step that leaves it becomes a bisection. Signs are compared, never
 * multiplied. The bracket returned is the tightest found around the zero whose ends have observed opposite signs.
 */
export function refineZero(sample: (x: number) => Sample, left: Sample, right: Sample): Refined {
  const falling = left.value > 0;
  const at = converge(sample, left, right);
  let step = 2.3e-16 * Math.abs(at) + Number.MIN_VALUE;
  for (; step < right.x - left.x; step *= 3) {
    const a = sample(Math.max(left.x, at - step));
    const b = sample(Math.min(right.x, at + step));
    if (falling ? a.value > 0 && b.value < 0 : a.value < 0 && b.value > 0) {
      const near = Math.min(Math.abs(a.value), Math.abs(b.value));
      const jump = near > CONTINUOUS * Math.max(Math.abs(left.value), Math.abs(right.value));
      return { at, bracket: [a.x, b.x], falling, jump };
    }
  }
  return { at, bracket: [left.x, right.x], falling, jump: false };
}

function converge(sample: (x: number) => Sample, left: Sample, right: Sample): number {
  let [low, high] = [left.x, right.x];
  let x = low + (high - low) / 2;
  for (let i = 0; i < MOST_STEPS; i++) {
    const p = sample(x);
    if (p.value === 0) break;
    if (p.value > 0 === left.value > 0) low = x;
    else high = x;
    const newton = x - p.value / p.slope;
    const next = newton > low && newton < high ? newton : low + (high - low) / 2;
    const settled = Math.abs(next - x) <= 2.3e-16 * Math.abs(x) || next === low || next === high;
    x = next;
    if (settled) break;
  }
  return x;
}
