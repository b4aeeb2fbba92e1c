// What is special about covers: where they end, and that an enclosure passes over it.
import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { mixAlbedo } from "../../src/albedo/mixAlbedo.ts";
import { parabolicCover } from "../../src/biosphere/parabolicCover.ts";
import { steadyCover } from "../../src/biosphere/steadyCover.ts";
import { greyEmission } from "../../src/greenhouse/greyEmission.ts";
import { closeLoop } from "../../src/loop/closeLoop.ts";
import { absorbedFlux } from "../../src/star/absorbedFlux.ts";
import { findStates } from "../../src/states/findStates.ts";
import { settings } from "../properties/settings.ts";
import { refusal } from "../refusal.ts";

const around = { best: 290, halfWidth: 20 };

test("steadyCover balances growth on what is left against deaths, or is 0 where growth cannot", () => {
  const some = fc.record({
    temperature: fc.double({ min: 260, max: 320, noNaN: true }),
    deathRate: fc.double({ min: 1e-6, max: 1, noNaN: true }),
    available: fc.double({ min: 1e-6, max: 1, noNaN: true }),
  });
  let bare = 0;
  let covered = 0;
  fc.assert(
    fc.property(some, ({ temperature, deathRate, available }) => {
      const cover = steadyCover({ ...around, temperature, deathRate, available });
      const growth = Math.max(0, 1 - ((temperature - 290) / 20) ** 2);
      if (growth * available < deathRate * (1 - 1e-12)) {
        bare++;
        expect(cover).toBe(0);
      } else {
        covered++;
        // a few roundings of numbers up to 1
        expect(Math.abs(growth * (available - cover) - deathRate)).toBeLessThan(2e-15);
      }
      expect(cover).toBeLessThanOrEqual(available);
    }),
    settings(1000),
  );
  expect(Math.min(bare, covered)).toBeGreaterThan(100);
});

test("both are exactly 0 far from the best temperature", () => {
  for (const temperature of [0, 269.9, 310.1, 1e5]) {
    expect(steadyCover({ ...around, temperature, deathRate: 0.3, available: 1 })).toBe(0);
    expect(parabolicCover({ ...around, temperature, most: 0.8 })).toBe(0);
  }
});

describe("a search over everything, with a growth rate that passes through 0", () => {
  const planet = (law: "steadyCover" | "parabolicCover") =>
    closeLoop(({ temperature, given, couple }) => {
      const flux = given("flux", 1300, "W m-2", { within: [0, 1e5] });
      const deathRate = given("deathRate", 0.3, "1", { within: [1e-6, 1] });
      const available = given("available", 0.9, "1", { within: [1e-6, 1] });
      const cover =
        law === "steadyCover"
          ? steadyCover({ ...around, temperature, deathRate, available })
          : parabolicCover({ ...around, temperature, most: available });
      const covers = [{ fraction: couple("cover", cover), albedo: 0.15 }];
      return {
        heating: { sunlight: absorbedFlux({ flux, albedo: mixAlbedo({ covers, bare: 0.35 }) }) },
        cooling: { longwave: greyEmission({ temperature, emissivity: 0.61 }) },
        heatCapacity: 4e8,
      };
    });

  test.each(["steadyCover", "parabolicCover"] as const)("%s is decided", (law) => {
    for (const flux of [800, 1100, 1200, 1300, 1400, 1600, 2000]) {
      const found = findStates(planet(law), { within: [1, 5000], at: { flux } });
      expect(found, `${flux}`).toMatchObject({ complete: true, proof: "proved", undecided: [] });
    }
  });
});

test("numbers for which the cover is not defined are refused", () => {
  const ports = { ...around, temperature: 290, deathRate: 0.3, available: 1 };
  const wrong = [{ deathRate: 0 }, { available: 0 }, { halfWidth: 0 }, { deathRate: 1.1 }];
  for (const port of wrong) {
    const path = `steadyCover.${Object.keys(port)[0]}`;
    expect(refusal(() => steadyCover({ ...ports, ...port }))).toMatchObject({ code: "out-of-range", path });
  }
  const most = refusal(() => parabolicCover({ ...around, temperature: 290, most: 1.1 }));
  expect(most).toMatchObject({ code: "out-of-range", path: "parabolicCover.most" });
});
