// Heating and cooling of a loop against temperature.
import { checkKeys } from "../ground/names.ts";
import { checkedNumber, checkedRange, type Range } from "../ground/range.ts";
import { givensAt, inputsOf } from "../loop/inputs.ts";
import { kept } from "../loop/kept.ts";
import type { Givens, Loop } from "../loop/types.ts";
import { valueKernel } from "../reading/valueKernel.ts";
import { checkOneVariable } from "./prepared.ts";

/** Where to read a budget, and how often. */
export interface BudgetCurveOptions<N extends string = string> {
  /** Lowest and highest temperature, K. */
  readonly within: Range;
  /** Values of givens that differ from those the loop was closed with. */
  readonly at?: { readonly [K in Givens<N>]?: number };
  /** How many temperatures, evenly spaced, ends included: 2 to 10,000; 201 unless said. */
  readonly points?: number;
}

/** What warms and what cools, against temperature. A plain frozen object: it survives `JSON.stringify` and back. */
export interface BudgetCurve<N extends string = string> {
  readonly within: Range;
  readonly givens: { readonly [K in Givens<N>]: number };
  /** By rising temperature. */
  readonly points: readonly BudgetPoint[];
  /** Temperatures at which the budget has no finite value; they are not in `points`. */
  readonly dropped: number;
}

/** The budget at one temperature. */
export interface BudgetPoint {
  /** K. */
  readonly temperature: number;
  /** Σ heating, W m⁻². */
  readonly heating: number;
  /** Σ cooling, W m⁻². */
  readonly cooling: number;
}

/** Reads the flows of a loop, in their order. */
const flowKernel = /* @__PURE__ */ kept((loop) =>
  valueKernel(loop.graph, { inputs: inputsOf(loop), outputs: loop.flows.map((f) => f.node) }),
);

/**
 * Heating and cooling of a loop with one variable, W m⁻² of the planet's whole area, at evenly spaced temperatures: what
 * is drawn to see where the two balance. It samples and proves nothing; `findStates` does.
 *
 * Temperatures in K. Throws `out-of-range`, `not-a-number`, `missing` and `unreadable` (for `within`), `unknown-name`,
 * `several-variables`.
 *
 * @example budgetCurve(loop, { within: [150, 400] }).points.length // 201
 */
export function budgetCurve<N extends string>(loop: Loop<N>, options: BudgetCurveOptions<N>): BudgetCurve<N> {
  checkKeys(options, "budgetCurve", ["within", "at", "points"]);
  checkOneVariable(loop, "budgetCurve");
  const within = checkedRange(options.within, "within", "K", loop.variables[0]?.within);
  const count = Math.floor(checkedNumber(options.points ?? 201, "points", "1", [2, 10_000]));
  const givens = givensAt(loop, options.at);
  const read = flowKernel(loop);
  const flows = new Float64Array(loop.flows.length);
  const total = (sign: 1 | -1): number =>
    loop.flows.reduce((sum, flow, i) => (flow.sign === sign ? sum + (flows[i] as number) : sum), 0);
  const points: BudgetPoint[] = [];
  for (let i = 0; i < count; i++) {
    const share = i / (count - 1);
    const temperature = within[0] * (1 - share) + within[1] * share;
    read(Float64Array.of(temperature, ...givens), flows);
    const [heating, cooling] = [total(1), total(-1)];
    if (Number.isFinite(heating - cooling)) points.push(Object.freeze({ temperature, heating, cooling }));
  }
  return Object.freeze({
    within: Object.freeze(within),
    givens: Object.freeze(Object.fromEntries(loop.givens.map(({ name }, i) => [name, givens[i]]))) as never,
    points: Object.freeze(points),
    dropped: count - points.length,
  });
}
