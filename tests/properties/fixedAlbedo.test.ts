// What holds for a planet of fixed albedo, through stars, orbits and loops.
import fc from "fast-check";
import { describe, expect, test } from "vitest";
import {
  absorbedFlux,
  closeLoop,
  equilibriumTemperature,
  findStates,
  greyEmission,
  stellarFlux,
  stellarLuminosity,
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
