import { div, sqrt } from "../graph/operations.ts";
import { STEFAN_BOLTZMANN } from "../ground/constants.ts";
import { defineLaw } from "../law/defineLaw.ts";

/**
 * Temperature of a black body that emits a flux: T = (F/σ)^¼, in K. Flux in W m⁻² from 0 to 10¹². Errors: as for
 * every law. Source: Stefan–Boltzmann law; σ from CODATA 2018.
 */
export const blackbodyTemperature = /* @__PURE__ */ defineLaw({
  name: "blackbodyTemperature",
  about: "Temperature of a black body that emits a flux.",
  output: { symbol: "T", unit: "K" },
  inputs: { flux: { symbol: "F", unit: "W m-2", within: [0, 1e12], about: "emitted flux" } },
  source: "Stefan–Boltzmann law",
  write: ({ flux }) => sqrt(sqrt(div(flux, STEFAN_BOLTZMANN))),
});
