// The mass–luminosity relation between and at the edges of its steps.
import { describe, expect, test } from "vitest";
import {
  GRAVITATION,
  MASS_LUMINOSITY_STEPS,
  massLuminosity,
  SOLAR_LUMINOSITY,
  SOLAR_MASS_PARAMETER,
  slopesOf,
} from "../../src/index.ts";
import { refusal } from "../refusal.ts";

const SUN = SOLAR_MASS_PARAMETER / GRAVITATION;
const at = (suns: number) => massLuminosity({ mass: suns * SUN }) / SOLAR_LUMINOSITY;
const edges = MASS_LUMINOSITY_STEPS.slice(0, -1);

test("the last step ends where the published range does", () => {
  const [, top] = massLuminosity.card.published.mass as readonly [number, number];
  // 31 solar masses by another rounding of the Sun's mass
  expect(MASS_LUMINOSITY_STEPS.at(-1)?.upTo).toBeCloseTo(top / SUN, 9);
});

describe("the edge of each step", () => {
  /** Jumps of the printed fits, by their own logarithms. */
  const jumps = [-0.0187659, -0.1528967, -0.0294044, -0.1182133, 0.2042093];

  test.each(edges.map((step, i) => [step.name, step.upTo, jumps[i] as number] as const))(
    "%s, up to %d solar masses",
    (_, edge, jump) => {
      // the edge itself, however it was rounded, belongs below; a part in 10¹³ above it to the next step
      const here = at(edge);
      for (const near of [edge * (1 - 2 ** -52), edge * (1 + 2 ** -52)])
        expect(Math.abs(at(near) / here - 1)).toBeLessThan(1e-14);
      expect(at(edge * (1 + 1e-13)) / here - 1).toBeCloseTo(jump, 6);
      expect(at(edge * (1 - 1e-13)) / here - 1).toBeCloseTo(0, 11);
    },
  );
});

test("inside a step the luminosity is a power of the mass", () => {
  MASS_LUMINOSITY_STEPS.forEach(({ upTo, slope }, i) => {
    const from = edges[i - 1]?.upTo ?? 0.179;
    const mass = ((from + upTo) / 2) * SUN;
    const { value, slopes } = slopesOf(massLuminosity, { mass });
    expect(((slopes.mass as number) * mass) / value).toBeCloseTo(slope, 12);
  });
});

test("the steps are frozen, in order, and end at 31 solar masses", () => {
  const ends = MASS_LUMINOSITY_STEPS.map((step) => step.upTo);
  expect(ends).toEqual([...ends].sort((a, b) => a - b));
  expect(ends.at(-1)).toBe(31);
  expect(Object.isFrozen(MASS_LUMINOSITY_STEPS) && MASS_LUMINOSITY_STEPS.every(Object.isFrozen)).toBe(true);
});

test("a mass in solar masses is refused", () => {
  const error = refusal(() => massLuminosity({ mass: 1 }));
  expect([error.code, error.path]).toEqual(["out-of-range", "massLuminosity.mass"]);
});
