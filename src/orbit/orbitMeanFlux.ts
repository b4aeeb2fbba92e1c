import { div, sqrt, square, sub } from "../graph/operations.ts";
import { defineLaw } from "../law/defineLaw.ts";
import { eccentricityPort, fluxPort } from "../law/ports.ts";

/**
 * Time-mean stellar flux over an eccentric orbit: ⟨S⟩ = S(a)/√(1 − e²), in W m⁻².
 * The right average where the thermal time is much longer than the orbital period. Flux S(a) at the distance
 * of the semi-major axis in W m⁻² from 0 to 10¹², eccentricity from 0 to 0.9999. Errors: as for every law.
 * Source: Quirrenbach 2022 (thermal time against period); the mean itself follows from Kepler's second law.
 */
export const orbitMeanFlux = /* @__PURE__ */ defineLaw({
  name: "orbitMeanFlux",
  about: "Time-mean stellar flux over an eccentric orbit.",
  output: { symbol: "⟨S⟩", unit: "W m-2" },
  inputs: {
    fluxAtSemiMajorAxis: /* @__PURE__ */ fluxPort("S_a", "flux at the distance of the semi-major axis"),
    eccentricity: /* @__PURE__ */ eccentricityPort(),
  },
  source: "Kepler's second law; use: Quirrenbach 2022",
  write({ fluxAtSemiMajorAxis, eccentricity }) {
    const axisRatio = sqrt(sub(1, square(eccentricity)));
    return div(fluxAtSemiMajorAxis, axisRatio);
  },
});
