// The light that reaches a planet, along its orbit.
import { orbitMeanFlux } from "../orbit/orbitMeanFlux.ts";
import type { PlanetFacts } from "../planet/facts.ts";
import type { Starlight } from "./appraisal.ts";
import { statedFlux } from "./stated.ts";

/** The starlight of a planet. Stars that it does not orbit count in the mean that the description asks for, not here. */
export function starlightOf(facts: PlanetFacts): Starlight {
  const { stars, semiMajorAxis, orbitalPeriod, eccentricity, fluxAtSemiMajorAxis } = facts;
  const hosts = stars.filter((star) => star.distance === null);
  const known = hosts.length > 0 && hosts.every((star) => star.luminosity !== null);
  return {
    luminosity: known ? hosts.reduce((sum, star) => sum + (star.luminosity as number), 0) : null,
    semiMajorAxis,
    period: orbitalPeriod,
    eccentricity,
    atSemiMajorAxis: statedFlux(fluxAtSemiMajorAxis),
    mean: statedFlux(orbitMeanFlux({ fluxAtSemiMajorAxis, eccentricity })),
    periastron: statedFlux(facts.fluxAtPeriastron),
    apoastron: statedFlux(facts.fluxAtApoastron),
  };
}
