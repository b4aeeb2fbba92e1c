// Numbers that carry proved bounds with them, and their arithmetic; every bound is moved outwards.
import type { Range } from "../ground/range.ts";
import { above, below } from "../search/enclosed.ts";
import { over, times } from "../search/interval.ts";

/** Bounds, or `null` where nothing is known. */
export type Bounds = Range | null;

/** A number with its bounds. */
export interface Bounded {
  readonly value: number;
  readonly bounds: Bounds;
}

/** A number without error. */
export const exactly = (value: number): Bounded => ({ value, bounds: [0 + value, 0 + value] });

const finite = (range: Range): Bounds =>
  Number.isFinite(range[0]) && Number.isFinite(range[1]) ? range : null;
const isZero = (range: Range): boolean => range[0] === 0 && range[1] === 0;

/** −x; of bounds as 0 − x, so that none is −0. */
export const negative = ({ value, bounds }: Bounded): Bounded => ({
  value: -value,
  bounds: bounds && [0 - bounds[1], 0 - bounds[0]],
});

/** x·y. */
export const product = (x: Bounded, y: Bounded): Bounded => ({
  value: x.value * y.value,
  bounds: x.bounds && y.bounds && finite(times(x.bounds, y.bounds)),
});

/** x − y. */
export const difference = (x: Bounded, y: Bounded): Bounded => ({
  value: x.value - y.value,
  bounds:
    x.bounds && y.bounds && finite([below(x.bounds[0] - y.bounds[1]), above(x.bounds[1] - y.bounds[0])]),
});

/** x/y; no bounds where y may be 0. Zero over anything else stays zero. */
export function quotient(x: Bounded, y: Bounded): Bounded {
  const bounds = x.bounds && y.bounds && finite(over(x.bounds, y.bounds));
  return { value: x.value / y.value, bounds: bounds && isZero(x.bounds as Range) ? x.bounds : bounds };
}

/** The number as it is given away: `null` where there is none, and not −0, which JSON does not keep. */
export const numberOf = (x: Bounded | null): number | null => x && 0 + x.value;

/** Its bounds, as they are given away. */
export const rangeOf = (x: Bounded | null): Bounds => (x?.bounds ? Object.freeze(x.bounds) : null);
