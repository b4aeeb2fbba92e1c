import { fourth, product } from "../graph/operations.ts";
import { STEFAN_BOLTZMANN } from "../ground/constants.ts";
import { defineLaw } from "../law/defineLaw.ts";
import { outgoingPort, temperaturePort } from "../law/ports.ts";

/**
 * Emission of a grey surface: F = εσT⁴, in W m⁻².
 * Temperature in K from 0 to 10⁵, emissivity between 0 and 1. Errors: as for every law.
 * Source: Stefan–Boltzmann law; σ from CODATA 2018.
 */
export const greyEmission = /* @__PURE__ */ defineLaw({
  name: "greyEmission",
  about: "Emission of a grey surface.",
  output: /* @__PURE__ */ outgoingPort(),
  inputs: {
    temperature: /* @__PURE__ */ temperaturePort(),
    emissivity: { symbol: "ε", unit: "1", within: [0, 1], about: "emissivity" },
  },
  source: "Stefan–Boltzmann law",
  write: ({ temperature, emissivity }) => product(emissivity, STEFAN_BOLTZMANN, fourth(temperature)),
});
