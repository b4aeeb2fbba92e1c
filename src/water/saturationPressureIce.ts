import { div, exp, log, mul, sub, sum } from "../graph/operations.ts";
import { defineLaw } from "../law/defineLaw.ts";

/**
 * Pressure of water vapour in equilibrium with hexagonal ice, in Pa: ln p = 9.550426 − 5723.265/T + 3.53068 ln T −
 * 0.00728332 T. Temperature in K from 30 to the triple point, 273.16; published from 110. Errors: as for every law.
 * Source: Murphy & Koop 2005, QJRMS 131, 1539, eq. 7.
 */
export const saturationPressureIce = /* @__PURE__ */ defineLaw({
  name: "saturationPressureIce",
  about: "Pressure of water vapour in equilibrium with ice.",
  output: { symbol: "p_i", unit: "Pa" },
  inputs: {
    temperature: { symbol: "T", unit: "K", within: [30, 273.16], about: "temperature of the ice" },
  },
  published: { temperature: [110, 273.16] },
  source: "Murphy & Koop 2005, QJRMS 131, 1539 (doi:10.1256/qj.04.94)",
  write({ temperature }) {
    const curvature = sub(mul(3.53068, log(temperature)), mul(0.00728332, temperature));
    return exp(sum(9.550426, div(-5723.265, temperature), curvature));
  },
});
