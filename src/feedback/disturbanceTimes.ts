// How a small disturbance of temperature goes on.
import { type Bounded, negative, numberOf, quotient, rangeOf } from "./bounds.ts";
import type { DisturbanceTimes } from "./feedbacks.ts";
import type { KnownSign } from "./signs.ts";

/** The times C over the size of λ, for a λ of a known sign (0: not known). None for a heat capacity below 0. */
export function disturbanceTimes(lambda: Bounded, heatCapacity: Bounded, sign: KnownSign): DisturbanceTimes {
  const isTime = sign !== 0 && heatCapacity.value >= 0;
  const time = isTime ? quotient(heatCapacity, sign < 0 ? negative(lambda) : lambda) : null;
  const [fall, growth] = sign < 0 ? [time, null] : [null, time];
  return {
    eFoldingTime: numberOf(fall),
    eFoldingTimeRange: rangeOf(fall),
    growthTime: numberOf(growth),
    growthTimeRange: rangeOf(growth),
  };
}
