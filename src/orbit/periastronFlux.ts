import { div, square, sub } from "../graph/operations.ts";
import { defineLaw } from "../law/defineLaw.ts";
import { eccentricityPort, fluxPort } from "../law/ports.ts";

/**
 * Stellar flux where the orbit is nearest to the star, normal to the beam: S = S(a)/(1 − e)², in W m⁻².
 * Flux S(a) at the distance of the semi-major axis in W m⁻² from 0 to 10¹², eccentricity from 0 to 0.9999.
 * Errors: as for every law.
 * Source: Kepler's first law (the distance is a(1 − e)), inverse-square law.
 */
export const periastronFlux = /* @__PURE__ */ defineLaw({
  name: "periastronFlux",
  about: "Stellar flux where the orbit is nearest to the star, normal to the beam.",
  output: { symbol: "S_p", unit: "W m-2", about: "flux at periastron" },
  inputs: {
    fluxAtSemiMajorAxis: /* @__PURE__ */ fluxPort("S_a", "flux at the distance of the semi-major axis"),
    eccentricity: /* @__PURE__ */ eccentricityPort(),
  },
  source: "Kepler's first law, inverse-square law",
  write: ({ fluxAtSemiMajorAxis, eccentricity }) => div(fluxAtSemiMajorAxis, square(sub(1, eccentricity))),
});
