import { div, mul, sqrt } from "../graph/operations.ts";
import { ASTRONOMICAL_UNIT, SOLAR_LUMINOSITY } from "../ground/constants.ts";
import { defineLaw } from "../law/defineLaw.ts";
import { HABITABLE_ZONE_FLUX_UNIT } from "./fluxPolynomial.ts";

/**
 * Distance of a limit of the habitable zone from its star, in m: d = 1 au·√((L/L☉)/(F/1360 W m⁻²)), as the papers have it.
 * Because the flux of L☉ at 1 au is 1361.2 W m⁻² and not 1360, it is 0.04 % less than √(L/4πF).
 * Luminosity in W from 0 to 10³⁵, flux of the limit in W m⁻² from 10⁻⁶ to 10¹². Errors: as for every law.
 * Source: Kopparapu et al. 2013, ApJ 765, 131, eq. 3.
 */
export const habitableZoneDistance = /* @__PURE__ */ defineLaw({
  name: "habitableZoneDistance",
  about: "Distance of a limit of the habitable zone from its star.",
  output: { symbol: "d_HZ", unit: "m" },
  inputs: {
    luminosity: { symbol: "L", unit: "W", within: [0, 1e35], about: "luminosity of the star" },
    flux: { symbol: "F", unit: "W m-2", within: [1e-6, 1e12], about: "flux at the limit" },
  },
  source: "Kopparapu et al. 2013, ApJ 765, 131 (doi:10.1088/0004-637X/765/2/131)",
  write({ luminosity, flux }) {
    const suns = div(luminosity, SOLAR_LUMINOSITY);
    return mul(ASTRONOMICAL_UNIT, sqrt(div(suns, div(flux, HABITABLE_ZONE_FLUX_UNIT))));
  },
});
