// Planets of the solar system: printed irradiance and albedo, or printed absorbed flux, to the printed temperature.
import {
  absorbedFlux,
  blackbodyTemperature,
  equilibriumTemperature,
  REDISTRIBUTION_GLOBAL,
  STEFAN_BOLTZMANN,
} from "../../src/index.ts";
import oblate from "../reference/computed/oblate.json" with { type: "json" };
import { type Check, halfUnit, printedTemperature } from "./check.ts";
import {
  FACT_SHEETS,
  HEAT_BALANCE,
  KT_1997,
  LI_2010,
  LI_2012,
  MARS_SHEET_2006,
  PIERREHUMBERT,
  TFK_2009,
} from "./sources.ts";

const redistribution = REDISTRIBUTION_GLOBAL;

/** Name, Bond albedo, irradiance and black-body temperature with the step in which each is printed. */
const SHEETS = [
  ["Mercury", [0.068, 0.001], [9082.7, 0.1], [439.6, 0.1], "from memory"],
  ["Venus", [0.77, 0.01], [2601.3, 0.1], [226.6, 0.1], "from memory"],
  ["Earth", [0.306, 0.001], [1361.0, 0.1], [254.0, 0.1], "seen"],
  ["Moon", [0.11, 0.01], [1361.0, 0.1], [270.4, 0.1], "seen"],
  ["Mars", [0.25, 0.01], [586.2, 0.1], [209.8, 0.1], "from memory"],
  ["Mars (older edition)", [0.25, 0.01], [589.2, 0.1], [210.1, 0.1], "seen"],
  ["Jupiter", [0.343, 0.001], [50.26, 0.01], [109.9, 0.1], "from memory"],
  ["Saturn", [0.342, 0.001], [14.82, 0.01], [81.0, 0.1], "from memory"],
  ["Uranus", [0.3, 0.001], [3.69, 0.01], [58.1, 0.1], "from memory"],
  ["Neptune", [0.29, 0.001], [1.508, 0.001], [46.6, 0.1], "from memory"],
] as const;

const sheetRows = SHEETS.map(
  ([name, albedo, flux, [published, step], basis]): Check => ({
    covers: ["equilibriumTemperature", "REDISTRIBUTION_GLOBAL"],
    what: `${name}: black-body temperature from irradiance and Bond albedo`,
    published,
    unit: "K",
    ours: () => equilibriumTemperature({ flux: flux[0], albedo: albedo[0], redistribution }),
    tolerance: printedTemperature(published, { flux, albedo }, step),
    because: "half a unit of the last digit of temperature, irradiance and albedo",
    source: name.includes("older") ? MARS_SHEET_2006 : FACT_SHEETS,
    basis,
  }),
);

/** Absorbed and internal flux, and both temperatures, of the heat-balance page. */
const BALANCES = [
  ["Venus", 163.6539, 231.89, 0, 231.89],
  ["Earth", 237.4147, 254.49, 0.062, 254.51],
  ["Mars", 110.4476, 210.18, 0, 210.18],
  ["Jupiter", 8.1233, 109.45, 5.44, 124.42],
  ["Saturn", 2.3814, 80.54, 2.01, 93.85],
  ["Uranus", 0.641, 58.01, 0.042, 58.94],
] as const;

/** The page's temperatures all follow from σ = 5.660·10⁻⁸ (±0.001): with today's σ they are 0.046 % lower. */
const OLD_SIGMA = ((5.661e-8 / STEFAN_BOLTZMANN) ** 0.25 - (5.659e-8 / STEFAN_BOLTZMANN) ** 0.25) / 2;
const toTheirs = (5.66e-8 / STEFAN_BOLTZMANN) ** -0.25;
const SIGMA_NOTE = "last digit, and the page's σ = 5.660(1)e-8, from which all its temperatures follow";

const balanceRows = BALANCES.flatMap(([name, absorbed, Teq, internal, Teff]): Check[] => {
  // absorbed flux as a beam on a sphere that reflects nothing
  const beam = { flux: 4 * absorbed, albedo: 0, redistribution };
  const row = (
    what: string,
    published: number,
    ours: () => number,
    covers: string[],
    step: number,
  ): Check => ({
    covers,
    what: `${name}: ${what} (rescaled to the page's σ)`,
    published,
    unit: "K",
    ours: () => ours() * toTheirs,
    tolerance:
      halfUnit(0.01) + published * OLD_SIGMA + (published * halfUnit(step)) / (4 * (absorbed + internal)),
    because: SIGMA_NOTE,
    source: HEAT_BALANCE,
    basis: "seen",
  });
  const step = name === "Uranus" ? 0.001 : 0.0001;
  const rows = [
    row(
      "equilibrium temperature from the absorbed flux",
      Teq,
      () => equilibriumTemperature(beam),
      ["equilibriumTemperature"],
      step,
    ),
  ];
  if (internal > 0) {
    const withInternal = () => equilibriumTemperature({ ...beam, internalFlux: internal });
    const coarse = internal < 1 ? 0.001 : 0.01;
    rows.push(
      row("effective temperature with internal heat", Teff, withInternal, ["equilibriumTemperature"], coarse),
    );
    const emitted = () => blackbodyTemperature({ flux: absorbed + internal });
    rows.push(row("temperature of the emitted flux", Teff, emitted, ["blackbodyTemperature"], coarse));
  }
  return rows;
});

/** Flux, Bond albedo, and absorbed flux that the page prints for the flattened planet. */
const FLATTENED = [
  ["Jupiter", 50.616, 0.343, 8.1233, 0.0001, oblate.rows.jupiter.factor],
  ["Saturn", 15.0117, 0.342, 2.3814, 0.0001, oblate.rows.saturn.factor],
  ["Uranus", 3.6917, 0.3, 0.641, 0.001, oblate.rows.uranus.factor],
] as const;

const flattenedRows = FLATTENED.map(
  ([name, flux, albedo, published, step, factor]): Check => ({
    covers: ["absorbedFlux"],
    what: `${name}: absorbed flux of a flattened planet (S(1 − A)/4 times its shadow over a quarter of its area, ${factor.toFixed(5)})`,
    published,
    unit: "W m-2",
    ours: () => absorbedFlux({ flux, albedo }) * factor,
    // radii to 1 km in 7·10⁴ move the factor by 10⁻⁵
    tolerance: halfUnit(step) + published * 1e-5,
    because: "last digit, and radii known to about a kilometre",
    source: HEAT_BALANCE,
    basis: "seen",
  }),
);

export const planetRows: readonly Check[] = [
  ...sheetRows,
  ...balanceRows,
  ...flattenedRows,
  {
    covers: ["absorbedFlux"],
    what: "Venus: absorbed flux from flux and Bond albedo",
    published: 163.6539,
    unit: "W m-2",
    ours: () => absorbedFlux({ flux: 2618.4628, albedo: 0.75 }),
    tolerance: halfUnit(0.0001) + halfUnit(0.0001) / 16,
    because: "last digit of both fluxes",
    source: HEAT_BALANCE,
    basis: "seen",
  },
  {
    covers: ["absorbedFlux"],
    what: "Earth: absorbed flux, 341.3 W m⁻² coming in and 29.8 % of it reflected",
    published: 239.4,
    unit: "W m-2",
    ours: () => absorbedFlux({ flux: 4 * 341.3, albedo: 0.298 }),
    tolerance: halfUnit(0.1) + 341.3 * halfUnit(0.001),
    because: "last digit of the flux and of the albedo",
    source: TFK_2009,
    basis: "from memory",
  },
  {
    covers: ["blackbodyTemperature"],
    what: "Earth: temperature of 235 W m⁻², printed as −19 °C",
    published: -19,
    unit: "degC",
    ours: () => blackbodyTemperature({ flux: 235 }) - 273.15,
    tolerance: halfUnit(1),
    because: "half a unit of the last digit",
    source: KT_1997,
    basis: "from memory",
  },
  {
    covers: ["blackbodyTemperature"],
    what: "Jupiter: effective temperature from the emitted power, 14.10 W m⁻²",
    published: 125.57,
    unit: "K",
    ours: () => blackbodyTemperature({ flux: 14.1 }),
    tolerance: halfUnit(0.01) + (125.57 * halfUnit(0.01)) / 14.1 / 4,
    because: "last digit of temperature and power",
    source: LI_2012,
    basis: "from memory",
  },
  {
    covers: ["blackbodyTemperature"],
    what: "Saturn: effective temperature from the emitted power, 4.952 W m⁻²",
    published: 96.67,
    unit: "K",
    ours: () => blackbodyTemperature({ flux: 4.952 }),
    tolerance: halfUnit(0.01) + (96.67 * halfUnit(0.001)) / 4.952 / 4,
    because: "last digit of temperature and power",
    source: LI_2010,
    basis: "from memory",
  },
  {
    covers: ["blackbodyTemperature", "absorbedFlux"],
    what: "Earth: skin temperature, of half the flux that a grey atmosphere emits",
    published: 214,
    unit: "K",
    ours: () => blackbodyTemperature({ flux: absorbedFlux({ flux: 1361, albedo: 0.3 }) / 2 }),
    tolerance: halfUnit(1),
    because: "half a unit of the last digit",
    source: PIERREHUMBERT,
    basis: "from memory",
  },
];
