// The light that reaches a planet, along its orbit.
import { orbitMeanFlux } from "../orbit/orbitMeanFlux.ts";
import type { PlanetFacts } from "../planet/facts.ts";
import { combinedFlux } from "../star/combinedFlux.ts";
import type { Starlight } from "./appraisedLight.ts";
import { statedFlux } from "./stated.ts";

/** The starlight of a planet: of the stars that it orbits, and apart from that of all others. */
export function starlightOf(facts: PlanetFacts): Starlight {
  const { stars, semiMajorAxis, orbitalPeriod, eccentricity, fluxAtSemiMajorAxis } = facts;
  const hosts = stars.filter((star) => star.distance === null);
  const known = hosts.length > 0 && hosts.every((star) => star.luminosity !== null);
  // a companion without a luminosity is refused when the planet is read
  const others = stars.filter((star) => star.distance !== null) as { luminosity: number; distance: number }[];
  const shining = others.map(({ luminosity, distance }) => ({ luminosity, distance }));
  return {
    luminosity: known ? hosts.reduce((sum, star) => sum + (star.luminosity as number), 0) : null,
    semiMajorAxis,
    period: orbitalPeriod,
    eccentricity,
    atSemiMajorAxis: statedFlux(fluxAtSemiMajorAxis),
    mean: statedFlux(orbitMeanFlux({ fluxAtSemiMajorAxis, eccentricity })),
    periastron: statedFlux(facts.fluxAtPeriastron),
    apoastron: statedFlux(facts.fluxAtApoastron),
    companions: shining.length === 0 ? null : statedFlux(combinedFlux({ stars: shining })),
    taken: statedFlux(facts.meanFlux),
  };
}

/** Flux of all stars together where those that the planet orbits give `own`, W m⁻². */
export const withCompanions = (own: number, { companions }: Starlight): number =>
  own + (companions?.flux ?? 0);
