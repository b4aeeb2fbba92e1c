// The stars of a description, each with the path under which its values stand.
import type { PlanetDescription } from "./planetShape.ts";

/** As much of a description as tells its light. */
export type Lit = Pick<PlanetDescription, "star" | "orbit">;

type Listed = Extract<PlanetDescription["star"], readonly unknown[]>[number];

/** A star and its path, `star` or `star[0]`. */
export interface DescribedStar {
  readonly path: string;
  readonly star: Listed;
}

/** All stars, in the order in which they are listed. */
export function starsOf({ star }: Pick<Lit, "star">): DescribedStar[] {
  if (!Array.isArray(star)) return [{ path: "star", star: (star ?? {}) as Listed }];
  return (star as readonly Listed[]).map((each, i) => ({ path: `star[${i}]`, star: each }));
}

/** The stars that the planet orbits: those without a distance of their own. */
export const hostsOf = (d: Lit): DescribedStar[] => starsOf(d).filter(({ star }) => !star.distance);

/** The other stars, each at a distance of its own. */
export const companionsOf = (d: Lit): DescribedStar[] => starsOf(d).filter(({ star }) => star.distance);
