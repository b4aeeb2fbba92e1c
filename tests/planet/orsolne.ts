// A planet of an invented star that is known by radius and temperature, as a fresh object that a test may change.
import fs from "node:fs";
import type { PlanetDescription } from "../../src/planet/planetShape.ts";

type Loose<T> = T extends object ? { -readonly [K in keyof T]: Loose<T[K]> } : T;

const text = fs.readFileSync(new URL("orsolne.json", import.meta.url), "utf8");

/** A description that can be written to. */
export const orsolne = (): Loose<PlanetDescription> => JSON.parse(text);

/** The example with some of its fields replaced, of any type. */
export const orsolneWith = (fields: Readonly<Record<string, unknown>>): Record<string, unknown> => ({
  ...orsolne(),
  ...fields,
});

/** A planet without a star of its own: flux 1361 W m⁻², albedo and emissivity as plain numbers. */
export const simple = (fields: Readonly<Record<string, unknown>> = {}): Record<string, unknown> => ({
  format: "thermostead-planet-1",
  orbit: { flux: "1361 W m-2" },
  redistribution: "global",
  albedo: 0.3,
  longwave: { law: "greyEmission", emissivity: 0.6 },
  heatCapacity: "4.2e8 J m-2 K-1",
  ...fields,
});
