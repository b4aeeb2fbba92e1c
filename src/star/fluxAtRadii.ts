import { div, fourth, mul, square } from "../graph/operations.ts";
import { STEFAN_BOLTZMANN } from "../ground/constants.ts";
import { defineLaw } from "../law/defineLaw.ts";

/**
 * Flux of a star at a distance given in stellar radii, normal to the beam: S = σT_eff⁴/(d/R)², in W m⁻².
 * Effective temperature in K from 0 to 10⁶, distance in radii of the star from 1 (its surface) to 10¹⁴. A
 * transit gives d/R without the radius or the mass of the star. Errors: as for every law.
 * Source: definition of effective temperature, inverse-square law; use: Cowan & Agol 2011, ApJ 729, 54.
 */
export const fluxAtRadii = /* @__PURE__ */ defineLaw({
  name: "fluxAtRadii",
  about: "Flux of a star at a distance given in stellar radii, normal to the beam.",
  output: { symbol: "S", unit: "W m-2", about: "stellar flux normal to the beam" },
  inputs: {
    effectiveTemperature: { symbol: "T_eff", unit: "K", within: [0, 1e6], about: "effective temperature" },
    radii: { symbol: "d/R", unit: "1", within: [1, 1e14], about: "distance in stellar radii" },
  },
  source:
    "definition of effective temperature; use: Cowan & Agol 2011, ApJ 729, 54 (doi:10.1088/0004-637X/729/1/54)",
  write: ({ effectiveTemperature, radii }) =>
    div(mul(STEFAN_BOLTZMANN, fourth(effectiveTemperature)), square(radii)),
});
