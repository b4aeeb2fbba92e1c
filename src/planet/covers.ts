// The covers of a surface: shares that are complete, with ice over them.
import { fail } from "../ground/errors.ts";
import { compensatedSum } from "../ground/sum.ts";
import { isLaw } from "./fieldLaws.ts";
import type { PlanetDescription } from "./planetShape.ts";
import type { Numbers } from "./wire.ts";

/** One cover of a description. */
export type Cover = Extract<PlanetDescription["albedo"], { covers: unknown }>["covers"][number];

/** How far the shares of a complete surface may be from 1. */
const SHARE_TOLERANCE = 1e-12;

/** True for a cover that reflects two bands differently. */
export const inBands = (cover: Cover): boolean => "visible" in cover;

/** True for a cover whose share is a law. */
export const isIce = ({ share }: Cover): boolean => isLaw(share);

/** Throws `shares-not-one`, or `repeated-name` when two covers take the rest or two answer to temperature. */
export function checkCovers(covers: readonly Cover[], path: string, numbers: Numbers): void {
  const twice = (value: string, allowed: string) => fail("repeated-name", { path, value, allowed });
  const wrong = (value: number, allowed: string) => fail("shares-not-one", { path, value, allowed });
  const open = covers.filter((cover) => !isIce(cover));
  if (covers.length - open.length > 1)
    twice("iceShare", "one cover whose share is a law: that of the ice over all others");
  const stated = covers.flatMap(({ share }, i) =>
    share === "rest" || isLaw(share) ? [] : [numbers(`${path}[${i}].share`)],
  );
  const rests = open.length - stated.length;
  if (rests > 1) twice("rest", 'one cover with the share "rest"');
  const total = compensatedSum(stated);
  if (rests === 1 && total > 1 + SHARE_TOLERANCE)
    wrong(total, "shares whose sum is at most 1 beside the rest");
  if (rests === 0 && !(Math.abs(total - 1) <= SHARE_TOLERANCE))
    wrong(total, 'shares whose sum is 1 within 1e-12, or one share "rest"');
}
