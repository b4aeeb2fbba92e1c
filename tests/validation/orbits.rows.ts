// Orbits: periods to distances, and means over eccentric orbits.
import {
  ASTRONOMICAL_UNIT,
  GRAVITATION,
  orbitMeanFlux,
  SOLAR_IRRADIANCE,
  SOLAR_MASS_PARAMETER,
  semiMajorAxis,
  temperatureMeanFlux,
} from "../../src/index.ts";
import means from "../reference/computed/orbit_means.json" with { type: "json" };
import { type Check, halfUnit } from "./check.ts";
import { AGOL, MENDEZ, PLANET_TABLES, QUIRRENBACH } from "./sources.ts";

const DAY = 86400;
const SUN = SOLAR_MASS_PARAMETER / GRAVITATION;
const axisOf = (days: number, mass: number) =>
  semiMajorAxis({ period: days * DAY, mass: mass * SUN }) / ASTRONOMICAL_UNIT;

/** Sidereal period in days (fact sheets, from memory), semi-major axis in au as printed. */
const sunRows = (
  [
    ["Mercury", 87.969, 0.387, 0],
    ["Venus", 224.701, 0.723, 0],
    ["Earth", 365.256, 1.0, 0],
    ["Mars", 686.98, 1.524, 0],
    // the law neglects the planet's own mass: 1/1047.35 of the Sun's, a third of it in the axis
    ["Jupiter", 4332.589, 5.203, 1 / 1047.35 / 3],
  ] as const
).map(
  ([name, days, published, neglected]): Check => ({
    covers: ["semiMajorAxis", "SOLAR_MASS_PARAMETER", "GRAVITATION"],
    what: `${name}: semi-major axis from a period of ${days} d`,
    published,
    unit: "au",
    ours: () => axisOf(days, 1),
    tolerance: halfUnit(0.001) + published * neglected,
    because: neglected > 0 ? "last digit, and the planet's own mass" : "half a unit of the last digit",
    source: PLANET_TABLES,
    basis: "seen",
  }),
);

const TRAPPIST_MASS = 0.0898;
/**
 * The printed axes are osculating elements of bodies that pull at each other: with the printed periods, d asks for a star
 * of at least 0.08981 and e for at most 0.08974 solar masses, so that Kepler's law holds for both to 2.5·10⁻⁴ only.
 */
const OSCULATION = (0.08981 - 0.08974) / 0.0898 / 3;
const trappistRows = (
  [
    ["b", 1.510826, 0.01154],
    ["c", 2.421937, 0.0158],
    ["d", 4.049219, 0.02227],
    ["e", 6.101013, 0.02925],
    ["f", 9.20754, 0.03849],
    ["g", 12.352446, 0.04683],
    ["h", 18.772866, 0.06189],
  ] as const
).map(
  ([planet, days, published]): Check => ({
    covers: ["semiMajorAxis"],
    what: `TRAPPIST-1 ${planet}: semi-major axis from ${days} d and 0.0898 M☉`,
    published,
    unit: "au",
    ours: () => axisOf(days, TRAPPIST_MASS),
    tolerance: halfUnit(1e-5) + published * (halfUnit(1e-4) / TRAPPIST_MASS / 3 + OSCULATION),
    because: "last digit of axis and mass, and osculating axes that no single mass gives",
    source: AGOL,
    basis: "from memory",
  }),
);

/** Quadrature over Kepler's equation was asked for 10⁻¹² of the integral. */
const QUADRATURE = 1e-11;
const flux = SOLAR_IRRADIANCE;

const meanRows = means.rows.flatMap(({ e, flux: factor, temperature }): Check[] => {
  const rest = {
    unit: "1",
    tolerance: factor * QUADRATURE,
    because: "the quadrature's own tolerance",
    basis: "computed with SciPy (orbit_means.py)",
  } as const;
  return [
    {
      ...rest,
      covers: ["orbitMeanFlux"],
      what: `time-mean flux over that at r = a, e = ${e}`,
      published: factor,
      ours: () => orbitMeanFlux({ fluxAtSemiMajorAxis: flux, eccentricity: e }) / flux,
      source: QUIRRENBACH,
    },
    {
      ...rest,
      covers: ["temperatureMeanFlux"],
      what: `time-mean of the instantaneous temperature over that at r = a, e = ${e}`,
      published: temperature,
      ours: () => (temperatureMeanFlux({ fluxAtSemiMajorAxis: flux, eccentricity: e }) / flux) ** 0.25,
      source: MENDEZ,
    },
  ];
});

export const orbitRows: readonly Check[] = [
  ...sunRows,
  ...trappistRows,
  ...meanRows,
  {
    covers: ["temperatureMeanFlux"],
    what: "limit of the mean temperature as e → 1, taken at e = 0.9999",
    published: 0.9003,
    unit: "1",
    ours: () => (temperatureMeanFlux({ fluxAtSemiMajorAxis: flux, eccentricity: 0.9999 }) / flux) ** 0.25,
    // near e = 1 the mean exceeds its limit by (1 − e)·(a logarithm below 8)
    tolerance: halfUnit(0.0001) + 1e-4,
    because: "last digit, and e = 0.9999 in place of 1",
    source: MENDEZ,
    basis: "seen",
  },
];
