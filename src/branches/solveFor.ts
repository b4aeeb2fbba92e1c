// Which value of a parameter gives a temperature.
import { coneOf } from "../graph/cone.ts";
import { derivative } from "../graph/derivative.ts";
import { CONSTANT_SET } from "../ground/constants.ts";
import { checkKeys } from "../ground/names.ts";
import { checkedNumber, checkedRange, type Range } from "../ground/range.ts";
import { givensAt, inputsOf } from "../loop/inputs.ts";
import type { Givens, Loop } from "../loop/types.ts";
import { type EnclosureKernel, enclosureKernel } from "../reading/enclosureKernel.ts";
import { valueKernel } from "../reading/valueKernel.ts";
import { above, below, signOf } from "../search/enclosed.ts";
import { enumerateZeros } from "../search/enumerateZeros.ts";
import type { DoubtKind } from "../search/enumeration.ts";
import { scanZeros } from "../search/scanZeros.ts";
import { rangesOf } from "../states/enclosedBalance.ts";
import { checkOneVariable } from "../states/prepared.ts";
import type { State } from "../states/state.ts";
import { checkedAlong } from "./checkedAlong.ts";
import { kept } from "./kept.ts";
import { lineOf } from "./line.ts";
import { sampledLine } from "./sampledLine.ts";

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

/** A value of the unknown for which the temperature is an equilibrium. */
export interface Solution {
  readonly value: number;
  /** Two values between which the balance changes sign: proved, and the solution is the only one between. */
  readonly bracket: Range;
  /** Of the state at the temperature. */
  readonly stability: State["stability"];
  /** λ there, W m⁻² K⁻¹. */
  readonly feedbackParameter: number;
}

/** All values of the unknown in a range, and how sure the list is. */
export interface Solutions<A extends string = string> {
  readonly unknown: A;
  readonly unit: string;
  /** K. */
  readonly temperature: number;
  /** By rising value. */
  readonly solutions: readonly Solution[];
  /** True only if it is proved that there is no other value in the range. */
  readonly complete: boolean;
  /** Stretches where the search cannot decide; a `flat` one is balanced throughout, as far as can be told. */
  readonly undecided: readonly { readonly interval: Range; readonly kind: DoubtKind }[];
  readonly proof: "proved" | "partial" | "sampled";
  readonly within: Range;
  /** The values of the other givens, which are held. */
  readonly fixed: Readonly<Record<string, number>>;
  readonly cost: { readonly boxes: number; readonly points: number };
  readonly constants: string;
}

/** The range of the unknown in units of the length over which a search takes its function to change little. */
const FINE_PARTS = 30;
const KINK_EFFORT = 60;
/** Rounding of a balance, relative to its largest flow. */
const NOISE = 2e-15;

/** Zeros of N along the unknown, for values of all inputs. */
type Solver = (values: ArrayLike<number>, within: Range, effort: number) => Found;
type Found = Pick<Solutions, "undecided" | "cost"> & {
  readonly zeros: readonly { readonly at: number; readonly bracket: Range }[];
};

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
  const { solve, judge } = solvers(loop, name);
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
    within,
    fixed: Object.freeze(
      Object.fromEntries(
        loop.givens.flatMap((g, i) => (g.name === name ? [] : [[g.name, givens[i] as number]])),
      ),
    ),
    cost: Object.freeze(cost),
    constants: CONSTANT_SET,
  });
}

const solvers = /* @__PURE__ */ kept((loop, name) => {
  const place = 1 + loop.givens.findIndex((g) => g.name === name);
  return { solve: loop.sampled ? sampled(loop, place) : enclosed(loop, place), judge: judgeOf(loop, place) };
});

function enclosed(loop: Loop, place: number): Solver {
  const { graph, net } = loop;
  const inputs = inputsOf(loop);
  const line = lineOf(loop, net, place);
  const kinks = coneOf(graph, [net], inputs)
    .filter((id) => graph.ops[id] === "min" || graph.ops[id] === "max")
    .map((id) => lineOf(loop, graph.node("sub", graph.args[id] as readonly number[]), place));
  return (values, within, effort) => {
    const fine = (within[1] - within[0]) / FINE_PARTS;
    const cuts: number[] = [];
    for (const kink of kinks) {
      kink.values.set(values);
      for (const { bracket } of enumerateZeros(kink, within, { effort: KINK_EFFORT, fine }).zeros)
        cuts.push(...bracket);
    }
    line.values.set(values);
    const { zeros, undecided, boxes, points } = enumerateZeros(line, within, { effort, fine, cuts });
    return { zeros, undecided: undecided.map(plain), cost: { boxes, points } };
  };
}

function sampled(loop: Loop, place: number): Solver {
  const line = sampledLine(loop, loop.net, place, NOISE);
  return (values, within, effort) => {
    line.values.set(values);
    const { crossings, doubts, evaluations } = scanZeros(line, within, effort);
    return { zeros: crossings, undecided: doubts.map(plain), cost: { boxes: 0, points: evaluations } };
  };
}

const plain = ({ interval, kind }: { readonly interval: Range; readonly kind: DoubtKind }) =>
  Object.freeze({ interval: Object.freeze([interval[0], interval[1]] as const), kind });

/** Reads λ at a solution: its proved sign over the bracket, or its plain sign for a sampled law. */
function judgeOf(loop: Loop, place: number) {
  const inputs = inputsOf(loop);
  const slope = derivative(loop.graph, loop.net, inputs[0] as number, inputs);
  const read = valueKernel(loop.graph, { inputs, outputs: [slope] });
  const wide = new Set([inputs[place] as number]);
  const ranges = rangesOf(loop);
  const bounds: EnclosureKernel | undefined = loop.sampled
    ? undefined
    : enclosureKernel(loop.graph, { inputs, outputs: [slope], wide, ranges });
  const out = new Float64Array(3);
  return (values: readonly number[], { at, bracket }: { at: number; bracket: Range }): Solution => {
    const [low, high] = bracket.map((p) => Float64Array.from(values, (v, i) => (i === place ? p : v)));
    read(
      Float64Array.from(values, (v, i) => (i === place ? at : v)),
      out,
    );
    const feedbackParameter = out[0] as number;
    bounds?.(low as Float64Array, high as Float64Array, out);
    const sign = bounds
      ? signOf(below(out[0] as number), above(out[1] as number), out[2] as number)
      : Math.sign(feedbackParameter);
    const stability = sign < 0 ? "stable" : sign > 0 ? "unstable" : "undecided";
    return Object.freeze({
      value: at,
      bracket: Object.freeze([bracket[0], bracket[1]] as const),
      stability,
      feedbackParameter,
    });
  };
}
