import { div, fourth, mul } from "../graph/operations.ts";
import { STEFAN_BOLTZMANN } from "../ground/constants.ts";
import { defineLaw } from "../law/defineLaw.ts";
import { outgoingPort, temperaturePort } from "../law/ports.ts";
import { closurePort, greyBlanket, opticalDepthPort } from "./greyBlanket.ts";

/**
 * Emission to space of a grey column in radiative equilibrium over a black ground: F = σT⁴/(1 + ½·closure·τ), in W m⁻².
 * Ground temperature in K from 0 to 10⁵, total longwave optical depth from 0 to 10¹², closure (diffusivity
 * factor) from 1 to 2, Eddington's 3/2 unless said. Errors: as for every law. Source: Eddington's grey
 * atmosphere; Goody & Yung 1989, Atmospheric Radiation.
 */
export const greyColumnEmission = /* @__PURE__ */ defineLaw({
  name: "greyColumnEmission",
  about: "Emission to space of a grey column in radiative equilibrium over a black ground.",
  output: /* @__PURE__ */ outgoingPort(),
  inputs: {
    temperature: /* @__PURE__ */ temperaturePort("T", "temperature of the ground"),
    opticalDepth: /* @__PURE__ */ opticalDepthPort(1e12),
    closure: /* @__PURE__ */ closurePort(),
  },
  source: "Eddington approximation; Goody & Yung 1989, Atmospheric Radiation",
  write({ temperature, opticalDepth, closure }) {
    const blanket = greyBlanket(closure, opticalDepth);
    return div(mul(STEFAN_BOLTZMANN, fourth(temperature)), blanket);
  },
});
