// The assumptions behind every number of a planet.
import { CONSTANT_SET } from "../ground/constants.ts";
import type { CheckedPlanet } from "./checkedPlanet.ts";
import type { PlanetDescription } from "./planetShape.ts";
import { redistributionOf } from "./redistribution.ts";
import { isAnswering } from "./reflection.ts";
import { hasSky } from "./sunlight.ts";

/** What every number of a planet rests on. */
export interface PlanetAssumptions {
  /** The Bond albedo as a number, or null where it answers to temperature. */
  readonly albedo: number | null;
  /** The law of the albedo, of the planet or of its surface, or null where it is told by numbers. */
  readonly albedoLaw: string | null;
  /** Where the Bond albedo comes from: stated of the whole planet, or from what lies below clear air, or below clouds. */
  readonly albedoOf: "planet" | "surface" | "surface and sky";
  readonly redistribution: number;
  readonly eccentricity: number;
  /** What is averaged over the orbit, or null where nothing is. */
  readonly average: "flux" | "temperature" | null;
  /** W m⁻². */
  readonly internalHeat: number;
  /** The set of constants. */
  readonly constants: string;
}

/** The assumptions of a description. */
export function assumptionsOf({ description: d, numbers, trial }: CheckedPlanet): PlanetAssumptions {
  const written = d.albedo ?? d.surface;
  const eccentricity = d.orbit.eccentricity === undefined ? 0 : numbers("orbit.eccentricity");
  return {
    albedo: isAnswering(written) ? null : (trial.albedo as number),
    albedoLaw: lawOf(written),
    albedoOf: d.albedo !== undefined ? "planet" : hasSky(d) ? "surface and sky" : "surface",
    redistribution: redistributionOf(d, numbers) as number,
    eccentricity,
    average: eccentricity === 0 ? null : (d.orbit.average ?? null),
    internalHeat: d.internalHeat === undefined ? 0 : numbers("internalHeat"),
    constants: CONSTANT_SET,
  };
}

function lawOf(written: PlanetDescription["albedo"] | PlanetDescription["surface"]): string | null {
  if (typeof written !== "object" || "value" in written) return null;
  if ("law" in written) return written.law;
  const laws = written.covers.map(({ share }) =>
    typeof share === "object" && "law" in share ? share.law : null,
  );
  return laws.find((law) => law !== null) ?? null;
}
