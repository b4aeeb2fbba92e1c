// Searches for many planets of one loop, one after the other.
import type { Range } from "../ground/range.ts";
import type { Loop } from "../loop/types.ts";
import { balanceOf } from "./enclosedBalance.ts";
import { searchBalance } from "./provedSearch.ts";
import { sampling } from "./sampledSearch.ts";
import type { Found } from "./stateColumns.ts";

/** What is found for a row; the next row overwrites it. */
export interface RowResult {
  readonly zeros: readonly Found[];
  /** How many of them belong to this row. */
  readonly found: number;
  readonly decided: boolean;
  readonly undecided: readonly { readonly kind: string; readonly interval: Range }[];
}

/** Finds the states for values of the givens. */
export type RowSearch = (givens: Float64Array) => RowResult;

/** With proof. Allocates nothing, unless a row is in doubt. */
export function provedRows(loop: Loop, within: Range, effort: number): RowSearch {
  const balance = balanceOf(loop);
  return (givens) => {
    balance.set(givens, givens);
    return searchBalance(balance, within, effort);
  };
}

const SIGNS = { stable: -1, undecided: 0, unstable: 1 } as const;

/** By sampling. */
export function sampledRows(loop: Loop, within: Range, effort: number): RowSearch {
  const search = sampling.searchOf(loop);
  return (givens) => {
    const { located, undecided } = search([...givens], within, effort);
    const zeros = located.map(({ at, lambda, stability }) => ({
      ...{ at, slope: lambda, slopeSign: SIGNS[stability] },
    }));
    return { zeros, found: zeros.length, decided: undecided.length === 0, undecided };
  };
}
