// The ports behind the fields of a description: units and ranges come from the laws that take the values.
import { cloudyAlbedo } from "../albedo/cloudyAlbedo.ts";
import { mixAlbedo } from "../albedo/mixAlbedo.ts";
import { twoBandAlbedo } from "../albedo/twoBandAlbedo.ts";
import { cloudyEmission } from "../greenhouse/cloudyEmission.ts";
import { daysideRedistribution } from "../greenhouse/daysideRedistribution.ts";
import { emissionHeight } from "../greenhouse/emissionHeight.ts";
import {
  equilibriumTemperature,
  REDISTRIBUTION_DAYSIDE,
  REDISTRIBUTION_GLOBAL,
  REDISTRIBUTION_INSTANT,
  REDISTRIBUTION_SUBSTELLAR,
} from "../greenhouse/equilibriumTemperature.ts";
import { pressureOpticalDepth } from "../greenhouse/pressureOpticalDepth.ts";
import { mixedLayerCapacity } from "../heat/mixedLayerCapacity.ts";
import { orbitMeanFlux } from "../orbit/orbitMeanFlux.ts";
import { semiMajorAxis } from "../orbit/semiMajorAxis.ts";
import { stellarFlux } from "../star/stellarFlux.ts";
import { stellarLuminosity } from "../star/stellarLuminosity.ts";

/** Fields of `star`; `distance` in a list of stars only. */
export const STAR_PORTS = {
  luminosity: { ...stellarFlux.card.inputs.luminosity, about: "luminosity of the star" },
  radius: { ...stellarLuminosity.card.inputs.radius, about: "radius of the star" },
  effectiveTemperature: {
    ...stellarLuminosity.card.inputs.effectiveTemperature,
    about: "effective temperature of the star",
  },
  mass: { ...semiMajorAxis.card.inputs.mass, about: "mass of the star" },
  visibleShare: {
    ...twoBandAlbedo.card.inputs.visibleShare,
    about: "share of the star's energy below 0.7 µm; that of a black body unless given",
  },
  brightening: {
    symbol: "(dL/dt)/L",
    unit: "s-1",
    within: [-1e-13, 1e-13],
    about: "share of its luminosity by which the star brightens in a unit of time; for margins in time",
  },
  distance: {
    ...stellarFlux.card.inputs.distance,
    about: "distance of a star that the planet does not orbit",
  },
} as const;

/** Fields of a table in place of a rate of brightening; it may begin before a star shines, or count from today. */
const time = { symbol: "t", unit: "s", within: [-1e22, 1e22] } as const;
const shining = { ...stellarFlux.card.inputs.luminosity, within: [1, 1e40] } as const;
export const BRIGHTENING_PORTS = {
  time: { ...time, about: "time of an entry of the table, rising" },
  luminosity: {
    ...shining,
    about: "luminosity of the star at that time, or its share of any one luminosity",
  },
  now: { ...time, about: "time of today in the table" },
} as const;
/** Luminosities of a table as shares of any one of them. */
export const RELATIVE_LUMINOSITY = {
  ...BRIGHTENING_PORTS.luminosity,
  unit: "1",
  within: [1e-9, 1e9],
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
/** A planet is described as a whole or by its day side; a night side is told by its transport of heat. */
export const REDISTRIBUTION_PORT = {
  ...redistribution,
  within: [0.25, 1],
  about: "redistribution factor",
} as const;
export const TRANSPORT_PORTS = daysideRedistribution.card.inputs;
export const INTERNAL_HEAT_PORT = { ...internalFlux, about: "internal heat" } as const;
export const HEAT_CAPACITY_PORT = {
  ...mixedLayerCapacity.card.output,
  within: [0, 1e15],
  about: "heat capacity; 0 where temperature follows at once",
} as const;

/** What reflects. */
export const ALBEDO_PORT = { ...albedo, about: "Bond albedo" } as const;
export const SURFACE_PORT = { ...albedo, about: "albedo of the surface below air and clouds" } as const;
const { fraction, albedo: coverAlbedo } = mixAlbedo.card.inputs.covers.each;
const { visible, nearInfrared } = twoBandAlbedo.card.inputs;
export const COVER_PORTS = {
  share: fraction,
  albedo: coverAlbedo,
  visible: { ...visible, about: "albedo below 0.7 µm" },
  nearInfrared: { ...nearInfrared, about: "albedo above 0.7 µm" },
} as const;
export const COVERED_PORTS = { covers: { each: COVER_PORTS } } as const;

/** The usual redistribution factors by name. */
export const REDISTRIBUTIONS = {
  global: REDISTRIBUTION_GLOBAL,
  dayside: REDISTRIBUTION_DAYSIDE,
  instant: REDISTRIBUTION_INSTANT,
  substellar: REDISTRIBUTION_SUBSTELLAR,
} as const;

/** Fields of `clouds`: what they do to sunlight, and to longwave. */
const { reflectance, absorptance } = cloudyAlbedo.card.inputs;
const { share: cloudShare, emissivity, temperature: cloudTemperature } = cloudyEmission.card.inputs;
export const CLOUD_PORTS = {
  share: { ...cloudShare, about: "share of the sky under clouds" },
  reflectance,
  absorptance: { ...absorptance, default: 0 },
  emissivity: { ...emissivity, about: "longwave emissivity of the clouds" },
  temperature: cloudTemperature,
} as const;

/** Fields of `atmosphere`. */
export const ATMOSPHERE_PORTS = {
  pressure: pressureOpticalDepth.card.inputs.pressure,
  lapseRate: emissionHeight.card.inputs.lapseRate,
  reflectance: { ...reflectance, about: "share of sunlight that the clear sky reflects" },
  absorptance: { ...absorptance, default: 0, about: "share of sunlight that the clear sky absorbs" },
} as const;

/** Facts that the budget does not need. */
export const ROTATION_PORTS = {
  period: { ...semiMajorAxis.card.inputs.period, about: "rotation period" },
} as const;
export const BODY_PORTS = {
  mass: { symbol: "M_p", unit: "kg", within: [1, 1e30], about: "mass of the planet" },
  radius: { symbol: "R_p", unit: "m", within: [1, 1e12], about: "radius of the planet" },
} as const;
