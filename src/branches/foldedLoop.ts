// The loop whose balance is λ on the curve p(T) of a loop that is a straight line in one of its givens.
import { coneOf } from "../graph/cone.ts";
import { inputsOf } from "../loop/inputs.ts";
import { kept } from "../loop/kept.ts";
import type { Loop } from "../loop/types.ts";
import { valueKernel } from "../reading/valueKernel.ts";
import { straightNodes } from "./gateCurve.ts";

/** The folds of a loop as the states of another. */
export interface FoldedLoop {
  readonly folded: Loop;
  /** The node of b = ∂N/∂p, which must not vanish where the curve p = −a/b is to be. */
  readonly answer: number;
  /** Whether b depends on temperature. */
  readonly answerMoves: boolean;
  /** p on the curve and b, for values of all inputs. */
  read(values: readonly number[]): { readonly at: number; readonly answer: number };
}

/** Undefined where the budget is no straight line in the given. */
export const foldedLoop = /* @__PURE__ */ kept((loop, along): FoldedLoop | undefined => {
  const nodes = straightNodes(loop, along);
  const inputs = inputsOf(loop);
  if (!nodes) return undefined;
  const { curve, answer, feedback } = nodes;
  const kernel = valueKernel(loop.graph, { inputs, outputs: [curve, answer] });
  const out = new Float64Array(2);
  const variables = loop.variables.map((v) => ({ ...v, rate: feedback }));
  return {
    folded: Object.freeze({ ...loop, net: feedback, variables }) as Loop,
    answer,
    answerMoves: coneOf(loop.graph, [answer], inputs).includes(inputs[0] as number),
    read(values) {
      kernel(Float64Array.from(values), out);
      return { at: out[0] as number, answer: out[1] as number };
    },
  };
});
