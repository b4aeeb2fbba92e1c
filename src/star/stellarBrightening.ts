import { add, div, mul, sub } from "../graph/operations.ts";
import { defineLaw } from "../law/defineLaw.ts";

/** Mass of the Sun, kg: the nominal mass parameter over G of CODATA 2018. */
export const SOLAR_MASS = 1.988409870698051e30;
/** Age of the Sun in the source, 4.57 × 10⁹ Julian years, s. */
export const SOLAR_AGE = 1.44218232e17;
/** Growth of 1/L over the age of the Sun. */
export const SOLAR_PACE = 0.4;

/**
 * Luminosity of the Sun in its history, as a share of today's: L/L₀ = 1/(1 + 0.4·(1 − t/t₀)) with t₀ = 4.57 × 10⁹ years.
 * Age in s since the Sun began to burn hydrogen, between 0 and 15 × 10⁹ years; after today extrapolated. It says nothing of a
 * star of another mass, which brightens at another pace: `tippingMargins` refuses it outside of 0.9 to 1.1 solar masses.
 * Errors: as for every law. Source: Gough 1981, Solar Physics 74, 21, eq. 1.
 */
export const stellarBrightening = /* @__PURE__ */ defineLaw({
  name: "stellarBrightening",
  about: "Luminosity of the Sun in its history, as a share of today's.",
  output: { symbol: "L/L_0", unit: "1" },
  inputs: {
    age: { symbol: "t", unit: "s", within: [0, 4.75e17], about: "age since hydrogen began to burn" },
  },
  published: { age: [0, SOLAR_AGE] },
  source: "Gough 1981, Solar Physics 74, 21 (doi:10.1007/BF00151270)",
  write: ({ age }) => div(1, add(1, mul(SOLAR_PACE, sub(1, div(age, SOLAR_AGE))))),
});
