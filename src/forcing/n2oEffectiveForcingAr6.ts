import { mul } from "../graph/operations.ts";
import { defineLaw } from "../law/defineLaw.ts";
import { n2oMeinshausen } from "./meinshausen.ts";
import { forcingPort, n2oInputs } from "./ports.ts";
import { CH4_RUNS, CO2_RUNS, N2O_BASE, N2O_RUNS } from "./publishedRanges.ts";

/** Clouds and temperatures of the troposphere that adjust before the surface warms: +7 %, as assessed. */
const TROPOSPHERE = 1.07;

/**
 * Effective forcing of N₂O as the sixth assessment report has it: F = 1.07·`n2oAdjustedForcingMeinshausen`, in W m⁻²,
 * with its ports and ranges. Do not adjust it again for what clouds do. It reduces cooling. Errors: as for every law.
 * Source: IPCC 2021, AR6 WGI, §7.3.2 and Table 7.SM.1; the fit of Meinshausen et al. 2020, GMD 13, 3571.
 */
export const n2oEffectiveForcingAr6 = /* @__PURE__ */ defineLaw({
  name: "n2oEffectiveForcingAr6",
  about: "Effective forcing of N₂O since 1750, +7 % of it by the troposphere.",
  output: /* @__PURE__ */ forcingPort("N2O", "effective"),
  inputs: /* @__PURE__ */ n2oInputs(),
  published: { concentration: N2O_RUNS, reference: N2O_BASE, co2: CO2_RUNS, methane: CH4_RUNS },
  reduces: "cooling",
  source:
    "IPCC 2021, AR6 WGI, §7.3.2 (doi:10.1017/9781009157896.009); Meinshausen et al. 2020, GMD 13, 3571, Table 3 (doi:10.5194/gmd-13-3571-2020)",
  write: (ports) => mul(TROPOSPHERE, n2oMeinshausen(ports)),
});
