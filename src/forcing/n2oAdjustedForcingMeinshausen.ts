import { defineLaw } from "../law/defineLaw.ts";
import { n2oMeinshausen } from "./meinshausen.ts";
import { forcingPort, n2oInputs } from "./ports.ts";
import { CH4_RUNS, CO2_RUNS, N2O_BASE, N2O_RUNS } from "./publishedRanges.ts";

/**
 * Stratosphere-adjusted forcing of N₂O:
 * F = (0.12173 − 3.4197·10⁻⁴√C + 2.5455·10⁻⁴√N − 2.4357·10⁻⁴√M)·(√N − √N₀) in W m⁻², C in ppm, N and M in ppb.
 * Mole fractions from 10⁻¹² to 2·10⁻⁶ (published: 200 to 525 ppb),
 * CO₂ 10⁻⁶ to 0.01 (180 to 2000 ppm), CH₄ 10⁻¹² to 10⁻⁵ (340 to 3500 ppb); the reference belongs to the fit:
 * 1750. It reduces cooling. Errors: as for every law. Source: Meinshausen et al. 2020, GMD 13, 3571, Table 3.
 */
export const n2oAdjustedForcingMeinshausen = /* @__PURE__ */ defineLaw({
  name: "n2oAdjustedForcingMeinshausen",
  about: "Stratosphere-adjusted forcing of N₂O since 1750.",
  output: /* @__PURE__ */ forcingPort("N2O", "adjusted"),
  inputs: /* @__PURE__ */ n2oInputs(),
  published: { concentration: N2O_RUNS, reference: N2O_BASE, co2: CO2_RUNS, methane: CH4_RUNS },
  reduces: "cooling",
  source: "Meinshausen et al. 2020, GMD 13, 3571, Table 3 (doi:10.5194/gmd-13-3571-2020)",
  write: n2oMeinshausen,
});
