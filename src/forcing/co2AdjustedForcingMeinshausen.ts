import { defineLaw } from "../law/defineLaw.ts";
import { co2Meinshausen } from "./meinshausen.ts";
import { co2Inputs, forcingPort } from "./ports.ts";
import { CO2_BASE, CO2_RUNS, N2O_RUNS } from "./publishedRanges.ts";

/**
 * Stratosphere-adjusted forcing of CO₂:
 * F = [α − 0.0021492√N]·ln(C/C₀) in W m⁻², with α = 5.2488 + 7.5906·10⁻⁴x − 2.4785·10⁻⁷x² and x = C − C₀ kept between 0
 * and 1531.3 ppm, so that α is flat below C₀ and above C₀ + 1531.3 ppm; C in ppm, N in ppb.
 * Mole fractions from 10⁻⁶ to 0.1 (published: 180 to 2000 ppm), N₂O 10⁻¹² to 2·10⁻⁶ (200 to 525 ppb); the reference belongs to the fit:
 * 1750. It reduces cooling. Errors: as for every law. Source: Meinshausen et al. 2020, GMD 13, 3571, Table 3.
 */
export const co2AdjustedForcingMeinshausen = /* @__PURE__ */ defineLaw({
  name: "co2AdjustedForcingMeinshausen",
  about: "Stratosphere-adjusted forcing of CO₂ since 1750.",
  output: /* @__PURE__ */ forcingPort("CO2", "adjusted"),
  inputs: /* @__PURE__ */ co2Inputs(),
  published: { concentration: CO2_RUNS, reference: CO2_BASE, nitrousOxide: N2O_RUNS },
  reduces: "cooling",
  source: "Meinshausen et al. 2020, GMD 13, 3571, Table 3 (doi:10.5194/gmd-13-3571-2020)",
  write: co2Meinshausen,
});
