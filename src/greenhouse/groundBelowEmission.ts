import { add, mul } from "../graph/operations.ts";
import { defineLaw } from "../law/defineLaw.ts";
import { effectiveTemperaturePort } from "../law/ports.ts";
import { EMISSION_HEIGHT, LAPSE_RATE } from "./lapse.ts";

/**
 * Ground temperature below the height from which a planet emits: T_s = T_e + Γ·z_e, in K.
 * Temperature in K from 0 to 10⁵, lapse rate in K m⁻¹ from 10⁻⁶ to 1, height in m from −10⁶ to 10⁶. Errors:
 * as for every law.
 * Source: Held & Soden 2000, Annu. Rev. Energy Environ. 25, 441.
 */
export const groundBelowEmission = /* @__PURE__ */ defineLaw({
  name: "groundBelowEmission",
  about: "Ground temperature below the height from which a planet emits.",
  output: { symbol: "T_s", unit: "K", about: "temperature of the ground" },
  inputs: {
    emissionTemperature: /* @__PURE__ */ effectiveTemperaturePort(),
    lapseRate: LAPSE_RATE,
    height: EMISSION_HEIGHT,
  },
  source: "Held & Soden 2000, Annu. Rev. Energy Environ. 25, 441 (doi:10.1146/annurev.energy.25.1.441)",
  write: ({ emissionTemperature, lapseRate, height }) => add(emissionTemperature, mul(lapseRate, height)),
});
