import { sub } from "../graph/operations.ts";
import { defineLaw } from "../law/defineLaw.ts";
import { outgoingPort } from "../law/ports.ts";

/**
 * Emission to space less a forcing: F = clear − forcing, in W m⁻²: the way a forcing enters a budget, on the cooling side.
 * Emission from −10¹² to 10¹², forcing from −10⁴ to 10⁴. Where the emission's optical depth already holds the
 * same gas, it would count twice. Errors: as for every law. Source: a forcing is the change of the net flux
 * that it brings at a given temperature.
 */
export const forcedEmission = /* @__PURE__ */ defineLaw({
  name: "forcedEmission",
  about: "Emission to space less a forcing.",
  output: /* @__PURE__ */ outgoingPort(),
  inputs: {
    clear: { symbol: "F_0", unit: "W m-2", within: [-1e12, 1e12], about: "emission without the forcing" },
    forcing: { symbol: "F_f", unit: "W m-2", within: [-1e4, 1e4], about: "its reduction by the forcing" },
  },
  source: "definition of a forcing; IPCC 2021, AR6 WGI, §7.1",
  write: ({ clear, forcing }) => sub(clear, forcing),
});
