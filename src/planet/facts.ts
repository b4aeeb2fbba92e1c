// What a description says of star, orbit and body in SI, given or following from what is given.
import type { TabledBrightening } from "../branches/brightening.ts";
import { apoastronFlux } from "../orbit/apoastronFlux.ts";
import { periastronFlux } from "../orbit/periastronFlux.ts";
import { visibleShareOf } from "./bands.ts";
import { tableOf } from "./brighteningTable.ts";
import type { CheckedPlanet } from "./checkedPlanet.ts";
import { fluxWays } from "./starlight.ts";
import { type DescribedStar, starsOf } from "./stars.ts";
import { distanceWays, luminosityWays, periodWays, pressureWays, temperatureWays, type Way } from "./ways.ts";

/** A star of a description. What is not given and does not follow is null. */
export interface StarFacts {
  readonly name: string | null;
  /** Where its values stand: `star`, or `star[0]` in a list. */
  readonly path: string;
  /** W. */
  readonly luminosity: number | null;
  /** m. */
  readonly radius: number | null;
  /** K. */
  readonly effectiveTemperature: number | null;
  /** kg. */
  readonly mass: number | null;
  /** Share of its energy below 0.7 µm, as given or of a black body. */
  readonly visibleShare: number | null;
  /** (dL/dt)/L, s⁻¹; null also where the star has a table. */
  readonly brightening: number | null;
  /** Its luminosity by time, s, and the time of today, as `tippingMargins` takes them. */
  readonly brighteningTable: TabledBrightening | null;
  /** Distance of a star that the planet does not orbit, m. */
  readonly distance: number | null;
}

/** What a description says of star, orbit and body, in SI; null where it is not given and does not follow. */
export interface PlanetFacts {
  readonly stars: readonly StarFacts[];
  /** m. */
  readonly semiMajorAxis: number | null;
  /** s. */
  readonly orbitalPeriod: number | null;
  readonly eccentricity: number;
  /** Flux of the stars that the planet orbits at the semi-major axis, at periastron and at apoastron, W m⁻². */
  readonly fluxAtSemiMajorAxis: number;
  readonly fluxAtPeriastron: number;
  readonly fluxAtApoastron: number;
  /** Flux of all stars in the mean that the description asks for, W m⁻². */
  readonly meanFlux: number;
  /** J m⁻² K⁻¹. */
  readonly heatCapacity: number | null;
  /** Pa. */
  readonly surfacePressure: number | null;
  /** K m⁻¹. */
  readonly lapseRate: number | null;
  /** s; that of the orbit for a locked planet. */
  readonly rotationPeriod: number | null;
  /** Whether it always shows one side to its star. */
  readonly locked: boolean | null;
  /** kg. */
  readonly mass: number | null;
  /** m. */
  readonly radius: number | null;
}

/** The facts of a planet. */
export function factsOf({
  description: d,
  inputs,
  numbers,
  trial,
  heatCapacity,
}: CheckedPlanet): PlanetFacts {
  const given = new Map(inputs.map(({ path, value }) => [path, value]));
  const at = (path: string): number | null => given.get(path) ?? null;
  const first = ([way]: readonly Way[]): number | null => (way ? (way.of(numbers) as number) : null);
  const starFacts = (star: DescribedStar): StarFacts => ({
    name: star.star.name ?? null,
    path: star.path,
    luminosity: first(luminosityWays(star)),
    radius: at(`${star.path}.radius`),
    effectiveTemperature: first(temperatureWays(star)),
    mass: at(`${star.path}.mass`),
    visibleShare:
      star.star.visibleShare === undefined && temperatureWays(star).length === 0
        ? null
        : (visibleShareOf(star, numbers) as number),
    brightening: at(`${star.path}.brightening`),
    brighteningTable: tableOf(star, numbers),
    distance: at(`${star.path}.distance`),
  });
  const eccentricity = at("orbit.eccentricity") ?? 0;
  const fluxAtSemiMajorAxis = first(fluxWays(d)) as number;
  const orbitalPeriod = first(periodWays(d));
  const locked = d.rotation?.locked ?? null;
  return {
    stars: d.star === undefined ? [] : starsOf(d).map(starFacts),
    semiMajorAxis: first(distanceWays(d)),
    orbitalPeriod,
    eccentricity,
    fluxAtSemiMajorAxis,
    fluxAtPeriastron: periastronFlux({ fluxAtSemiMajorAxis, eccentricity }),
    fluxAtApoastron: apoastronFlux({ fluxAtSemiMajorAxis, eccentricity }),
    meanFlux: trial.flux as number,
    heatCapacity: d.heatCapacity === "unknown" ? null : heatCapacity,
    surfacePressure: first(pressureWays(d)),
    lapseRate: at("atmosphere.lapseRate"),
    rotationPeriod: at("rotation.period") ?? (locked ? orbitalPeriod : null),
    locked,
    mass: at("mass"),
    radius: at("radius"),
  };
}
