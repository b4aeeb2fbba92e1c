import { div, mul, product, sqrt, square } from "../graph/operations.ts";
import { FOUR_PI_SQUARED } from "../ground/circle.ts";
import { GRAVITATION } from "../ground/constants.ts";
import { defineLaw } from "../law/defineLaw.ts";

/**
 * Period of a light body's orbit from its semi-major axis: P = 2π√(a³/(G·M)), in s; the inverse of `semiMajorAxis`.
 * Semi-major axis in m from 1 to 10¹⁷, mass of the star in kg from 10²⁰ to 10³⁵; the planet's own mass is
 * neglected. Errors: as for every law.
 * Source: Kepler's third law; G from CODATA 2018.
 */
export const orbitalPeriod = /* @__PURE__ */ defineLaw({
  name: "orbitalPeriod",
  about: "Period of a light body's orbit from its semi-major axis.",
  output: { symbol: "P", unit: "s", about: "orbital period" },
  inputs: {
    semiMajorAxis: { symbol: "a", unit: "m", within: [1, 1e17], about: "semi-major axis" },
    mass: { symbol: "M", unit: "kg", within: [1e20, 1e35], about: "mass of the star" },
  },
  source: "Kepler's third law",
  write({ semiMajorAxis, mass }) {
    const cube = mul(semiMajorAxis, square(semiMajorAxis));
    return sqrt(div(mul(FOUR_PI_SQUARED, cube), product(GRAVITATION, mass)));
  },
});
