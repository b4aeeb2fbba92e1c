// Orbits with many digits: periods, fluxes at their ends, means, shares of time, and thermal time against period.
import {
  ASTRONOMICAL_UNIT,
  apoastronFlux,
  fluxTimeShare,
  GRAVITATION,
  INSTANT_FLUX_INERTIA,
  MEAN_FLUX_INERTIA,
  orbitalPeriod,
  orbitMeanTemperature,
  periastronFlux,
  SOLAR_MASS_PARAMETER,
  temperatureMeanFlux,
  thermalInertiaRatio,
} from "../../src/index.ts";
import times from "../reference/computed/orbit_times.json" with { type: "json" };
import { type Check, halfUnit, ROUNDED, ROUNDING } from "./check.ts";
import { FACT_SHEETS, HARTMANN, JI, KEPLER, MENDEZ } from "./sources.ts";

const DAY = 86400;
const SUN = SOLAR_MASS_PARAMETER / GRAVITATION;

const periodRows = (
  [
    ["Mercury", 0.38709893, 87.969, 0.001],
    ["Venus", 0.72333199, 224.701, 0.001],
    ["Earth", 1.00000011, 365.256, 0.001],
  ] as const
).map(
  ([name, axis, published, step]): Check => ({
    covers: ["orbitalPeriod", "SOLAR_MASS_PARAMETER", "GRAVITATION"],
    what: `${name}: sidereal period from a semi-major axis of ${axis} au`,
    published,
    unit: "d",
    ours: () => orbitalPeriod({ semiMajorAxis: axis * ASTRONOMICAL_UNIT, mass: SUN }) / DAY,
    // the mean elements hold the pull of the other planets: 10⁻⁵ of the period for these three (for Mars, between the
    // axes of two printed fits, five times as much: left out)
    tolerance: halfUnit(step) + published * 1e-5,
    because: "last digit, and the pull of other planets in the mean elements",
    source: FACT_SHEETS,
    basis: "from memory",
  }),
);

/** Mercury's flux at both ends of its orbit, as the fact sheet's distances say: 46.00 and 69.82 million km at 57.909. */
const endRows = (
  [
    ["perihelion", "periastronFlux", periastronFlux, 46.0],
    ["aphelion", "apoastronFlux", apoastronFlux, 69.818],
  ] as const
).map(
  ([where, name, law, distance]): Check => ({
    covers: [name],
    what: `Mercury: flux at ${where} over that at the semi-major axis, ${distance} of 57.909 million km`,
    published: (57.909 / distance) ** 2,
    unit: "1",
    ours: () => law({ fluxAtSemiMajorAxis: 1, eccentricity: 0.2056 }),
    tolerance: 2 * (57.909 / distance) ** 2 * (halfUnit(0.0001) / 0.7944 + halfUnit(0.002) / distance),
    because: "last digit of the eccentricity and of the distances",
    source: FACT_SHEETS,
    basis: "from memory",
  }),
);

const meanRows = times.means
  .filter(({ e }) => [0.1, 0.3, 0.7, 0.9, 0.9999].includes(e))
  .flatMap(({ e, temperature }): Check[] => {
    const published = Number(temperature);
    const rest = {
      published,
      unit: "1",
      source: MENDEZ,
      basis: "computed with mpmath (orbit_times.py)",
      tolerance: published * ROUNDING,
      because: ROUNDED,
    } as const;
    return [
      {
        ...rest,
        covers: ["orbitMeanTemperature"],
        what: `time-mean temperature at 300 K for r = a, over 300 K, e = ${e}`,
        ours: () => orbitMeanTemperature({ temperatureAtSemiMajorAxis: 300, eccentricity: e }) / 300,
      },
      {
        ...rest,
        covers: ["temperatureMeanFlux"],
        what: `fourth root of the flux of the time-mean temperature, e = ${e}`,
        ours: () =>
          Math.sqrt(Math.sqrt(temperatureMeanFlux({ fluxAtSemiMajorAxis: 1361, eccentricity: e }) / 1361)),
      },
    ];
  });

const shareRows = times.shares.map(
  ({ e, low, high, share }): Check => ({
    covers: ["fluxTimeShare"],
    what: `share of time with ${low} ≤ S/S(a) ≤ ${high}, e = ${e}`,
    published: Number(share),
    unit: "1",
    ours: () => fluxTimeShare({ eccentricity: e, low, high }),
    tolerance: ROUNDING,
    because: ROUNDED,
    source: KEPLER,
    basis: "computed with mpmath (orbit_times.py)",
  }),
);

export const orbitShelfRows: readonly Check[] = [
  ...periodRows,
  ...endRows,
  ...meanRows,
  ...shareRows,
  {
    covers: ["thermalInertiaRatio"],
    what: "thermal time of 2.08 × 10⁸ J m⁻² K⁻¹ at 3.0872 W m⁻² K⁻¹ in years, as Π of a one-year orbit",
    published: 2.13,
    unit: "1",
    ours: () => thermalInertiaRatio({ heatCapacity: 2.08e8, emissionSlope: 3.0872, period: 365.25 * DAY }),
    tolerance: halfUnit(0.01) + 2.13 * (halfUnit(0.01) / 2.08),
    because: "last digit of the time and of the heat capacity",
    source: HARTMANN,
    basis: "from memory",
  },
  ...(
    [
      ["mean flux counts", "MEAN_FLUX_INERTIA", MEAN_FLUX_INERTIA, 1],
      ["flux of the moment counts", "INSTANT_FLUX_INERTIA", INSTANT_FLUX_INERTIA, 0.01],
    ] as const
  ).map(
    ([what, name, value, published]): Check => ({
      covers: [name],
      what: `thermal time over period where the ${what}`,
      published,
      unit: "1",
      ours: () => value,
      tolerance: 0,
      because: "adopted as printed",
      source: JI,
      basis: "from memory",
    }),
  ),
];
