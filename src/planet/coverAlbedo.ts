// The albedo of a surface of several covers, whose shares stay free to be set and swept.
import { mixAlbedo } from "../albedo/mixAlbedo.ts";
import { twoBandAlbedo } from "../albedo/twoBandAlbedo.ts";
import type { Value } from "../graph/quantity.ts";
import { visibleShare } from "./bands.ts";
import { type Cover, inBands, isIce } from "./covers.ts";
import type { Lit } from "./stars.ts";
import { callWritten, type Sources, type WrittenLaw } from "./wire.ts";

/** A cover and where it stands. */
interface Placed {
  readonly cover: Cover;
  readonly at: string;
}
type AlbedoOf = (placed: Placed) => Value;

/** Σ shareᵢ·albedoᵢ over the open surface, with ice over a share of all of it. */
export function coverAlbedo(d: Lit, covers: readonly Cover[], path: string, from: Sources): Value {
  const placed = covers.map((cover, i): Placed => ({ cover, at: `${path}.covers[${i}]` }));
  // the light is the same for all covers, so it is recorded once
  const light = covers.some(inBands) ? visibleShare(d, from.wire) : 0;
  const albedoOf: AlbedoOf = ({ cover, at }) => {
    if (!inBands(cover)) return from.wire(`${at}.albedo`);
    const [visible, nearInfrared] = [from.wire(`${at}.visible`), from.wire(`${at}.nearInfrared`)];
    return twoBandAlbedo({ visible, nearInfrared, visibleShare: light });
  };
  const [bare, ice] = [placed.filter(({ cover }) => !isIce(cover)), placed.find(({ cover }) => isIce(cover))];
  const open = openAlbedo(bare, albedoOf, from);
  if (!ice) return open;
  const fraction = callWritten(ice.cover.share as WrittenLaw, `${ice.at}.share`, from);
  return mixAlbedo({ covers: [{ fraction, albedo: albedoOf(ice) }], bare: open });
}

/**
 * The cover whose share is what the others leave is the one that says `"rest"`, or else the last one, so that every other
 * share can be changed and the surface stays complete.
 */
function openAlbedo(covers: readonly Placed[], albedoOf: AlbedoOf, { wire }: Sources): Value {
  const rest = covers.findIndex(({ cover }) => cover.share === "rest");
  const last = rest < 0 ? covers.length - 1 : rest;
  const bare = albedoOf(covers[last] as Placed);
  const others = covers.filter((_, i) => i !== last);
  if (others.length === 0) return bare;
  return mixAlbedo({
    covers: others.map((each) => ({ fraction: wire(`${each.at}.share`), albedo: albedoOf(each) })),
    bare,
  });
}
