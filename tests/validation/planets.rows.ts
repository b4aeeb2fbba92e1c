// Planets of the solar system: printed irradiance and albedo, or printed emission, to the printed temperature.
import {
  absorbedFlux,
  blackbodyTemperature,
  equilibriumTemperature,
  REDISTRIBUTION_GLOBAL,
} from "../../src/index.ts";
import { type Check, halfUnit, printedTemperature } from "./check.ts";
import {
  FACT_SHEETS,
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

export const planetRows: readonly Check[] = [
  ...sheetRows,
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
