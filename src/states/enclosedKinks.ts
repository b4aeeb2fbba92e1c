// Enclosures of what is zero at the kinks and leaps behind a loop's balance.
import { kept } from "../loop/kept.ts";
import type { Loop } from "../loop/types.ts";
import type { Ends } from "../search/enclosed.ts";
import { enclosedNodes, type SetGivens } from "./enclosedNodes.ts";
import { kinkNodes, leapNodes } from "./kinkNodes.ts";

/** Functions of temperature, for givens that can be set. */
export interface EnclosedKinks {
  /** For every min and max of a and b behind the balance: a − b, which is zero at the kink; then the leaps. */
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
  const nodes = enclosedNodes(loop, wide);
  const leaps = leapNodes(loop).map(nodes.of);
  return { kinks: [...kinkNodes(loop).map(({ node }) => nodes.of(node)), ...leaps], leaps, set: nodes.set };
}
