// Where the planet is among published limits, and where its own climates end.

import type { Margin } from "../branches/margins.ts";
import { habitableZoneDistance } from "../habitable/habitableZoneDistance.ts";
import { habitableZoneFlux } from "../habitable/habitableZoneFlux.ts";
import { HABITABLE_ZONE_LIMITS } from "../habitable/habitableZoneLimits.ts";
import type { Starlight, StateAppraisal, StatedLimit } from "./appraisal.ts";
import { statedFlux } from "./stated.ts";

/** The stars for which limits are published, K. */
export const [COOLEST_STAR, HOTTEST_STAR] = habitableZoneFlux.card.inputs.effectiveTemperature.within;

/** Whether the limits are published for stars of this temperature, K. */
export const limitsArePublished = (effectiveTemperature: number | null): effectiveTemperature is number =>
  effectiveTemperature !== null &&
  effectiveTemperature >= COOLEST_STAR &&
  effectiveTemperature <= HOTTEST_STAR;

/** Every published limit, with the planet's mean flux over that of the limit. */
export function publishedLimits(
  effectiveTemperature: number | null,
  { mean, luminosity }: Starlight,
): StatedLimit[] {
  if (!limitsArePublished(effectiveTemperature)) return [];
  return HABITABLE_ZONE_LIMITS.map(({ name, paper, doi, massEarths, coefficients }) => {
    const flux = habitableZoneFlux({ effectiveTemperature, ...coefficients });
    return {
      ...{ name, paper, doi, massEarths },
      limit: statedFlux(flux),
      distance: luminosity === null ? null : habitableZoneDistance({ luminosity, flux }),
      ratio: mean.flux / flux,
      temperature: null,
    };
  });
}

/** The folds and corners at which the climates that hold end as the star brightens or fades. */
export function ownLimits(
  states: readonly StateAppraisal[],
  { mean, semiMajorAxis }: Starlight,
): StatedLimit[] {
  return states.flatMap(({ state, margins }) => {
    if (!margins) return [];
    const { at } = margins;
    const ended = [margins.rise, margins.fall].filter(
      ({ end }) => end.kind === "fold" || end.kind === "corner",
    );
    return ended.map(({ direction, end }: Margin): StatedLimit => {
      const brighter = end.at / at;
      const change = direction === "rise" ? "brightens" : "fades";
      return {
        name: `the climate at ${state.temperature.toFixed(2)} K ends in a ${end.kind} as the star ${change}`,
        ...{ paper: null, doi: null, massEarths: null },
        limit: statedFlux(mean.flux * brighter),
        // under today's star the same flux is met farther in, or out, by the inverse-square law
        distance: semiMajorAxis === null ? null : semiMajorAxis / Math.sqrt(brighter),
        ratio: 1 / brighter,
        temperature: end.temperature,
      };
    });
  });
}
