// The shares of a black body's energy on either side of a wavelength, as series in x = hc/(λkT).
import { add, div, exp, mul, neg, product, square, sub } from "../graph/operations.ts";
import type { Value } from "../graph/quantity.ts";

/** Where the two series meet: both leave out 2·10⁻¹⁷ of their sum there, and less on their own sides. */
export const MEETING = 2;

/** 15/π⁴. */
const NORM = 0.15398973382026504;
/** Terms of the series in e⁻ˣ. */
const TERMS = 17;
/** B₂ₖ/((2k)!·(2k + 3)) for k = 1, 2, …, B₂ₖ being Bernoulli's numbers. */
const BERNOULLI = [
  0.016666666666666666, -0.0001984126984126984, 3.6743092298647855e-6, -7.515632515632516e-8,
  1.6059043836821615e-9, -3.522793425791662e-11, 7.872080312167458e-13, -1.784042261222412e-14,
  4.088600979179926e-16, -9.455950863295921e-18, 2.203601131344092e-19, -5.1683202540046385e-21,
  1.2188644964239542e-22, -2.888231428076628e-24, 6.87258318890207e-26,
];

/** Share at shorter wavelengths, for x ≥ 2: (15/π⁴) Σ e⁻ⁿˣ(x³ + 3x²/n + 6x/n² + 6/n³)/n. */
export function shorterShare(x: Value): Value {
  const decay = exp(neg(x));
  let series: Value = 0;
  for (let n = TERMS; n >= 1; n--) {
    const linear = add(x, 3 / n);
    const parabola = add(mul(x, linear), 6 / (n * n));
    const cubic = add(mul(x, parabola), 6 / (n * n * n));
    series = n === TERMS ? div(cubic, n) : add(div(cubic, n), mul(decay, series));
  }
  return product(NORM, decay, series);
}

/** Share at longer wavelengths, for x ≤ 2: (15/π⁴) x³ (1/3 − x/8 + Σ B₂ₖ x²ᵏ/((2k)!(2k + 3))). */
export function longerShare(x: Value): Value {
  const z = square(x);
  const series = BERNOULLI.reduceRight<Value>((sum, term) => (sum === 0 ? term : add(term, mul(z, sum))), 0);
  const bracket = add(sub(1 / 3, div(x, 8)), mul(z, series));
  return product(NORM, mul(x, z), bracket);
}
