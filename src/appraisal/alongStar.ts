// The given of a planet's loop that stands for the brightness of its star.
import type { Brightening } from "../branches/brightening.ts";
import type { Loop } from "../loop/types.ts";
import type { Planet } from "../planet/planetTypes.ts";
import { type ReadPlanetOptions, readPlanet } from "../planet/readPlanet.ts";
import { brighteningOf } from "./starBrightening.ts";

/** A budget that depends on its star through one given. */
export interface AlongStar {
  /** The planet's own loop, or the same budget with a luminosity in place of radius and effective temperature. */
  readonly loop: Loop;
  /** A luminosity or `orbit.flux`. */
  readonly along: string;
  readonly now: number;
  readonly brightening: Brightening | null;
}

/**
 * The given to follow as the star brightens; null where there are several stars. A star that is told by radius and effective
 * temperature is told by its luminosity as well, which then comes first.
 */
export function alongStar(planet: Planet, options: ReadPlanetOptions): AlongStar | null {
  const { stars } = planet.facts;
  if (has(planet, "orbit.flux")) return follow(planet, "orbit.flux");
  const [star] = stars;
  if (!star || stars.length > 1) return null;
  const along = `${star.path}.luminosity`;
  if (has(planet, along)) return follow(planet, along);
  if (star.luminosity === null) return null;
  const { description } = planet;
  const luminosity = { value: star.luminosity, unit: "W" };
  const lit = Array.isArray(description.star)
    ? [{ ...description.star[0], luminosity }]
    : { ...description.star, luminosity };
  const told = readPlanet({ ...description, star: lit }, options);
  return has(told, along) ? follow(told, along) : null;
}

const has = (planet: Planet, name: string): boolean =>
  planet.loop.givens.some((given) => given.name === name);

function follow({ loop, facts }: Planet, along: string): AlongStar {
  const now = loop.givens.find((given) => given.name === along)?.value as number;
  return { loop, along, now, brightening: brighteningOf(facts.stars) };
}
