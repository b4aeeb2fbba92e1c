import { fourth, mix, mul } from "../graph/operations.ts";
import { STEFAN_BOLTZMANN } from "../ground/constants.ts";
import { defineLaw } from "../law/defineLaw.ts";
import { outgoingPort, temperaturePort } from "../law/ports.ts";

/**
 * Outgoing longwave radiation above grey clouds: F = (1 − f)·F_clear + f[(1 − ε)·F_clear + ε·σT_c⁴], in W m⁻².
 * `clear` is the emission without clouds in W m⁻² from 0 to 10¹³; `share` of the sky and `emissivity`, both
 * between 0 and 1, and `temperature` in K from 0 to 10⁵ are the clouds'. What lies above the clouds is taken
 * as transparent. Errors: as for every law.
 * Source: a grey layer over a column; Kirchhoff's law.
 */
export const cloudyEmission = /* @__PURE__ */ defineLaw({
  name: "cloudyEmission",
  about: "Outgoing longwave radiation above grey clouds.",
  output: /* @__PURE__ */ outgoingPort(),
  inputs: {
    clear: { symbol: "F_clear", unit: "W m-2", within: [0, 1e13], about: "emission without clouds" },
    share: { symbol: "f", unit: "1", within: [0, 1], about: "share of the sky under clouds" },
    emissivity: { symbol: "ε", unit: "1", within: [0, 1], about: "emissivity of the clouds" },
    temperature: /* @__PURE__ */ temperaturePort("T_c", "temperature of the clouds' tops"),
  },
  source: "a grey layer over a column; Kirchhoff's law",
  write({ clear, share, emissivity, temperature }) {
    const replaced = mul(share, emissivity);
    return mix(clear, mul(STEFAN_BOLTZMANN, fourth(temperature)), replaced);
  },
});
