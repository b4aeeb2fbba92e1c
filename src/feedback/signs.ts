// Which signs are known.
import { signOfRange } from "../search/interval.ts";
import type { Bounded } from "./bounds.ts";
import type { FeedbackLoop } from "./feedbacks.ts";

/** λ and its parts in a sampled loop are rounding below this share of the sum of all parts. */
const SLOPE_NOISE = 1e-12;
/** Bounds that are moved outwards hold a little even of nothing. */
const NOTHING = 1e-290;

/** A sign; 0 where it is not known. */
export type KnownSign = 1 | -1 | 0;

/** Signs are proved by bounds. In a sampled loop there are none: a sign is one beyond rounding. `size`: that of all parts. */
export const signReader =
  (sampled: boolean, size: number) =>
  ({ value, bounds }: Bounded): KnownSign => {
    if (!sampled) return bounds ? signOfRange(bounds) : 0;
    return Math.abs(value) > SLOPE_NOISE * size ? (value > 0 ? 1 : -1) : 0;
  };

/** What a part of λ with this sign does to a disturbance. */
export function effectOf({ value, bounds }: Bounded, sign: KnownSign): FeedbackLoop["effect"] {
  if (sign !== 0) return sign > 0 ? "amplifies" : "counters";
  const isNothing = value === 0 && (bounds ?? []).every((end) => Math.abs(end) < NOTHING);
  return isNothing ? "none" : "undecided";
}
