// Which inputs give a quantity of the star or the orbit, in which order of preference.
import { add, mul } from "../graph/operations.ts";
import type { Value } from "../graph/quantity.ts";
import { blackbodyTemperature } from "../greenhouse/blackbodyTemperature.ts";
import { orbitalPeriod } from "../orbit/orbitalPeriod.ts";
import { semiMajorAxis } from "../orbit/semiMajorAxis.ts";
import { stellarFlux } from "../star/stellarFlux.ts";
import { stellarLuminosity } from "../star/stellarLuminosity.ts";
import type { PlanetDescription } from "./planetShape.ts";
import { type DescribedStar, hostsOf, type Lit } from "./stars.ts";
import type { Wire } from "./wire.ts";

/** One way to a quantity. */
export interface Way {
  /** The inputs that it takes. */
  readonly uses: readonly string[];
  readonly of: (wire: Wire) => Value;
  /** What may be written where it gives something else. */
  readonly instead?: string;
}

/** The input at a path as it is. */
export const direct = (path: string): Way => ({ uses: [path], of: (wire) => wire(path) });

/** All ways to the luminosity of a star, W; the first is used. */
export function luminosityWays({ path, star }: DescribedStar): Way[] {
  const ways: Way[] = [];
  if (star.luminosity !== undefined) ways.push(direct(`${path}.luminosity`));
  if (star.radius !== undefined && star.effectiveTemperature !== undefined) {
    const [radius, temperature] = [`${path}.radius`, `${path}.effectiveTemperature`] as const;
    ways.push({
      uses: [radius, temperature],
      of: (wire) => stellarLuminosity({ radius: wire(radius), effectiveTemperature: wire(temperature) }),
    });
  }
  return ways;
}

/** All ways to the effective temperature of a star, K; the first is used. */
export function temperatureWays({ path, star }: DescribedStar): Way[] {
  const ways: Way[] = [];
  if (star.effectiveTemperature !== undefined) ways.push(direct(`${path}.effectiveTemperature`));
  if (star.luminosity !== undefined && star.radius !== undefined) {
    const [luminosity, radius] = [`${path}.luminosity`, `${path}.radius`] as const;
    ways.push({
      uses: [luminosity, radius],
      of: (wire) =>
        blackbodyTemperature({
          flux: stellarFlux({ luminosity: wire(luminosity), distance: wire(radius) }),
        }),
    });
  }
  return ways;
}

/** All ways to the semi-major axis, m; the first is used. */
export function distanceWays(d: Lit): Way[] {
  const ways: Way[] = [];
  const hosts = hostsOf(d);
  const [only, second] = hosts;
  if (d.orbit.semiMajorAxis !== undefined) ways.push(direct("orbit.semiMajorAxis"));
  if (d.orbit.period !== undefined && hosts.every(({ star }) => star.mass !== undefined)) {
    ways.push({
      uses: ["orbit.period", ...hosts.map(({ path }) => `${path}.mass`)],
      of: (wire) => semiMajorAxis({ period: wire("orbit.period"), mass: massOf(d, wire) }),
    });
  }
  if (d.orbit.distanceInStellarRadii !== undefined && !second && only?.star.radius !== undefined) {
    const [ratio, radius] = ["orbit.distanceInStellarRadii", `${only.path}.radius`] as const;
    ways.push({ uses: [ratio, radius], of: (wire) => mul(wire(ratio), wire(radius)) });
  }
  return ways;
}

/** All ways to the orbital period, s; the first is used. */
export function periodWays(d: Lit): Way[] {
  const ways: Way[] = [];
  if (d.orbit.period !== undefined) ways.push(direct("orbit.period"));
  const hosts = hostsOf(d);
  const [distance] = distanceWays(d);
  if (distance && hosts.every(({ star }) => star.mass !== undefined)) {
    ways.push({
      uses: [...new Set([...distance.uses, ...hosts.map(({ path }) => `${path}.mass`)])],
      of: (wire) => orbitalPeriod({ semiMajorAxis: distance.of(wire), mass: massOf(d, wire) }),
    });
  }
  return ways;
}

/** All ways to the pressure at the surface, Pa; the first is used. */
export function pressureWays(d: Pick<PlanetDescription, "atmosphere" | "heatCapacity">): Way[] {
  const ways: Way[] = [];
  if (d.atmosphere?.pressure !== undefined) ways.push(direct("atmosphere.pressure"));
  const { heatCapacity } = d;
  if (typeof heatCapacity === "object" && "law" in heatCapacity && heatCapacity.law === "atmosphereCapacity")
    ways.push(direct("heatCapacity.surfacePressure"));
  return ways;
}

/** The mass that the planet orbits, kg. */
const massOf = (d: Lit, wire: Wire): Value =>
  hostsOf(d)
    .map(({ path }) => wire(`${path}.mass`))
    .reduce((all, mass) => add(all, mass));
