import { defineLaw } from "../law/defineLaw.ts";
import { outgoingPort, temperaturePort } from "../law/ports.ts";
import { STRAIGHT_RANGE, straightLine } from "./straightLine.ts";

/**
 * Outgoing longwave radiation under a clear, moist sky, which water vapour makes straight over 60 K and more:
 * F = F₀ + 2.2·(T − T₀), in W m⁻². The slope is theirs. The point it goes through is not: unless given, it is the
 * emission of the present Earth, 240.1 W m⁻² (Loeb et al. 2018) at 288 K, clouds included. Temperatures in K
 * from 0 to 10⁵, straight at about 230 to 300 K; emission in W m⁻² from 0 to 10⁶. Errors: as for every law.
 * Source: Koll & Cronin 2018, PNAS 115, 10293.
 */
export const kollCroninEmission = /* @__PURE__ */ defineLaw({
  name: "kollCroninEmission",
  about: "Outgoing longwave radiation with the slope that water vapour gives it.",
  output: /* @__PURE__ */ outgoingPort(),
  inputs: {
    temperature: /* @__PURE__ */ temperaturePort(),
    known: {
      symbol: "F_0",
      unit: "W m-2",
      within: [0, 1e6],
      default: 240.1,
      about: "emission at the reference temperature",
    },
    reference: { symbol: "T_0", unit: "K", within: [0, 1e5], default: 288, about: "reference temperature" },
  },
  published: { temperature: STRAIGHT_RANGE },
  source:
    "Koll & Cronin 2018, PNAS 115, 10293 (doi:10.1073/pnas.1809868115); Loeb et al. 2018, J. Climate 31, 895 (doi:10.1175/JCLI-D-17-0208.1)",
  write: ({ temperature, known, reference }) =>
    straightLine({ temperature, intercept: known, slope: 2.2, reference }),
});
