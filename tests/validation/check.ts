// What one comparison with the outside holds.
import type { Source } from "./sources.ts";

/** One number of ours against one that somebody else printed or computed. */
export interface Check {
  /** Exported names that the number goes through. */
  readonly covers: readonly string[];
  readonly what: string;
  readonly published: number;
  readonly unit: string;
  readonly ours: () => number;
  /** Absolute, in `unit`. */
  readonly tolerance: number;
  /** Where the tolerance comes from. */
  readonly because: string;
  readonly source: Source;
  /** How the number reached this file: read in the source, remembered, or made by a script of `tests/reference`. */
  readonly basis: "seen" | "from memory" | `computed with ${string}`;
}

/** What rounding to a printed digit can hide. */
export const halfUnit = (lastDigit: number): number => lastDigit / 2;
/** Astropy's σ has more digits than CODATA prints: 3.3·10⁻¹¹ of the flux. */
export const SIGMA_DIGITS = 4e-11;

/** A computed reference: a dozen roundings of a double on either side. */
export const ROUNDING = 24 * 2 ** -53;
export const ROUNDED = "a dozen roundings on either side";

/**
 * How far T = (f·S(1 − A)/σ)^¼ may move when flux and albedo are printed with these steps, and the printed step of T itself.
 */
export function printedTemperature(
  T: number,
  { flux, albedo }: { flux: readonly [number, number]; albedo: readonly [number, number] },
  step: number,
): number {
  const share = halfUnit(flux[1]) / flux[0] + halfUnit(albedo[1]) / (1 - albedo[0]);
  return (T * share) / 4 + halfUnit(step);
}
