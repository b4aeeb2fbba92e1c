// The kinks behind the balance of a loop.
import { coneOf } from "../graph/cone.ts";
import { inputsOf } from "../loop/inputs.ts";
import type { Loop } from "../loop/types.ts";

/** A kink: the difference of two arguments, first of them the one with the lower number, and every min and max of the two. */
export interface Kink {
  readonly node: number;
  readonly nodes: readonly number[];
}

/** All of them, in the order of the graph. */
export function kinkNodes(loop: Loop): Kink[] {
  const { graph, net } = loop;
  const found = new Map<number, number[]>();
  for (const id of coneOf(graph, [net], inputsOf(loop))) {
    if (graph.ops[id] !== "min" && graph.ops[id] !== "max") continue;
    const args = graph.args[id] as readonly [number, number];
    const node = graph.node("sub", [Math.min(...args), Math.max(...args)]);
    found.set(node, [...(found.get(node) ?? []), id]);
  }
  return [...found].map(([node, nodes]) => ({ node, nodes }));
}

/** The nodes that are zero at the leaps behind a balance: the arguments of its steps. */
export function leapNodes(loop: Loop): number[] {
  const { graph, net } = loop;
  const steps = coneOf(graph, [net], inputsOf(loop)).filter((id) => graph.ops[id] === "step");
  return [...new Set(steps.map((id) => (graph.args[id] as readonly number[])[0] as number))];
}
