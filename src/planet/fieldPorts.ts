// The ports behind the fields of a description: units and ranges come from the laws that take the values.
import { mixAlbedo } from "../albedo/mixAlbedo.ts";
import {
  equilibriumTemperature,
  REDISTRIBUTION_DAYSIDE,
  REDISTRIBUTION_GLOBAL,
  REDISTRIBUTION_INSTANT,
  REDISTRIBUTION_SUBSTELLAR,
} from "../greenhouse/equilibriumTemperature.ts";
import { mixedLayerCapacity } from "../heat/mixedLayerCapacity.ts";
import { orbitMeanFlux } from "../orbit/orbitMeanFlux.ts";
import { semiMajorAxis } from "../orbit/semiMajorAxis.ts";
import { stellarFlux } from "../star/stellarFlux.ts";
import { stellarLuminosity } from "../star/stellarLuminosity.ts";

/** Fields of `star`. */
export const STAR_PORTS = {
  luminosity: { ...stellarFlux.card.inputs.luminosity, about: "luminosity of the star" },
  radius: { ...stellarLuminosity.card.inputs.radius, about: "radius of the star" },
  effectiveTemperature: {
    ...stellarLuminosity.card.inputs.effectiveTemperature,
    about: "effective temperature of the star",
  },
  mass: { ...semiMajorAxis.card.inputs.mass, about: "mass of the star" },
  brightening: {
    symbol: "(dL/dt)/L",
    unit: "s-1",
    within: [-1e-13, 1e-13],
    about: "share of its luminosity by which the star brightens in a unit of time; for margins in time",
  },
} as const;

/** Fields of `orbit`. */
export const ORBIT_PORTS = {
  semiMajorAxis: { ...stellarFlux.card.inputs.distance, about: "semi-major axis" },
  period: { ...semiMajorAxis.card.inputs.period, about: "orbital period" },
  distanceInStellarRadii: {
    symbol: "a/R",
    unit: "1",
    within: [1, 1e12],
    about: "semi-major axis over the radius of the star",
  },
  flux: { ...orbitMeanFlux.card.inputs.fluxAtSemiMajorAxis, about: "stellar flux at the semi-major axis" },
  eccentricity: { ...orbitMeanFlux.card.inputs.eccentricity, about: "orbital eccentricity" },
} as const;

/** Fields of the planet itself. */
const { redistribution, internalFlux, albedo } = equilibriumTemperature.card.inputs;
export const REDISTRIBUTION_PORT = { ...redistribution, about: "redistribution factor" } as const;
export const INTERNAL_HEAT_PORT = { ...internalFlux, about: "internal heat" } as const;
export const ALBEDO_PORT = { ...albedo, about: "Bond albedo" } as const;
const { fraction, albedo: coverAlbedo } = mixAlbedo.card.inputs.covers.each;
export const COVER_PORTS = { share: fraction, albedo: coverAlbedo } as const;
export const COVERED_PORTS = { covers: { each: COVER_PORTS } } as const;
export const HEAT_CAPACITY_PORT = {
  ...mixedLayerCapacity.card.output,
  within: [0, 1e15],
  about: "heat capacity; 0 where temperature follows at once",
} as const;

/** The usual redistribution factors by name. */
export const REDISTRIBUTIONS = {
  global: REDISTRIBUTION_GLOBAL,
  dayside: REDISTRIBUTION_DAYSIDE,
  instant: REDISTRIBUTION_INSTANT,
  substellar: REDISTRIBUTION_SUBSTELLAR,
} as const;
