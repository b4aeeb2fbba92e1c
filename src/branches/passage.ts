// Proves what happens in a narrow stretch of parameters between two numbers of states: a fold, or a state that leaves the range.

import { kept } from "../loop/kept.ts";
import { type EnclosedBalance, enclosedBalance } from "../states/enclosedBalance.ts";
import { enumerateBalance } from "../states/provedSearch.ts";
import { cornerFinder } from "./cornerFinder.ts";
import type { BranchEnd } from "./diagram.ts";
import { exitFinder } from "./exitFinder.ts";
import { foldFinder } from "./foldFinder.ts";
import type { Rest, Stretch } from "./stretch.ts";

/** The end of the branches of these states, if it is proved that nothing else happens in the stretch. */
export type Passage = (stretch: Stretch) => BranchEnd | undefined;

const REST_EFFORT = 400;

/** Prepares the proofs for a loop along one of its givens. */
export const passageOf = /* @__PURE__ */ kept<Passage>((loop, along) => {
  const place = loop.givens.findIndex((g) => g.name === along);
  const wide = enclosedBalance(loop, new Set([loop.givens[place]?.node as number]));
  const rest = restCounter(wide, place);
  const fold = foldFinder(loop, place);
  const corner = cornerFinder(loop, place, wide);
  const exit = exitFinder(loop, place);
  return (stretch) => {
    const [first, second] = stretch.temperatures as [number, number?];
    if (second === undefined) return exit(stretch, first, rest);
    return fold(stretch, [first, second], rest) ?? corner(stretch, [first, second], rest);
  };
});

/** Counts the states outside of a range of temperature. */
export function restCounter(balance: EnclosedBalance, place: number): Rest {
  return ({ parameters, others, within, givens }, [from, to]) => {
    const [low, high] = parameters.map((p) => givens.map((v, i) => (i === place ? p : v)));
    balance.set(low as number[], high as number[]);
    let count = 0;
    for (const range of [[within[0], from] as const, [to, within[1]] as const]) {
      if (!(range[0] < range[1])) continue;
      const { zeros, undecided } = enumerateBalance(balance, range, REST_EFFORT);
      if (undecided.length > 0) return false;
      count += zeros.length;
    }
    return count === others;
  };
}
