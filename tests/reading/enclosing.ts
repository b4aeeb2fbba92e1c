// What tests ask of an enclosure.
import * as big from "./bigNumber.ts";

/** (lo, hi, err) as a kernel writes it. */
export type Bounds = readonly [lo: number, hi: number, err: number];

/** The bounds of output `i`. */
export const boundsOf = (out: Float64Array, i: number): Bounds =>
  [out[3 * i], out[3 * i + 1], out[3 * i + 2]] as unknown as Bounds;

/** A reading that promises something. */
export const isKnown = ([, , err]: Bounds): boolean => Number.isFinite(err);

/** Does the truth lie in [lo − part·err, hi + part·err]? */
export function holds([lo, hi, err]: Bounds, truth: big.Real, part = 1): boolean {
  const e = big.mul(big.fromDouble(part), big.fromDouble(err));
  const low = big.sub(big.fromDouble(lo), e);
  const high = big.add(big.fromDouble(hi), e);
  return !big.less(truth, low) && !big.less(high, truth);
}
