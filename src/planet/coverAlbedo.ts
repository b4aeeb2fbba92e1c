// The albedo of a surface of several covers, whose shares stay free to be set and swept.
import { mixAlbedo } from "../albedo/mixAlbedo.ts";
import type { Value } from "../graph/quantity.ts";
import { fail } from "../ground/errors.ts";
import { compensatedSum } from "../ground/sum.ts";
import type { Numbers } from "./agreement.ts";
import type { PlanetDescription } from "./planetShape.ts";
import type { Wire } from "./wire.ts";

type Covers = Extract<PlanetDescription["albedo"], { covers: unknown }>["covers"];

/** How far the shares of a complete surface may be from 1. */
const SHARE_TOLERANCE = 1e-12;

/**
 * The cover whose share is what the others leave: the one that says `"rest"`, or else the last one, so that every other
 * share can be changed and the surface stays complete.
 */
function remainder(covers: Covers): number {
  const rest = covers.findIndex((cover) => cover.share === "rest");
  return rest < 0 ? covers.length - 1 : rest;
}

/** Σ shareᵢ·albedoᵢ. */
export function coverAlbedo(covers: Covers, wire: Wire): Value {
  const last = remainder(covers);
  const at = (i: number, field: string) => wire(`albedo.covers[${i}].${field}`);
  const others = covers.flatMap((_, i) => (i === last ? [] : [i]));
  const bare = at(last, "albedo");
  if (others.length === 0) return bare;
  return mixAlbedo({
    covers: others.map((i) => ({ fraction: at(i, "share"), albedo: at(i, "albedo") })),
    bare,
  });
}

/** Throws `shares-not-one`, or `repeated-name` when two covers take the rest. */
export function checkCovers(covers: Covers, numbers: Numbers): void {
  const path = "albedo.covers";
  const stated = covers.flatMap((cover, i) =>
    cover.share === "rest" ? [] : [numbers(`${path}[${i}].share`)],
  );
  const rests = covers.length - stated.length;
  if (rests > 1) fail("repeated-name", { path, value: "rest", allowed: 'one cover with the share "rest"' });
  const total = compensatedSum(stated);
  if (rests === 1 && total > 1 + SHARE_TOLERANCE)
    fail("shares-not-one", { path, value: total, allowed: "shares whose sum is at most 1 beside the rest" });
  if (rests === 0 && !(Math.abs(total - 1) <= SHARE_TOLERANCE))
    fail("shares-not-one", {
      path,
      value: total,
      allowed: 'shares whose sum is 1 within 1e-12, or one share "rest"',
    });
}
