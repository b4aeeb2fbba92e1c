// The polynomial in the star's effective temperature that all published limits of the habitable zone share.
import { add, mul, sub } from "../graph/operations.ts";
import type { Value } from "../graph/quantity.ts";

/**
 * The unit of the published fluxes, 1360 W m⁻²: what they take as the flux at the Earth.
 * Source: Kopparapu et al. 2013, ApJ 765, 131.
 */
export const HABITABLE_ZONE_FLUX_UNIT = 1360;
/** The effective temperature from which the published polynomials count, K. */
export const HABITABLE_ZONE_SUN = 5780;

/** A star, and nothing outside the temperatures that the polynomials cover, K. */
export const starPort = () =>
  ({ symbol: "T_eff", unit: "K", within: [2600, 7200], about: "effective temperature of the star" }) as const;

/** Coefficients of one limit, by the names of the ports of `habitableZoneFlux`. */
export interface HabitableZoneCoefficients<V = number> {
  readonly sunlike: V;
  readonly linear: V;
  readonly quadratic: V;
  readonly cubic: V;
  readonly quartic: V;
}

/** S₀, a, b, c, d as the papers list them. */
export type FiveNumbers = readonly [number, number, number, number, number];

/** The papers' five numbers under their names. */
export const coefficientsOf = ([sunlike, linear, quadratic, cubic, quartic]: FiveNumbers) => ({
  sunlike,
  linear,
  quadratic,
  cubic,
  quartic,
});

/** 1360·(S₀ + aT* + bT*² + cT*³ + dT*⁴) with T* = T_eff − 5780 K, by Horner's rule. */
export function fluxPolynomial(
  effectiveTemperature: Value,
  { sunlike, linear, quadratic, cubic, quartic }: HabitableZoneCoefficients<Value>,
): Value {
  const excess = sub(effectiveTemperature, HABITABLE_ZONE_SUN);
  const curved = add(quadratic, mul(excess, add(cubic, mul(excess, quartic))));
  const share = add(sunlike, mul(excess, add(linear, mul(excess, curved))));
  return mul(HABITABLE_ZONE_FLUX_UNIT, share);
}
