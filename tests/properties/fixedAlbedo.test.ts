// What holds for a planet of fixed albedo, through stars, orbits and loops; and for mixtures of surfaces.
import fc from "fast-check";
import { describe, expect, test } from "vitest";
import {
  absorbedFlux,
  closeLoop,
  equilibriumTemperature,
  findStates,
  greyEmission,
  mixAlbedo,
  orbitMeanFlux,
  stellarFlux,
  stellarLuminosity,
  temperatureMeanFlux,
} from "../../src/index.ts";
import { settings } from "./settings.ts";

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });

const planets = fc.record({
  radius: between(1e8, 2e9),
  effectiveTemperature: between(2500, 8000),
  distance: between(1e10, 1e12),
  albedo: between(0, 0.9),
  redistribution: between(0.25, 1),
  emissivity: between(0.3, 1),
});
type Planet = {
  readonly [K in
    | "radius"
    | "effectiveTemperature"
    | "distance"
    | "albedo"
    | "redistribution"
    | "emissivity"]: number;
};

const fluxOf = ({ radius, effectiveTemperature, distance }: Planet) =>
  stellarFlux({ luminosity: stellarLuminosity({ radius, effectiveTemperature }), distance });
const temperatureOf = (planet: Planet) => {
  const { albedo, redistribution, emissivity } = planet;
  return equilibriumTemperature({ flux: fluxOf(planet), albedo, redistribution, emissivity });
};

describe("equilibrium temperature", () => {
  /** A few dozen roundings along the chain. */
  const CLOSE = 32 * 2 ** -53;
  const ratio = (a: number, b: number, expected: number) =>
    expect(Math.abs(a / b / expected - 1)).toBeLessThanOrEqual(CLOSE);

  test("follows S to the fourth root", () => {
    fc.assert(
      fc.property(planets, between(0.01, 100), (planet, k) => {
        const { albedo, redistribution } = planet;
        const at = (flux: number) => equilibriumTemperature({ flux, albedo, redistribution });
        ratio(at(k * fluxOf(planet)), at(fluxOf(planet)), Math.sqrt(Math.sqrt(k)));
      }),
      settings(300),
    );
  });

  test("follows distance to −1/2, the star's radius to 1/2 and its temperature to 1", () => {
    fc.assert(
      fc.property(planets, between(0.1, 10), (planet, k) => {
        const at = (change: Partial<Planet>) => temperatureOf({ ...planet, ...change });
        const here = temperatureOf(planet);
        ratio(at({ distance: k * planet.distance }), here, 1 / Math.sqrt(k));
        ratio(at({ radius: k * planet.radius }), here, Math.sqrt(k));
        ratio(at({ effectiveTemperature: k * planet.effectiveTemperature }), here, k);
      }),
      settings(300),
    );
  });

  test("a warmer or larger star, a nearer orbit, a darker planet, less spreading are never colder", () => {
    const factors = fc.record({
      radius: between(1, 2),
      effectiveTemperature: between(1, 2),
      distance: between(0.5, 1),
      albedo: between(0, 1),
      redistribution: between(1, 2),
      emissivity: between(0.5, 1),
    });
    fc.assert(
      fc.property(planets, factors, (planet, factor) => {
        const here = temperatureOf(planet);
        for (const key of Object.keys(factor) as (keyof Planet)[]) {
          const moved = { ...planet, [key]: planet[key] * factor[key] };
          const changed = { ...moved, redistribution: Math.min(1, moved.redistribution) };
          expect(temperatureOf(changed), key).toBeGreaterThanOrEqual(here);
        }
      }),
      settings(300),
    );
  });

  test("is the only state of a loop with the same albedo and emissivity", () => {
    const within = [1, 2e4] as const;
    const loop = closeLoop(({ temperature, given }) => {
      const flux = given("flux", 1361, "W m-2", { within: [0, 1e12] });
      const albedo = given("albedo", 0.3, "1", { within: [0, 1] });
      const emissivity = given("emissivity", 1, "1", { within: [0, 1] });
      return {
        heating: { sunlight: absorbedFlux({ flux, albedo }) },
        cooling: { longwave: greyEmission({ temperature, emissivity }) },
        heatCapacity: 0,
      };
    });
    fc.assert(
      fc.property(planets, (planet) => {
        const { albedo, emissivity } = planet;
        const at = { flux: fluxOf(planet), albedo, emissivity };
        const { states, complete } = findStates(loop, { within, at });
        expect(complete).toBe(true);
        expect(states).toHaveLength(1);
        ratio(states[0]?.temperature as number, temperatureOf({ ...planet, redistribution: 0.25 }), 1);
      }),
      settings(100),
    );
  });
});

describe("means over an orbit", () => {
  test("the mean flux rises with eccentricity, the flux of the mean temperature falls; they bracket the circular one", () => {
    fc.assert(
      fc.property(between(1, 1e5), between(0, 0.99), between(0, 0.0099), (fluxAtSemiMajorAxis, e, more) => {
        const mean = (eccentricity: number) => orbitMeanFlux({ fluxAtSemiMajorAxis, eccentricity });
        const cool = (eccentricity: number) => temperatureMeanFlux({ fluxAtSemiMajorAxis, eccentricity });
        const rounding = fluxAtSemiMajorAxis * 64 * 2 ** -53;
        expect(mean(e + more)).toBeGreaterThanOrEqual(mean(e) - rounding);
        expect(cool(e + more)).toBeLessThanOrEqual(cool(e) + rounding);
        expect(mean(e)).toBeGreaterThanOrEqual(fluxAtSemiMajorAxis);
        expect(cool(e)).toBeLessThanOrEqual(fluxAtSemiMajorAxis + rounding);
      }),
      settings(300),
    );
  });
});

describe("a mixture of surfaces", () => {
  const cover = fc.record({ fraction: between(0, 1), albedo: between(0, 1) });
  const covers = fc.array(cover, { minLength: 1, maxLength: 8 }).map((list) => {
    const total = list.reduce((sum, c) => sum + c.fraction, 0);
    return list.map((c) => ({ ...c, fraction: total > 1 ? c.fraction / total : c.fraction }));
  });
  /** The sum of eight products. */
  const ROUNDING = 16 * 2 ** -53;

  test("lies between its parts", () => {
    fc.assert(
      fc.property(covers, between(0, 1), (list, bare) => {
        const mixed = mixAlbedo({ covers: list, bare });
        const parts = [bare, ...list.map((c) => c.albedo)];
        expect(mixed).toBeGreaterThanOrEqual(Math.min(...parts) - ROUNDING);
        expect(mixed).toBeLessThanOrEqual(Math.max(...parts) + ROUNDING);
      }),
      settings(300),
    );
  });

  test("of shares in whole percents is an albedo, however bright its parts", () => {
    const percents = fc
      .array(fc.integer({ min: 0, max: 100 }), { minLength: 1, maxLength: 6 })
      .map((cuts) => [0, ...cuts.sort((a, b) => a - b), 100])
      .map((cuts) => cuts.slice(1).map((cut, i) => (cut - (cuts[i] as number)) / 100));
    fc.assert(
      fc.property(percents, (fractions) => {
        const bright = mixAlbedo({ covers: fractions.map((fraction) => ({ fraction, albedo: 1 })) });
        expect(bright).toBeLessThanOrEqual(1);
        expect(absorbedFlux({ flux: 1361, albedo: bright })).toBeLessThanOrEqual(1361 * ROUNDING);
      }),
      settings(300),
    );
  });

  test("does not depend on the order of its parts", () => {
    fc.assert(
      fc.property(
        covers.chain((list) =>
          fc.tuple(fc.constant(list), fc.shuffledSubarray(list, { minLength: list.length })),
        ),
        between(0, 1),
        ([list, other], bare) => {
          const difference = mixAlbedo({ covers: list, bare }) - mixAlbedo({ covers: other, bare });
          expect(Math.abs(difference)).toBeLessThanOrEqual(ROUNDING);
        },
      ),
      settings(300),
    );
  });

  test("is the same with its last part as the rest of the surface", () => {
    const complete = fc.array(cover, { minLength: 2, maxLength: 8 }).map((list) => {
      const total = list.reduce((sum, c) => sum + c.fraction + 0.01, 0);
      return list.map((c) => ({ ...c, fraction: (c.fraction + 0.01) / total }));
    });
    fc.assert(
      fc.property(complete, (list) => {
        const rest = list.at(-1)?.albedo as number;
        const difference = mixAlbedo({ covers: list }) - mixAlbedo({ covers: list.slice(0, -1), bare: rest });
        expect(Math.abs(difference)).toBeLessThanOrEqual(ROUNDING);
      }),
      settings(300),
    );
  });
});
