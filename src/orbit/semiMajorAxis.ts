import { div, exp, log, product, square } from "../graph/operations.ts";
import { FOUR_PI_SQUARED } from "../ground/circle.ts";
import { GRAVITATION } from "../ground/constants.ts";
import { defineLaw } from "../law/defineLaw.ts";

/**
 * Semi-major axis of a light body's orbit from its period: a = (G·M·P²/4π²)^⅓, in m.
 * Period in s from 1 to 10¹³, mass of the star in kg from 10²⁰ to 10³⁵; the planet's own mass is neglected.
 * Errors: as for every law.
 * Source: Kepler's third law; G from CODATA 2018.
 */
export const semiMajorAxis = /* @__PURE__ */ defineLaw({
  name: "semiMajorAxis",
  about: "Semi-major axis of a light body's orbit from its period.",
  output: { symbol: "a", unit: "m" },
  inputs: {
    period: { symbol: "P", unit: "s", within: [1, 1e13], about: "orbital period" },
    mass: { symbol: "M", unit: "kg", within: [1e20, 1e35], about: "mass of the star" },
  },
  source: "Kepler's third law",
  write({ period, mass }) {
    const cube = div(product(GRAVITATION, mass, square(period)), FOUR_PI_SQUARED);
    return exp(div(log(cube), 3));
  },
});
