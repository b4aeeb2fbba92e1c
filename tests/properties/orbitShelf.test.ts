// What holds for the ends, the means and the hours of any eccentric orbit.
import fc from "fast-check";
import { describe, expect, test } from "vitest";
import {
  apoastronFlux,
  fluxTimeShare,
  orbitalPeriod,
  orbitMeanFlux,
  orbitMeanTemperature,
  periastronFlux,
  semiMajorAxis,
  temperatureMeanFlux,
} from "../../src/index.ts";
import { settings } from "./settings.ts";

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const ROUNDING = 16 * 2 ** -53;

describe("means", () => {
  test("agree on a circle", () => {
    fc.assert(
      fc.property(between(1e-3, 1e6), (flux) => {
        const circle = { fluxAtSemiMajorAxis: flux, eccentricity: 0 };
        for (const law of [orbitMeanFlux, temperatureMeanFlux, periastronFlux, apoastronFlux])
          expect(law(circle)).toBe(flux);
        expect(orbitMeanTemperature({ temperatureAtSemiMajorAxis: flux / 1e3, eccentricity: 0 })).toBe(
          flux / 1e3,
        );
      }),
      settings(200),
    );
  });

  test("move in opposite directions with eccentricity, between the fluxes at both ends", () => {
    fc.assert(
      fc.property(between(0.001, 0.98), between(1e-4, 0.01), (e, more) => {
        const at = (eccentricity: number) => ({ fluxAtSemiMajorAxis: 1, eccentricity });
        const warmth = (eccentricity: number) =>
          orbitMeanTemperature({ temperatureAtSemiMajorAxis: 1, eccentricity });
        expect(orbitMeanFlux(at(e + more))).toBeGreaterThan(orbitMeanFlux(at(e)));
        expect(warmth(e + more)).toBeLessThan(warmth(e));
        expect(orbitMeanFlux(at(e))).toBeLessThan(periastronFlux(at(e)));
        expect(temperatureMeanFlux(at(e))).toBeGreaterThan(apoastronFlux(at(e)));
        // their product with the geometry: both ends and the mean are tied by 1 − e² = (1 − e)(1 + e)
        const ends = Math.sqrt(Math.sqrt(periastronFlux(at(e)) * apoastronFlux(at(e))));
        expect(Math.abs(ends / orbitMeanFlux(at(e)) - 1)).toBeLessThan(ROUNDING / (1 - e));
      }),
      settings(300),
    );
  });
});

describe("shares of time", () => {
  const orbit = fc.record({
    eccentricity: between(0.001, 0.99),
    a: between(0, 4),
    b: between(0, 4),
    c: between(0, 4),
  });
  const sorted = ({ a, b, c }: { a: number; b: number; c: number }) =>
    [a, b, c].sort((x, y) => x - y) as [number, number, number];

  test("add up where limits meet, grow with the limits, and stay between 0 and 1", () => {
    fc.assert(
      fc.property(orbit, ({ eccentricity, ...limits }) => {
        const [low, middle, high] = sorted(limits);
        const share = (from: number, to: number) => fluxTimeShare({ eccentricity, low: from, high: to });
        const whole = share(low, high);
        expect(Math.abs(share(low, middle) + share(middle, high) - whole)).toBeLessThan(ROUNDING);
        expect(whole).toBeGreaterThanOrEqual(share(low, middle));
        expect(whole).toBeGreaterThanOrEqual(0);
        expect(whole).toBeLessThanOrEqual(1);
      }),
      settings(300),
    );
  });

  test("are everything between the fluxes at both ends", () => {
    fc.assert(
      fc.property(between(0, 0.999), (eccentricity) => {
        const at = { fluxAtSemiMajorAxis: 1, eccentricity };
        const low = apoastronFlux(at) * (1 - ROUNDING);
        const high = periastronFlux(at) * (1 + ROUNDING);
        expect(fluxTimeShare({ eccentricity, low, high })).toBe(1);
      }),
      settings(200),
    );
  });

  test("give back the mean flux when they are summed over the fluxes", () => {
    fc.assert(
      fc.property(between(0.01, 0.6), (eccentricity) => {
        const at = { fluxAtSemiMajorAxis: 1, eccentricity };
        const [low, high] = [apoastronFlux(at), periastronFlux(at)];
        // ∫ (time above S) dS by Simpson's rule in an angle that takes away the roots at both ends
        const steps = 400;
        let sum = low;
        for (let i = 0; i <= steps; i++) {
          const angle = (Math.PI * i) / steps;
          const flux = low + ((high - low) * (1 - Math.cos(angle))) / 2;
          const weight = i === 0 || i === steps ? 1 : i % 2 === 1 ? 4 : 2;
          const above = fluxTimeShare({ eccentricity, low: flux, high: 1e12 });
          sum += (weight / 3) * above * (Math.PI / steps) * ((high - low) / 2) * Math.sin(angle);
        }
        expect(Math.abs(sum / orbitMeanFlux(at) - 1)).toBeLessThan(1e-6);
      }),
      settings(30),
    );
  });
});

test("period and axis undo each other", () => {
  fc.assert(
    fc.property(between(1e4, 1e10), between(1e28, 1e32), (period, mass) => {
      const back = orbitalPeriod({ semiMajorAxis: semiMajorAxis({ period, mass }), mass });
      expect(Math.abs(back / period - 1)).toBeLessThan(1e-13);
    }),
    settings(300),
  );
});
