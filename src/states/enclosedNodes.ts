// Enclosures of nodes of a loop as functions of temperature.
import { derivative } from "../graph/derivative.ts";
import { inputsOf, rangesOf } from "../loop/inputs.ts";
import type { Loop } from "../loop/types.ts";
import { type SpanKernel, spanKernel } from "../reading/spanKernel.ts";
import type { Ends } from "../search/enclosed.ts";

/** Sets the values of the givens, in order; `high` differs from `low` where they are intervals. */
export type SetGivens = (low: ArrayLike<number>, high: ArrayLike<number>) => void;

/** Nodes that are enclosed over boxes of temperature, for givens that are set for all of them. */
export interface EnclosedNodes {
  of(node: number): Ends;
  readonly set: SetGivens;
  /** The lower values that were set, behind a place for temperature, 0 K. */
  readonly low: Float64Array;
}

/** Prepares enclosures of nodes; `wide` are the nodes of the givens that may be intervals. */
export function enclosedNodes(loop: Loop, wide: ReadonlySet<number>): EnclosedNodes {
  const { graph } = loop;
  const inputs = inputsOf(loop);
  const ranges = rangesOf(loop);
  const slope = (node: number) => derivative(graph, node, inputs[0] as number, inputs);
  const kernels: SpanKernel[] = [];
  const low = new Float64Array(inputs.length);
  const high = new Float64Array(inputs.length);
  return {
    low,
    of(node) {
      const first = slope(node);
      const outputs = [node, first];
      const kernel = spanKernel(graph, {
        ...{ inputs, atEnds: outputs, over: [outputs, [slope(first)]], wide, ranges },
      });
      kernels.push(kernel);
      const { size, point, over } = kernel;
      const [box, bend] = over as [Ends["box"], Ends["bend"]];
      return { size, at: 1, point, box, bend };
    },
    set(lows, highs) {
      for (let i = 1; i < low.length; i++) {
        low[i] = lows[i - 1] as number;
        high[i] = highs[i - 1] as number;
      }
      for (let i = 0; i < kernels.length; i++) kernels[i]?.prepare(low, high);
    },
  };
}
