// The flux that reaches the planet: which inputs give it, in which order of preference.

import { mul } from "../graph/operations.ts";
import type { Value } from "../graph/quantity.ts";
import { fail } from "../ground/errors.ts";
import { orbitMeanFlux } from "../orbit/orbitMeanFlux.ts";
import { semiMajorAxis } from "../orbit/semiMajorAxis.ts";
import { temperatureMeanFlux } from "../orbit/temperatureMeanFlux.ts";
import { stellarFlux } from "../star/stellarFlux.ts";
import { stellarLuminosity } from "../star/stellarLuminosity.ts";
import type { PlanetDescription } from "./planetShape.ts";
import type { Wire } from "./wire.ts";

/** One way to the same quantity. */
export interface Way {
  /** The inputs that it takes. */
  readonly uses: readonly string[];
  readonly of: (wire: Wire) => Value;
}

/** All ways to the luminosity of the star, W; the first is used. */
export function luminosityWays({ star = {} }: PlanetDescription): Way[] {
  const ways: Way[] = [];
  if (star.luminosity !== undefined) ways.push(direct("star.luminosity"));
  if (star.radius !== undefined && star.effectiveTemperature !== undefined) {
    const [radius, temperature] = ["star.radius", "star.effectiveTemperature"] as const;
    ways.push({
      uses: [radius, temperature],
      of: (wire) => stellarLuminosity({ radius: wire(radius), effectiveTemperature: wire(temperature) }),
    });
  }
  return ways;
}

/** All ways to the semi-major axis, m; the first is used. */
export function distanceWays({ star = {}, orbit }: PlanetDescription): Way[] {
  const ways: Way[] = [];
  if (orbit.semiMajorAxis !== undefined) ways.push(direct("orbit.semiMajorAxis"));
  if (orbit.period !== undefined && star.mass !== undefined) {
    const [period, mass] = ["orbit.period", "star.mass"] as const;
    ways.push({
      uses: [period, mass],
      of: (wire) => semiMajorAxis({ period: wire(period), mass: wire(mass) }),
    });
  }
  if (orbit.distanceInStellarRadii !== undefined && star.radius !== undefined) {
    const [ratio, radius] = ["orbit.distanceInStellarRadii", "star.radius"] as const;
    ways.push({ uses: [ratio, radius], of: (wire) => mul(wire(ratio), wire(radius)) });
  }
  return ways;
}

/** All ways to the flux at the distance of the semi-major axis, W m⁻²; the first is used. Throws `missing`. */
export function fluxWays(d: PlanetDescription): Way[] {
  const ways: Way[] = [];
  const [luminosity] = luminosityWays(d);
  const [distance] = distanceWays(d);
  if (luminosity && distance) {
    ways.push({
      uses: [...luminosity.uses, ...distance.uses],
      of: (wire) => stellarFlux({ luminosity: luminosity.of(wire), distance: distance.of(wire) }),
    });
  }
  if (d.orbit.flux !== undefined) ways.push(direct("orbit.flux"));
  if (ways.length === 0) failIncomplete(d, distance !== undefined);
  return ways;
}

/** The stellar flux that the planet receives in the mean over its orbit, W m⁻² normal to the beam. */
export function meanFlux(d: PlanetDescription, wire: Wire): Value {
  const { eccentricity, average } = d.orbit;
  const fluxAtSemiMajorAxis = (fluxWays(d)[0] as Way).of(wire);
  if (eccentricity === undefined || average === undefined) return fluxAtSemiMajorAxis;
  const ports = { fluxAtSemiMajorAxis, eccentricity: wire("orbit.eccentricity") };
  return average === "flux" ? orbitMeanFlux(ports) : temperatureMeanFlux(ports);
}

const direct = (path: string): Way => ({ uses: [path], of: (wire) => wire(path) });

function failIncomplete({ orbit }: PlanetDescription, hasDistance: boolean): never {
  const missing = (path: string, allowed: string) => fail("missing", { path, value: undefined, allowed });
  if (hasDistance)
    return missing("star.luminosity", "the luminosity, or radius and effectiveTemperature, or orbit.flux");
  if (orbit.period !== undefined) return missing("star.mass", "the mass of the star, for the period");
  if (orbit.distanceInStellarRadii !== undefined)
    return missing("star.radius", "the radius of the star, for the distance in stellar radii");
  return missing("orbit.semiMajorAxis", "semiMajorAxis, period, distanceInStellarRadii or flux");
}
