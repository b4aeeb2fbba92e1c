// Which value of a parameter gives a temperature.
import { CONSTANT_SET } from "../ground/constants.ts";
import { checkKeys } from "../ground/names.ts";
import { checkedNumber, checkedRange, type Range } from "../ground/range.ts";
import { givensAt } from "../loop/inputs.ts";
import type { Givens, Loop } from "../loop/types.ts";
import { checkOneVariable } from "../states/prepared.ts";
import { checkedAlong } from "./checkedAlong.ts";
import { fixedGivens } from "./fixedGivens.ts";
import type { Solutions } from "./solutions.ts";
import { solversOf } from "./solversOf.ts";

/** Which parameter is sought, for which temperature, and where. */
export interface SolveForOptions<N extends string = string> {
  /** The given that is sought. */
  readonly unknown: Givens<N>;
  /** The temperature that is to be an equilibrium, K. */
  readonly temperature: number;
  /** Lowest and highest value of the unknown. */
  readonly within: Range;
  /** Values of other givens that differ from those the loop was closed with. */
  readonly at?: { readonly [K in Givens<N>]?: number };
  /** How many boxes may be enclosed, 2000 unless said; for a sampled law evaluations, 20,000. */
  readonly effort?: number;
}

/**
 * Every value of a given in a range for which a stated temperature is an equilibrium, N(T, p) = 0, each with a proved
 * bracket. With `complete: true` there is no other value in the range. A loop with a sampled law is searched by sampling.
 *
 * Throws `unknown-name`, `out-of-range`, `not-a-number`, `unreadable`, `missing`, `several-variables`, and `contradiction`
 * for a given that the budget does not depend on or that is set in `at` as well.
 *
 * @example solveFor(loop, { unknown: "emissivity", temperature: 288, within: [0.1, 1] }).solutions[0].value
 */
export function solveFor<N extends string>(loop: Loop<N>, options: SolveForOptions<N>): Solutions<Givens<N>> {
  const path = "solveFor";
  checkKeys(options, path, ["unknown", "temperature", "within", "at", "effort"]);
  checkOneVariable(loop, path);
  const { name, given } = checkedAlong(loop, options.unknown, options.at, `${path}.unknown`);
  const temperature = checkedNumber(options.temperature, "temperature", "K", loop.variables[0]?.within);
  const within = checkedRange(options.within, "within", given.unit, given.within);
  const standard = loop.sampled ? 20_000 : 2000;
  const effort = checkedNumber(options.effort ?? standard, "effort", "1", [10, 1e9]);
  const givens = givensAt(loop, options.at);
  const { solve, judge } = solversOf(loop, name);
  const values = [temperature, ...givens];
  const { zeros, undecided, cost } = solve(values, within, effort);
  const proof = loop.sampled ? "sampled" : undecided.length === 0 ? "proved" : "partial";
  return Object.freeze({
    unknown: options.unknown,
    unit: given.unit,
    temperature,
    solutions: Object.freeze(zeros.map((zero) => judge(values, zero))),
    complete: proof === "proved",
    undecided: Object.freeze(undecided),
    proof,
    within: Object.freeze(within),
    fixed: fixedGivens(loop, name, givens),
    cost: Object.freeze(cost),
    constants: CONSTANT_SET,
  });
}
