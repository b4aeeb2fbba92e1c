// Any planet with air, clouds, ice, several stars and forcings is read, has finite states, and its sunlight adds up.
import fc from "fast-check";
import { expect, test } from "vitest";
import { planetSchema } from "../../src/planet/planetSchema.ts";
import { readPlanet } from "../../src/planet/readPlanet.ts";
import { findStates } from "../../src/states/findStates.ts";
import { residualOf } from "../../src/states/ledger.ts";

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const share = between(0, 1);
const measured = (min: number, max: number, unit: string) =>
  between(min, max).map((value) => `${value} ${unit}`);

const own = fc.record({
  luminosity: measured(0.01, 5, "solLum"),
  mass: measured(0.1, 2, "solMass"),
  effectiveTemperature: measured(2500, 8000, "K"),
});
const far = fc.record({
  luminosity: measured(0.01, 5, "solLum"),
  visibleShare: share,
  distance: measured(10, 99, "au"),
});
const star = fc.oneof(
  own,
  fc
    .tuple(fc.array(own, { minLength: 1, maxLength: 3 }), fc.array(far, { maxLength: 2 }))
    .map(([near, others]) => [...near, ...others]),
);
const orbit = fc.oneof(
  fc.record({ semiMajorAxis: measured(0.2, 3, "au") }),
  fc.record({ period: measured(50, 900, "d"), eccentricity: between(0, 0.7), average: fc.constant("flux") }),
);

const reflecting = fc.oneof(fc.record({ albedo: share }), fc.record({ visible: share, nearInfrared: share }));
const iceRamp = fc.record({
  law: fc.constant("iceShare"),
  frozenBelow: measured(220, 265, "K"),
  openAbove: measured(266, 300, "K"),
});
const surface = fc.oneof(
  share,
  fc
    .tuple(fc.option(fc.tuple(iceRamp, reflecting)), share, reflecting, reflecting)
    .map(([ice, stated, a, b]) => ({
      covers: [
        ...(ice ? [{ share: ice[0], ...ice[1] }] : []),
        { share: stated, ...a },
        { share: "rest", ...b },
      ],
    })),
);

/** What a layer reflects and absorbs, at most 0.95 of the light together. */
const layer = fc
  .record({ reflectance: between(0, 0.95), absorbed: share })
  .map(({ reflectance, absorbed }) => ({ reflectance, absorptance: absorbed * (0.95 - reflectance) }));
const clouds = fc
  .tuple(share, layer, fc.option(fc.record({ emissivity: share, temperature: measured(180, 290, "K") })))
  .map(([covered, sunlight, longwave]) => ({ share: covered, ...sunlight, ...longwave }));

const depth = fc.oneof(
  between(0, 4),
  fc.record({
    law: fc.constant("pressureOpticalDepth"),
    referencePressure: measured(0.1, 3, "bar"),
    referenceDepth: between(0, 2),
    exponent: between(1, 2),
  }),
  fc.record({
    law: fc.constant("vapourOpticalDepth"),
    referenceTemperature: measured(270, 300, "K"),
    referenceDepth: between(0, 2),
    humidity: share,
  }),
);
const emission = fc.oneof(
  fc.record({
    law: fc.constant("greyColumnEmission"),
    opticalDepth: fc.oneof(depth, fc.array(depth, { minLength: 1, maxLength: 3 })),
  }),
  fc.record({ law: fc.constantFrom("budykoEmission", "northEmission", "kollCroninEmission") }),
  fc.record({
    law: fc.constant("leakyStackEmission"),
    layers: fc.array(fc.record({ emissivity: between(0.1, 1), heating: measured(0, 20, "W m-2") }), {
      minLength: 1,
      maxLength: 4,
    }),
  }),
);
const longwave = fc.oneof(
  emission,
  emission.map((inner) => ({ law: "ceilingEmission", ceiling: "282 W m-2", emission: inner })),
);
const forcing = fc.record({
  law: fc.constant("co2AdjustedForcingMyhre"),
  concentration: between(1e-4, 1e-3),
  reference: fc.constant(280e-6),
});

const valid = fc
  .record(
    {
      star,
      orbit,
      redistribution: fc.oneof(
        fc.constant("global"),
        fc.record({ transport: share, side: fc.constantFrom("day", "night") }),
      ),
      surface,
      longwave,
      heatCapacity: fc.constantFrom("unknown", "4e8 J m-2 K-1"),
      pressure: measured(0.1, 5, "bar"),
      clouds,
      air: layer,
      forcing,
      internalHeat: measured(0, 5, "W m-2"),
    },
    {
      requiredKeys: ["star", "orbit", "redistribution", "surface", "longwave", "heatCapacity", "pressure"],
    },
  )
  .map(({ pressure, air, ...rest }) => ({
    format: "thermostead-planet-1",
    ...rest,
    atmosphere: { pressure, ...air },
  }));

/** Every number inside a value. */
function numbersIn(value: unknown): number[] {
  if (typeof value === "number") return [value];
  return typeof value === "object" && value !== null ? Object.values(value).flatMap(numbersIn) : [];
}

test("sunlight that is not reflected is absorbed by air, clouds or surface, and every reservoir closes", () => {
  let [split, found] = [0, 0];
  fc.assert(
    fc.property(valid, (description) => {
      expect(planetSchema["~standard"].validate(description)).toEqual({ value: description });
      const planet = readPlanet(description);
      for (const number of numbersIn([planet.facts, planet.assumptions]))
        expect(Number.isFinite(number)).toBe(true);
      const { redistribution } = planet.assumptions;
      for (const state of findStates(planet.loop, { within: [100, 600], effort: 300 }).states) {
        found++;
        for (const number of numbersIn(state)) expect(Number.isFinite(number)).toBe(true);
        const { albedo, flux } = state.report as { albedo: number; flux: number };
        const incoming = redistribution * flux;
        const into = state.ledger.flows.filter(
          ({ from, name }) => from === "space" && name.startsWith("sunlight"),
        );
        const absorbed = into.reduce((sum, { value }) => sum + value, 0);
        // shares of the light, each a handful of rounded operations
        expect(Math.abs(absorbed - incoming * (1 - albedo))).toBeLessThanOrEqual(4e-15 * incoming);
        if (into.length > 1) {
          split++;
          expect(residualOf(state.ledger, "atmosphere")).toBe(0);
        }
        expect(state.notes.filter(({ code }) => code === "open-reservoir")).toEqual([]);
      }
    }),
    { seed: 20263, numRuns: 60 },
  );
  expect(split).toBeGreaterThan(20);
  expect(found).toBeGreaterThan(split);
});

test("a cloud brightens every surface, and a share of it by its share", () => {
  fc.assert(
    fc.property(between(0, 0.95), between(0, 0.95), share, (surface, reflectance, covered) => {
      const albedoUnder = (share: number) =>
        readPlanet({
          format: "thermostead-planet-1",
          orbit: { flux: "1000 W m-2" },
          redistribution: "global",
          surface,
          clouds: { share, reflectance },
          longwave: { law: "budykoEmission" },
          heatCapacity: "unknown",
        }).assumptions.albedo as number;
      const gain = (reflectance * (1 - surface) ** 2) / (1 - reflectance * surface);
      expect(Math.abs(albedoUnder(1) - surface - gain)).toBeLessThan(1e-14);
      expect(Math.abs(albedoUnder(covered) - surface - covered * gain)).toBeLessThan(1e-14);
    }),
    { seed: 20264, numRuns: 100 },
  );
});
