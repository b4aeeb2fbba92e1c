import { fourth, mul } from "../graph/operations.ts";
import { defineLaw } from "../law/defineLaw.ts";
import { eccentricityPort, fluxPort } from "../law/ports.ts";
import { meanTemperatureRatio } from "./meanTemperatureRatio.ts";

/**
 * The steady flux whose equilibrium temperature is the time-mean of the instantaneous equilibrium temperature over an
 * eccentric orbit: S(a)·(⟨T⟩/T(a))⁴ with ⟨T⟩/T(a) = (2/π)√(1 + e)·E(2e/(1 + e)), in W m⁻², E the complete elliptic
 * integral of the second kind (parameter m). The right average for a body without thermal inertia and with a constant
 * albedo; `orbitMeanTemperature` gives the mean temperature itself. Flux S(a) at the distance of the
 * semi-major axis in W m⁻² from 0 to 10¹², eccentricity from 0 to 0.9999. Errors: as for every law.
 * Source: Méndez & Rivera-Valentín 2017; E by the arithmetic-geometric mean (Abramowitz & Stegun 17.6).
 */
export const temperatureMeanFlux = /* @__PURE__ */ defineLaw({
  name: "temperatureMeanFlux",
  about: "The steady flux whose equilibrium temperature is the time-mean over an eccentric orbit.",
  output: { symbol: "S_⟨T⟩", unit: "W m-2" },
  inputs: {
    fluxAtSemiMajorAxis: /* @__PURE__ */ fluxPort("S_a", "flux at the distance of the semi-major axis"),
    eccentricity: /* @__PURE__ */ eccentricityPort(),
  },
  source: "Méndez & Rivera-Valentín 2017, ApJL 837, L1 (doi:10.3847/2041-8213/aa5f13)",
  write: ({ fluxAtSemiMajorAxis, eccentricity }) =>
    mul(fluxAtSemiMajorAxis, fourth(meanTemperatureRatio(eccentricity))),
});
