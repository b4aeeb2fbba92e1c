// The climates of a planet and everything that is said of each.

import { tippingMargins } from "../branches/tippingMargins.ts";
import { analyseFeedbacks } from "../feedback/analyseFeedbacks.ts";
import type { Range } from "../ground/range.ts";
import type { Loop } from "../loop/types.ts";
import type { PlanetFacts } from "../planet/facts.ts";
import { findStates } from "../states/findStates.ts";
import type { FoundStates, State } from "../states/state.ts";
import type { AlongStar } from "./alongStar.ts";
import type { StateAppraisal } from "./appraisal.ts";
import { orbitAveraging } from "./orbitAveraging.ts";
import { surfacePhases } from "./surfacePhases.ts";

/** How far the star is brightened and dimmed in looking for the end of a branch. */
const FACTORS = [0.2, 5] as const;

/** Where to look and how hard. */
export interface Search {
  readonly within: Range;
  readonly effort: number | undefined;
}

/** The climates that were found and what is said of each. */
export interface Climates {
  readonly found: FoundStates | null;
  readonly states: readonly StateAppraisal[];
}

/** A loop, what is known beside it, and the given that stands for its star. */
export interface Subject {
  readonly loop: Loop;
  readonly facts: PlanetFacts;
  readonly star: AlongStar | null;
}

/** All climates of a planet. */
export function statesOfPlanet({ loop, facts, star }: Subject, { within, effort }: Search): Climates {
  const spend = effort === undefined ? {} : { effort };
  const found = findStates(loop, { within, ...spend });
  const { heatCapacity, orbitalPeriod: period, surfacePressure } = facts;
  const states = found.states.map((state): StateAppraisal => {
    const holds = state.stability === "stable";
    const equilibriumTemperature = state.report.equilibriumTemperature as number;
    const { temperature } = state;
    return {
      state,
      equilibriumTemperature,
      greenhouseWarming: temperature - equilibriumTemperature,
      averaging: orbitAveraging(loop, state, { heatCapacity, period }),
      feedbacks: holds ? analyseFeedbacks(loop, state) : null,
      margins: holds && star ? marginsOf(loop, state, star, { within, ...spend }) : null,
      surface: surfacePressure === null ? null : surfacePhases({ temperature, pressure: surfacePressure }),
    };
  });
  return { found, states };
}

function marginsOf(
  loop: Loop,
  state: State,
  { along, now, brightening }: AlongStar,
  search: { readonly within: Range; readonly effort?: number },
): StateAppraisal["margins"] {
  const declared = loop.givens.find((given) => given.name === along)?.within ?? [0, Number.MAX_VALUE];
  const between = [Math.max(FACTORS[0] * now, declared[0]), Math.min(FACTORS[1] * now, declared[1])] as const;
  return tippingMargins(loop, state, { along, between, ...search, ...(brightening ? { brightening } : {}) });
}
