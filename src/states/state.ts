// An equilibrium with everything known about it.
import type { Couplings, Givens, Variables } from "../loop/types.ts";
import type { Note } from "./note.ts";

/** Who gives whom how much: for every reservoir but space, inflow − outflow = storage. */
export interface Ledger {
  readonly reservoirs: readonly {
    readonly name: string;
    /** Heat taken up, W m⁻², known without the flows: N for the surface, 0 for a layer; `null` for space. */
    readonly storage: number | null;
  }[];
  readonly flows: readonly {
    readonly name: string;
    readonly from: string;
    readonly to: string;
    /** W m⁻² of the planet's whole area. */
    readonly value: number;
    /** The CF standard name, where there is one. */
    readonly standardName: string | null;
  }[];
}

/** An equilibrium of a loop. A plain frozen object: it survives `JSON.stringify` and back. */
export interface State<N extends string = string> {
  readonly variables: {
    readonly [K in Variables<N>]: { readonly value: number; readonly bracket: readonly [number, number] };
  };
  /** K; the same number as in `variables`, by its usual name. */
  readonly temperature: number;
  /** The two temperatures between which the balance changes sign, K. */
  readonly bracket: readonly [number, number];
  /** The parameters to which the state belongs. */
  readonly givens: { readonly [K in Givens<N>]: number };
  readonly couplings: { readonly [K in Couplings<N>]: number };
  readonly report: Readonly<Record<string, number>>;
  /** `stable`: a small disturbance dies away. `undecided`: λ cannot be told from zero. */
  readonly stability: "stable" | "unstable" | "undecided";
  /** λ/C, s⁻¹; `null` where temperature follows at once (C = 0). */
  readonly eigenvalues: readonly { readonly re: number; readonly im: number }[] | null;
  /** λ = ∂N/∂T with other variables frozen, W m⁻² K⁻¹; negative when it restores. */
  readonly feedbackParameter: number;
  /** λ with other variables in balance; the same number when there are none. */
  readonly settledFeedbackParameter: number;
  /** −C/λ, s; `null` for a state that does not return. */
  readonly eFoldingTime: number | null;
  /** |N| at the reported temperature, W m⁻². */
  readonly imbalance: { readonly [K in Variables<N>]: number };
  readonly ledger: Ledger;
  readonly notes: readonly Note[];
}

/** A part of the range where the search cannot decide. */
export interface Undecided {
  readonly interval: readonly [number, number];
  /**
   * `fold`: two states about to merge, or none. `flat`: balanced on a whole stretch. `jump`: the balance changes sign without passing through zero. `edge`: a state at an end of the range.
   * `undefined`: the budget has no value there. `effort`: the search stopped before.
   */
  readonly kind: "fold" | "flat" | "jump" | "edge" | "undefined" | "effort";
}

/** What a search for states found, how sure it is, and what it cost. */
export interface FoundStates<N extends string = string> {
  /** By rising temperature. */
  readonly states: readonly State<N>[];
  /** True only if it is proved that no other equilibrium lies in the range. */
  readonly complete: boolean;
  readonly undecided: readonly Undecided[];
  /** `sampled`: found by sampling, so states may be missing. */
  readonly proof: "sampled";
  readonly within: readonly [number, number];
  readonly cost: { readonly evaluations: number };
  readonly notes: readonly Note[];
  /** The set of constants behind the numbers. */
  readonly constants: string;
}
