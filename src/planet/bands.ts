// How much of the light that reaches the planet is visible, for surfaces that reflect it differently.
import { add, div, mul } from "../graph/operations.ts";
import type { Value } from "../graph/quantity.ts";
import { fail } from "../ground/errors.ts";
import { bandFraction } from "../star/bandFraction.ts";
import { stellarFlux } from "../star/stellarFlux.ts";
import { inBands } from "./covers.ts";
import type { PlanetDescription } from "./planetShape.ts";
import { companionPlace, fluxWays, overOrbit } from "./starlight.ts";
import { companionsOf, type DescribedStar, hostsOf, type Lit } from "./stars.ts";
import { luminosityWays, temperatureWays, type Way } from "./ways.ts";
import type { Wire } from "./wire.ts";

/** Where the two bands meet, m: as in Shields et al. 2013, Astrobiology 13, 715. */
const DIVIDING_WAVELENGTH = 0.7e-6;

/** True where a cover reflects visible and near-infrared light differently. */
export function hasBands({ albedo, surface }: PlanetDescription): boolean {
  const written = albedo ?? surface;
  return typeof written === "object" && "covers" in written && written.covers.some(inBands);
}

/** The visible share of a star's energy: as given, or that of a black body of its effective temperature. Throws `missing`. */
export function visibleShareOf(star: DescribedStar, wire: Wire): Value {
  if (star.star.visibleShare !== undefined) return wire(`${star.path}.visibleShare`);
  const [temperature] = temperatureWays(star);
  if (temperature) return bandFraction({ temperature: temperature.of(wire), to: DIVIDING_WAVELENGTH });
  return fail("missing", {
    path: `${star.path}.visibleShare`,
    value: undefined,
    allowed: "a number from 0 to 1, or effectiveTemperature, for covers in two bands",
  });
}

/** The visible share of all light that the planet receives over its orbit. */
export function visibleShare(d: Lit, wire: Wire): Value {
  const hosts = hostsOf(d);
  const own = hosts.length === 1 ? visibleShareOf(hosts[0] as DescribedStar, wire) : sharedOf(hosts, wire);
  const companions = companionsOf(d);
  if (companions.length === 0) return own;
  const hostFlux = overOrbit(d, wire, (fluxWays(d)[0] as Way).of(wire));
  const others = companions.map((star) => ({
    share: visibleShareOf(star, wire),
    weight: stellarFlux(companionPlace(star, wire)),
  }));
  return weighted([{ share: own, weight: hostFlux }, ...others]);
}

/** Stars at one distance count by their luminosities. Throws `missing`. */
function sharedOf(hosts: readonly DescribedStar[], wire: Wire): Value {
  return weighted(
    hosts.map((host) => {
      const [luminosity] = luminosityWays(host);
      if (luminosity) return { share: visibleShareOf(host, wire), weight: luminosity.of(wire) };
      const allowed = "the luminosity, or radius and effectiveTemperature, for covers in two bands";
      return fail("missing", { path: `${host.path}.luminosity`, value: undefined, allowed });
    }),
  );
}

interface Weighted {
  readonly share: Value;
  readonly weight: Value;
}

function weighted(parts: readonly Weighted[]): Value {
  const visible = parts.map(({ share, weight }) => mul(share, weight)).reduce((all, one) => add(all, one));
  return div(
    visible,
    parts.map(({ weight }) => weight).reduce((all, one) => add(all, one)),
  );
}
