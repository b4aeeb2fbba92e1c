import { mul, sqrt, sub, sum } from "../graph/operations.ts";
import { defineLaw } from "../law/defineLaw.ts";
import { ppb } from "./concentration.ts";
import { ch4Port, forcingPort, n2oPort, referenceOf } from "./ports.ts";
import { CH4_RUNS, N2O_RUNS } from "./publishedRanges.ts";

/**
 * Stratosphere-adjusted forcing of CH₄, its shortwave absorption included:
 * F = [−1.3·10⁻⁶·M̄ − 8.2·10⁻⁶·N̄ + 0.043]·(√M − √M₀) in W m⁻², in ppb, M̄ the mean of M and M₀.
 * Mole fractions from 10⁻¹² to 10⁻⁵ (fitted from 340 to 3500 ppb), N₂O 200 to 525 ppb. It reduces cooling.
 * Errors: as for every law. Source: Etminan et al. 2016, GRL 43, 12614, Table 1.
 */
export const ch4AdjustedForcingEtminan = /* @__PURE__ */ defineLaw({
  name: "ch4AdjustedForcingEtminan",
  about: "Stratosphere-adjusted forcing of CH₄, its shortwave absorption included.",
  output: /* @__PURE__ */ forcingPort("CH4", "adjusted"),
  inputs: {
    concentration: /* @__PURE__ */ ch4Port(),
    reference: /* @__PURE__ */ ch4Port("M_0", /* @__PURE__ */ referenceOf("CH₄")),
    meanNitrousOxide: /* @__PURE__ */ n2oPort("N_m", "mole fraction of N₂O, mean of the reference and now"),
  },
  published: { concentration: CH4_RUNS, reference: CH4_RUNS, meanNitrousOxide: N2O_RUNS },
  reduces: "cooling",
  source: "Etminan et al. 2016, GRL 43, 12614 (doi:10.1002/2016GL071930)",
  write({ concentration, reference, meanNitrousOxide }) {
    const [methane, before] = [ppb(concentration), ppb(reference)];
    const mean = mul(0.5, sum(methane, before));
    const efficiency = sum(mul(-1.3e-6, mean), mul(-8.2e-6, ppb(meanNitrousOxide)), 0.043);
    return mul(efficiency, sub(sqrt(methane), sqrt(before)));
  },
});
