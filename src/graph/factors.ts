// Writes a node as a product of two others.
import { coneOf } from "./cone.ts";
import { Writer } from "./derivative.ts";
import type { Graph } from "./node.ts";
import type { Op } from "./op.ts";

/** node = factor · rest, as real numbers, wherever no divisor is zero. */
export interface Factored {
  readonly factor: number;
  readonly rest: number;
}

/**
 * The ways in which the graph shows a node as a product of two that depend on the unknown: as a multiplication, or by a factor
 * that all terms of a sum have in common, so that p·x − x² is x·(p − x).
 */
export function factorsOf(g: Graph, target: number, unknown: number): Factored[] {
  const moved = new Set([unknown]);
  for (const id of coneOf(g, [target], [unknown]))
    if ((g.args[id] as readonly number[]).some((a) => moved.has(a))) moved.add(id);
  const whole = bare(g, target);
  const w = new Writer(g);
  return [...partsOf(g, whole)]
    .filter((id) => id !== whole && moved.has(id) && holds(g, whole, id, new Map()))
    .map((factor) => ({ factor, rest: without(w, whole, factor) }))
    .filter(({ rest }) => coneOf(g, [rest]).includes(unknown));
}

/** Names and units around a node do not change its value. */
function bare(g: Graph, id: number): number {
  let inner = id;
  while (g.ops[inner] === "mean") inner = argument(g, inner, 0);
  return inner;
}

const argument = (g: Graph, id: number, i: number): number => (g.args[id] as readonly number[])[i] as number;

/** The arguments through which a factor can reach a node: in sums it must be in both, in products in one. */
const THROUGH: Partial<Record<Op, { readonly places: readonly number[]; readonly all: boolean }>> = {
  neg: { places: [0], all: true },
  div: { places: [0], all: true },
  mul: { places: [0, 1], all: false },
  add: { places: [0, 1], all: true },
  sub: { places: [0, 1], all: true },
};

function partsOf(g: Graph, id: number, found = new Set<number>()): Set<number> {
  if (found.has(id)) return found;
  found.add(id);
  for (const i of THROUGH[g.ops[id] as Op]?.places ?? []) partsOf(g, bare(g, argument(g, id, i)), found);
  return found;
}

/** Whether a node (without names) is a multiple of a factor. */
function holds(g: Graph, id: number, factor: number, known: Map<number, boolean>): boolean {
  if (id === factor) return true;
  const before = known.get(id);
  if (before !== undefined) return before;
  const through = THROUGH[g.ops[id] as Op];
  const inside = (i: number) => holds(g, bare(g, argument(g, id, i)), factor, known);
  const found =
    through !== undefined && (through.all ? through.places.every(inside) : through.places.some(inside));
  known.set(id, found);
  return found;
}

/** The node divided by a factor that it holds. */
function without(w: Writer, id: number, factor: number): number {
  if (id === factor) return w.constant(1);
  const { g } = w;
  const at = (i: number) => bare(g, argument(g, id, i));
  const divided = (i: number) => without(w, at(i), factor);
  switch (g.ops[id]) {
    case "neg":
      return w.neg(divided(0));
    case "div":
      return g.node("div", [divided(0), at(1)]);
    case "mul":
      return holds(g, at(0), factor, new Map()) ? w.mul(divided(0), at(1)) : w.mul(at(0), divided(1));
    case "add":
      return w.add(divided(0), divided(1));
    default:
      return w.sub(divided(0), divided(1));
  }
}
