import { defineLaw } from "../law/defineLaw.ts";
import { outgoingPort, temperaturePort } from "../law/ports.ts";
import { STRAIGHT_RANGE, straightLine } from "./straightLine.ts";

/**
 * Outgoing longwave radiation as a straight line: F = A + B(T − T₀), in W m⁻².
 * A at the reference temperature in W m⁻² from −10⁶ to 10⁶, B in W m⁻² K⁻¹ from 0 to 10⁴, temperatures in K
 * from 0 to 10⁵, for the Earth about 230 to 300 K. B already holds water vapour and lapse rate. Errors: as
 * for every law. Source: Budyko 1969, Tellus 21, 611 (A 202, B 1.45 with T₀ = 0 °C); North et al. 1981
 * (203.3, 2.09); straight over at least 60 K on Earth: Koll & Cronin 2018.
 */
export const linearEmission = /* @__PURE__ */ defineLaw({
  name: "linearEmission",
  about: "Outgoing longwave radiation as a straight line in temperature.",
  output: /* @__PURE__ */ outgoingPort(),
  inputs: {
    temperature: /* @__PURE__ */ temperaturePort(),
    intercept: {
      symbol: "A",
      unit: "W m-2",
      within: [-1e6, 1e6],
      about: "emission at the reference temperature",
    },
    slope: { symbol: "B", unit: "W m-2 K-1", within: [0, 1e4], about: "increase with temperature" },
    reference: /* @__PURE__ */ temperaturePort("T_0", "reference temperature"),
  },
  published: { temperature: STRAIGHT_RANGE },
  source:
    "Budyko 1969, Tellus 21, 611 (doi:10.1111/j.2153-3490.1969.tb00466.x); Koll & Cronin 2018, PNAS 115, 10293 (doi:10.1073/pnas.1809868115)",
  write: straightLine,
});
