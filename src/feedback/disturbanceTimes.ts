// How a small disturbance of temperature goes on.
import { type Bounded, negative, numberOf, quotient, rangeOf } from "./bounds.ts";
import type { DisturbanceTimes } from "./feedbacks.ts";
import type { KnownSign } from "./signs.ts";

/** The times C over the size of λ, for a λ of a known sign (0: not known). None for a heat capacity below 0. */
export function disturbanceTimes(lambda: Bounded, heatCapacity: Bounded, sign: KnownSign): DisturbanceTimes {
  const isTime = heatCapacity.value >= 0;
  const fall = isTime && sign < 0 ? quotient(heatCapacity, negative(lambda)) : null;
  const growth = isTime && sign > 0 ? quotient(heatCapacity, lambda) : null;
  return {
    eFoldingTime: numberOf(fall),
    eFoldingTimeRange: rangeOf(fall),
    growthTime: numberOf(growth),
    growthTimeRange: rangeOf(growth),
  };
}
