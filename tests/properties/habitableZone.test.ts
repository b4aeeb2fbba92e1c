// What holds for the limits of the habitable zone of every star.
import fc from "fast-check";
import { describe, expect, test } from "vitest";
import {
  HABITABLE_ZONE_LIMITS,
  type HabitableZoneLimit,
  habitableZoneDistance,
  habitableZoneFlux,
  interpolatedRunawayFlux,
} from "../../src/index.ts";
import { refusal } from "../refusal.ts";
import { settings } from "./settings.ts";

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const star = between(2600, 7200);
const EARTH = 5.972167867791379e24;

const flux = ({ coefficients }: HabitableZoneLimit, effectiveTemperature: number) =>
  habitableZoneFlux({ effectiveTemperature, ...coefficients });

test("the table is frozen, names every limit once, and gives each its paper", () => {
  expect(Object.isFrozen(HABITABLE_ZONE_LIMITS)).toBe(true);
  expect(HABITABLE_ZONE_LIMITS.every((l) => Object.isFrozen(l) && Object.isFrozen(l.coefficients))).toBe(
    true,
  );
  const names = HABITABLE_ZONE_LIMITS.map((l) => `${l.year} ${l.name} ${l.massEarths}`);
  expect(new Set(names).size).toBe(11);
  for (const { paper, year, doi } of HABITABLE_ZONE_LIMITS) {
    expect(paper).toContain(`Kopparapu et al. ${year}`);
    expect(doi).toMatch(/^10\.1088\//);
  }
});

test("what was seen of Venus and Mars is told from what models say, and outer edges from inner ones", () => {
  for (const { name, basis, edge } of HABITABLE_ZONE_LIMITS) {
    expect(basis, name).toBe(/^recent Venus$|^early Mars$/.test(name) ? "solar system" : "climate model");
    expect(edge, name).toBe(/^maximum greenhouse$|^early Mars$/.test(name) ? "outer" : "inner");
  }
});

describe.each([2013, 2014])("the limits of %i", (year) => {
  const limits = HABITABLE_ZONE_LIMITS.filter((l) => l.year === year);

  test("are in the order of the table for every star, but for two of 2013 that cross by less than a percent", () => {
    expect(limits.map((l) => l.edge)).toEqual([...limits.map((l) => l.edge)].sort());
    let crossed = 0;
    fc.assert(
      fc.property(star, between(1e22, 1e28), (effectiveTemperature, luminosity) => {
        const fluxes = limits.map((l) => flux(l, effectiveTemperature));
        const distances = fluxes.map((f) => habitableZoneDistance({ luminosity, flux: f }));
        limits.slice(1).forEach((l, i) => {
          const ratio = (fluxes[i] as number) / (fluxes[i + 1] as number);
          expect((distances[i] as number) < (distances[i + 1] as number)).toBe(ratio > 1);
          if (l.name !== "moist greenhouse" || effectiveTemperature < 3658 || effectiveTemperature > 5028) {
            expect(ratio, l.name).toBeGreaterThan(1);
          } else {
            crossed++;
            expect(ratio).toBeGreaterThan(0.993);
            if (effectiveTemperature > 3660 && effectiveTemperature < 5026) expect(ratio).toBeLessThan(1);
          }
        });
      }),
      settings(300),
    );
    expect(crossed > 0).toBe(year === 2013);
  });

  test("lie at more flux where the star is hotter", () => {
    fc.assert(
      fc.property(star, star, (a, b) => {
        fc.pre(Math.abs(a - b) > 0.1);
        for (const l of limits) expect(Math.sign(flux(l, a) - flux(l, b))).toBe(Math.sign(a - b));
      }),
      settings(300),
    );
  });
});

describe("the runaway greenhouse by mass", () => {
  const runaway = HABITABLE_ZONE_LIMITS.filter((l) => l.year === 2014 && l.name === "runaway greenhouse");

  test("is the paper's at the paper's masses", () => {
    expect(runaway.map((l) => l.massEarths)).toEqual([5, 1, 0.1]);
    fc.assert(
      fc.property(star, (effectiveTemperature) => {
        for (const l of runaway) {
          const ours = interpolatedRunawayFlux({ effectiveTemperature, mass: l.massEarths * EARTH });
          expect(Math.abs(ours / flux(l, effectiveTemperature) - 1)).toBeLessThan(1e-14);
        }
      }),
      settings(100),
    );
  });

  test("rises with mass between them", () => {
    fc.assert(
      fc.property(star, between(0.1, 5), between(0.1, 5), (effectiveTemperature, a, b) => {
        fc.pre(Math.abs(a - b) > 1e-6);
        const at = (earths: number) =>
          interpolatedRunawayFlux({ effectiveTemperature, mass: earths * EARTH });
        expect(Math.sign(at(a) - at(b))).toBe(Math.sign(a - b));
      }),
      settings(300),
    );
  });
});

test("stars and masses outside the papers are refused", () => {
  const [first] = HABITABLE_ZONE_LIMITS as readonly [HabitableZoneLimit];
  const refusals = [
    () => flux(first, 2599),
    () => flux(first, 7201),
    () => interpolatedRunawayFlux({ effectiveTemperature: 2599, mass: EARTH }),
    () => interpolatedRunawayFlux({ effectiveTemperature: 5780, mass: 0.0999 * EARTH }),
    () => interpolatedRunawayFlux({ effectiveTemperature: 5780, mass: 5.01 * EARTH }),
  ].map(refusal);
  expect(refusals.map((e) => `${e.code} ${e.path}`)).toEqual([
    "out-of-range habitableZoneFlux.effectiveTemperature",
    "out-of-range habitableZoneFlux.effectiveTemperature",
    "out-of-range interpolatedRunawayFlux.effectiveTemperature",
    "out-of-range interpolatedRunawayFlux.mass",
    "out-of-range interpolatedRunawayFlux.mass",
  ]);
});
