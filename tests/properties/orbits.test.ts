// What holds for means over any eccentric orbit.
import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { orbitMeanFlux, temperatureMeanFlux } from "../../src/index.ts";
import { settings } from "./settings.ts";

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });

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
