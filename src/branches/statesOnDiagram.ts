// The states of a diagram at one value of its parameter.
import { fail } from "../ground/errors.ts";
import { checkedNumber, holds, type Range } from "../ground/range.ts";
import { checkLoop } from "../loop/checkLoop.ts";
import { givensAt } from "../loop/inputs.ts";
import type { Givens, Loop } from "../loop/types.ts";
import { readerOf } from "../states/prepared.ts";
import type { State } from "../states/state.ts";
import type { Branch, BranchEnd, Diagram } from "./diagram.ts";
import { type NetReader, netReader } from "./netReader.ts";

/** The states at one value of the parameter. */
export interface StatesOnDiagram<N extends string = string> {
  readonly at: number;
  /** By rising temperature. */
  readonly states: readonly State<N>[];
  /** The index of each state's branch. */
  readonly branches: readonly number[];
  /** True only if it is proved that there are no others in the diagram's range of temperature. */
  readonly complete: boolean;
}

/**
 * The states of a loop at one value of a diagram's parameter: one on every branch whose range holds it, found between the
 * ends of that branch. `loop` is the one that the diagram was traced for; the diagram may come from `JSON.parse`. Inside the
 * bracket of a fold it is not known whether its two states exist, nor inside that of a crossing whether they are one; there
 * `complete` is false.
 *
 * `at` in the unit of the parameter. Throws `out-of-range` outside of the diagram, `missing`, `not-a-number`, `unreadable`
 * for what is no diagram, `unknown-name` for a diagram of another loop.
 */
export function statesOnDiagram<N extends string>(
  loop: Loop<N>,
  diagram: Diagram<Givens<N>>,
  at: number,
): StatesOnDiagram<N> {
  checkLoop(loop, "statesOnDiagram");
  if (
    diagram?.method === undefined ||
    ![diagram.branches, diagram.folds, diagram.crossings].every(Array.isArray)
  )
    fail("unreadable", { path: "diagram", value: diagram, allowed: "what traceBranches returned" });
  const value = checkedNumber(at, "at", diagram.unit, diagram.between);
  const inside = (range: Range) => holds(range, value);
  const found = diagram.branches.flatMap((branch, i) => {
    const state = inside(branch.parameters) ? stateOn(loop, diagram, branch, value) : undefined;
    return state ? [{ state: state as State<N>, branch: i }] : [];
  });
  found.sort((a, b) => a.state.temperature - b.state.temperature);
  const states = found.map(({ state }) => state);
  const doubtful = [...diagram.folds, ...diagram.crossings].some((f) => inside(f.atBracket));
  const count = diagram.branches.filter((b) => inside(b.parameters)).length;
  const complete = diagram.complete && !doubtful && count === states.length && areApart(states);
  return Object.freeze({
    at: value,
    states: Object.freeze(states),
    branches: Object.freeze(found.map(({ branch }) => branch)),
    complete,
  });
}

/** Whether each state is warmer than the one before, by their brackets: none is another one again. */
function areApart(states: readonly State[]): boolean {
  const brackets = states.map(({ variables }) => variables.temperature?.bracket as Range);
  return brackets.every(([low], i) => i === 0 || (brackets[i - 1] as Range)[1] < low);
}

/** The state of a branch at a value of the diagram's parameter inside its range; undefined where it is not found. */
export function stateOn(loop: Loop, diagram: Diagram, branch: Branch, at: number): State | undefined {
  const givens = givensAt(loop, { ...diagram.fixed, [diagram.along]: at });
  const place = loop.givens.findIndex((g) => g.name === diagram.along);
  const net = netReader(loop, place, givens);
  const located = ordered(net, diagram, branch, at) ?? net.stateOn(branch, at);
  return located && readerOf(loop)(located, givens);
}

/** In tiles the states of branches keep their order: between its columns a branch is known by it alone. */
function ordered(net: NetReader, { method, branches, within }: Diagram, branch: Branch, at: number) {
  if (method !== "tiles") return undefined;
  const here = branches.filter(({ parameters }) => holds(parameters, at));
  here.sort((a, b) => warmth(a, b, at));
  const states = net.statesAt(at, within);
  return states?.length === here.length ? states[here.indexOf(branch)] : undefined;
}

/** How much warmer one branch of tiles is than another, where both have a point, near a parameter; 0 if they never have. */
function warmth(one: Branch, other: Branch, at: number): number {
  const temperatures = new Map(other.points.map((p) => [p.at, p.temperature]));
  let [nearest, warmer] = [Number.POSITIVE_INFINITY, 0];
  for (const point of one.points) {
    const difference = point.temperature - (temperatures.get(point.at) ?? point.temperature);
    const distance = Math.abs(point.at - at);
    // in a fold both have one point
    if (difference !== 0 && distance < nearest) [nearest, warmer] = [distance, difference];
  }
  return warmer;
}

/** The end of a branch in a direction. */
export const endOf = (branch: Branch, direction: "rise" | "fall"): BranchEnd =>
  direction === "rise" ? branch.high : branch.low;
