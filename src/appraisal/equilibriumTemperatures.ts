// Temperatures of re-radiation under stated assumptions.
import { daysideRedistribution } from "../greenhouse/daysideRedistribution.ts";
import {
  equilibriumTemperature,
  REDISTRIBUTION_DAYSIDE,
  REDISTRIBUTION_GLOBAL,
  REDISTRIBUTION_SUBSTELLAR,
} from "../greenhouse/equilibriumTemperature.ts";
import { nightsideRedistribution } from "../greenhouse/nightsideRedistribution.ts";
import { temperatureMeanFlux } from "../orbit/temperatureMeanFlux.ts";
import type { PlanetEquilibriumTemperature } from "../planet/planetTypes.ts";
import type {
  ConventionalTemperature,
  EquilibriumTemperatures,
  PlaceTemperatures,
  Starlight,
} from "./appraisedLight.ts";
import { withCompanions } from "./starlightOf.ts";

/** The pairs that tables of planets quote for the flux at the semi-major axis, mostly without saying which. */
const CONVENTIONAL = [
  { albedo: 0, redistribution: REDISTRIBUTION_GLOBAL, spread: "the whole sphere" },
  { albedo: 0.3, redistribution: REDISTRIBUTION_GLOBAL, spread: "the whole sphere" },
  { albedo: 0, redistribution: REDISTRIBUTION_DAYSIDE, spread: "the day side" },
  { albedo: 0.3, redistribution: REDISTRIBUTION_DAYSIDE, spread: "the day side" },
] as const;

/** What re-radiates at a place: the flux of all stars and what comes from below, W m⁻², and its Bond albedo. */
export interface Ground {
  readonly flux: number;
  readonly albedo: number;
  readonly internalFlux: number;
}

/** All equilibrium temperatures of a planet; `ground` is null where the albedo is not a number. */
export function equilibriumTemperatures(
  starlight: Starlight,
  described: PlanetEquilibriumTemperature | null,
  ground: Ground | null,
): EquilibriumTemperatures {
  const { mean, atSemiMajorAxis, eccentricity, companions } = starlight;
  const flux = withCompanions(atSemiMajorAxis.flux, starlight);
  const dark = { albedo: 0, redistribution: REDISTRIBUTION_GLOBAL };
  const overTime = temperatureMeanFlux({ fluxAtSemiMajorAxis: atSemiMajorAxis.flux, eccentricity });
  return {
    described,
    conventional: CONVENTIONAL.map(({ albedo, redistribution, spread }): ConventionalTemperature => {
      const value = equilibriumTemperature({ flux, albedo, redistribution });
      return { albedo, redistribution, spread, value };
    }),
    places: ground && placeTemperatures(ground),
    orbit: {
      ofMeanFlux: equilibriumTemperature({ flux: withCompanions(mean.flux, starlight), ...dark }),
      meanOverTime: companions ? null : equilibriumTemperature({ flux: overTime, ...dark }),
    },
  };
}

/** Substellar point, day and night side between no transport of heat and a complete one. */
export function placeTemperatures({ flux, albedo, internalFlux }: Ground): PlaceTemperatures {
  const at = (redistribution: number) =>
    equilibriumTemperature({ flux, albedo, redistribution, emissivity: 1, internalFlux });
  const between = (share: (ports: { transport: number }) => number) => ({
    still: at(share({ transport: 0 })),
    spread: at(share({ transport: 1 })),
  });
  return {
    substellar: at(REDISTRIBUTION_SUBSTELLAR),
    day: between(daysideRedistribution),
    night: between(nightsideRedistribution),
  };
}
