// Finds the equilibria of a loop.
import { CONSTANT_SET } from "../ground/constants.ts";
import { deepFreeze } from "../ground/deepFreeze.ts";
import { checkKeys } from "../ground/names.ts";
import { checkedNumber, checkedRange } from "../ground/range.ts";
import type { SearchedFunction } from "../law/functionLaw.ts";
import { givensAt } from "../loop/inputs.ts";
import type { Givens, Loop } from "../loop/types.ts";
import type { Method } from "./located.ts";
import { type Note, searchNote } from "./note.ts";
import { checkOneVariable, readerOf } from "./prepared.ts";
import { proving } from "./provedSearch.ts";
import type { FoundStates, State, Undecided } from "./state.ts";

/** Where to look, for which parameters, and how hard. */
export interface FindStatesOptions<N extends string = string> {
  /** Lowest and highest temperature, K. */
  readonly within: readonly [number, number];
  /** Values of givens that differ from those the loop was closed with. */
  readonly at?: { readonly [K in Givens<N>]?: number };
  /**
   * What the search may spend: boxes of temperature to enclose, 500 unless said; for a loop with a sampled law
   * evaluations of the balance, 20,000 unless said.
   */
  readonly effort?: number;
}

/**
 * Finds all equilibria N(T) = 0 of a loop with one variable in a range of temperature, each with its stability,
 * feedback parameter λ = ∂N/∂T, e-folding time −C/λ and energy ledger.
 *
 * The search encloses N, ∂N/∂T and ∂²N/∂T² over boxes of temperature with outward rounding, so that it proves what it
 * says: with `complete: true` (`proof: "proved"`) every equilibrium in the range is in the list, each is the only one in its
 * bracket, and its imbalance is bounded. What it cannot decide is listed in `undecided`, never dropped. It assumes IEEE
 * double arithmetic, the laws as they are written, and givens inside their declared ranges. A loop with a sampled law is
 * searched by sampling and proves nothing (`proof: "sampled"`).
 *
 * Temperatures in K, λ in W m⁻² K⁻¹, times in s. Throws `out-of-range`, `not-a-number`, `missing` and `unreadable` (for
 * `within`), `unknown-name`, `several-variables`, and `not-finite` when a quantity to be read in a state has no finite
 * value there. Source of the method: Moore, Kearfott & Cloud 2009, Introduction to Interval Analysis (SIAM).
 *
 * @example findStates(loop, { within: [150, 400], at: { flux: 1400 } }).states[0].temperature
 */
export function findStates<N extends string>(loop: Loop<N>, options: FindStatesOptions<N>): FoundStates<N> {
  checkKeys(options, "findStates", ["within", "at", "effort"]);
  checkOneVariable(loop, "findStates");
  const within = checkedRange(options.within, "within", "K", loop.variables[0]?.within);
  const method = methodOf(loop);
  const effort = checkedNumber(options.effort ?? method.effort, "effort", "1", [10, 1e9]);
  const givens = givensAt(loop, options.at);
  const { located, undecided, cost } = method.searchOf(loop)(givens, within, effort);
  const read = readerOf(loop);
  const proof = loop.sampled ? "sampled" : undecided.length === 0 ? "proved" : "partial";
  return Object.freeze({
    states: Object.freeze(located.map((found) => read(found, givens) as State<N>)),
    complete: proof === "proved",
    undecided: deepFreeze(undecided) as readonly Undecided<N>[],
    proof,
    within: Object.freeze(within),
    cost: Object.freeze(cost),
    notes: Object.freeze([...method.notes, ...notesOn(undecided)]),
    constants: CONSTANT_SET,
  });
}

/** With proof, or as a sampled law that takes part brings it along. */
const methodOf = (loop: Loop): Method =>
  loop.sampled ? (loop.graph.functions[0] as SearchedFunction<Method>).search : proving;

const notesOn = (undecided: readonly Undecided[]): Note[] =>
  undecided.some((u) => u.kind === "effort")
    ? [
        searchNote(
          "findStates",
          "search-stopped",
          "caution",
          "the effort was spent before the range was searched",
        ),
      ]
    : [];
