// What holds for the bands of any black body, and for surfaces under its light.
import fc from "fast-check";
import { expect, test } from "vitest";
import { bandFraction, twoBandAlbedo } from "../../src/index.ts";
import { settings } from "./settings.ts";

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
/** From 10 nm to 1 m, evenly in the exponent. */
const wavelength = between(-8, 0).map((power) => 10 ** power);
const temperature = between(0.5, 5).map((power) => 10 ** power);
const ROUNDING = 32 * 2 ** -53;

test("the bands of a spectrum sum to 1", () => {
  fc.assert(
    fc.property(temperature, fc.array(wavelength, { minLength: 1, maxLength: 8 }), (T, cuts) => {
      const edges = cuts.sort((a, b) => a - b);
      const bands = [
        bandFraction({ temperature: T, to: edges[0] as number }),
        ...edges.slice(1).map((to, i) => bandFraction({ temperature: T, from: edges[i] as number, to })),
        bandFraction({ temperature: T, from: edges.at(-1) as number }),
      ];
      expect(Math.abs(bands.reduce((sum, f) => sum + f, 0) - 1)).toBeLessThan(ROUNDING);
    }),
    settings(300),
  );
});

test("only wavelength times temperature counts, and a hotter body has more of its energy below any wavelength", () => {
  fc.assert(
    fc.property(between(100, 1e4), between(1e-6, 1e-4), between(1.01, 3), (T, to, factor) => {
      const share = bandFraction({ temperature: T, to });
      const hotter = bandFraction({ temperature: T * factor, to });
      const same = bandFraction({ temperature: T * factor, to: to / factor });
      const reduced = 0.0143878 / (T * to);
      // roundings of hc/(λkT), multiplied by it in the exponent
      expect(Math.abs(same - share)).toBeLessThanOrEqual(share * ROUNDING * (1 + reduced));
      expect(hotter).toBeGreaterThanOrEqual(share);
    }),
    settings(300),
  );
});

test("ice that is dark in the near infrared is darker under a cooler star, and stays between its two albedos", () => {
  fc.assert(
    fc.property(
      between(2000, 8000),
      between(1.02, 2),
      between(0.3, 0.95),
      between(0.01, 0.28),
      (cool, factor, visible, nearInfrared) => {
        const under = (star: number) =>
          twoBandAlbedo({
            visible,
            nearInfrared,
            visibleShare: bandFraction({ temperature: star, to: 7e-7 }),
          });
        expect(under(cool)).toBeLessThan(under(cool * factor));
        expect(under(cool)).toBeGreaterThanOrEqual(nearInfrared);
        expect(under(cool * factor)).toBeLessThanOrEqual(visible);
      },
    ),
    settings(300),
  );
});
