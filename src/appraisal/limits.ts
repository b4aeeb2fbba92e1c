// Where the planet is among published limits, and where its own climates end.

import type { Margin } from "../branches/margins.ts";
import { EARTH_MASS_PARAMETER, GRAVITATION } from "../ground/constants.ts";
import { habitableZoneDistance } from "../habitable/habitableZoneDistance.ts";
import { habitableZoneFlux } from "../habitable/habitableZoneFlux.ts";
import { HABITABLE_ZONE_LIMITS } from "../habitable/habitableZoneLimits.ts";
import { interpolatedRunawayFlux } from "../habitable/interpolatedRunawayFlux.ts";
import type { Starlight } from "./appraisedLight.ts";
import type { StateAppraisal } from "./appraisedState.ts";
import { rangeOf, takes } from "./portRange.ts";
import { withCompanions } from "./starlightOf.ts";
import { statedFlux } from "./stated.ts";
import type { StatedLimit } from "./statedLimit.ts";

/** What is said in the name of a limit that no paper has. */
export const INTERPOLATED = ", interpolated here";

/** The stars for which limits are published, K. */
export const PUBLISHED_STARS = /* @__PURE__ */ rangeOf(habitableZoneFlux, "effectiveTemperature");

/** Whether the limits are published for stars of this temperature, K. */
export const limitsArePublished = (effectiveTemperature: number | null): effectiveTemperature is number =>
  effectiveTemperature !== null && takes(habitableZoneFlux, "effectiveTemperature", effectiveTemperature);

/** What a limit depends on besides its paper: the star's effective temperature, K, and the planet's mass, kg. */
export interface LimitSubject {
  readonly effectiveTemperature: number | null;
  readonly mass: number | null;
}

type Published = Pick<StatedLimit, "name" | "edge" | "paper" | "doi" | "massEarths"> & {
  readonly flux: number;
};

/** Every published limit, and that of the runaway greenhouse for the planet's own mass; with the planet's flux over it. */
export function publishedLimits(
  { effectiveTemperature, mass }: LimitSubject,
  starlight: Starlight,
): StatedLimit[] {
  if (!limitsArePublished(effectiveTemperature)) return [];
  const published = HABITABLE_ZONE_LIMITS.map(
    ({ name, edge, paper, doi, massEarths, coefficients }): Published => {
      const flux = habitableZoneFlux({ effectiveTemperature, ...coefficients });
      return { name, edge, paper, doi, massEarths, flux };
    },
  );
  return [...published, ...ofOwnMass(effectiveTemperature, mass)].map((it): StatedLimit => {
    const { ratio, position } = positionAt(it.flux, starlight);
    return {
      name: it.name,
      edge: it.edge,
      paper: it.paper,
      doi: it.doi,
      massEarths: it.massEarths,
      limit: statedFlux(it.flux),
      distance: distanceOf(it.flux, starlight.luminosity),
      ratio,
      position,
      temperature: null,
    };
  });
}

/** The runaway greenhouse between the masses for which it was computed. */
function ofOwnMass(effectiveTemperature: number, mass: number | null): Published[] {
  if (mass === null || !takes(interpolatedRunawayFlux, "mass", mass)) return [];
  const computed = HABITABLE_ZONE_LIMITS.find((l) => l.year === 2014 && l.name === "runaway greenhouse");
  const { paper, doi } = computed as (typeof HABITABLE_ZONE_LIMITS)[number];
  const massEarths = mass / (EARTH_MASS_PARAMETER / GRAVITATION);
  const flux = interpolatedRunawayFlux({ effectiveTemperature, mass });
  return [{ name: `runaway greenhouse${INTERPOLATED}`, edge: "inner", paper, doi, massEarths, flux }];
}

const distanceOf = (flux: number, luminosity: number | null): number | null =>
  luminosity === null || !takes(habitableZoneDistance, "luminosity", luminosity)
    ? null
    : habitableZoneDistance({ luminosity, flux });

/** The planet at a flux: its mean flux over it, and on which side of it the orbit lies. */
function positionAt(flux: number, starlight: Starlight): Pick<StatedLimit, "ratio" | "position"> {
  const [mean, most, least] = [starlight.mean, starlight.periastron, starlight.apoastron].map((at) =>
    withCompanions(at.flux, starlight),
  ) as [number, number, number];
  const position = least >= flux ? "nearer" : most <= flux ? "farther" : "crosses";
  return { ratio: mean / flux, position };
}

/** The folds, corners and leaps at which the climates that hold end as the star brightens or fades. */
export function ownLimits(
  states: readonly StateAppraisal[],
  { mean, semiMajorAxis }: Starlight,
): StatedLimit[] {
  return states.flatMap(({ state, margins }) => {
    if (!margins) return [];
    const { at } = margins;
    const ended = [margins.rise, margins.fall].filter(({ end }) =>
      ["fold", "corner", "leap"].includes(end.kind),
    );
    return ended.map(({ direction, end }: Margin): StatedLimit => {
      const brighter = end.at / at;
      return {
        name: `${end.kind} of the climate at ${state.temperature.toFixed(2)} K, star ${direction === "rise" ? "brighter" : "fainter"}`,
        ...{ edge: null, paper: null, doi: null, massEarths: null },
        limit: statedFlux(mean.flux * brighter),
        // under today's star the same flux is met farther in, or out, by the inverse-square law
        distance: semiMajorAxis === null ? null : semiMajorAxis / Math.sqrt(brighter),
        ratio: 1 / brighter,
        // a budget knows the mean flux alone, so that its orbit has no two sides
        position: direction === "rise" ? "farther" : "nearer",
        temperature: end.temperature,
      };
    });
  });
}
