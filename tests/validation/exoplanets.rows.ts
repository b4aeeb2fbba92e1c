// Planets of other stars: luminosity, flux and equilibrium temperature.
import {
  ASTRONOMICAL_UNIT,
  blackbodyTemperature,
  equilibriumTemperature,
  localAbsorbedFlux,
  REDISTRIBUTION_GLOBAL,
  SOLAR_LUMINOSITY,
  SOLAR_RADIUS,
  stellarFlux,
  stellarLuminosity,
} from "../../src/index.ts";
import exoplanets from "../reference/computed/exoplanets.json" with { type: "json" };
import { type Check, halfUnit, SIGMA_DIGITS } from "./check.ts";
import { AGOL, ASTROPY, BENNEKE, HEBB, TORRES } from "./sources.ts";

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
    {
      ...rest,
      covers: ["localAbsorbedFlux", "blackbodyTemperature"],
      what: `${row.name}: temperature that radiates what it absorbs, A = ${row.albedo}, f = ${row.redistribution.toFixed(3)}`,
      published: row.T,
      unit: "K",
      ours: () => {
        const { albedo, redistribution } = row;
        return blackbodyTemperature({
          flux: localAbsorbedFlux({ flux: fluxOf(row), albedo, redistribution }),
        });
      },
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

export const exoplanetRows: readonly Check[] = [
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
  ...astropyRows,
];
