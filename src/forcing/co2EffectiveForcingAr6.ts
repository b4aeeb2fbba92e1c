import { mul } from "../graph/operations.ts";
import { defineLaw } from "../law/defineLaw.ts";
import { co2Meinshausen } from "./meinshausen.ts";
import { co2Inputs, forcingPort } from "./ports.ts";
import { CO2_BASE, CO2_RUNS, N2O_RUNS } from "./publishedRanges.ts";

/** Clouds and temperatures of the troposphere that adjust before the surface warms: +5 %, as assessed. */
const TROPOSPHERE = 1.05;

/**
 * Effective forcing of CO₂ as the sixth assessment report has it: F = 1.05·`co2AdjustedForcingMeinshausen`, in W m⁻²,
 * with its ports and ranges. Do not adjust it again for what clouds do. It reduces cooling. Errors: as for every law.
 * Source: IPCC 2021, AR6 WGI, §7.3.2 and Table 7.SM.1; the fit of Meinshausen et al. 2020, GMD 13, 3571.
 */
export const co2EffectiveForcingAr6 = /* @__PURE__ */ defineLaw({
  name: "co2EffectiveForcingAr6",
  about: "Effective forcing of CO₂ since 1750, +5 % of it by the troposphere.",
  output: /* @__PURE__ */ forcingPort("CO2", "effective"),
  inputs: /* @__PURE__ */ co2Inputs(),
  published: { concentration: CO2_RUNS, reference: CO2_BASE, nitrousOxide: N2O_RUNS },
  reduces: "cooling",
  source:
    "IPCC 2021, AR6 WGI, §7.3.2 (doi:10.1017/9781009157896.009); Meinshausen et al. 2020, GMD 13, 3571, Table 3 (doi:10.5194/gmd-13-3571-2020)",
  write: (ports) => mul(TROPOSPHERE, co2Meinshausen(ports)),
});
