import { div, mul, square } from "../graph/operations.ts";
import { FOUR_PI } from "../ground/circle.ts";
import { defineLaw } from "../law/defineLaw.ts";
import { distancePort, luminosityPort } from "./starPorts.ts";

/**
 * Flux of a star at a distance, normal to the beam: S = L/(4πd²), in W m⁻².
 * Luminosity in W from 0 to 10⁴⁰, distance in m from 1 to 10²². Errors: as for every law.
 * Source: conservation of energy (inverse-square law).
 */
export const stellarFlux = /* @__PURE__ */ defineLaw({
  name: "stellarFlux",
  about: "Flux of a star at a distance, normal to the beam.",
  output: { symbol: "S", unit: "W m-2", about: "stellar flux normal to the beam" },
  inputs: { luminosity: /* @__PURE__ */ luminosityPort(), distance: /* @__PURE__ */ distancePort() },
  source: "inverse-square law",
  write: ({ luminosity, distance }) => div(luminosity, mul(FOUR_PI, square(distance))),
});
