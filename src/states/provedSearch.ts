// The proved search: every equilibrium in a range of temperature, each enclosed, and proof that there is no other.
import type { Range } from "../ground/range.ts";
import { kept } from "../loop/kept.ts";
import type { Loop } from "../loop/types.ts";
import type { Ends } from "../search/enclosed.ts";
import { type EnumerationOptions, enumerateZeros, searchZeros } from "../search/enumerateZeros.ts";
import type { Enumeration, ProvedZero } from "../search/enumeration.ts";
import type { Search } from "../search/search.ts";
import type { Zero } from "../search/zero.ts";
import { balanceOf, type EnclosedBalance } from "./enclosedBalance.ts";
import { foldDistances } from "./foldDistances.ts";
import type { Located, Method, StateSearch } from "./located.ts";
import type { State } from "./state.ts";

/** What finding the place of one kink may cost; a kink that is not found only makes the search longer. */
const KINK_LIMITS = { effort: 60 };

/** Prepares the proved search of a loop. */
function provedSearch(loop: Loop): StateSearch {
  const balance = balanceOf(loop);
  return (givens, within, effort) => {
    balance.set(givens, givens);
    const { zeros, undecided, boxes, points } = enumerateBalance(balance, within, effort);
    return {
      located: zeros.map(located),
      undecided: undecided.map(({ interval, kind, counts, enclosure }) => ({
        interval,
        kind,
        counts,
        enclosure: enclosure.every(Number.isFinite) ? enclosure : null,
        distances:
          kind === "fold" || kind === "corner" ? foldDistances(loop, givens, { interval, enclosure }) : null,
      })),
      cost: { boxes, points },
    };
  };
}

/** The proved search; its effort is a number of boxes. */
export const proving: Method = { searchOf: /* @__PURE__ */ kept(provedSearch), effort: 500, notes: [] };

/** Enumerates the zeros of a balance whose givens are set. */
export function enumerateBalance(balance: EnclosedBalance, within: Range, effort: number): Enumeration {
  return enumerateZeros(balance.net, within, cutsOf(balance, within, effort));
}

/** The same; what is found stays in the search, until the balance is searched again. */
export function searchBalance(balance: EnclosedBalance, within: Range, effort: number): Search {
  return searchZeros(balance.net, within, cutsOf(balance, within, effort));
}

/** The range is cut at both ends of each kink's bracket and at shoulders. The same object for each search of a balance. */
function cutsOf({ kinks, limits }: EnclosedBalance, within: Range, effort: number): EnumerationOptions {
  const { cuts } = limits;
  limits.effort = effort;
  if (cuts.length > 0) cuts.length = 0;
  for (let k = 0; k < kinks.length; k++) {
    const { zeros, found } = searchZeros(kinks[k] as Ends, within, KINK_LIMITS);
    for (let i = 0; i < found; i++) cuts.push((zeros[i] as Zero).low, (zeros[i] as Zero).high);
  }
  return limits;
}

const STABILITY: Readonly<Record<number, State["stability"]>> = {
  [-1]: "stable",
  0: "undecided",
  1: "unstable",
};

/** A zero of the balance as a state: λ is its slope. */
export const located = ({ at, bracket, slopeSign, size, slope, slopes }: ProvedZero): Located => ({
  ...{ at, bracket, stability: STABILITY[slopeSign] as State["stability"] },
  ...{ lambda: slope, slope: slopes, imbalance: size },
});
