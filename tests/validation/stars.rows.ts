// Stars, their light at a distance, and planets of other stars.
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
  stellarFlux,
  stellarLuminosity,
} from "../../src/index.ts";
import exoplanets from "../reference/computed/exoplanets.json" with { type: "json" };
import planck from "../reference/computed/planck_flux.json" with { type: "json" };
import { type Check, halfUnit } from "./check.ts";
import {
  AGOL,
  ASTROPY,
  BENNEKE,
  COWAN_AGOL,
  FACT_SHEETS,
  HEAT_BALANCE,
  HEBB,
  IAU_B3,
  PLANCK_LAW,
  PLANET_TABLES,
  TORRES,
} from "./sources.ts";

interface Host {
  /** Solar radii. */
  readonly radius: number;
  /** K. */
  readonly temperature: number;
  /** Semi-major axis, au. */
  readonly axis: number;
}

const luminosityOf = ({ radius, temperature }: Omit<Host, "axis">) =>
  stellarLuminosity({ radius: radius * SOLAR_RADIUS, effectiveTemperature: temperature });
const fluxOf = (host: Host) =>
  stellarFlux({ luminosity: luminosityOf(host), distance: host.axis * ASTRONOMICAL_UNIT });
const temperatureOf = (host: Host, albedo: number, redistribution: number) =>
  equilibriumTemperature({ flux: fluxOf(host), albedo, redistribution });

/** Relative change of the flux when radius, temperature and axis move by half their printed steps. */
const steps = (host: Host, radius: number, temperature: number, axis: number) =>
  (2 * halfUnit(radius)) / host.radius +
  (4 * halfUnit(temperature)) / host.temperature +
  (2 * halfUnit(axis)) / host.axis;

/** Astropy's σ has more digits than CODATA prints: 3.3·10⁻¹¹ of the flux. */
const SIGMA_DIGITS = 4e-11;

const astropyRows = exoplanets.rows.flatMap((row): Check[] => {
  const basis = "computed with Astropy (exoplanets.py)";
  const rest = { source: ASTROPY, basis, because: "σ with ten digits against all of them" } as const;
  return [
    {
      ...rest,
      covers: ["stellarLuminosity"],
      what: `${row.name}: luminosity from ${row.radius} R☉ and ${row.temperature} K`,
      published: row.luminosity / SOLAR_LUMINOSITY,
      unit: "L☉",
      ours: () => luminosityOf(row) / SOLAR_LUMINOSITY,
      tolerance: (row.luminosity / SOLAR_LUMINOSITY) * SIGMA_DIGITS,
    },
    {
      ...rest,
      covers: ["stellarFlux"],
      what: `${row.name}: flux at ${row.axis} au`,
      published: row.flux,
      unit: "W m-2",
      ours: () => fluxOf(row),
      tolerance: row.flux * SIGMA_DIGITS,
    },
    {
      ...rest,
      covers: ["equilibriumTemperature"],
      what: `${row.name}: equilibrium temperature, A = ${row.albedo}, f = ${row.redistribution.toFixed(3)}`,
      published: row.T,
      unit: "K",
      ours: () => temperatureOf(row, row.albedo, row.redistribution),
      tolerance: row.T * SIGMA_DIGITS,
    },
  ];
});

/** TRAPPIST-1: planet, semi-major axis in au, flux over the nominal solar irradiance. */
const TRAPPIST_FLUX = [
  ["b", 0.01154, 4.153],
  ["c", 0.0158, 2.214],
  ["d", 0.02227, 1.115],
  ["e", 0.02925, 0.646],
  ["f", 0.03849, 0.373],
  ["g", 0.04683, 0.252],
  ["h", 0.06189, 0.144],
] as const;
const TRAPPIST_LUMINOSITY = 5.53e-4;

const trappistRows = TRAPPIST_FLUX.map(
  ([planet, axis, published]): Check => ({
    covers: ["stellarFlux", "SOLAR_LUMINOSITY"],
    what: `TRAPPIST-1 ${planet}: flux from 0.000553 L☉ at ${axis} au`,
    published,
    unit: "Earth's",
    ours: () => {
      const distance = axis * ASTRONOMICAL_UNIT;
      const there = stellarFlux({ luminosity: TRAPPIST_LUMINOSITY * SOLAR_LUMINOSITY, distance });
      return there / stellarFlux({ luminosity: SOLAR_LUMINOSITY, distance: ASTRONOMICAL_UNIT });
    },
    tolerance:
      halfUnit(0.001) + published * (halfUnit(1e-6) / TRAPPIST_LUMINOSITY + (2 * halfUnit(1e-5)) / axis),
    because: "last digit of flux, luminosity and axis",
    source: AGOL,
    basis: "from memory",
  }),
);

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

const K2_18: Host = { radius: 0.4445, temperature: 3457, axis: 0.1591 };
const WASP_12: Host = { radius: 1.57, temperature: 6300, axis: 0.0229 };
const HD_209458: Host = { radius: 1.155, temperature: 6065, axis: 0.04707 };
const HD_189733: Host = { radius: 0.756, temperature: 5040, axis: 0.03099 };

const hot = (
  name: string,
  host: Host,
  published: number,
  source: Check["source"],
  radius: number,
  axis: number,
): Check => ({
  covers: ["equilibriumTemperature", "stellarFlux", "stellarLuminosity"],
  what: `${name}: equilibrium temperature without albedo, f = 1/4`,
  published,
  unit: "K",
  ours: () => temperatureOf(host, 0, REDISTRIBUTION_GLOBAL),
  tolerance: halfUnit(1) + (published * steps(host, radius, 1, axis)) / 4,
  because: "last digit of temperatures, radius and axis",
  source,
  basis: "from memory",
});

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

export const starRows: readonly Check[] = [
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
    covers: ["stellarLuminosity"],
    what: "TRAPPIST-1: luminosity from 0.1192 R☉ and 2566 K",
    published: TRAPPIST_LUMINOSITY,
    unit: "L☉",
    ours: () => luminosityOf({ radius: 0.1192, temperature: 2566 }) / SOLAR_LUMINOSITY,
    tolerance: 1.8e-5,
    because: "the source's own standard error: its luminosity is measured, not derived from these two",
    source: AGOL,
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
  {
    covers: ["stellarFlux", "stellarLuminosity"],
    what: "K2-18 b: flux from 0.4445 R☉, 3457 K, 0.1591 au",
    published: 1368,
    unit: "W m-2",
    ours: () => fluxOf(K2_18),
    tolerance: halfUnit(1) + 1368 * steps(K2_18, 0.0001, 1, 0.0001),
    because: "last digit of flux, radius, temperature and axis",
    source: BENNEKE,
    basis: "from memory",
  },
  {
    covers: ["equilibriumTemperature"],
    what: "K2-18 b: equilibrium temperature, A = 0.3, f = 1/4",
    published: 254.9,
    unit: "K",
    ours: () => temperatureOf(K2_18, 0.3, REDISTRIBUTION_GLOBAL),
    tolerance: halfUnit(0.1) + (254.9 * steps(K2_18, 0.0001, 1, 0.0001)) / 4,
    because: "last digit of temperatures, radius and axis",
    source: BENNEKE,
    basis: "from memory",
  },
  hot("WASP-12 b", WASP_12, 2516, HEBB, 0.01, 0.0001),
  hot("HD 209458 b", HD_209458, 1449, TORRES, 0.001, 0.00001),
  hot("HD 189733 b", HD_189733, 1201, TORRES, 0.001, 0.00001),
  ...trappistRows,
  ...ratioRows,
  ...redistributionRows,
  ...astropyRows,
  ...planckRows,
];
