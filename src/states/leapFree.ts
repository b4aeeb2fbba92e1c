// Where a node of a graph is continuous in all of its inputs at once.
import { coneOf } from "../graph/cone.ts";
import type { Graph } from "../graph/node.ts";
import { type EnclosureOf, enclosureKernel } from "../reading/enclosureKernel.ts";

/**
 * Makes a test whether a node is proved to be free of leaps over boxes of inputs in which it has finite values: no `step` on
 * which it depends is undecided there. All other operations are continuous.
 */
export function leapFree(
  graph: Graph,
  node: number,
  over: Omit<EnclosureOf, "outputs">,
): (low: Float64Array, high: Float64Array) => boolean {
  const steps = coneOf(graph, [node]).filter((id) => graph.ops[id] === "step");
  const read = enclosureKernel(graph, { ...over, outputs: steps });
  const out = new Float64Array(3 * steps.length);
  return (low, high) => {
    read(low, high, out);
    return steps.every((_, k) => out[3 * k] === out[3 * k + 1] && out[3 * k + 2] === 0);
  };
}
