// How much of the flux a unit of area receives.
import type { Value } from "../graph/quantity.ts";
import { daysideRedistribution } from "../greenhouse/daysideRedistribution.ts";
import { REDISTRIBUTION_GLOBAL } from "../greenhouse/equilibriumTemperature.ts";
import { nightsideRedistribution } from "../greenhouse/nightsideRedistribution.ts";
import type { PlanetDescription } from "./planetShape.ts";
import type { Wire } from "./wire.ts";

type Spread = Pick<PlanetDescription, "redistribution">;

/** The redistribution factor: as given, or from the transport of heat between two sides. */
export function redistributionOf({ redistribution }: Spread, wire: Wire): Value {
  if (typeof redistribution !== "object" || "value" in redistribution) return wire("redistribution");
  const transport = wire("redistribution.transport");
  const { side } = redistribution;
  return side === "day" ? daysideRedistribution({ transport }) : nightsideRedistribution({ transport });
}

/** True where all numbers are means over the whole planet. */
export function isWhole({ redistribution }: Spread): boolean {
  if (typeof redistribution === "string") return redistribution === "global";
  if (typeof redistribution === "number") return redistribution === REDISTRIBUTION_GLOBAL;
  return "value" in redistribution && redistribution.value === REDISTRIBUTION_GLOBAL;
}
