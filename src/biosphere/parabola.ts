// A parabola in temperature that is 1 at its top and 0 at its half-width: what the covers have in common.

import type { Ports } from "../graph/card.ts";
import { div, square, sub } from "../graph/operations.ts";
import type { Quantity, Value } from "../graph/quantity.ts";
import { temperaturePort } from "../law/ports.ts";

/** The ports of a cover that thrives around one temperature, with more of its own. */
export const parabolaPorts = <const P extends Ports>(more: P) => ({
  temperature: temperaturePort("T", "temperature where it grows"),
  best: temperaturePort("T_b", "temperature that suits it best"),
  halfWidth: {
    symbol: "w",
    unit: "K",
    within: [1e-6, 1e5],
    about: "from the best temperature to no growth",
  } as const,
  ...more,
});

type Around = { readonly temperature: Quantity; readonly best: Quantity; readonly halfWidth: Quantity };

/** 1 − ((T − best)/halfWidth)²; negative beyond the half-width. */
export function parabola({ temperature, best, halfWidth }: Around): Value {
  return sub(1, square(div(sub(temperature, best), halfWidth)));
}
