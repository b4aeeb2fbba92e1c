// Copies a part of a graph, with other inputs inside some of its nodes.
import { Graph } from "./node.ts";
import type { Meaning } from "./op.ts";

/** What is put in place of inputs, and where. */
export interface Substitution {
  /** Inputs that may be replaced. */
  readonly inputs: ReadonlySet<number>;
  /** Nodes inside which they are, each with its mark (bits); a node inside several has the marks of all. */
  readonly inside: ReadonlyMap<number, number>;
  /** The node of the copy that stands for an input under these marks (0: outside of all); `undefined` keeps the input. */
  readonly replace: (copy: Graph, input: number, marks: number) => number | undefined;
}

/** A copy and where a node of the original is found in it. */
export interface Copied {
  readonly graph: Graph;
  readonly nodeOf: (id: number) => number;
}

/**
 * A new graph with all that `roots` need: the same operations on the same arguments, so the same bits, but with inputs
 * replaced inside the nodes of `inside`. Identity nodes keep their meaning; only a coupling that happens to lie inside
 * such a node loses its name there, because a name stands for one value.
 */
export function substitute(
  g: Graph,
  roots: readonly number[],
  { inputs, inside, replace }: Substitution,
): Copied {
  const moves = dependents(g, inputs);
  const inner = (id: number, marks: number) => (moves[id] ? marks : 0);
  const copy = new Graph();
  const wanted: (Set<number> | undefined)[] = [];
  const want = (id: number, marks: number) => {
    wanted[id] ??= new Set();
    wanted[id].add(inner(id, marks));
  };
  for (const root of roots) want(root, 0);
  // arguments have smaller ids, so everything is wanted before it is reached
  for (let id = wanted.length - 1; id >= 0; id--) {
    for (const marks of wanted[id] ?? []) {
      for (const a of needsOf(g, id)) want(a, marks | (inside.get(id) ?? 0));
    }
  }
  const copies: Map<number, number>[] = [];
  const found = (id: number, marks: number): number => copies[id]?.get(inner(id, marks)) as number;
  wanted.forEach((contexts, id) => {
    copies[id] = new Map();
    for (const marks of contexts ?? []) {
      const within = marks | (inside.get(id) ?? 0);
      const replaced = inputs.has(id) ? replace(copy, id, marks) : undefined;
      copies[id].set(marks, replaced ?? copyNode(g, id, copy, (a) => found(a, within), marks));
    }
  });
  return { graph: copy, nodeOf: (id) => found(id, 0) };
}

/** Which nodes depend on an input. */
function dependents(g: Graph, inputs: ReadonlySet<number>): Uint8Array {
  const moves = new Uint8Array(g.ops.length);
  for (let id = 0; id < moves.length; id++) {
    if (inputs.has(id) || needsOf(g, id).some((a) => moves[a])) moves[id] = 1;
  }
  return moves;
}

/** The nodes that a node refers to: its arguments, and the wires and demands of a law. */
function needsOf(g: Graph, id: number): readonly number[] {
  const args = g.args[id] as readonly number[];
  const meaning = g.meanings[id];
  if (meaning?.kind !== "law") return args;
  return [...args, ...Object.values(meaning.wires), ...Object.values(meaning.demands).map((d) => d.node)];
}

function copyNode(g: Graph, id: number, copy: Graph, of: (id: number) => number, marks: number): number {
  const meaning = g.meanings[id];
  const dimension = g.dimensions[id];
  const args = (g.args[id] as readonly number[]).map(of);
  const op = g.ops[id] as (typeof g.ops)[number];
  switch (op) {
    case "input":
      return copy.node("input", [], { tag: (meaning as Named).name, meaning: meaning as Named, dimension });
    case "mean":
      if (meaning?.kind === "coupling" && marks !== 0) return args[0] as number;
      return copy.mean(args[0] as number, moved(meaning as Meaning, of), dimension);
    case "call":
      return copy.call(g.functions[g.values[id] as number] as Graph["functions"][number], args);
    case "add":
    case "mul":
      args.sort((a, b) => a - b);
      break;
  }
  return copy.node(op, args, { value: g.values[id] as number, dimension });
}

type Named = Extract<Meaning, { name: string }>;

/** The meaning with the nodes of the copy. */
function moved(meaning: Meaning, of: (id: number) => number): Meaning {
  if (meaning.kind !== "law") return meaning;
  const wires = Object.entries(meaning.wires).map(([name, node]) => [name, of(node)]);
  const demands = Object.entries(meaning.demands).map(([name, d]) => [name, { ...d, node: of(d.node) }]);
  return { ...meaning, wires: Object.fromEntries(wires), demands: Object.fromEntries(demands) };
}
