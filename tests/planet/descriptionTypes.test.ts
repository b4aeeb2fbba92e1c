// The type of a description knows the fields, the laws and which values carry a unit. Checked by the compiler.
import { expect, test } from "vitest";
import type { PlanetDescription } from "../../src/planet/planetShape.ts";
import { readPlanet } from "../../src/planet/readPlanet.ts";
import { findStates } from "../../src/states/findStates.ts";

const description: PlanetDescription = {
  format: "thermostead-planet-1",
  star: { luminosity: { value: 0.42, unit: "solLum", minus: 0.02, source: "invented" } },
  orbit: { semiMajorAxis: "0.61 au", eccentricity: 0.1, average: "flux" },
  redistribution: "global",
  albedo: {
    law: "tanhAlbedo",
    cold: 0.6,
    warm: { value: 0.3, plus: 0.05 },
    midpoint: "265 K",
    width: "10 K",
  },
  longwave: { law: "greyColumnEmission", opticalDepth: 1 },
  heatCapacity: "4.2e8 J m-2 K-1",
};

test("a typed description is read, and its loop takes paths as names", () => {
  const { loop } = readPlanet(description);
  const { states } = findStates(loop, { within: [100, 500], at: { "albedo.cold": 0.5 } });
  expect(states[0]?.couplings.albedo).toBe(states[0]?.report.albedo);
});

test("a typed description refuses what a reader would", () => {
  const wrong: PlanetDescription[] = [
    // @ts-expect-error a bare number is not a distance
    { ...description, orbit: { semiMajorAxis: 0.61 } },
    // @ts-expect-error a text is not an albedo
    { ...description, albedo: "0.3" },
    // @ts-expect-error a misspelt field
    { ...description, internalHeet: "1 W m-2" },
    // @ts-expect-error an unknown law
    { ...description, longwave: { law: "grayEmission", emissivity: 1 } },
    // @ts-expect-error a missing port
    { ...description, longwave: { law: "greyEmission" } },
    // @ts-expect-error the temperature of a law is the planet's own
    { ...description, longwave: { law: "greyEmission", emissivity: 1, temperature: "300 K" } },
    // @ts-expect-error no format
    { ...description, format: undefined },
  ];
  for (const each of wrong) expect(() => readPlanet(each)).toThrow();
});
