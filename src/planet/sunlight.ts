// What becomes of sunlight on its way to the surface: reflected, absorbed aloft, absorbed below.
import { cloudShareAbsorbed } from "../albedo/cloudShareAbsorbed.ts";
import { cloudyAlbedo } from "../albedo/cloudyAlbedo.ts";
import { mixAlbedo } from "../albedo/mixAlbedo.ts";
import { surfaceShareBelowCloud } from "../albedo/surfaceShareBelowCloud.ts";
import { mix, sub } from "../graph/operations.ts";
import type { Value } from "../graph/quantity.ts";
import type { PlanetDescription } from "./planetShape.ts";
import { reflection } from "./reflection.ts";
import { callLaw, type Sources, type Wire } from "./wire.ts";

/** Shares of the sunlight that falls on the planet; albedo, surface and aloft make 1. */
export interface SharedSunlight {
  /** What goes back to space. */
  readonly albedo: Value;
  /** What the surface absorbs, and what air and clouds do; null where the description does not tell them apart. */
  readonly surface: Value | null;
  readonly aloft: Value | null;
  /** What the surface reflects of the light that reaches it; null where the description does not say. */
  readonly surfaceAlbedo: Value | null;
}

/** True where air or clouds reflect or absorb sunlight, so that the planetary albedo is an output. */
export const hasSky = ({ clouds, atmosphere }: Pick<PlanetDescription, "clouds" | "atmosphere">): boolean =>
  [clouds, atmosphere].some((l) => l?.reflectance !== undefined || l?.absorptance !== undefined);

/** The shares of sunlight of a description. */
export function sharedSunlight(d: PlanetDescription, from: Sources): SharedSunlight {
  if (d.albedo !== undefined)
    return { albedo: reflection(d, "albedo", from), surface: null, aloft: null, surfaceAlbedo: null };
  const surfaceAlbedo = reflection(d, "surface", from);
  if (!hasSky(d)) return { albedo: surfaceAlbedo, surface: null, aloft: null, surfaceAlbedo };
  const clear = below("atmosphere", d.atmosphere, surfaceAlbedo, from.wire);
  if (d.clouds?.reflectance === undefined) return { ...clear, surfaceAlbedo };
  const cloudy = below("clouds", d.clouds, surfaceAlbedo, from.wire);
  const share = from.wire("clouds.share");
  return {
    albedo: mixAlbedo({ covers: [{ fraction: share, albedo: cloudy.albedo }], bare: clear.albedo }),
    surface: mix(clear.surface, cloudy.surface, share),
    aloft: mix(clear.aloft, cloudy.aloft, share),
    surfaceAlbedo,
  };
}

interface Layer {
  readonly reflectance?: unknown;
  readonly absorptance?: unknown;
}

/** The shares of sunlight under one layer; all reaches the surface where there is none. */
function below(path: string, layer: Layer | undefined, surface: Value, wire: Wire) {
  const { reflectance, absorptance } = layer ?? {};
  if (reflectance === undefined) return { albedo: surface, surface: sub(1, surface), aloft: 0 };
  const written = { reflectance, ...(absorptance === undefined ? {} : { absorptance }) };
  const bound = { surface, ...(absorptance === undefined ? { absorptance: 0 } : {}) };
  const of = (law: unknown) => callLaw(law, { path, written, wire, bound });
  return { albedo: of(cloudyAlbedo), surface: of(surfaceShareBelowCloud), aloft: of(cloudShareAbsorbed) };
}
