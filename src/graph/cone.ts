// The part of a graph that some outputs need.
import type { Graph } from "./node.ts";

/**
 * The nodes that `outputs` need, each after its arguments. The nodes in `inputs` are taken as given: what lies behind
 * them is not visited, so a coupling can be held and a partial derivative taken without rebuilding anything.
 */
export function coneOf(g: Graph, outputs: readonly number[], inputs: Iterable<number> = []): number[] {
  const wanted = new Uint8Array(g.ops.length);
  const leaves = new Set(inputs);
  const list: number[] = [];
  for (const id of outputs) wanted[id] = 1;
  for (let id = wanted.length - 1; id >= 0; id--) {
    if (!wanted[id]) continue;
    list.push(id);
    if (!leaves.has(id)) for (const a of g.args[id] as readonly number[]) wanted[a] = 1;
  }
  return list.reverse();
}
