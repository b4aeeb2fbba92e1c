// Stars, their light at a distance, and how it spreads over a planet.
import {
  ASTRONOMICAL_UNIT,
  blackbodyFlux,
  equilibriumTemperature,
  REDISTRIBUTION_DAYSIDE,
  REDISTRIBUTION_GLOBAL,
  REDISTRIBUTION_INSTANT,
  REDISTRIBUTION_SUBSTELLAR,
  SOLAR_EFFECTIVE_TEMPERATURE,
  SOLAR_IRRADIANCE,
  SOLAR_LUMINOSITY,
  SOLAR_RADIUS,
  stellarBrightening,
  stellarFlux,
  stellarLuminosity,
} from "../../src/index.ts";
import planck from "../reference/computed/planck_flux.json" with { type: "json" };
import { type Check, halfUnit, SIGMA_DIGITS } from "./check.ts";
import {
  COWAN_AGOL,
  FACT_SHEETS,
  GOUGH,
  HEAT_BALANCE,
  IAU_B3,
  PLANCK_LAW,
  PLANET_TABLES,
} from "./sources.ts";

const planckRows = planck.rows.map(
  ({ T, flux }): Check => ({
    covers: ["blackbodyFlux"],
    what: `Planck's law at ${T} K, integrated over the spectrum and half a sphere`,
    published: Number(flux),
    unit: "W m-2",
    ours: () => blackbodyFlux({ temperature: T }),
    tolerance: Number(flux) * SIGMA_DIGITS,
    because: "σ with ten digits against h, c and k",
    source: PLANCK_LAW,
    basis: "computed with mpmath (planck_flux.py)",
  }),
);

const atAxis = (axis: number) =>
  stellarFlux({ luminosity: SOLAR_LUMINOSITY, distance: axis * ASTRONOMICAL_UNIT }) /
  stellarFlux({ luminosity: SOLAR_LUMINOSITY, distance: ASTRONOMICAL_UNIT });

const ratioRows = (
  [
    ["Mercury", 0.387, 6.673, 0.001, FACT_SHEETS, "from memory"],
    ["Venus", 0.723, 1.911, 0.001, FACT_SHEETS, "from memory"],
    ["Mars", 1.524, 0.431, 0.001, FACT_SHEETS, "from memory"],
    ["Jupiter", 5.203, 50.616 / 1370, 0.001 / 1370, HEAT_BALANCE, "seen"],
  ] as const
).map(
  ([name, axis, published, step, source, basis]): Check => ({
    covers: ["stellarFlux"],
    what: `${name}: flux over the Earth's, at ${axis} au (${PLANET_TABLES.title})`,
    published,
    unit: "1",
    ours: () => atAxis(axis),
    tolerance: halfUnit(step) + (published * 2 * halfUnit(0.001)) / axis,
    because: "last digit of the ratio and of the axis",
    source,
    basis,
  }),
);

/** T/T₀ of Cowan & Agol: T₀ is the substellar temperature of a black planet without transport. */
const ratio = (redistribution: number) => {
  const beam = { flux: SOLAR_IRRADIANCE, albedo: 0 };
  return (
    equilibriumTemperature({ ...beam, redistribution }) /
    equilibriumTemperature({ ...beam, redistribution: REDISTRIBUTION_SUBSTELLAR })
  );
};

const redistributionRows = (
  [
    ["without transport, seen from the star", REDISTRIBUTION_INSTANT, "REDISTRIBUTION_INSTANT", 0.9],
    ["over the day side", REDISTRIBUTION_DAYSIDE, "REDISTRIBUTION_DAYSIDE", 0.84],
    ["over the whole sphere", REDISTRIBUTION_GLOBAL, "REDISTRIBUTION_GLOBAL", 0.71],
  ] as const
).map(
  ([how, factor, name, published]): Check => ({
    covers: ["equilibriumTemperature", name, "REDISTRIBUTION_SUBSTELLAR"],
    what: `temperature over the substellar one, heat spread ${how}`,
    published,
    unit: "1",
    ours: () => ratio(factor),
    tolerance: halfUnit(0.01),
    because: "half a unit of the last digit",
    source: COWAN_AGOL,
    basis: "from memory",
  }),
);

/** 4.57 × 10⁹ Julian years, s. */
const SUN = 4.57e9 * 31557600;
const goughRows = (
  [
    [0, 0.7142857],
    [0.5, 0.8333333],
  ] as const
).map(
  ([share, published]): Check => ({
    covers: ["stellarBrightening"],
    what: `the Sun's luminosity over today's, at ${share} of its age`,
    published,
    unit: "1",
    ours: () => stellarBrightening({ age: share * SUN }),
    tolerance: halfUnit(1e-7),
    because: "last digit",
    source: GOUGH,
    basis: "seen",
  }),
);

export const starRows: readonly Check[] = [
  ...goughRows,
  {
    covers: ["stellarLuminosity", "SOLAR_RADIUS", "SOLAR_EFFECTIVE_TEMPERATURE"],
    what: "Sun: luminosity from the nominal radius and effective temperature",
    published: 3.828e26,
    unit: "W",
    ours: () =>
      stellarLuminosity({ radius: SOLAR_RADIUS, effectiveTemperature: SOLAR_EFFECTIVE_TEMPERATURE }),
    tolerance: 3.828e26 * ((4 * halfUnit(1)) / 5772 + (2 * halfUnit(1e5)) / 6.957e8),
    because: "half a kelvin in 5772 K, half a unit of the radius's last digit",
    source: IAU_B3,
    basis: "seen",
  },
  {
    covers: ["stellarFlux", "SOLAR_LUMINOSITY", "ASTRONOMICAL_UNIT"],
    what: "Sun: flux at 1 au from the nominal luminosity",
    published: 1361,
    unit: "W m-2",
    ours: () => stellarFlux({ luminosity: SOLAR_LUMINOSITY, distance: ASTRONOMICAL_UNIT }),
    tolerance: halfUnit(1),
    because: "half a unit of the last digit",
    source: IAU_B3,
    basis: "from memory",
  },
  ...ratioRows,
  ...redistributionRows,
  ...planckRows,
];
