import { defineLaw } from "../law/defineLaw.ts";
import { ch4Meinshausen } from "./meinshausen.ts";
import { ch4Inputs, forcingPort } from "./ports.ts";
import { CH4_BASE, CH4_RUNS, N2O_RUNS } from "./publishedRanges.ts";

/**
 * Stratosphere-adjusted forcing of CH₄:
 * F = (0.045194 − 8.9603·10⁻⁵√M − 1.2462·10⁻⁴√N)·(√M − √M₀) in W m⁻², M and N in ppb.
 * Mole fractions from 10⁻¹² to 10⁻⁵ (published: 340 to 3500 ppb), N₂O 10⁻¹² to 2·10⁻⁶ (200 to 525 ppb); the reference belongs to the fit:
 * 1750. It reduces cooling. Errors: as for every law. Source: Meinshausen et al. 2020, GMD 13, 3571, Table 3.
 */
export const ch4AdjustedForcingMeinshausen = /* @__PURE__ */ defineLaw({
  name: "ch4AdjustedForcingMeinshausen",
  about: "Stratosphere-adjusted forcing of CH₄ since 1750.",
  output: /* @__PURE__ */ forcingPort("CH4", "adjusted"),
  inputs: /* @__PURE__ */ ch4Inputs(),
  published: { concentration: CH4_RUNS, reference: CH4_BASE, nitrousOxide: N2O_RUNS },
  reduces: "cooling",
  source: "Meinshausen et al. 2020, GMD 13, 3571, Table 3 (doi:10.5194/gmd-13-3571-2020)",
  write: ch4Meinshausen,
});
