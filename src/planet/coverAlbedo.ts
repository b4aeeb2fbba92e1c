// The albedo of a surface of several covers, whose shares stay free to be set and swept.
import { mixAlbedo } from "../albedo/mixAlbedo.ts";
import { twoBandAlbedo } from "../albedo/twoBandAlbedo.ts";
import type { Value } from "../graph/quantity.ts";
import { visibleShare } from "./bands.ts";
import { type Cover, isIce } from "./covers.ts";
import type { Lit } from "./stars.ts";
import { callWritten, type Sources } from "./wire.ts";

type Numbered = readonly { readonly cover: Cover; readonly at: string }[];

/** Σ shareᵢ·albedoᵢ over the open surface, with ice over a share of all of it. */
export function coverAlbedo(d: Lit, covers: readonly Cover[], path: string, from: Sources): Value {
  const numbered = covers.map((cover, i) => ({ cover, at: `${path}.covers[${i}]` }));
  const ice = numbered.filter(({ cover }) => isIce(cover));
  const open = openAlbedo(
    d,
    numbered.filter(({ cover }) => !isIce(cover)),
    from,
  );
  if (ice.length === 0) return open;
  return mixAlbedo({
    covers: ice.map(({ cover, at }) => ({
      fraction: callWritten(cover.share as { law: string }, `${at}.share`, from),
      albedo: albedoOf(d, cover, at, from),
    })),
    bare: open,
  });
}

/**
 * The cover whose share is what the others leave is the one that says `"rest"`, or else the last one, so that every other
 * share can be changed and the surface stays complete.
 */
function openAlbedo(d: Lit, covers: Numbered, from: Sources): Value {
  const rest = covers.findIndex(({ cover }) => cover.share === "rest");
  const last = rest < 0 ? covers.length - 1 : rest;
  const albedoAt = ({ cover, at }: Numbered[number]) => albedoOf(d, cover, at, from);
  const bare = albedoAt(covers[last] as Numbered[number]);
  if (covers.length === 1) return bare;
  const others = covers.filter((_, i) => i !== last);
  return mixAlbedo({
    covers: others.map((each) => ({ fraction: from.wire(`${each.at}.share`), albedo: albedoAt(each) })),
    bare,
  });
}

function albedoOf(d: Lit, cover: Cover, at: string, { wire }: Sources): Value {
  if ("albedo" in cover) return wire(`${at}.albedo`);
  const [visible, nearInfrared] = [wire(`${at}.visible`), wire(`${at}.nearInfrared`)];
  return twoBandAlbedo({ visible, nearInfrared, visibleShare: visibleShare(d, wire) });
}
