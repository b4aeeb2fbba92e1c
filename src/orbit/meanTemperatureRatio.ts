// What an eccentric orbit does to the time-mean of the instantaneous equilibrium temperature.
import { add, div, mul, sqrt, square, sub } from "../graph/operations.ts";
import type { Value } from "../graph/quantity.ts";

/** Steps of the arithmetic-geometric mean; each doubles the digits, and eight reach 2⁻⁵³ up to e = 0.9999. */
const MEAN_STEPS = 8;

/**
 * ⟨T⟩/T(a) = (2/π)√(1 + e)·E(2e/(1 + e)), E the complete elliptic integral of the second kind (parameter m): Méndez &
 * Rivera-Valentín 2017, ApJL 837, L1; by the arithmetic-geometric mean (Abramowitz & Stegun 17.6).
 */
export const meanTemperatureRatio = (eccentricity: Value): Value =>
  mul(sqrt(add(1, eccentricity)), ellipticRatio(eccentricity));

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
