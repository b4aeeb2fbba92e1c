// Refines a sign change to the precision of the arithmetic.

/** A sample of a function with its slope. */
interface Sample {
  readonly x: number;
  readonly value: number;
  readonly slope: number;
}

const MOST_STEPS = 120;

/**
 * Newton's method kept inside a shrinking bracket: a step that leaves it becomes a bisection. Signs are compared, never
 * multiplied. The bracket returned is the tightest found around the zero whose ends have observed opposite signs.
 */
export function refineZero(
  sample: (x: number) => Sample,
  left: Sample,
  right: Sample,
): { at: number; bracket: readonly [number, number]; falling: boolean } {
  const falling = left.value > 0;
  let [low, high] = [left.x, right.x];
  let x = low + (high - low) / 2;
  for (let i = 0; i < MOST_STEPS; i++) {
    const p = sample(x);
    if (p.value === 0) break;
    if (p.value > 0 === falling) low = x;
    else high = x;
    const newton = x - p.value / p.slope;
    const next = newton > low && newton < high ? newton : low + (high - low) / 2;
    const settled = Math.abs(next - x) <= 2.3e-16 * Math.abs(x) || next === low || next === high;
    x = next;
    if (settled) break;
  }
  let step = 2.3e-16 * Math.abs(x) + Number.MIN_VALUE;
  for (; step < right.x - left.x; step *= 3) {
    const a = Math.max(left.x, x - step);
    const b = Math.min(right.x, x + step);
    if (signIs(sample(a).value, falling) && signIs(sample(b).value, !falling))
      return { at: x, bracket: [a, b], falling };
  }
  return { at: x, bracket: [left.x, right.x], falling };
}

const signIs = (value: number, positive: boolean): boolean => (positive ? value > 0 : value < 0);
