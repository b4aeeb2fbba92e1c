// How far a state is from the ends of its branch, and what comes then.
import { fail } from "../ground/errors.ts";
import { checkKeys } from "../ground/names.ts";
import type { Range } from "../ground/range.ts";
import { checkBelongs, type StateLike } from "../loop/checkBelongs.ts";
import type { Loop } from "../loop/types.ts";
import { checkOneVariable } from "../states/prepared.ts";
import { USUAL_WITHIN } from "../states/rangeWith.ts";
import type { State } from "../states/state.ts";
import { basinOf } from "./basinOf.ts";
import { type Brightening, type TimeUntil, timeUntil } from "./brightening.ts";
import { checkedAlong } from "./checkedAlong.ts";
import type { Branch, BranchPoint, Diagram } from "./diagram.ts";
import { fixedGivens } from "./fixedGivens.ts";
import type { Margin, TippingMargins, TippingMarginsOptions } from "./margins.ts";
import { endOf, stateOn } from "./statesOnDiagram.ts";
import { traceBranches } from "./traceBranches.ts";

/**
 * The margins of a state along one given: the distance to the end of its branch in both directions, the temperature there, the
 * state after the jump and whether there is a way back, the edges of its basin, and λ along the way. With a star that brightens
 * or fades also the time until its branch ends, at fixed other givens: for the Sun's history Δt = 2.5·t₀·(1 − p/p_end).
 *
 * `state` may come from `JSON.parse`. Throws `foreign-state`, `unknown-name`, `missing` (no range for the given),
 * `contradiction` (the budget does not depend on it; the diagram is another; or time is asked along a given that is no
 * luminosity or flux),
 * `out-of-range` (a star that is not like the Sun), `not-a-number`, `unreadable`, `several-variables`.
 *
 * @example tippingMargins(loop, state, { along: "flux", between: [900, 1900] }).rise.relative
 */
export function tippingMargins<N extends string>(
  loop: Loop<N>,
  state: StateLike<N>,
  options: TippingMarginsOptions<N>,
): TippingMargins<N> {
  const path = "tippingMargins";
  checkKeys(options, path, ["along", "within", "between", "diagram", "brightening", "effort", "tolerance"]);
  checkOneVariable(loop, path);
  const { name, given, place } = checkedAlong(loop, options.along, undefined, `${path}.along`);
  const { values } = checkBelongs(loop, state, "state");
  const [temperature, at] = [values[0] as number, values[place] as number];
  const until = options.brightening === undefined ? undefined : timeFor(options.brightening, given);
  const others = fixedGivens(loop, name, [...values.subarray(loop.variables.length)]);
  const diagram = options.diagram ?? diagramAround(loop, options, { along: name, others });
  if (diagram.along !== name || !sameValues(diagram.fixed, others)) {
    const allowed = `a diagram along ${name} with the other givens of the state`;
    fail("contradiction", { path: "diagram", value: `along ${diagram.along}`, allowed });
  }
  checkHolds(diagram.within, temperature, "within", "K");
  checkHolds(diagram.between, at, "between", given.unit);
  const index = branchAt(loop, diagram, at, temperature);
  const branch = diagram.branches[index];
  const here = branch && stateOn(loop, diagram, branch, at);
  if (!here) {
    const allowed = "a state on a branch that is decided";
    return fail("foreign-state", { path: "state", value: temperature, allowed, unit: "K" });
  }
  const margin = (direction: Margin["direction"]): Margin<N> => {
    const end = endOf(branch, direction);
    const jump = diagram.jumps.find((j) => j.from === index && j.direction === direction) ?? null;
    const target = diagram.branches[jump?.to?.branch ?? -1];
    const distance = Math.abs(end.at - at);
    return Object.freeze({
      direction,
      end,
      distance,
      jump,
      relative: at === 0 ? null : distance / Math.abs(at),
      after: target ? ((stateOn(loop, diagram, target, end.at) ?? null) as State<N> | null) : null,
      way: Object.freeze(wayTo(branch, { ...here, temperature }, { at, direction })),
      time: until && at > 0 && end.at !== at ? until(end.at / at) : null,
    });
  };
  return Object.freeze({
    along: options.along,
    unit: given.unit,
    at,
    temperature,
    stability: branch.stability,
    rise: margin("rise"),
    fall: margin("fall"),
    basin: branch.stability === "stable" ? basinOf(loop, diagram, { index, at, temperature }) : null,
    fixed: diagram.fixed,
    held: heldText(loop, name, diagram.fixed),
    within: diagram.within,
    between: diagram.between,
    proof: diagram.proof,
  });
}

function diagramAround<N extends string>(
  loop: Loop<N>,
  { within = USUAL_WITHIN, between, effort, tolerance }: TippingMarginsOptions<N>,
  { along, others }: { along: string; others: Readonly<Record<string, number>> },
): Diagram {
  const given = loop.givens.find((g) => g.name === along);
  const range = between ?? given?.within;
  if (!range) {
    const allowed = "a range for the given";
    return fail("missing", { path: "between", value: range, allowed, unit: given?.unit ?? "1" });
  }
  return traceBranches(loop as Loop, {
    ...{ along, between: range, within, at: others },
    ...(effort === undefined ? {} : { effort }),
    ...(tolerance === undefined ? {} : { tolerance }),
  });
}

const sameValues = (a: Readonly<Record<string, number>>, b: Readonly<Record<string, number>>): boolean =>
  Object.keys(a).length === Object.keys(b).length && Object.entries(b).every(([name, x]) => a[name] === x);

function timeFor(brightening: Brightening, { name, unit }: { name: string; unit: string }): TimeUntil {
  if (unit !== "W" && unit !== "W m-2") {
    const allowed = "a luminosity or a flux, in W or W m-2, to tell a time";
    fail("contradiction", { path: "along", value: `${name} in ${unit}`, allowed });
  }
  return timeUntil(brightening);
}

function checkHolds([low, high]: Range, value: number, path: string, unit: string): void {
  if (value >= low && value <= high) return;
  fail("out-of-range", { path, value, allowed: "a range with the state in it", unit });
}

/** A state is known to a few roundings. */
const SLACK = 1e-12;

/** Two findings of one state are closer, relative to its temperature. */
const SAME = 1e-9;

/** The branch that holds a state: the one whose temperatures are nearest; in tiles, where these overlap, whose state it is. */
function branchAt(loop: Loop, diagram: Diagram, at: number, temperature: number): number {
  const { branches, method } = diagram;
  const missed = ({ parameters: [low, high], temperatures: [cold, hot] }: Branch): number => {
    const slack = Math.abs(at) * SLACK;
    if (at < low - slack || at > high + slack) return Number.POSITIVE_INFINITY;
    return Math.max(0, cold - temperature, temperature - hot);
  };
  const misses = branches.map(missed);
  const nearest = (distances: readonly number[], most: number): number => {
    const least = distances.reduce((a, b) => Math.min(a, b), Number.POSITIVE_INFINITY);
    return least <= temperature * most ? distances.indexOf(least) : -1;
  };
  if (method === "line" || method === "monotone") return nearest(misses, SLACK);
  const apart = branches.map((branch, i) => {
    const state = misses[i] === Infinity ? undefined : stateOn(loop, diagram, branch, at);
    return state ? Math.abs(state.temperature - temperature) : Number.POSITIVE_INFINITY;
  });
  return nearest(apart, SAME);
}

/** The points of a branch from a state on to its end. */
function wayTo(
  { points }: Branch,
  { temperature, feedbackParameter }: State,
  { at, direction }: { at: number; direction: Margin["direction"] },
): BranchPoint[] {
  const ahead =
    direction === "rise" ? points.filter((p) => p.at > at) : points.filter((p) => p.at < at).reverse();
  return [Object.freeze({ at, temperature, feedbackParameter }), ...ahead];
}

function heldText(loop: Loop, name: string, fixed: Readonly<Record<string, number>>): string {
  const others = loop.givens.filter((g) => g.name !== name);
  if (others.length === 0) return "nothing else is a given";
  const list = others.map((g) => `${g.name} ${fixed[g.name]}${g.unit === "1" ? "" : ` ${g.unit}`}`);
  return `at fixed ${list.join(", ")}`;
}
