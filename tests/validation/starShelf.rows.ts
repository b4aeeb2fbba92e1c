// Stars by mass, by band and by number, and what their light does at given distances.
import {
  ASTRONOMICAL_UNIT,
  bandFraction,
  combinedFlux,
  daysideRedistribution,
  distanceInRadii,
  equilibriumTemperature,
  fluxAtRadii,
  GRAVITATION,
  massLuminosity,
  nightsideRedistribution,
  REDISTRIBUTION_GLOBAL,
  REDISTRIBUTION_SUBSTELLAR,
  SOLAR_IRRADIANCE,
  SOLAR_LUMINOSITY,
  SOLAR_MASS_PARAMETER,
  SOLAR_RADIUS,
} from "../../src/index.ts";
import bands from "../reference/computed/ix_planck_bands.json" with { type: "json" };
import stars from "../reference/computed/mass_luminosity.json" with { type: "json" };
import { type Check, halfUnit, ROUNDING } from "./check.ts";
import { BRIGHT_STARS, COWAN_AGOL, EKER, IAU_B3, INCROPERA_BANDS, PLANCK_LAW, TORRES } from "./sources.ts";

const SUN = SOLAR_MASS_PARAMETER / GRAVITATION;
const luminosityOf = (suns: number) => massLuminosity({ mass: suns * SUN }) / SOLAR_LUMINOSITY;

const massRows: Check[] = [
  ...stars.rows.map(
    ({ mass, luminosity }): Check => ({
      covers: ["massLuminosity", "MASS_LUMINOSITY_STEPS"],
      what: `main-sequence star of ${mass} M☉: luminosity by its step`,
      published: Number(luminosity),
      unit: "L☉",
      ours: () => luminosityOf(Number(mass)),
      // up to 5 for the logarithm of the luminosity, times ln 10
      tolerance: Number(luminosity) * ROUNDING * 5,
      because: "a dozen roundings on either side, of an exponent up to 5·ln 10",
      source: EKER,
      basis: "computed with mpmath (mass_luminosity.py)",
    }),
  ),
  {
    covers: ["massLuminosity"],
    what: "main-sequence star of one solar mass: luminosity",
    published: 0.984,
    unit: "L☉",
    ours: () => luminosityOf(1),
    tolerance: halfUnit(0.001),
    because: "half a unit of the last digit",
    source: EKER,
    basis: "from memory",
  },
];

/** The book integrated its table in steps: its entries are off by up to 2.7·10⁻⁵. */
const BOOK = 3e-5;
const bookRows = (
  [
    [2000, 0.066728],
    [2898, 0.250108],
    [4000, 0.480877],
    [5000, 0.633747],
    [5800, 0.720158],
  ] as const
).map(
  ([product, published]): Check => ({
    covers: ["bandFraction"],
    what: `share of a black body's energy below λT = ${product} µm K`,
    published,
    unit: "1",
    ours: () => bandFraction({ temperature: 1000, to: product * 1e-9 }),
    tolerance: BOOK,
    because: "the table was integrated in steps, and the radiation constants were older",
    source: INCROPERA_BANDS,
    basis: "from memory",
  }),
);

const metres = (micrometres: string) => Number(`${micrometres}e-6`);
/** Where the band starts and ends in words. */
const named = (from: string, to: string) =>
  to === "inf" ? `beyond ${from} µm` : from === "0" ? `below ${to} µm` : `from ${from} to ${to} µm`;

/** A planet, the Earth, a red dwarf and the Sun; tests/tables reads all fourteen temperatures. */
const bandRows = bands.rows
  .filter(({ T }) => ["255", "288", "2600", "5772"].includes(T))
  .map(({ T, from, to, fraction }): Check => {
    const published = Number(fraction);
    const reduced = 14387.77 / (Number(T) * Number(to === "inf" ? from : to));
    return {
      covers: ["bandFraction"],
      what: `share of a black body's energy at ${T} K ${named(from, to)}`,
      published,
      unit: "1",
      ours: () =>
        bandFraction({
          temperature: Number(T),
          from: metres(from),
          ...(to === "inf" ? {} : { to: metres(to) }),
        }),
      tolerance: published * ROUNDING * (1 + reduced),
      because: "a dozen roundings, in the exponent hc/(λkT) too",
      source: PLANCK_LAW,
      basis: "computed with mpmath (planck_bands.py)",
    };
  });

/** Apparent magnitude of two stars together: 2.5 log₁₀ of their fluxes, which are added at one distance. */
const magnitudeOf = (magnitudes: readonly number[]) => {
  const star = (magnitude: number) => ({
    luminosity: SOLAR_LUMINOSITY * 10 ** (-0.4 * magnitude),
    distance: ASTRONOMICAL_UNIT,
  });
  return (
    -2.5 * Math.log10(combinedFlux({ stars: magnitudes.map(star) }) / combinedFlux({ stars: [star(0)] }))
  );
};
const pairRows = (
  [
    ["α Centauri", 0.01, 1.33, -0.27],
    ["Castor", 1.93, 2.97, 1.58],
  ] as const
).map(
  ([name, first, second, published]): Check => ({
    covers: ["combinedFlux"],
    what: `${name}: visual magnitude of its two stars together, ${first} and ${second}`,
    published,
    unit: "mag",
    ours: () => magnitudeOf([first, second]),
    tolerance: 2 * halfUnit(0.01),
    because: "last digit of the sum and of the brighter star",
    source: BRIGHT_STARS,
    basis: "from memory",
  }),
);

const transitRows = (
  [
    ["HD 189733 b", 5040, 8.81, 1201],
    ["HD 209458 b", 6065, 8.76, 1449],
  ] as const
).map(
  ([name, effectiveTemperature, radii, published]): Check => ({
    covers: ["fluxAtRadii", "equilibriumTemperature"],
    what: `${name}: equilibrium temperature without albedo, f = 1/4, from ${radii} stellar radii and ${effectiveTemperature} K`,
    published,
    unit: "K",
    ours: () =>
      equilibriumTemperature({
        flux: fluxAtRadii({ effectiveTemperature, radii }),
        albedo: 0,
        redistribution: REDISTRIBUTION_GLOBAL,
      }),
    tolerance: halfUnit(1) + (published * halfUnit(0.01)) / radii / 2,
    because: "last digit of the temperature and of the distance",
    source: TORRES,
    basis: "from memory",
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
const transportRows = (
  [
    ["day side without transport", "daysideRedistribution", daysideRedistribution, 0, 0.9],
    ["day side with full transport", "daysideRedistribution", daysideRedistribution, 1, 0.71],
    ["night side with full transport", "nightsideRedistribution", nightsideRedistribution, 1, 0.71],
  ] as const
).map(
  ([what, name, law, transport, published]): Check => ({
    covers: [name, "equilibriumTemperature"],
    what: `temperature of the ${what} over the substellar one`,
    published,
    unit: "1",
    ours: () => ratio(law({ transport })),
    tolerance: halfUnit(0.01),
    because: "half a unit of the last digit",
    source: COWAN_AGOL,
    basis: "from memory",
  }),
);

export const starShelfRows: readonly Check[] = [
  ...massRows,
  ...bookRows,
  ...bandRows,
  ...pairRows,
  {
    covers: ["distanceInRadii", "ASTRONOMICAL_UNIT", "SOLAR_RADIUS"],
    what: "astronomical unit in nominal solar radii",
    published: 215.032,
    unit: "1",
    ours: () => distanceInRadii({ distance: ASTRONOMICAL_UNIT, radius: SOLAR_RADIUS }),
    tolerance: halfUnit(0.001),
    because: "half a unit of the last digit",
    source: IAU_B3,
    basis: "from memory",
  },
  {
    covers: ["distanceInRadii"],
    what: "HD 189733 b: semi-major axis in stellar radii, from 0.03099 au and 0.756 R☉",
    published: 8.81,
    unit: "1",
    ours: () => distanceInRadii({ distance: 0.03099 * ASTRONOMICAL_UNIT, radius: 0.756 * SOLAR_RADIUS }),
    tolerance: halfUnit(0.01) + 8.81 * (halfUnit(0.001) / 0.756 + halfUnit(1e-5) / 0.03099),
    because: "last digit of the ratio, the axis and the radius",
    source: TORRES,
    basis: "from memory",
  },
  ...transitRows,
  ...transportRows,
];
