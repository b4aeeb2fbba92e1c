// Rebuilds a node with others in place of some behind it.
import { coneOf } from "./cone.ts";
import type { Graph } from "./node.ts";
import type { Op } from "./op.ts";

/** A node of the same value as `target` would have if each key of `by` were its value. Names and units are left out of what is rebuilt. */
export function replaceNodes(g: Graph, target: number, by: ReadonlyMap<number, number>): number {
  const made = new Map<number, number>(by);
  for (const id of coneOf(g, [target], by.keys())) {
    if (made.has(id)) continue;
    const args = g.args[id] as readonly number[];
    const next = args.map((a) => made.get(a) as number);
    made.set(id, next.every((a, i) => a === args[i]) ? id : rebuilt(g, id, next));
  }
  return made.get(target) as number;
}

function rebuilt(g: Graph, id: number, args: readonly number[]): number {
  const op = g.ops[id] as Op;
  if (op === "mean") return args[0] as number;
  if (op === "call") return g.call(g.functions[g.values[id] as number] as Graph["functions"][number], args);
  return g.node(op, op === "add" || op === "mul" ? [...args].sort((a, b) => a - b) : args);
}
