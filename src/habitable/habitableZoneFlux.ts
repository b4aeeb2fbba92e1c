import { defineLaw } from "../law/defineLaw.ts";
import { fluxPolynomial, starPort } from "./fluxPolynomial.ts";

/**
 * Flux at a limit of the habitable zone, as a star's light becomes redder or bluer: F = 1360·(S₀ + aT* + bT*² + cT*³ + dT*⁴)
 * in W m⁻², normal to the beam, with T* = T_eff − 5780 K. The coefficients are those of a row of `HABITABLE_ZONE_LIMITS`.
 * Effective temperature in K from 2600 to 7200. Errors: as for every law.
 * Source: Kopparapu et al. 2013, ApJ 765, 131, eq. 2 with the erratum ApJ 770, 82; Kopparapu et al. 2014, ApJL 787, L29, eq. 4.
 */
export const habitableZoneFlux = /* @__PURE__ */ defineLaw({
  name: "habitableZoneFlux",
  about: "Flux at a limit of the habitable zone of a star.",
  output: { symbol: "F_HZ", unit: "W m-2" },
  inputs: {
    effectiveTemperature: /* @__PURE__ */ starPort(),
    sunlike: {
      symbol: "S_0",
      unit: "1",
      within: [0, 100],
      about: "flux for a star of 5780 K, in 1360 W m⁻²",
    },
    linear: { symbol: "a", unit: "K-1", within: [-1, 1], about: "coefficient of T*" },
    quadratic: { symbol: "b", unit: "K-2", within: [-1, 1], about: "coefficient of T*²" },
    cubic: { symbol: "c", unit: "K-3", within: [-1, 1], about: "coefficient of T*³" },
    quartic: { symbol: "d", unit: "K-4", within: [-1, 1], about: "coefficient of T*⁴" },
  },
  source:
    "Kopparapu et al. 2013, ApJ 765, 131 (doi:10.1088/0004-637X/765/2/131) with erratum ApJ 770, 82 (doi:10.1088/0004-637X/770/1/82); Kopparapu et al. 2014, ApJL 787, L29 (doi:10.1088/2041-8205/787/2/L29)",
  write: ({ effectiveTemperature, ...coefficients }) => fluxPolynomial(effectiveTemperature, coefficients),
});
