import { div, mul, square } from "../graph/operations.ts";
import { FOUR_PI } from "../ground/circle.ts";
import { defineLaw } from "../law/defineLaw.ts";

/**
 * Flux of a star at a distance, normal to the beam: S = L/(4πd²), in W m⁻².
 * Luminosity in W, distance in m (above 0). Errors: as for every law; a distance of 0 is out of range.
 * Source: conservation of energy (inverse-square law).
 */
export const stellarFlux = /* @__PURE__ */ defineLaw({
  name: "stellarFlux",
  about: "Flux of a star at a distance, normal to the beam.",
  output: { symbol: "S", unit: "W m-2" },
  inputs: {
    luminosity: { symbol: "L", unit: "W", within: [0, 1e40] },
    distance: { symbol: "d", unit: "m", within: [1, 1e22] },
  },
  source: "inverse-square law",
  write: ({ luminosity, distance }) => div(luminosity, mul(FOUR_PI, square(distance))),
});
