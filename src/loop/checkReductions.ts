// Refuses a forcing that was written as a heating, or with the wrong sign as a cooling.
import type { Graph } from "../graph/node.ts";
import { fail } from "../ground/errors.ts";

/** What a term of a flow is multiplied by: its sign where that can be told. */
type Sign = 1 | -1 | 0;

/**
 * Throws `bad-budget` if a flow adds a law that reduces cooling to the heating side, or to the cooling side without a minus.
 * Only sums, differences and factors are looked through: what another law makes of a forcing is that law's own affair.
 */
export function checkReductions(graph: Graph, flow: number, side: Sign, path: string): void {
  const seen = new Set<string>();
  const visit = (node: number, sign: Sign): void => {
    if (seen.has(`${node} ${sign}`)) return;
    seen.add(`${node} ${sign}`);
    const meaning = graph.meanings[node];
    if (meaning?.kind === "law") {
      const { name, reduces } = meaning.card;
      if (reduces === "cooling" && (side === 1 || side * sign === -1)) {
        fail("bad-budget", { path, value: name, allowed: "a forcing on the cooling side, subtracted" });
      }
      return;
    }
    for (const [term, factor] of termsOf(graph, node)) visit(term, (sign * factor) as Sign);
  };
  visit(flow, 1);
}

/** The terms of a node that reach the sum, each with the sign of its factor. */
function termsOf(graph: Graph, node: number): (readonly [number, Sign])[] {
  const [a, b] = graph.args[node] as readonly [number, number];
  switch (graph.ops[node]) {
    case "mean":
      return [[a, 1]];
    case "neg":
      return [[a, -1]];
    case "add":
    case "min":
    case "max":
      return [
        [a, 1],
        [b, 1],
      ];
    case "sub":
      return [
        [a, 1],
        [b, -1],
      ];
    case "mul":
      return [
        [a, signOf(graph, b)],
        [b, signOf(graph, a)],
      ];
    case "div":
      return [[a, signOf(graph, b)]];
    default:
      return [];
  }
}

/** The sign of a constant; of anything else it cannot be told. */
const signOf = (graph: Graph, node: number): Sign =>
  graph.ops[node] === "const" ? (Math.sign(graph.values[node] as number) as Sign) : 0;
