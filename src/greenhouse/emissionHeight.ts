import { div, sub } from "../graph/operations.ts";
import { defineLaw } from "../law/defineLaw.ts";
import { effectiveTemperaturePort, temperaturePort } from "../law/ports.ts";
import { LAPSE_RATE } from "./lapse.ts";

/**
 * Height from which a planet seems to emit to space: z_e = (T_s − T_e)/Γ, in m; negative where the ground is the colder.
 * Temperatures in K from 0 to 10⁵, lapse rate in K m⁻¹ from 10⁻⁶ to 1. Errors: as for every law.
 * Source: Held & Soden 2000, Annu. Rev. Energy Environ. 25, 441.
 */
export const emissionHeight = /* @__PURE__ */ defineLaw({
  name: "emissionHeight",
  about: "Height from which a planet seems to emit to space.",
  output: { symbol: "z_e", unit: "m", about: "effective height of emission" },
  inputs: {
    surfaceTemperature: /* @__PURE__ */ temperaturePort("T_s", "temperature of the ground"),
    emissionTemperature: /* @__PURE__ */ effectiveTemperaturePort(),
    lapseRate: LAPSE_RATE,
  },
  source: "Held & Soden 2000, Annu. Rev. Energy Environ. 25, 441 (doi:10.1146/annurev.energy.25.1.441)",
  write: ({ surfaceTemperature, emissionTemperature, lapseRate }) =>
    div(sub(surfaceTemperature, emissionTemperature), lapseRate),
});
