import { fourth, mul } from "../graph/operations.ts";
import { STEFAN_BOLTZMANN } from "../ground/constants.ts";
import { defineLaw } from "../law/defineLaw.ts";
import { temperaturePort } from "../law/ports.ts";

/**
 * Flux that a black body emits: F = σT⁴, in W m⁻². Temperature in K from 0 to 10⁵. Errors: as for every law.
 * Source: Stefan–Boltzmann law; σ from CODATA 2018.
 */
export const blackbodyFlux = /* @__PURE__ */ defineLaw({
  name: "blackbodyFlux",
  about: "Flux that a black body emits.",
  output: { symbol: "F", unit: "W m-2" },
  inputs: { temperature: /* @__PURE__ */ temperaturePort() },
  source: "Stefan–Boltzmann law",
  write: ({ temperature }) => mul(STEFAN_BOLTZMANN, fourth(temperature)),
});
