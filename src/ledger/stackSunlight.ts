// Sunlight through absorbing layers to a surface and back, so that the planetary albedo comes out instead of going in.
import { deepFreeze } from "../ground/deepFreeze.ts";
import { checkedNumber } from "../ground/range.ts";
import { fieldsOf, listed } from "./written.ts";

/** What falls on a stack of layers, from the top down. */
export interface StackSunlightOptions {
  /** Sunlight at the top, W m⁻² of the planet's whole area: S/4 for a sphere. */
  readonly incoming: number;
  /** Share that the surface reflects. */
  readonly surfaceAlbedo: number;
  /** Share that each layer takes, of the light going down and of the light coming back up. */
  readonly layers: readonly { readonly absorptivity: number }[];
}

/** Where sunlight goes, W m⁻². */
export interface StackSunlight {
  /** Absorbed by each layer, from the top down. */
  readonly layers: readonly number[];
  /** Absorbed by the surface. */
  readonly surface: number;
  /** Back to space. */
  readonly reflected: number;
  /** Reflected over incoming. */
  readonly planetaryAlbedo: number;
  /** From the top (0) to the surface (N). */
  readonly interfaces: readonly { readonly down: number; readonly up: number }[];
}

const PATH = "stackSunlight";

/**
 * Sunlight through absorbing layers to a surface and back: each layer takes the share a of what goes down and of what
 * comes up, the surface reflects the share α once, layers reflect nothing. Planetary albedo: α·Π(1 − a)². In W m⁻².
 * Incoming from 0; albedo and absorptivities between 0 and 1. What it gives for layers and surface goes into
 * `leakyStackLedger`. Throws `missing`, `not-a-number`, `out-of-range`, `unknown-name`, `unreadable`.
 * Source: Beer's law for two beams that do not scatter.
 */
export function stackSunlight(options: StackSunlightOptions): StackSunlight {
  const given = fieldsOf(options, PATH, ["incoming", "surfaceAlbedo", "layers"]);
  const incoming = checkedNumber(given.incoming, `${PATH}.incoming`, "W m-2", [0, 1e9]);
  const albedo = checkedNumber(given.surfaceAlbedo, `${PATH}.surfaceAlbedo`, "1", [0, 1]);
  const taken = listed(given.layers, `${PATH}.layers`, ["absorptivity"]).map((layer, i) =>
    checkedNumber(layer.absorptivity, `${PATH}.layers[${i}].absorptivity`, "1", [0, 1]),
  );
  const through = taken.map((share) => 1 - share);
  const down = passed(incoming, through);
  const ground = down.at(-1) as number;
  const up = passed(ground * albedo, [...through].reverse()).reverse();
  return deepFreeze({
    layers: taken.map((share, i) => share * ((down[i] as number) + (up[i + 1] as number))),
    surface: ground * (1 - albedo),
    reflected: up[0] as number,
    planetaryAlbedo: through.reduce((left, share) => left * share * share, albedo),
    interfaces: down.map((value, i) => ({ down: value, up: up[i] as number })),
  });
}

/** A beam before, between and after what it passes. */
function passed(beam: number, shares: readonly number[]): number[] {
  const beams = [beam];
  for (const share of shares) beams.push((beams.at(-1) as number) * share);
  return beams;
}
