// Emission as a straight line in temperature: what the linear laws have in common.
import { add, mul, sub } from "../graph/operations.ts";
import type { Value } from "../graph/quantity.ts";

interface Line {
  readonly temperature: Value;
  readonly intercept: Value;
  readonly slope: Value;
  readonly reference: Value;
}

/** Where straight lines were fitted on Earth, K. */
export const STRAIGHT_RANGE = [230, 300] as const;

/** A + B(T − T₀). */
export const straightLine = ({ temperature, intercept, slope, reference }: Line): Value =>
  add(intercept, mul(slope, sub(temperature, reference)));
