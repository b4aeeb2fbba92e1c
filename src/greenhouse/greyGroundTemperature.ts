import { defineLaw } from "../law/defineLaw.ts";
import { effectiveTemperaturePort } from "../law/ports.ts";
import { closurePort, greyBlanket, groundUnder, opticalDepthPort } from "./greyBlanket.ts";

/**
 * Temperature of the black ground under a grey column in radiative equilibrium: T_g = T_e·(1 + ½Dτ)^¼, in K. The air
 * that touches the ground is colder, and the skin at the top is colder still (`greySkinTemperature`).
 * Effective temperature in K from 0 to 10⁵, total longwave optical depth from 0 to 10⁶, closure (diffusivity
 * factor) from 1 to 2, Eddington's 3/2 unless said. Errors: as for every law. Source: Eddington's grey
 * atmosphere; Goody & Yung 1989, Atmospheric Radiation.
 */
export const greyGroundTemperature = /* @__PURE__ */ defineLaw({
  name: "greyGroundTemperature",
  about: "Temperature of the black ground under a grey column in radiative equilibrium.",
  output: { symbol: "T_g", unit: "K", within: [0, 3.2e6], about: "ground temperature" },
  inputs: {
    effectiveTemperature: /* @__PURE__ */ effectiveTemperaturePort(),
    opticalDepth: /* @__PURE__ */ opticalDepthPort(),
    closure: /* @__PURE__ */ closurePort(),
  },
  source: "Eddington approximation; Goody & Yung 1989, Atmospheric Radiation",
  write({ effectiveTemperature, opticalDepth, closure }) {
    const blanket = greyBlanket(closure, opticalDepth);
    return groundUnder(blanket, effectiveTemperature);
  },
});
