// Limits of the habitable zone.
import {
  ASTRONOMICAL_UNIT,
  HABITABLE_ZONE_LIMITS,
  type HabitableZoneLimit,
  habitableZoneDistance,
  habitableZoneFlux,
  interpolatedRunawayFlux,
  SOLAR_LUMINOSITY,
} from "../../src/index.ts";
import zone from "../reference/computed/habitable_zone.json" with { type: "json" };
import { type Check, halfUnit, ROUNDED, ROUNDING } from "./check.ts";
import { ANGLADA_ESCUDE, KOPPARAPU_2013, KOPPARAPU_2014 } from "./sources.ts";

type Named = Pick<HabitableZoneLimit, "year" | "name" | "massEarths">;
interface Star {
  readonly effectiveTemperature: number;
  /** In solar luminosities. */
  readonly suns: number;
}
const SUN: Star = { effectiveTemperature: 5780, suns: 1 };
const PROXIMA: Star = { effectiveTemperature: 3050, suns: 0.00155 };
/** Of the Earth, kg. */
const EARTH = 5.9721679e24;

function flux(named: Named, effectiveTemperature: number): number {
  const limit = HABITABLE_ZONE_LIMITS.find(
    (l) => l.year === named.year && l.name === named.name && l.massEarths === named.massEarths,
  ) as HabitableZoneLimit;
  return habitableZoneFlux({ effectiveTemperature, ...limit.coefficients });
}

function distance(named: Named, { effectiveTemperature, suns }: Star): number {
  const luminosity = suns * SOLAR_LUMINOSITY;
  return habitableZoneDistance({ luminosity, flux: flux(named, effectiveTemperature) }) / ASTRONOMICAL_UNIT;
}

const row = (
  named: Named,
  published: number,
  step: number,
  rest: { star: Star; of: string; source: Check["source"] },
): Check => ({
  covers: ["habitableZoneFlux", "habitableZoneDistance", "HABITABLE_ZONE_LIMITS"],
  what: `${named.name} of ${rest.of}, ${named.massEarths} Earth masses, ${named.year}`,
  published,
  unit: "au",
  ours: () => distance(named, rest.star),
  tolerance: halfUnit(step),
  because: "half a unit of the last digit",
  source: rest.source,
  basis: "from memory",
});

const erratum = (name: Named["name"], published: number): Check =>
  row({ year: 2013, name, massEarths: 1 }, published, 0.01, {
    star: SUN,
    of: "the Sun",
    source: KOPPARAPU_2013,
  });
const later = (name: Named["name"], massEarths: Named["massEarths"], published: number): Check =>
  row({ year: 2014, name, massEarths }, published, 0.001, {
    star: SUN,
    of: "the Sun",
    source: KOPPARAPU_2014,
  });
const proxima = (name: Named["name"], published: number): Check =>
  row({ year: 2013, name, massEarths: 1 }, published, 1e-4, {
    star: PROXIMA,
    of: "Proxima Centauri",
    source: ANGLADA_ESCUDE,
  });

/** Of the coolest and the hottest star that the papers cover, where every coefficient weighs. */
const extreme = ({ T, share, ...rest }: (typeof zone.rows)[number]): Check => {
  const named = rest as Named;
  return {
    covers: ["habitableZoneFlux", "HABITABLE_ZONE_LIMITS"],
    what: `${named.name} of a star of ${T} K, ${named.massEarths} Earth masses, ${named.year}`,
    published: 1360 * Number(share),
    unit: "W m-2",
    ours: () => flux(named, T),
    tolerance: ROUNDING * 1360 * Number(share),
    because: ROUNDED,
    source: named.year === 2013 ? KOPPARAPU_2013 : KOPPARAPU_2014,
    basis: "computed with mpmath (habitable_zone.py)",
  };
};

const ratio = (earths: number, published: number): Check => ({
  covers: ["interpolatedRunawayFlux"],
  what: `flux at the runaway greenhouse for ${earths} Earth masses over that for one`,
  published,
  unit: "1",
  ours: () =>
    interpolatedRunawayFlux({ effectiveTemperature: 5780, mass: earths * EARTH }) /
    interpolatedRunawayFlux({ effectiveTemperature: 5780, mass: EARTH }),
  tolerance: 0.01,
  because: "the abstract says about ten and about seven percent",
  source: KOPPARAPU_2014,
  basis: "seen",
});

export const habitableRows: readonly Check[] = [
  erratum("recent Venus", 0.75),
  erratum("runaway greenhouse", 0.98),
  erratum("moist greenhouse", 0.99),
  erratum("maximum greenhouse", 1.69),
  erratum("early Mars", 1.77),
  later("recent Venus", 1, 0.75),
  later("runaway greenhouse", 5, 0.917),
  later("runaway greenhouse", 1, 0.95),
  later("runaway greenhouse", 0.1, 1.005),
  later("maximum greenhouse", 1, 1.676),
  later("early Mars", 1, 1.768),
  proxima("runaway greenhouse", 0.0423),
  proxima("maximum greenhouse", 0.0816),
  ...zone.rows.map(extreme),
  ratio(0.1, 0.9),
  ratio(5, 1.07),
];
