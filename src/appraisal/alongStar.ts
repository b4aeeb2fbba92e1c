// The given of a planet's loop that stands for the brightness of its star.
import type { Brightening } from "../branches/brightening.ts";
import type { Planet } from "../planet/planetTypes.ts";
import { type ReadPlanetOptions, readPlanet } from "../planet/readPlanet.ts";

/** A planet whose budget depends on its star through one given. */
export interface AlongStar {
  readonly planet: Planet;
  /** `star.luminosity` or `orbit.flux`. */
  readonly along: string;
  readonly now: number;
  readonly brightening: Brightening | null;
}

/**
 * The given to follow as the star brightens; null where there are several stars. A star that is told by radius and effective
 * temperature is told by its luminosity instead, in the same planet.
 */
export function alongStar(planet: Planet, options: ReadPlanetOptions): AlongStar | null {
  const direct = ["star.luminosity", "orbit.flux"].find((name) => has(planet, name));
  if (direct !== undefined) return follow(planet, direct);
  const [star, ...others] = planet.facts.stars;
  const { description } = planet;
  if (!star || others.length > 0 || star.luminosity === null || Array.isArray(description.star)) return null;
  const { radius: _, effectiveTemperature: __, ...rest } = description.star ?? {};
  const luminosity = { value: star.luminosity, unit: "W" };
  const lit = readPlanet({ ...description, star: { ...rest, luminosity } }, options);
  return has(lit, "star.luminosity") ? follow(lit, "star.luminosity") : null;
}

const has = (planet: Planet, name: string): boolean =>
  planet.loop.givens.some((given) => given.name === name);

function follow(planet: Planet, along: string): AlongStar {
  const now = planet.loop.givens.find((given) => given.name === along)?.value as number;
  const rate = planet.facts.stars[0]?.brightening ?? null;
  return { planet, along, now, brightening: rate === null ? null : { rate } };
}
