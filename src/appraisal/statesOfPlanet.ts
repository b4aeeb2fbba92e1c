// The climates of a planet and everything that is said of each.

import type { Diagram } from "../branches/diagram.ts";
import { tippingMargins } from "../branches/tippingMargins.ts";
import { traceBranches } from "../branches/traceBranches.ts";
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
  readonly diagram: Diagram | null;
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
  const diagram = branchesOf(loop, found.states, star, { within, ...spend });
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
      margins: holds && star && diagram ? marginsOf(loop, state, star, diagram) : null,
      surface: surfacePressure === null ? null : surfacePhases({ temperature, pressure: surfacePressure }),
    };
  });
  return { found, states, diagram };
}

/** The diagram of all climates as the star brightens or fades; null where there is none that holds, or no given for the star. */
function branchesOf(
  loop: Loop,
  states: readonly State[],
  star: AlongStar | null,
  search: { readonly within: Range; readonly effort?: number },
): Diagram | null {
  if (star === null || !states.some((state) => state.stability === "stable")) return null;
  const { along, now } = star;
  const [low, high] = loop.givens.find((given) => given.name === along)?.within ?? [0, Number.MAX_VALUE];
  const between = [Math.max(FACTORS[0] * now, low), Math.min(FACTORS[1] * now, high)] as const;
  return traceBranches(loop, { along, between, ...search });
}

const marginsOf = (
  loop: Loop,
  state: State,
  { along, brightening }: AlongStar,
  diagram: Diagram,
): StateAppraisal["margins"] =>
  tippingMargins(loop, state, { along, diagram, ...(brightening ? { brightening } : {}) });
