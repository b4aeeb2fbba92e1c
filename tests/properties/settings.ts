// One seed and one limit for all random tests, so that a run can be repeated and shrinking ends.
import type { Parameters } from "fast-check";

/** Every property runs the same cases each time; a run that takes too long fails instead of passing unfinished. */
export const settings = (numRuns: number, seed = 20251): Parameters<unknown> => ({
  seed,
  numRuns,
  interruptAfterTimeLimit: 8000,
  markInterruptAsFailure: true,
  skipAllAfterTimeLimit: 8000,
});
