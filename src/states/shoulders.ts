// Where the smooth steps of a balance begin and end, so that a search can cut there.
import { coneOf } from "../graph/cone.ts";
import { derivative } from "../graph/derivative.ts";
import { inputsOf } from "../loop/inputs.ts";
import type { Loop } from "../loop/types.ts";
import { valueKernel } from "../reading/valueKernel.ts";

/** tanh has done 96 % of its step between −2 and 2. */
const SHOULDER = 2;

/** Temperatures, some of them perhaps NaN or outside of any range; they are right for the givens last set. */
export interface Shoulders {
  readonly places: Float64Array;
  /** Takes the inputs of the loop, temperature at 0 K. */
  set(inputs: Float64Array): void;
}

/** The shoulders of each tanh behind the balance whose argument is a straight line in temperature. Guides; nothing is proved. */
export function shouldersOf(loop: Loop): Shoulders {
  const { graph, net } = loop;
  const inputs = inputsOf(loop);
  const temperature = inputs[0] as number;
  const lines = coneOf(graph, [net], inputs)
    .filter((id) => graph.ops[id] === "tanh")
    .map((id) => (graph.args[id] as readonly number[])[0] as number)
    .map((u) => [u, derivative(graph, u, temperature, inputs)] as const)
    .filter(([, slope]) => !coneOf(graph, [slope], inputs).includes(temperature));
  const places = new Float64Array(2 * lines.length);
  const read = lines.length > 0 && valueKernel(graph, { inputs, outputs: lines.flat() });
  const out = new Float64Array(2 * lines.length);
  return {
    places,
    set(inputs) {
      if (!read) return;
      // each line from its value at 0 K
      read(inputs, out);
      for (let i = 0; i < out.length; i += 2) {
        places[i] = (-SHOULDER - (out[i] as number)) / (out[i + 1] as number);
        places[i + 1] = (SHOULDER - (out[i] as number)) / (out[i + 1] as number);
      }
    },
  };
}
