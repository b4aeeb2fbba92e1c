// Enclosures of what is zero at the kinks and leaps behind a loop's balance.
import { coneOf } from "../graph/cone.ts";
import { inputsOf } from "../loop/inputs.ts";
import { kept } from "../loop/kept.ts";
import type { Loop } from "../loop/types.ts";
import type { Ends } from "../search/enclosed.ts";
import { enclosedNodes, type SetGivens } from "./enclosedNodes.ts";

/** Functions of temperature, for givens that can be set. */
export interface EnclosedKinks {
  /** For every min(a, b) and max(a, b) behind the balance: a − b, which is zero at the kink; then the leaps. */
  readonly kinks: readonly Ends[];
  /** For every step(a) behind the balance: a, which is zero at the leap. */
  readonly leaps: readonly Ends[];
  readonly set: SetGivens;
}

/** The kinks of a loop, made once; whoever reads them sets the givens first. */
export const kinksOf: (loop: Loop) => EnclosedKinks = /* @__PURE__ */ kept((loop) =>
  enclosedKinks(loop, new Set()),
);

/** Prepares the kinks of a loop; `wide` are the nodes of the givens that may be intervals. */
export function enclosedKinks(loop: Loop, wide: ReadonlySet<number>): EnclosedKinks {
  const { graph, net } = loop;
  const nodes = enclosedNodes(loop, wide);
  const argumentsOf = (...ops: string[]) =>
    coneOf(graph, [net], inputsOf(loop))
      .filter((id) => ops.includes(graph.ops[id] as string))
      .map((id) => graph.args[id] as readonly number[]);
  const differences = argumentsOf("min", "max").map((args) => graph.node("sub", args));
  const leaps = [...new Set(argumentsOf("step").flat())].map(nodes.of);
  return { kinks: [...[...new Set(differences)].map(nodes.of), ...leaps], leaps, set: nodes.set };
}
