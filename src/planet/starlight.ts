// The flux that reaches the planet: at the semi-major axis, and in the mean over its orbit.
import { add } from "../graph/operations.ts";
import type { Value } from "../graph/quantity.ts";
import { fail } from "../ground/errors.ts";
import { orbitMeanFlux } from "../orbit/orbitMeanFlux.ts";
import { temperatureMeanFlux } from "../orbit/temperatureMeanFlux.ts";
import { combinedFlux } from "../star/combinedFlux.ts";
import { stellarFlux } from "../star/stellarFlux.ts";
import { companionsOf, type DescribedStar, hostsOf, type Lit, starsOf } from "./stars.ts";
import { direct, distanceWays, luminosityWays, type Way } from "./ways.ts";
import type { Wire } from "./wire.ts";

/**
 * All ways to the flux that the stars which the planet orbits give at the semi-major axis, W m⁻²; the first is used.
 * Throws `missing`.
 */
export function fluxWays(d: Lit): Way[] {
  const ways: Way[] = [];
  const luminosities = hostsOf(d).map((host) => luminosityWays(host)[0]);
  const [distance] = distanceWays(d);
  if (distance && luminosities.every((way) => way !== undefined)) {
    ways.push({
      uses: [...luminosities.flatMap((way) => way.uses), ...distance.uses],
      of: (wire) => {
        const lights = luminosities.map((way) => way.of(wire));
        const at = distance.of(wire);
        return fluxOf(lights.map((luminosity) => ({ luminosity, distance: at })));
      },
    });
  }
  if (d.orbit.flux !== undefined) ways.push(direct("orbit.flux"));
  if (ways.length === 0) failIncomplete(d, distance !== undefined);
  return ways;
}

/** The flux that the planet receives in the mean over its orbit, W m⁻² normal to the beam. */
export function meanFlux(d: Lit, wire: Wire): Value {
  const own = overOrbit(d, wire, (fluxWays(d)[0] as Way).of(wire));
  const others = companionsOf(d);
  if (others.length === 0) return own;
  return add(own, fluxOf(others.map((star) => companionPlace(star, wire))));
}

/** What a flux at the semi-major axis is in the mean over the orbit. */
export function overOrbit({ orbit }: Lit, wire: Wire, fluxAtSemiMajorAxis: Value): Value {
  const { eccentricity, average } = orbit;
  if (eccentricity === undefined || average === undefined) return fluxAtSemiMajorAxis;
  const ports = { fluxAtSemiMajorAxis, eccentricity: wire("orbit.eccentricity") };
  return average === "flux" ? orbitMeanFlux(ports) : temperatureMeanFlux(ports);
}

type Place = { readonly luminosity: Value; readonly distance: Value };

/** Luminosity and distance of a star that the planet does not orbit. Throws `missing`. */
export function companionPlace(star: DescribedStar, wire: Wire): Place {
  const [luminosity] = luminosityWays(star);
  if (!luminosity)
    return missing(`${star.path}.luminosity`, "the luminosity, or radius and effectiveTemperature");
  return { luminosity: luminosity.of(wire), distance: wire(`${star.path}.distance`) };
}

const fluxOf = (stars: readonly Place[]): Value =>
  stars.length === 1 ? stellarFlux(stars[0] as Place) : combinedFlux({ stars });

const missing = (path: string, allowed: string) => fail("missing", { path, value: undefined, allowed });

const failLuminosity = ({ path }: DescribedStar): never =>
  missing(`${path}.luminosity`, "the luminosity, or radius and effectiveTemperature, or orbit.flux");

function failIncomplete(d: Lit, hasDistance: boolean): never {
  const { orbit } = d;
  const dark = hostsOf(d).find((host) => luminosityWays(host).length === 0);
  if (hasDistance) return failLuminosity(dark ?? (starsOf(d)[0] as DescribedStar));
  const [first] = hostsOf(d) as [DescribedStar];
  const massless = hostsOf(d).find(({ star }) => star.mass === undefined) ?? first;
  if (orbit.period !== undefined)
    return missing(`${massless.path}.mass`, "the mass of the star, for the period");
  if (orbit.distanceInStellarRadii !== undefined)
    return missing(`${first.path}.radius`, "the radius of the star, for the distance in stellar radii");
  return missing("orbit.semiMajorAxis", "semiMajorAxis, period, distanceInStellarRadii or flux");
}
