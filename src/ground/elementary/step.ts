// The unit step.

/** 0 below zero, 1 at zero (−0 as well) and above; NaN for NaN. */
export function step(a: number): number {
  return a < 0 ? 0 : a >= 0 ? 1 : Number.NaN;
}
