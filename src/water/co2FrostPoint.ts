import { div, log, sub } from "../graph/operations.ts";
import { defineLaw } from "../law/defineLaw.ts";

/**
 * Temperature below which CO₂ freezes out of an atmosphere, in K: T = 3167.8/(23.23 − ln(p/100 Pa)).
 * Partial pressure of CO₂ in Pa from 10⁻⁶ to its triple point, 517,950; above, it condenses to a liquid. The line is 0.8 K
 * too cold at the triple point. Errors: as for every law.
 * Source: Fanale et al. 1982, Icarus 50, 381, as restated by Forget et al. 2013, Icarus 222, 81.
 */
export const co2FrostPoint = /* @__PURE__ */ defineLaw({
  name: "co2FrostPoint",
  about: "Temperature below which CO₂ freezes out of an atmosphere.",
  output: { symbol: "T_f", unit: "K" },
  inputs: {
    pressure: { symbol: "p", unit: "Pa", within: [1e-6, 517950], about: "partial pressure of CO₂" },
  },
  source:
    "Fanale et al. 1982, Icarus 50, 381 (doi:10.1016/0019-1035(82)90131-2); Forget et al. 2013, Icarus 222, 81 (doi:10.1016/j.icarus.2012.10.019)",
  write: ({ pressure }) => div(3167.8, sub(23.23, log(div(pressure, 100)))),
});
