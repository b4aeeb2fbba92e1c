import { fourth, mul, product, square } from "../graph/operations.ts";
import { FOUR_PI } from "../ground/circle.ts";
import { STEFAN_BOLTZMANN } from "../ground/constants.ts";
import { defineLaw } from "../law/defineLaw.ts";

/**
 * Luminosity of a star from its radius and effective temperature: L = 4πR²σT_eff⁴, in W.
 * Radius in m from 0 to 10¹⁴, effective temperature in K from 0 to 10⁶. Errors: as for every law.
 * Source: the definition of effective temperature (IAU 2015 Resolution B3 uses it with the same σ).
 */
export const stellarLuminosity = /* @__PURE__ */ defineLaw({
  name: "stellarLuminosity",
  about: "Luminosity of a star from its radius and effective temperature.",
  output: { symbol: "L", unit: "W" },
  inputs: {
    radius: { symbol: "R", unit: "m", within: [0, 1e14], about: "stellar radius" },
    effectiveTemperature: { symbol: "T_eff", unit: "K", within: [0, 1e6], about: "effective temperature" },
  },
  source:
    "definition of effective temperature; Prša et al. 2016, AJ 152, 41 (doi:10.3847/0004-6256/152/2/41)",
  write({ radius, effectiveTemperature }) {
    const area = mul(FOUR_PI, square(radius));
    return product(area, STEFAN_BOLTZMANN, fourth(effectiveTemperature));
  },
});
