import { mul } from "../graph/operations.ts";
import { defineLaw } from "../law/defineLaw.ts";
import { ch4Meinshausen } from "./meinshausen.ts";
import { ch4Inputs, forcingPort } from "./ports.ts";
import { CH4_BASE, CH4_RUNS, N2O_RUNS } from "./publishedRanges.ts";

/** Clouds and temperatures of the troposphere that adjust before the surface warms: −14 %, as assessed. */
const TROPOSPHERE = 0.86;

/**
 * Effective forcing of CH₄ as the sixth assessment report has it: F = 0.86·`ch4AdjustedForcingMeinshausen`, in W m⁻²,
 * with its ports and ranges. Do not adjust it again for what clouds do. It reduces cooling. Errors: as for every law.
 * Source: IPCC 2021, AR6 WGI, §7.3.2 and Table 7.SM.1; the fit of Meinshausen et al. 2020, GMD 13, 3571.
 */
export const ch4EffectiveForcingAr6 = /* @__PURE__ */ defineLaw({
  name: "ch4EffectiveForcingAr6",
  about: "Effective forcing of CH₄ since 1750, −14 % of it by the troposphere.",
  output: /* @__PURE__ */ forcingPort("CH4", "effective"),
  inputs: /* @__PURE__ */ ch4Inputs(),
  published: { concentration: CH4_RUNS, reference: CH4_BASE, nitrousOxide: N2O_RUNS },
  reduces: "cooling",
  source:
    "IPCC 2021, AR6 WGI, §7.3.2 (doi:10.1017/9781009157896.009); Meinshausen et al. 2020, GMD 13, 3571, Table 3 (doi:10.5194/gmd-13-3571-2020)",
  write: (ports) => mul(TROPOSPHERE, ch4Meinshausen(ports)),
});
