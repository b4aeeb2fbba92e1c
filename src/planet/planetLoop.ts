// Closes the loop of a described planet, with every input that counts as a given named by its path.
import type { Quantity, Value } from "../graph/quantity.ts";
import { closeLoop } from "../loop/closeLoop.ts";
import type { Loop } from "../loop/types.ts";
import { withGivens } from "../loop/withGivens.ts";
import type { CheckedPlanet } from "./checkedPlanet.ts";
import { planetBudget } from "./planetBudget.ts";
import type { PlanetNames } from "./planetTypes.ts";
import { shapeKey } from "./shapeKey.ts";

/** Loops by the shape of their descriptions, the one that was used last at the end. */
const known = /* @__PURE__ */ new Map<string, Loop<PlanetNames>>();
/** More shapes than a catalogue has; each keeps its compiled code, some 100 kB. */
const MOST_SHAPES = 64;

/** The loop of a planet. Planets that differ in nothing but numbers share what is recorded and compiled for the first. */
export function planetLoop(checked: CheckedPlanet): Loop<PlanetNames> {
  const { description, inputs, numbers } = checked;
  const key = shapeKey(description, inputs);
  const alike = known.get(key) ?? closedLoop(checked);
  known.delete(key);
  known.set(key, alike);
  if (known.size > MOST_SHAPES) known.delete(known.keys().next().value as string);
  return withGivens(alike, Object.fromEntries(alike.givens.map(({ name }) => [name, numbers(name)])));
}

function closedLoop({ description, inputs }: CheckedPlanet): Loop<PlanetNames> {
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
