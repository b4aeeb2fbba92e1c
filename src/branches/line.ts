// Encloses a node of a loop as a function of one of its inputs.
import { derivative } from "../graph/derivative.ts";
import { inputsOf, rangesOf } from "../loop/inputs.ts";
import type { Loop } from "../loop/types.ts";
import { enclosureKernel } from "../reading/enclosureKernel.ts";
import { type Enclosed, type Ends, endsOf } from "../search/enclosed.ts";

/** A node along an input; the other inputs are read from `values`, in order, whenever it is read. */
export interface Line extends Enclosed {
  readonly values: Float64Array;
  /** The same, to be searched. */
  readonly ends: Ends;
}

/** The line of a node; `along` is the place of the input among the loop's inputs. */
export function lineOf(loop: Loop, node: number, along: number): Line {
  const { graph } = loop;
  const inputs = inputsOf(loop);
  const input = inputs[along] as number;
  const ranges = rangesOf(loop);
  const slope = derivative(graph, node, input, inputs);
  const bend = derivative(graph, slope, input, inputs);
  const box = enclosureKernel(graph, {
    inputs,
    outputs: [node, slope, bend],
    wide: new Set([input]),
    ranges,
  });
  const point = enclosureKernel(graph, { inputs, outputs: [node, slope], wide: new Set(), ranges });
  const values = new Float64Array(inputs.length);
  const high = new Float64Array(inputs.length);
  const line: Enclosed = {
    box(a, b, out) {
      values[along] = a;
      high[along] = b;
      box(values, high, out);
    },
    point(x, out) {
      values[along] = x;
      point(values, values, out);
    },
  };
  return { ...line, values, ends: endsOf(line) };
}
