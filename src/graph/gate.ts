// The node through which alone an input reaches another, and in which that other is a straight line.
import { coneOf } from "./cone.ts";
import { derivative, Writer } from "./derivative.ts";
import type { Graph } from "./node.ts";
import type { Op } from "./op.ts";

/** target = offset + slope · node, where neither offset nor slope depends on the node. */
export interface Gate {
  readonly node: number;
  readonly offset: number;
  readonly slope: number;
}

/** What is asked: the node that answers, the input that acts on it, and the unknowns that must not enter the gate. */
export interface GateOf {
  readonly target: number;
  readonly input: number;
  readonly unknowns: readonly number[];
}

/**
 * The gate nearest to the input: a function of it alone (and of other inputs that are no unknowns) without which it does
 * not reach the target, such as the flux for a distance or the forcing for a concentration. It is the input itself where
 * that enters as a straight line, and undefined where there is none.
 */
export function gateOf(g: Graph, { target, input, unknowns }: GateOf): Gate | undefined {
  const list = coneOf(g, [target], [input, ...unknowns]);
  if (!list.includes(input)) return undefined;
  const moved = dependents(g, list, [input]);
  const unknown = dependents(g, list, unknowns);
  for (const node of list) {
    if (!moved.has(node) || unknown.has(node)) continue;
    const around = coneOf(g, [target], [node]).filter((id) => id !== node);
    if (node !== input && dependents(g, around, [input]).has(target)) continue;
    const slope = derivative(g, target, node, unknowns);
    if (coneOf(g, [slope], [node]).includes(node)) continue;
    return { node, slope, offset: withoutNode(g, target, node) };
  }
  return undefined;
}

/** Those of `list` that are one of `sources` or depend on one; arguments come before. */
export function dependents(g: Graph, list: readonly number[], sources: readonly number[]): Set<number> {
  const found = new Set<number>(sources);
  for (const id of list) if ((g.args[id] as readonly number[]).some((a) => found.has(a))) found.add(id);
  return found;
}

/** The target with zero in place of a node, simplified as derivatives are: it has no twin in numbers. */
function withoutNode(g: Graph, target: number, node: number): number {
  const w = new Writer(g);
  // undefined: zero
  const made = new Map<number, number | undefined>([[node, undefined]]);
  for (const id of coneOf(g, [target], [node])) {
    if (id === node) continue;
    const args = g.args[id] as readonly number[];
    const replaced = args.map((a) => made.get(a));
    const same = args.every((a, i) => replaced[i] === a);
    made.set(id, same ? id : rebuilt(w, id, replaced));
  }
  return made.get(target) ?? w.constant(0);
}

function rebuilt(w: Writer, id: number, args: readonly (number | undefined)[]): number | undefined {
  const { g } = w;
  const [a, b] = args;
  switch (g.ops[id] as Op) {
    case "mean":
      return a;
    case "neg":
      return a === undefined ? a : w.neg(a);
    case "add":
      return a === undefined && b === undefined ? a : w.add(a, b);
    case "sub":
      return a === undefined && b === undefined ? a : w.sub(a, b);
    case "mul":
      return a === undefined || b === undefined ? undefined : w.mul(a, b);
    case "div":
      if (a === undefined) return a;
      break;
    case "call":
      return g.call(
        g.functions[g.values[id] as number] as Graph["functions"][number],
        args.map(w.zeroIfNone),
      );
  }
  return g.node(g.ops[id] as Op, args.map(w.zeroIfNone));
}
