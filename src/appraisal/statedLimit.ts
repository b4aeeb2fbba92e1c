// A limit, and where the planet is.
import type { StatedFlux } from "./appraisedLight.ts";

/**
 * A published limit of the habitable zone, or one of the planet's own budget, and where the planet is. What a planet is like
 * there does not follow.
 */
export interface StatedLimit {
  /** What the limit is, such as `runaway greenhouse`. */
  readonly name: string;
  /** Which edge of the zone; null for a limit of the planet's own budget. */
  readonly edge: "inner" | "outer" | null;
  /** Where it is published; null for a limit of the planet's own budget. */
  readonly paper: string | null;
  readonly doi: string | null;
  /** Mass of the planet for which it was computed, Earth masses. */
  readonly massEarths: number | null;
  /** Flux at the limit. */
  readonly limit: StatedFlux;
  /** Distance at which the star gives this flux, m; null where its luminosity is not known. */
  readonly distance: number | null;
  /** Mean flux of the planet over the flux of the limit. */
  readonly ratio: number;
  /** Whether the planet gets more light than at the limit, less, or one after the other along its orbit. */
  readonly position: "nearer" | "farther" | "crosses";
  /** K, at the limit; null where none is published. */
  readonly temperature: number | null;
}
