import { add, div, mul, tanh } from "../graph/operations.ts";
import { defineLaw } from "../law/defineLaw.ts";
import { effectiveTemperaturePort } from "../law/ports.ts";
import { closurePort, groundUnder, halfSlantDepth, opticalDepthPort } from "./greyBlanket.ts";

/**
 * Temperature of the black ground under a grey column cut into N equal layers, each of one temperature:
 * T_g = T_e·(1 + N·tanh(Dτ/2N))^¼, in K. A layer absorbs 1 − exp(−Dτ/N). With more layers it comes up to
 * `greyGroundTemperature`, the difference of T_g⁴/T_e⁴ being −(Dτ)³/24N² to leading order.
 * Effective temperature in K from 0 to 10⁵, total longwave optical depth from 0 to 10⁶, number of layers from
 * 1 to 10⁴ (any real number is read), closure (diffusivity factor) from 1 to 2, Eddington's 3/2 unless said.
 * Errors: as for every law.
 * Source: sum of the balances of leaky layers, with r = ε/(2 − ε) = tanh(Dτ/2N); Goody & Yung 1989 for the limit.
 */
export const layeredGroundTemperature = /* @__PURE__ */ defineLaw({
  name: "layeredGroundTemperature",
  about: "Temperature of the black ground under a grey column cut into equal layers.",
  output: { symbol: "T_g", unit: "K", within: [0, 3.2e6], about: "ground temperature" },
  inputs: {
    effectiveTemperature: /* @__PURE__ */ effectiveTemperaturePort(),
    opticalDepth: /* @__PURE__ */ opticalDepthPort(),
    layers: { symbol: "N", unit: "1", within: [1, 1e4], about: "number of layers" },
    closure: /* @__PURE__ */ closurePort(),
  },
  source: "balances of leaky layers; Goody & Yung 1989, Atmospheric Radiation",
  write({ effectiveTemperature, opticalDepth, layers, closure }) {
    const halfDepthOfLayer = div(halfSlantDepth(closure, opticalDepth), layers);
    const blanket = add(1, mul(layers, tanh(halfDepthOfLayer)));
    return groundUnder(blanket, effectiveTemperature);
  },
});
