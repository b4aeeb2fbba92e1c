// The folds of a loop in two of its givens: the lines beyond which states appear or vanish.
import { CONSTANT_SET } from "../ground/constants.ts";
import { fail } from "../ground/errors.ts";
import { checkKeys } from "../ground/names.ts";
import { checkedNumber, checkedRange, type Range } from "../ground/range.ts";
import { givensAt, inputsOf } from "../loop/inputs.ts";
import { kept } from "../loop/kept.ts";
import type { Givens, Loop } from "../loop/types.ts";
import { valueKernel } from "../reading/valueKernel.ts";
import { checkOneVariable } from "../states/prepared.ts";
import { checkedAlong } from "./checkedAlong.ts";
import type { Branch, BranchEnd } from "./diagram.ts";
import type { Cusp, FoldCurve, FoldCurveEnd, FoldDiagram, FoldPoint } from "./foldDiagram.ts";
import { gateNodes } from "./gateCurve.ts";
import { netReader } from "./netReader.ts";
import { partsInColumns } from "./partsInColumns.ts";

/** In which two givens, and where to look. */
export interface TraceFoldsOptions<N extends string = string> {
  /** The given in which a state meets a fold: the budget must be a straight line in it. */
  readonly along: Givens<N>;
  /** The given with which the fold moves. */
  readonly and: Givens<N>;
  /** Lowest and highest value of the second given. */
  readonly between: Range;
  /** Lowest and highest temperature, K. */
  readonly within: Range;
  /** Values of other givens that differ from those the loop was closed with. */
  readonly at?: { readonly [K in Givens<N>]?: number };
  /** How many boxes may be enclosed; 20,000 unless said. */
  readonly effort?: number;
}

/**
 * The fold curves of a loop in two givens, with the cusps in which they meet. On the curve p(T) of balanced states a fold is a zero
 * of λ; so the folds are the states of a balance of their own, λ(T, q) = 0, and their cusps are its folds: both are proved
 * as in `traceBranches`, over tiles of the second given q. The first given p takes any value that the folds have.
 *
 * The budget must be a straight line in p. Corner folds are no zeros of λ; where a law has kinks the folds around them
 * stay undecided. Temperatures in K. Throws `contradiction` where the budget is no straight line in `along`, or does not depend on
 * one of the givens, `unknown-name`, `out-of-range`, `not-a-number`, `unreadable`, `several-variables`.
 *
 * @example traceFolds(loop, { along: "flux", and: "width", between: [2, 60], within: [150, 400] }).cusps
 */
export function traceFolds<N extends string>(
  loop: Loop<N>,
  options: TraceFoldsOptions<N>,
): FoldDiagram<Givens<N>> {
  const path = "traceFolds";
  checkKeys(options, path, ["along", "and", "between", "within", "at", "effort"]);
  checkOneVariable(loop, path);
  const { name: along } = checkedAlong(loop, options.along, options.at, `${path}.along`);
  const { name, given, place } = checkedAlong(loop, options.and, options.at, `${path}.and`);
  if (along === name)
    fail("contradiction", { path: "and", value: name, allowed: "another given than `along`" });
  const within = checkedRange(options.within, "within", "K", loop.variables[0]?.within);
  const between = checkedRange(options.between, "between", given.unit, given.within);
  const effort = checkedNumber(options.effort ?? 20_000, "effort", "1", [10, 1e9]);
  const givens = givensAt(loop, options.at);
  const { folded, read } = foldedLoop(loop, along);
  const index = place - loop.variables.length;
  const task = { name, place: index, givens, between, within, effort, tolerance: 1 };
  const parts = partsInColumns(folded, task, netReader(folded, index, givens));
  const point = ({ at: and, temperature }: { at: number; temperature: number }): FoldPoint => {
    const values = [temperature, ...givens];
    values[place] = and;
    return Object.freeze({ at: read(values)[0] as number, and, temperature });
  };
  const curves = parts.branches.map((branch): FoldCurve => {
    const middle = branch.points[Math.floor(branch.points.length / 2)] as Branch["points"][number];
    const values = [middle.temperature, ...givens];
    values[place] = middle.at;
    // along the curve p′ = −λ/N_p, so p″ = −λ′/N_p at a fold
    const exists = -middle.feedbackParameter / (read(values)[1] as number) > 0 ? "above" : "below";
    const ends = [endName(branch.low), endName(branch.high)] as const;
    const points = Object.freeze(branch.points.map(point));
    return Object.freeze({ exists, range: branch.parameters, ends: Object.freeze(ends), points });
  });
  const cusps = parts.folds.map((fold): Cusp => {
    const { atBracket: andBracket, temperatureBracket, exists, branches } = fold;
    return Object.freeze({ ...point(fold), andBracket, temperatureBracket, exists, curves: branches });
  });
  const complete = parts.undecided.length === 0 && !loop.sampled;
  return Object.freeze({
    along: options.along,
    and: options.and,
    between: Object.freeze(between),
    within: Object.freeze(within),
    curves: Object.freeze(curves),
    cusps: Object.freeze(cusps),
    undecided: Object.freeze(parts.undecided.map((u) => u.parameters)),
    complete,
    proof: loop.sampled ? "sampled" : complete ? "proved" : "partial",
    cost: Object.freeze(parts.cost),
    constants: CONSTANT_SET,
  });

  function endName({ kind }: BranchEnd): FoldCurveEnd {
    return kind === "fold" || kind === "corner" ? "cusp" : kind === "transcritical" ? "undecided" : kind;
  }
}

/** The loop whose balance is λ on the curve p(T), with a reader of p and of ∂N/∂p there. */
const foldedLoop = /* @__PURE__ */ kept((loop, along) => {
  const nodes = gateNodes(loop, along);
  const inputs = inputsOf(loop);
  const given = loop.givens.find((g) => g.name === along);
  if (!nodes || nodes.gate !== given?.node) {
    const allowed = "a given in which the budget is a straight line, such as a flux";
    return fail("contradiction", { path: "traceFolds.along", value: along, allowed });
  }
  const kernel = valueKernel(loop.graph, { inputs, outputs: [nodes.curve, nodes.answer] });
  const out = new Float64Array(2);
  const read = (values: readonly number[]): Float64Array => {
    kernel(Float64Array.from(values), out);
    return out;
  };
  const variables = loop.variables.map((v) => ({ ...v, rate: nodes.feedback }));
  return { folded: Object.freeze({ ...loop, net: nodes.feedback, variables }) as Loop, read };
});
