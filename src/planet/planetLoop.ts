// Closes the loop of a described planet, with every input that counts as a given named by its path.
import type { Quantity, Value } from "../graph/quantity.ts";
import { closeLoop } from "../loop/closeLoop.ts";
import type { Loop } from "../loop/types.ts";
import type { CheckedPlanet } from "./checkedPlanet.ts";
import { planetBudget } from "./planetBudget.ts";
import type { PlanetNames } from "./planetTypes.ts";

/** The loop of a planet. */
export function planetLoop({ description, inputs }: CheckedPlanet): Loop<PlanetNames> {
  const byPath = new Map(inputs.map((input) => [input.path, input]));
  return closeLoop<PlanetNames>(({ temperature, given, couple }) => {
    const made = new Map<string, Quantity>();
    const wire = (path: string): Value => {
      const { value, unit, within } = byPath.get(path) as (typeof inputs)[number];
      const quantity = made.get(path) ?? given(path, value, unit, within ? { within } : {});
      made.set(path, quantity);
      return quantity;
    };
    return planetBudget(description, { wire, temperature, couple }) as never;
  });
}
