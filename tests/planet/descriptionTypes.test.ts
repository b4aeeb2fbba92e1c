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

const layered: PlanetDescription = {
  format: "thermostead-planet-1",
  star: [
    { luminosity: "0.4 solLum", visibleShare: 0.4 },
    { luminosity: "0.1 solLum", visibleShare: 0.2, distance: "30 au" },
  ],
  orbit: { semiMajorAxis: "0.6 au" },
  redistribution: { transport: 0.8, side: "day" },
  surface: {
    covers: [
      {
        share: { law: "iceShare", frozenBelow: "250 K", openAbove: "280 K" },
        visible: 0.7,
        nearInfrared: 0.3,
      },
      { share: "rest", albedo: 0.1 },
    ],
  },
  clouds: { share: 0.5, reflectance: 0.4, emissivity: 0.9, temperature: "255 K" },
  longwave: {
    law: "ceilingEmission",
    ceiling: "282 W m-2",
    emission: {
      law: "greyColumnEmission",
      opticalDepth: [
        0.5,
        { law: "vapourOpticalDepth", referenceTemperature: "288 K", referenceDepth: 0.2, humidity: 0.7 },
      ],
    },
  },
  forcing: [{ law: "co2AdjustedForcingMyhre", concentration: 560e-6, reference: 280e-6 }],
  heatCapacity: "unknown",
  rotation: { locked: true },
};

test("a typed description of surface, sky and stars is read, and couplings have their names", () => {
  const { states } = findStates(readPlanet(layered).loop, { within: [100, 500] });
  expect(states[0]?.couplings.surfaceAlbedo).toBe(states[0]?.report.surfaceAlbedo);
  expect(states[0]?.couplings.opticalDepth).toBe(states[0]?.report.opticalDepth);
  // @ts-expect-error no planet has a coupling of this name
  expect(states[0]?.couplings.vapour).toBeUndefined();
});

test("a typed description of surface and sky refuses what a reader would", () => {
  const scaled = { law: "pressureOpticalDepth", pressure: "1 bar" } as const;
  const wrong: PlanetDescription[] = [
    // @ts-expect-error both
    { ...layered, albedo: 0.3 },
    // @ts-expect-error neither
    { ...layered, surface: undefined },
    // @ts-expect-error a cover in one band
    { ...layered, surface: { covers: [{ share: 1, visible: 0.3 }] } },
    // @ts-expect-error a Bond albedo of a surface
    { ...layered, surface: { law: "bondAlbedo", geometric: 0.2, phaseIntegral: 1 } },
    // @ts-expect-error a ceiling over a ceiling
    { ...layered, longwave: { ...layered.longwave, emission: layered.longwave } },
    // @ts-expect-error a bound pressure
    { ...layered, longwave: { law: "greyColumnEmission", opticalDepth: scaled } },
    // @ts-expect-error a forcing without its reference
    { ...layered, forcing: { law: "co2AdjustedForcingMyhre", concentration: 560e-6 } },
    // @ts-expect-error the distance of the only star
    { ...layered, star: { luminosity: "0.4 solLum", distance: "1 au" } },
  ];
  for (const each of wrong) expect(() => readPlanet(each)).toThrow();
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
