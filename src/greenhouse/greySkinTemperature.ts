import { div, sqrt } from "../graph/operations.ts";
import { defineLaw } from "../law/defineLaw.ts";
import { effectiveTemperaturePort } from "../law/ports.ts";

/**
 * Temperature of the thin air at the top of a grey column, heated by longwave from below alone: T_skin = T_e/2^¼, in K,
 * whatever the optical depth below. Neither the ground's temperature (`greyGroundTemperature`) nor the effective one.
 * Effective temperature in K from 0 to 10⁵. Errors: as for every law. Source: Pierrehumbert 2010, Principles
 * of Planetary Climate, §3.6.
 */
export const greySkinTemperature = /* @__PURE__ */ defineLaw({
  name: "greySkinTemperature",
  about: "Temperature of the thin air at the top of a grey column, heated by longwave from below alone.",
  output: { symbol: "T_skin", unit: "K", within: [0, 1e5], about: "skin temperature" },
  inputs: {
    effectiveTemperature: /* @__PURE__ */ effectiveTemperaturePort(),
  },
  source: "Pierrehumbert 2010, Principles of Planetary Climate, §3.6",
  write: ({ effectiveTemperature }) => div(effectiveTemperature, sqrt(sqrt(2))),
});
