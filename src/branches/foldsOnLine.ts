// The folds in two givens of a loop whose budget is a straight line in the first.
import { inputsOf } from "../loop/inputs.ts";
import { kept } from "../loop/kept.ts";
import type { Loop } from "../loop/types.ts";
import { valueKernel } from "../reading/valueKernel.ts";
import type { Branch, BranchEnd } from "./diagram.ts";
import type { Task } from "./diagramOf.ts";
import type { Cusp, FoldCurve, FoldCurveEnd, FoldDiagram, FoldPoint } from "./foldDiagram.ts";
import { gateNodes } from "./gateCurve.ts";
import { netReader } from "./netReader.ts";
import { partsInColumns } from "./partsInColumns.ts";

/** What was found. */
export type FoldParts = Pick<FoldDiagram, "curves" | "cusps" | "touches" | "undecided" | "cost" | "method">;

/** The loop whose balance is λ on the curve p(T), with a reader of p and of ∂N/∂p there; undefined where it is no straight line. */
export const foldedLoop = /* @__PURE__ */ kept((loop, along) => {
  const nodes = gateNodes(loop, along);
  const inputs = inputsOf(loop);
  const given = loop.givens.find((g) => g.name === along);
  if (!nodes || nodes.gate !== given?.node) return undefined;
  const kernel = valueKernel(loop.graph, { inputs, outputs: [nodes.curve, nodes.answer] });
  const out = new Float64Array(2);
  const read = (values: readonly number[]): Float64Array => {
    kernel(Float64Array.from(values), out);
    return out;
  };
  const variables = loop.variables.map((v) => ({ ...v, rate: nodes.feedback }));
  return { folded: Object.freeze({ ...loop, net: nodes.feedback, variables }) as Loop, read };
});

/**
 * The folds are the states of a balance of their own, λ(T, q) = 0 on the curve p(T), and their cusps are its folds. The task is
 * that of the second given.
 */
export function foldsOnLine(
  { folded, read }: NonNullable<ReturnType<typeof foldedLoop>>,
  task: Task,
): FoldParts {
  const { place, givens } = task;
  const parts = partsInColumns(folded, task, netReader(folded, place, givens));
  const inputsAt = (temperature: number, and: number): number[] => [
    temperature,
    ...givens.map((v, i) => (i === place ? and : v)),
  ];
  const point = ({ at: and, temperature }: { at: number; temperature: number }): FoldPoint =>
    Object.freeze({ at: read(inputsAt(temperature, and))[0] as number, and, temperature });
  const curves = parts.branches.map((branch): FoldCurve => {
    const middle = branch.points[Math.floor(branch.points.length / 2)] as Branch["points"][number];
    // along the curve p′ = −λ/N_p, so p″ = −λ′/N_p at a fold
    const answer = read(inputsAt(middle.temperature, middle.at))[1] as number;
    const exists = -middle.feedbackParameter / answer > 0 ? "above" : "below";
    const ends = [endName(branch.low), endName(branch.high)] as const;
    const points = Object.freeze(branch.points.map(point));
    return Object.freeze({ exists, range: branch.parameters, ends: Object.freeze(ends), points });
  });
  const cusps = parts.folds.map((fold): Cusp => {
    const { atBracket: andBracket, temperatureBracket, exists, branches } = fold;
    return Object.freeze({ ...point(fold), andBracket, temperatureBracket, exists, curves: branches });
  });
  const undecided = parts.undecided.map((u) => u.parameters);
  return { method: "line", curves, cusps, touches: [], undecided, cost: parts.cost };
}

function endName({ kind }: BranchEnd): FoldCurveEnd {
  if (kind === "leap") return "undecided";
  return kind === "fold" || kind === "corner" ? "cusp" : kind;
}
