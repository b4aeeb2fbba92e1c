import { add, div, log, max, mul, neg, square, sub, sum } from "../graph/operations.ts";
import { defineLaw } from "../law/defineLaw.ts";
import { ppb, ppm } from "./concentration.ts";
import { co2Port, forcingPort, n2oPort, referenceOf } from "./ports.ts";
import { CO2_RUNS, N2O_RUNS } from "./publishedRanges.ts";

/** Its parabola turns down soon above the range of the runs, so the law ends at 2500 ppm. */
const MEANINGFUL = [100e-6, 2500e-6] as const;

/**
 * Stratosphere-adjusted forcing of CO₂ with its overlap with N₂O:
 * F = [−2.4·10⁻⁷(C − C₀)² + 7.2·10⁻⁴|C − C₀| − 2.1·10⁻⁴·N̄ + 5.36]·ln(C/C₀) in W m⁻², C in ppm, N̄ in ppb.
 * Mole fractions of CO₂ from 10⁻⁴ to 2.5·10⁻³ (fitted from 180 to 2000 ppm), N₂O 200 to 525 ppb. It reduces cooling.
 * Errors: as for every law. Source: Etminan et al. 2016, GRL 43, 12614, Table 1.
 */
export const co2AdjustedForcingEtminan = /* @__PURE__ */ defineLaw({
  name: "co2AdjustedForcingEtminan",
  about: "Stratosphere-adjusted forcing of CO₂ with its overlap with N₂O.",
  output: /* @__PURE__ */ forcingPort("CO2", "adjusted"),
  inputs: {
    concentration: /* @__PURE__ */ co2Port("C", "mole fraction of CO₂ (420 ppm is 420e-6)", MEANINGFUL),
    reference: /* @__PURE__ */ co2Port("C_0", /* @__PURE__ */ referenceOf("CO₂"), MEANINGFUL),
    meanNitrousOxide: /* @__PURE__ */ n2oPort("N_m", "mole fraction of N₂O, mean of the reference and now"),
  },
  published: { concentration: CO2_RUNS, reference: CO2_RUNS, meanNitrousOxide: N2O_RUNS },
  reduces: "cooling",
  source: "Etminan et al. 2016, GRL 43, 12614 (doi:10.1002/2016GL071930)",
  write({ concentration, reference, meanNitrousOxide }) {
    const change = sub(ppm(concentration), ppm(reference));
    const distance = max(change, neg(change));
    const parabola = add(mul(-2.4e-7, square(distance)), mul(7.2e-4, distance));
    const overlap = mul(-2.1e-4, ppb(meanNitrousOxide));
    return mul(sum(parabola, overlap, 5.36), log(div(concentration, reference)));
  },
});
