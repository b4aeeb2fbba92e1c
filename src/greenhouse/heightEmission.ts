import { fourth, max, mul, sub } from "../graph/operations.ts";
import { STEFAN_BOLTZMANN } from "../ground/constants.ts";
import { defineLaw } from "../law/defineLaw.ts";
import { outgoingPort, temperaturePort } from "../law/ports.ts";
import { EMISSION_HEIGHT, LAPSE_RATE } from "./lapse.ts";

/**
 * Outgoing longwave radiation of a column that emits from one height: F = σ·max(0, T − Γ·z_e)⁴, in W m⁻².
 * Ground temperature in K from 0 to 10⁵, lapse rate in K m⁻¹ from 10⁻⁶ to 1, height in m from −10⁶ to 10⁶;
 * nothing leaves a ground colder than Γ·z_e. Errors: as for every law. Source: Held & Soden 2000, Annu. Rev.
 * Energy Environ. 25, 441.
 */
export const heightEmission = /* @__PURE__ */ defineLaw({
  name: "heightEmission",
  about: "Outgoing longwave radiation of a column that emits from one height.",
  output: /* @__PURE__ */ outgoingPort(),
  inputs: {
    temperature: /* @__PURE__ */ temperaturePort("T", "temperature of the ground"),
    lapseRate: LAPSE_RATE,
    height: EMISSION_HEIGHT,
  },
  source: "Held & Soden 2000, Annu. Rev. Energy Environ. 25, 441 (doi:10.1146/annurev.energy.25.1.441)",
  write({ temperature, lapseRate, height }) {
    const emitting = max(0, sub(temperature, mul(lapseRate, height)));
    return mul(STEFAN_BOLTZMANN, fourth(emitting));
  },
});
