import { add, div, fourth, mul, product } from "../graph/operations.ts";
import { STEFAN_BOLTZMANN } from "../ground/constants.ts";
import { defineLaw } from "../law/defineLaw.ts";
import { outgoingPort, temperaturePort } from "../law/ports.ts";

/**
 * Emission to space of a grey column in radiative equilibrium over a black ground: F = σT⁴/(1 + ½·closure·τ), in W m⁻².
 * Ground temperature in K, total longwave optical depth from 0, closure (diffusivity factor) 3/2 for Eddington's or 2.
 * Errors: as for every law. Source: Eddington's grey atmosphere; Goody & Yung 1989, Atmospheric Radiation.
 */
export const greyColumnEmission = /* @__PURE__ */ defineLaw({
  name: "greyColumnEmission",
  about: "Emission to space of a grey column in radiative equilibrium over a black ground.",
  output: /* @__PURE__ */ outgoingPort(),
  inputs: {
    temperature: /* @__PURE__ */ temperaturePort("T", "temperature of the ground"),
    opticalDepth: {
      symbol: "τ",
      unit: "1",
      within: [0, 1e6],
      about: "longwave optical depth of the whole column",
    },
    closure: { symbol: "D", unit: "1", within: [1, 2], default: 1.5, about: "diffusivity factor" },
  },
  source: "Eddington approximation; Goody & Yung 1989, Atmospheric Radiation",
  write({ temperature, opticalDepth, closure }) {
    const blanket = add(1, product(0.5, closure, opticalDepth));
    return div(mul(STEFAN_BOLTZMANN, fourth(temperature)), blanket);
  },
});
