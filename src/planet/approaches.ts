// How near the planet comes to the stars that it orbits, against how large they are.

import { blackbodyFlux } from "../greenhouse/blackbodyFlux.ts";
import { stellarFlux } from "../star/stellarFlux.ts";
import { type DescribedStar, hostsOf, type Lit } from "./stars.ts";
import { distanceWays, luminosityWays } from "./ways.ts";
import type { Numbers } from "./wire.ts";

/** The periastron and the radius of each star for which both follow, m. */
export function approaches(d: Lit, numbers: Numbers): { periastron: number; radius: number }[] {
  const distance = distanceOf(d, numbers);
  if (distance === undefined) return [];
  const eccentricity = d.orbit.eccentricity === undefined ? 0 : numbers("orbit.eccentricity");
  const periastron = distance * (1 - eccentricity);
  return hostsOf(d).flatMap((host) => {
    const radius = radiusOf(host, numbers);
    return radius === undefined ? [] : [{ periastron, radius }];
  });
}

function distanceOf(d: Lit, numbers: Numbers): number | undefined {
  const [stated] = distanceWays(d);
  if (stated) return stated.of(numbers) as number;
  // without a distance the flux is given, or there would be none
  const luminosities = hostsOf(d).map((host) => luminosityOf(host, numbers));
  if (!luminosities.every((one) => one !== undefined)) return undefined;
  const luminosity = luminosities.reduce((all, one) => all + one);
  return distanceAt({ luminosity, flux: numbers("orbit.flux") });
}

function radiusOf({ path, star }: DescribedStar, numbers: Numbers): number | undefined {
  if (star.radius !== undefined) return numbers(`${path}.radius`);
  const luminosity = luminosityOf({ path, star }, numbers);
  if (star.effectiveTemperature === undefined || luminosity === undefined) return undefined;
  const flux = blackbodyFlux({ temperature: numbers(`${path}.effectiveTemperature`) });
  return distanceAt({ luminosity, flux });
}

const luminosityOf = (star: DescribedStar, numbers: Numbers): number | undefined =>
  luminosityWays(star)[0]?.of(numbers) as number | undefined;

/** Where a star has this flux: the inverse-square law from its value at 1 m. */
const distanceAt = ({ luminosity, flux }: { luminosity: number; flux: number }): number =>
  Math.sqrt(stellarFlux({ luminosity, distance: 1 }) / flux);
