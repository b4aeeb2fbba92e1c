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
  const want = (ids: readonly number[]): void => {
    for (let i = 0; i < ids.length; i++) wanted[ids[i] as number] = 1;
  };
  want(outputs);
  for (let id = wanted.length - 1; id >= 0; id--) {
    if (!wanted[id]) continue;
    list.push(id);
    if (!leaves.has(id)) want(g.args[id] as readonly number[]);
  }
  return list.reverse();
}
