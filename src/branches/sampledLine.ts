// Samples a node of a loop as a function of one of its inputs, for loops with a law that cannot be enclosed.
import { derivative } from "../graph/derivative.ts";
import { inputsOf } from "../loop/inputs.ts";
import type { Loop } from "../loop/types.ts";
import { valueKernel } from "../reading/valueKernel.ts";
import type { Sampled } from "../search/scanZeros.ts";

/** A node along an input; the other inputs are read from `values`, in order. */
export interface SampledLine extends Sampled {
  readonly values: Float64Array;
}

/** The line of a node along the input at a place; below `noise` times the largest flow it cannot be told from zero. */
export function sampledLine(loop: Loop, node: number, along: number, noise: number): SampledLine {
  const { graph } = loop;
  const inputs = inputsOf(loop);
  const slope = derivative(graph, node, inputs[along] as number, inputs);
  const flows = loop.flows.filter((f) => f.sign !== 0).map((f) => f.node);
  const kernel = valueKernel(graph, { inputs, outputs: [node, slope, ...flows] });
  const values = new Float64Array(inputs.length);
  const read = new Float64Array(2 + flows.length);
  return {
    values,
    at(x, out) {
      values[along] = x;
      kernel(values, read);
      let largest = 0;
      for (let i = 2; i < read.length; i++) largest = Math.max(largest, Math.abs(read[i] as number));
      out[0] = read[0] as number;
      out[1] = read[1] as number;
      out[2] = noise * largest;
    },
  };
}
