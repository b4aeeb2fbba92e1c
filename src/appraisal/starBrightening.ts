// How a star brightens, as the times of margins have it.
import { type Brightening, luminosityNow } from "../branches/brightening.ts";
import type { Margin } from "../branches/margins.ts";
import type { StarFacts } from "../planet/facts.ts";

/** How the one star of a planet brightens or fades, as its description says. */
export interface StarBrightening {
  /** (dL/dt)/L, s⁻¹; null for a table. */
  readonly rate: number | null;
  /** What a table holds from today on; null for a rate, which has no end. */
  readonly table: {
    /** From today to its last time, s. */
    readonly lasts: number;
    /** Least, most and last luminosity from today on, over today's. */
    readonly least: number;
    readonly most: number;
    readonly last: number;
  } | null;
}

/** Null where nothing is described, and where several stars shine. */
export function starBrightening(stars: readonly StarFacts[]): StarBrightening | null {
  const [star, another] = stars;
  if (!star || another) return null;
  const { brightening: rate, brighteningTable: tabled } = star;
  if (!tabled) return rate === null ? null : { rate, table: null };
  const today = luminosityNow(tabled);
  const later = tabled.table.filter(({ time }) => time > tabled.now);
  const factors = later.map(({ luminosity }) => luminosity / today);
  return {
    rate: null,
    table: {
      lasts: (later.at(-1)?.time ?? tabled.now) - tabled.now,
      least: factors.reduce((a, b) => Math.min(a, b), 1),
      most: factors.reduce((a, b) => Math.max(a, b), 1),
      last: factors.at(-1) ?? 1,
    },
  };
}

/** The same as `tippingMargins` takes it. */
export function brighteningOf(stars: readonly StarFacts[]): Brightening | null {
  const [star, another] = stars;
  if (!star || another) return null;
  return star.brighteningTable ?? (star.brightening === null ? null : { rate: star.brightening });
}

/** Whether an end of a branch is not met before the table ends; one to which the star never turns is no matter of its end. */
export const isBeyondTable = (
  { direction, end, time }: Margin,
  brightening: StarBrightening | null,
): boolean =>
  time === null &&
  end.kind !== "between" &&
  brightening?.table != null &&
  (direction === "rise" || brightening.table.least < 1);
