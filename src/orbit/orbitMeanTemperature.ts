import { mul } from "../graph/operations.ts";
import { defineLaw } from "../law/defineLaw.ts";
import { eccentricityPort, temperaturePort } from "../law/ports.ts";
import { meanTemperatureRatio } from "./meanTemperatureRatio.ts";

/**
 * Time-mean of the instantaneous equilibrium temperature over an eccentric orbit: ⟨T⟩ = T(a)·(2/π)√(1 + e)·E(2e/(1 + e)),
 * in K, E the complete elliptic integral of the second kind (parameter m). T(a) is the equilibrium temperature at
 * the distance of the semi-major axis, of starlight alone: the mean holds for a body without thermal inertia, with a constant
 * albedo and no internal heat. T(a) in K from 0 to 10⁵, eccentricity from 0 to 0.9999. Errors: as for every
 * law.
 * Source: Méndez & Rivera-Valentín 2017; E by the arithmetic-geometric mean (Abramowitz & Stegun 17.6).
 */
export const orbitMeanTemperature = /* @__PURE__ */ defineLaw({
  name: "orbitMeanTemperature",
  about: "Time-mean of the instantaneous equilibrium temperature over an eccentric orbit.",
  output: { symbol: "⟨T⟩", unit: "K", about: "time-mean of the equilibrium temperature" },
  inputs: {
    temperatureAtSemiMajorAxis: /* @__PURE__ */ temperaturePort(
      "T_a",
      "equilibrium temperature at the distance of the semi-major axis",
    ),
    eccentricity: /* @__PURE__ */ eccentricityPort(),
  },
  source: "Méndez & Rivera-Valentín 2017, ApJL 837, L1 (doi:10.3847/2041-8213/aa5f13)",
  write: ({ temperatureAtSemiMajorAxis, eccentricity }) =>
    mul(temperatureAtSemiMajorAxis, meanTemperatureRatio(eccentricity)),
});
