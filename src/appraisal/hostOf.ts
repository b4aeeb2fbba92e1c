// The star for whose light limits and cautions hold.
import type { PlanetFacts, StarFacts } from "../planet/facts.ts";

/** The first star that the planet orbits; undefined where only a flux is given. */
export const hostOf = ({ stars }: Pick<PlanetFacts, "stars">): StarFacts | undefined =>
  stars.find((star) => star.distance === null);
