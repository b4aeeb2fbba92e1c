// Invented planets for the tests of appraisals.
import type { Appraisal } from "../../src/appraisal/appraisal.ts";
import type { StateAppraisal } from "../../src/appraisal/appraisedState.ts";
import { appraisePlanet } from "../../src/appraisal/appraisePlanet.ts";

type Fields = Readonly<Record<string, unknown>>;

/** A planet of an orange dwarf with two climates that hold, and everything known of it. */
export const snowy = (fields: Fields = {}): Record<string, unknown> => ({
  format: "thermostead-planet-1",
  name: "Sovimel",
  star: {
    name: "Kerrun",
    luminosity: { value: 0.2, unit: "solLum", minus: 0.01, plus: 0.02 },
    effectiveTemperature: "4680 K",
    mass: "0.72 solMass",
    brightening: "0.045 Gyr-1",
  },
  orbit: { semiMajorAxis: "0.46 au", eccentricity: 0.08, average: "flux" },
  redistribution: "global",
  albedo: { law: "tanhAlbedo", cold: 0.62, warm: 0.28, midpoint: "266 K", width: "9 K" },
  atmosphere: { pressure: "1.2 bar" },
  longwave: { law: "greyColumnEmission", opticalDepth: 0.9 },
  heatCapacity: "2.5e8 J m-2 K-1",
  internalHeat: "0.08 W m-2",
  ...fields,
});

/** A planet of a star that is known by radius and temperature, with albedo and emissivity as plain numbers. */
export const plain = (fields: Fields = {}): Record<string, unknown> => ({
  format: "thermostead-planet-1",
  star: { radius: "0.68 solRad", effectiveTemperature: "4680 K", mass: "0.72 solMass" },
  orbit: { semiMajorAxis: "0.46 au" },
  redistribution: "global",
  albedo: 0.3,
  longwave: { law: "greyEmission", emissivity: 0.6 },
  heatCapacity: "4.2e8 J m-2 K-1",
  ...fields,
});

/** A description without some of its fields. */
export const without = (description: Fields, ...fields: readonly string[]): Record<string, unknown> =>
  Object.fromEntries(Object.entries(description).filter(([field]) => !fields.includes(field)));

/** The first climate of an appraisal, which must have one. */
export function firstOf({ states }: Appraisal): StateAppraisal {
  const [first] = states;
  if (!first) throw new Error("no climate was found");
  return first;
}

/** The codes of all notes of an appraisal. */
export const codesOf = (description: unknown): string[] =>
  appraisePlanet(description).notes.map((note) => note.code);

/** Every number inside a value. */
export function numbersIn(value: unknown): number[] {
  if (typeof value === "number") return [value];
  return typeof value === "object" && value !== null ? Object.values(value).flatMap(numbersIn) : [];
}
