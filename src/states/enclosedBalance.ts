// Enclosures of a loop's balance, and of its kinks, as functions of temperature.
import { kept } from "../loop/kept.ts";
import type { Loop } from "../loop/types.ts";
import type { Ends } from "../search/enclosed.ts";
import { type EnclosedKinks, enclosedKinks, kinksOf } from "./enclosedKinks.ts";
import { enclosedNodes } from "./enclosedNodes.ts";
import { shouldersOf } from "./shoulders.ts";

/** A balance that can be enclosed over boxes of temperature, for givens that can be set. */
export interface EnclosedBalance extends EnclosedKinks {
  readonly net: Ends;
  /** For searches of the balance, which write down here where it is to be cut; the guides change with the givens. */
  readonly limits: { effort: number; readonly cuts: number[]; readonly guides: Float64Array };
}

/** The balance of a loop, made once; whoever reads it sets the givens first. */
export const balanceOf: (loop: Loop) => EnclosedBalance = /* @__PURE__ */ kept((loop) =>
  enclosedBalance(loop, new Set(), kinksOf(loop)),
);

/** Prepares the enclosures of a loop's balance; `wide` are the nodes of the givens that may be intervals. */
export function enclosedBalance(
  loop: Loop,
  wide: ReadonlySet<number> = new Set(),
  { kinks, leaps, set }: EnclosedKinks = enclosedKinks(loop, wide),
): EnclosedBalance {
  const nodes = enclosedNodes(loop, wide);
  const shoulders = shouldersOf(loop);
  return {
    ...{ net: nodes.of(loop.net), kinks, leaps },
    limits: { effort: 0, cuts: [], guides: shoulders.places },
    set(low, high) {
      set(low, high);
      nodes.set(low, high);
      shoulders.set(nodes.low);
    },
  };
}
