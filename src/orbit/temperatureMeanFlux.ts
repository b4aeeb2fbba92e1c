import { add, div, fourth, mul, sqrt, square, sub } from "../graph/operations.ts";
import type { Value } from "../graph/quantity.ts";
import { defineLaw } from "../law/defineLaw.ts";
import { eccentricityPort, fluxPort } from "../law/ports.ts";

/** Steps of the arithmetic-geometric mean; each doubles the digits, and eight reach 2⁻⁵³ up to e = 0.9999. */
const MEAN_STEPS = 8;

/**
 * The steady flux whose equilibrium temperature is the time-mean of the instantaneous equilibrium temperature over an
 * eccentric orbit: S(a)·(⟨T⟩/T(a))⁴ with ⟨T⟩/T(a) = (2/π)√(1 + e)·E(2e/(1 + e)), in W m⁻², E the complete elliptic
 * integral of the second kind (parameter m). The right average for a body without thermal inertia and with a constant
 * albedo. Errors: as for every law; an eccentricity of 1 or more is out of range.
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
  source: "Méndez & Rivera-Valentín 2017, ApJL 837, L1",
  write({ fluxAtSemiMajorAxis, eccentricity }) {
    const meanTemperature = mul(sqrt(add(1, eccentricity)), ellipticRatio(eccentricity));
    return mul(fluxAtSemiMajorAxis, fourth(meanTemperature));
  },
});

/** (2/π)·E(m) for m = 2e/(1 + e): (1 − Σ 2ⁿ⁻¹cₙ²)/agm(1, √(1 − m)), with 1 − m = (1 − e)/(1 + e) free of cancellation. */
function ellipticRatio(eccentricity: Value): Value {
  const onePlus = add(1, eccentricity);
  let a: Value = 1;
  let b: Value = sqrt(div(sub(1, eccentricity), onePlus));
  let weight = 0.5;
  let spent: Value = div(eccentricity, onePlus);
  for (let n = 1; n <= MEAN_STEPS; n++) {
    const half: Value = div(sub(a, b), 2);
    const mean: Value = div(add(a, b), 2);
    b = sqrt(mul(a, b));
    a = mean;
    weight *= 2;
    spent = add(spent, mul(weight, square(half)));
  }
  return div(sub(1, spent), a);
}
