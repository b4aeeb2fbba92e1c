// The climates of a planet and everything that is said of each.

import type { Diagram } from "../branches/diagram.ts";
import { tippingMargins } from "../branches/tippingMargins.ts";
import { traceBranches } from "../branches/traceBranches.ts";
import { analyseFeedbacks } from "../feedback/analyseFeedbacks.ts";
import { equilibriumTemperature } from "../greenhouse/equilibriumTemperature.ts";
import { SOLAR_LUMINOSITY } from "../ground/constants.ts";
import { ThermosteadError } from "../ground/errors.ts";
import type { Range } from "../ground/range.ts";
import type { Loop } from "../loop/types.ts";
import type { PlanetFacts } from "../planet/facts.ts";
import type { PlanetInput } from "../planet/planetInput.ts";
import type { WrittenUnit } from "../planet/writtenUnits.ts";
import { budgetCurve } from "../states/budgetCurve.ts";
import { findStates } from "../states/findStates.ts";
import type { FoundStates, State } from "../states/state.ts";
import type { AlongStar } from "./alongStar.ts";
import type { Appraisal, AppraisedDiagram } from "./appraisal.ts";
import type { StateAppraisal } from "./appraisedState.ts";
import { placeTemperatures } from "./equilibriumTemperatures.ts";
import { orbitAveraging } from "./orbitAveraging.ts";
import { takes } from "./portRange.ts";
import { sensitivitiesOf } from "./sensitivities.ts";
import { surfacePhases } from "./surfacePhases.ts";

/** What the budget of every planet reports. */
type Reported = Readonly<Record<"flux" | "albedo" | "equilibriumTemperature", number>>;

/** How far the star is brightened and dimmed in looking for the end of a branch. */
const FACTORS = [0.4, 2.5] as const;
/** How far the lines of its branches may miss them, as a share of that range: fine enough for a picture of the folds. */
const TOLERANCE = 5e-4;

/** Where to look and how hard. */
export interface Search {
  readonly within: Range;
  readonly effort: number | undefined;
}

/** The climates that were found and what is said of each. */
export interface Climates {
  readonly found: FoundStates | null;
  readonly states: readonly StateAppraisal[];
  readonly leaves: Appraisal["leaves"];
  readonly diagram: AppraisedDiagram | null;
}

/** A loop, what is known beside it, and the given that stands for its star. */
export interface Subject {
  readonly loop: Loop;
  readonly facts: PlanetFacts;
  readonly inputs: readonly PlanetInput[];
  readonly units: readonly WrittenUnit[];
  readonly star: AlongStar | null;
}

/** All climates of a planet. */
export function statesOfPlanet(
  { loop, facts, inputs, units, star }: Subject,
  { within, effort }: Search,
): Climates {
  const spend = effort === undefined ? {} : { effort };
  const found = findStates(loop, { within, ...spend });
  const { heatCapacity, orbitalPeriod: period, surfacePressure } = facts;
  const diagram = star && branchesOf(star, { within, ...spend });
  const internalFlux = inputs.find(({ path }) => path === "internalHeat")?.value ?? 0;
  const states = found.states.map((state): StateAppraisal => {
    const holds = state.stability === "stable";
    const { flux, albedo, equilibriumTemperature: reradiating } = state.report as Reported;
    const { temperature } = state;
    const feedbacks = holds ? analyseFeedbacks(loop, state) : null;
    return {
      state,
      equilibriumTemperature: reradiating,
      greenhouseWarming: temperature - reradiating,
      averaging: orbitAveraging(loop, state, { heatCapacity, period }),
      places: takes(equilibriumTemperature, "albedo", albedo)
        ? placeTemperatures({ flux, albedo, internalFlux })
        : null,
      feedbacks,
      sensitivities: feedbacks && sensitivitiesOf(feedbacks, inputs),
      margins: holds && star && diagram ? marginsOf(state, star, diagram) : null,
      surface: surfacePressure === null ? null : surfacePhases({ temperature, pressure: surfacePressure }),
    };
  });
  const holding = found.states.filter(({ stability }) => stability === "stable");
  return {
    found,
    states,
    leaves: leavesOf(loop, found),
    diagram: diagram && {
      ...diagram,
      units: unitsOf(diagram, units),
      now: { at: star.now, temperatures: holding.map(({ temperature }) => temperature) },
    },
  };
}

/** Without a state in a range, the balance has one sign all over it. */
function leavesOf(loop: Loop, { complete, states, within }: FoundStates): Appraisal["leaves"] {
  if (!complete || states.length > 0) return null;
  const gains = budgetCurve(loop, { within, points: 2 }).points.map((p) => p.heating - p.cooling);
  if (gains.length === 2 && gains.every((gain) => gain > 0)) return "hotter";
  return gains.length === 2 && gains.every((gain) => gain < 0) ? "colder" : null;
}

/** Units of the givens of a diagram. What stands for the star is an input, or the luminosity that follows from others. */
function unitsOf({ along, fixed }: Diagram, units: readonly WrittenUnit[]): WrittenUnit[] {
  const own = units.filter(({ name }) => name === along || name in fixed);
  if (own.some(({ name }) => name === along)) return own;
  return [{ name: along, unit: "solLum", size: SOLAR_LUMINOSITY }, ...own];
}

/** The diagram of all climates as the star brightens or fades, also where there is none today; null without any light. */
function branchesOf(
  { loop, along, now }: AlongStar,
  search: { readonly within: Range; readonly effort?: number },
): Diagram | null {
  const [low, high] = loop.givens.find((given) => given.name === along)?.within ?? [0, Number.MAX_VALUE];
  const between = [Math.max(FACTORS[0] * now, low), Math.min(FACTORS[1] * now, high)] as const;
  if (!(between[0] < between[1])) return null;
  return traceBranches(loop, { along, between, tolerance: TOLERANCE, ...search });
}

/**
 * The budget along the star has the same flux in the same bits, so that a state of the planet's loop is one of it. Null where
 * the diagram does not decide its branch.
 */
function marginsOf(
  state: State,
  { loop, along, brightening }: AlongStar,
  diagram: Diagram,
): StateAppraisal["margins"] {
  const givens = Object.fromEntries(loop.givens.map(({ name, value }) => [name, value]));
  const options = { along, diagram, ...(brightening ? { brightening } : {}) };
  try {
    return tippingMargins(loop, { ...state, givens }, options);
  } catch (error) {
    if (error instanceof ThermosteadError && error.code === "foreign-state" && !diagram.complete) return null;
    throw error;
  }
}
