import { add, mul, sqrt, sub, sum } from "../graph/operations.ts";
import { defineLaw } from "../law/defineLaw.ts";
import { ppb, ppm } from "./concentration.ts";
import { ch4Port, co2Port, forcingPort, n2oPort, referenceOf } from "./ports.ts";
import { CH4_RUNS, CO2_RUNS, N2O_RUNS } from "./publishedRanges.ts";

/** Up to here the forcing grows with N₂O whatever the others are. */
const MEANINGFUL = [1e-6, 5000e-6] as const;

/**
 * Stratosphere-adjusted forcing of N₂O with its overlap with CO₂ and CH₄:
 * F = [−8·10⁻⁶·C̄ + 4.2·10⁻⁶·N̄ − 4.9·10⁻⁶·M̄ + 0.117]·(√N − √N₀) in W m⁻², C̄ in ppm, N̄ and M̄ in ppb, each the mean of
 * the reference and now. Mole fractions of N₂O from 10⁻¹² to 2·10⁻⁶ (fitted from 200 to 525 ppb), of CO₂ from 10⁻⁶ to
 * 5·10⁻³ (180 to 2000 ppm), of CH₄ from 10⁻¹² to 10⁻⁵ (340 to 3500 ppb). It reduces cooling.
 * Errors: as for every law. Source: Etminan et al. 2016, GRL 43, 12614, Table 1.
 */
export const n2oAdjustedForcingEtminan = /* @__PURE__ */ defineLaw({
  name: "n2oAdjustedForcingEtminan",
  about: "Stratosphere-adjusted forcing of N₂O with its overlap with CO₂ and CH₄.",
  output: /* @__PURE__ */ forcingPort("N2O", "adjusted"),
  inputs: {
    concentration: /* @__PURE__ */ n2oPort(),
    reference: /* @__PURE__ */ n2oPort("N_0", /* @__PURE__ */ referenceOf("N₂O")),
    meanCo2: /* @__PURE__ */ co2Port(
      "C_m",
      "mole fraction of CO₂, mean of the reference and now",
      MEANINGFUL,
    ),
    meanMethane: /* @__PURE__ */ ch4Port("M_m", "mole fraction of CH₄, mean of the reference and now"),
  },
  published: { concentration: N2O_RUNS, reference: N2O_RUNS, meanCo2: CO2_RUNS, meanMethane: CH4_RUNS },
  reduces: "cooling",
  source: "Etminan et al. 2016, GRL 43, 12614 (doi:10.1002/2016GL071930)",
  write({ concentration, reference, meanCo2, meanMethane }) {
    const [nitrousOxide, before] = [ppb(concentration), ppb(reference)];
    const mean = mul(0.5, add(nitrousOxide, before));
    const overlap = add(mul(-8e-6, ppm(meanCo2)), mul(-4.9e-6, ppb(meanMethane)));
    const efficiency = sum(overlap, mul(4.2e-6, mean), 0.117);
    return mul(efficiency, sub(sqrt(nitrousOxide), sqrt(before)));
  },
});
