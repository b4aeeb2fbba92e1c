import { div, mul, square, sum } from "../graph/operations.ts";
import { FOUR_PI } from "../ground/circle.ts";
import { defineLaw } from "../law/defineLaw.ts";
import { distancePort, luminosityPort } from "./starPorts.ts";

/**
 * Flux of several stars together: S = Σ Lᵢ/(4πdᵢ²), in W m⁻², each normal to its own beam.
 * Luminosities in W from 0 to 10⁴⁰, distances in m from 1 to 10²². A quarter of it is what each square metre
 * of a sphere intercepts on the average, wherever the stars stand; no point of the planet need ever see the
 * sum. Distances are those of one moment, or such that their inverse squares are the means over the orbits.
 * Errors: as for every law; `unreadable` for an empty list.
 * Source: conservation of energy (inverse-square law); light adds.
 */
export const combinedFlux = /* @__PURE__ */ defineLaw({
  name: "combinedFlux",
  about: "Flux of several stars together, each normal to its own beam.",
  output: { symbol: "S", unit: "W m-2", about: "sum of the fluxes of all stars" },
  inputs: {
    stars: {
      each: { luminosity: /* @__PURE__ */ luminosityPort(), distance: /* @__PURE__ */ distancePort() },
    },
  },
  source: "inverse-square law; light adds",
  write: ({ stars }) =>
    sum(...stars.map(({ luminosity, distance }) => div(luminosity, mul(FOUR_PI, square(distance))))),
});
