// Kepler orbits: every row of the table of time means, shares of time and angles; limits and refusals.
import { describe, expect, test } from "vitest";
import {
  fluxTimeShare,
  orbitalPeriod,
  orbitMeanFlux,
  orbitMeanTemperature,
  semiMajorAxis,
  temperatureMeanFlux,
} from "../../src/index.ts";
import { angleFrom } from "../../src/orbit/angleFrom.ts";
import table from "../reference/computed/orbit_times.json" with { type: "json" };
import { refusal } from "../refusal.ts";

const ulps = (ours: number, exact: string) => Math.abs(ours / Number(exact) - 1) * 2 ** 53;

describe.each(table.means)("e = $e", ({ e: eccentricity, flux, temperature }) => {
  test("mean temperature and the flux of it", () => {
    // nine square roots and as many means
    expect(
      ulps(orbitMeanTemperature({ temperatureAtSemiMajorAxis: 1, eccentricity }), temperature),
    ).toBeLessThan(16);
    const fourthRoot = Math.sqrt(Math.sqrt(temperatureMeanFlux({ fluxAtSemiMajorAxis: 1, eccentricity })));
    expect(ulps(fourthRoot, temperature)).toBeLessThan(16);
  });

  test("mean flux", () => {
    // 1 − e² loses digits near e = 1
    const lost = 4 + 1 / (1 - eccentricity * eccentricity);
    expect(ulps(orbitMeanFlux({ fluxAtSemiMajorAxis: 1, eccentricity }), flux)).toBeLessThan(lost);
  });
});

test.each(table.shares)("e = $e, $low ≤ S/S(a) ≤ $high", ({ e: eccentricity, low, high, share }) => {
  expect(Math.abs(fluxTimeShare({ eccentricity, low, high }) - Number(share))).toBeLessThan(1e-15);
});

test("shares are of the time, not of the angle", () => {
  const share = fluxTimeShare({ eccentricity: 0.3, low: 0.8, high: 1.2 });
  expect(share).toBeCloseTo(0.2261014, 7);
  // true anomaly where r = (1 − e²)/(1 + e·cos f) is 1/√S
  const angle = (flux: number) => Math.acos(((1 - 0.09) * Math.sqrt(flux) - 1) / 0.3);
  expect((angle(0.8) - angle(1.2)) / Math.PI).toBeCloseTo(0.2096, 4);
});

describe("shares of time", () => {
  test("a circular orbit is inside the limits or not", () => {
    const circular = (low: number, high: number) => fluxTimeShare({ eccentricity: 0, low, high });
    expect([circular(0.9, 1.1), circular(1, 1), circular(1, 2), circular(0, 1)]).toEqual([1, 1, 1, 1]);
    expect([circular(0, 0.999), circular(1.001, 5)]).toEqual([0, 0]);
  });

  test("limits outside the orbit hold for all of it or for nothing", () => {
    expect(fluxTimeShare({ eccentricity: 0.3, low: 0, high: 1e12 })).toBe(1);
    expect(fluxTimeShare({ eccentricity: 0.3, low: 0, high: 0.5 })).toBe(0);
    expect(fluxTimeShare({ eccentricity: 0.3, low: 2.1, high: 3 })).toBe(0);
  });

  test.each([
    [{ eccentricity: 1, low: 0, high: 1 }, "out-of-range", "fluxTimeShare.eccentricity"],
    [{ eccentricity: 0.1, low: -1, high: 1 }, "out-of-range", "fluxTimeShare.low"],
    [{ eccentricity: 0.1, low: 1, high: 0.9 }, "out-of-range", "fluxTimeShare.high"],
    [{ eccentricity: 0.1, low: 1, high: Number.NaN }, "not-a-number", "fluxTimeShare.high"],
    [{ eccentricity: 0.1, low: 1 }, "missing", "fluxTimeShare.high"],
    [{ eccentricity: 0.1, low: 1, high: 2, hihg: 3 }, "unknown-name", "fluxTimeShare.hihg"],
    [null, "unreadable", "fluxTimeShare"],
  ])("%o is refused", (limits, code, path) => {
    const error = refusal(() => fluxTimeShare(limits as never));
    expect([error.code, error.path]).toEqual([code, path]);
  });
});

test("an angle is within two ulp of the one that mpmath gives for its tangent", () => {
  expect(table.angles).toHaveLength(120);
  const errors = table.angles.map(({ angle, ...legs }) => ulps(angleFrom(legs), angle));
  // relative errors in units of 2⁻⁵³ are up to twice those in ulp
  expect(Math.max(...errors)).toBeLessThanOrEqual(4);
  expect(angleFrom({ along: 1, across: 0 })).toBe(0);
  expect(angleFrom({ along: 0, across: 1 })).toBe(Math.PI / 2);
});

test("period and axis are each other's inverse, from the smallest to the largest orbits that both allow", () => {
  for (const mass of [1e20, 2e30, 1e35])
    for (const period of [1, 86400, 3e7, 1e13]) {
      const back = orbitalPeriod({ semiMajorAxis: semiMajorAxis({ period, mass }), mass });
      // the cube root by a logarithm near 110 loses two digits
      expect(Math.abs(back / period - 1)).toBeLessThan(1e-13);
    }
});
