// An equilibrium with everything known about it.
import type { Couplings, Givens, Variables } from "../loop/types.ts";
import type { Note } from "./note.ts";

/** Who gives whom how much: for every reservoir with a storage, inflow − outflow = storage. */
export interface Ledger {
  readonly reservoirs: readonly {
    readonly name: string;
    /** Heat taken up, W m⁻², known without the flows: N for the surface, 0 for a layer; `null` for space and the interior. */
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
  /** The two temperatures between which the balance changes sign, K: proved, and the state is the only one between. */
  readonly bracket: readonly [number, number];
  /** The parameters to which the state belongs. */
  readonly givens: { readonly [K in Givens<N>]: number };
  readonly couplings: { readonly [K in Couplings<N>]: number };
  readonly report: Readonly<Record<string, number>>;
  /** `stable`: a small disturbance dies away. `undecided`: the sign of λ is not known. */
  readonly stability: "stable" | "unstable" | "undecided";
  /** λ/C, s⁻¹; `null` where temperature follows at once (C = 0). */
  readonly eigenvalues: readonly { readonly re: number; readonly im: number }[] | null;
  /** λ = ∂N/∂T with other variables frozen, W m⁻² K⁻¹; negative when it restores. */
  readonly feedbackParameter: number;
  /** Proved bounds of λ over the bracket; `null` for a state found by sampling. */
  readonly feedbackParameterRange: readonly [number, number] | null;
  /** λ with other variables in balance; the same number when there are none. */
  readonly settledFeedbackParameter: number;
  /** −C/λ, s; `null` for a state that does not return, or where C < 0 (then it is `invalid` too). */
  readonly eFoldingTime: number | null;
  /** Bound of |N| at the reported temperature, W m⁻²: proved, unless the state was found by sampling. */
  readonly imbalance: { readonly [K in Variables<N>]: number };
  readonly ledger: Ledger;
  /** True if the state is proved and no law is used outside of the range in which it has a meaning. */
  readonly proved: boolean;
  readonly notes: readonly Note[];
}

/** A part of the range where the search cannot decide. */
export interface Undecided<N extends string = string> {
  readonly interval: readonly [number, number];
  /**
   * `fold`: two states about to merge, or none. `corner`: the same at a kink of a law. `flat`: balanced, as far as can be
   * told, on a whole stretch. `jump`: the balance changes sign without passing through zero, as at a step.
   * `edge`: a state at an end of the range, inside or outside. `undefined`: the budget has no finite value somewhere.
   * `effort`: the search stopped before.
   */
  readonly kind: "fold" | "corner" | "flat" | "jump" | "edge" | "undefined" | "effort";
  /** How many states it may hold, in words; `null` where nothing is proved. */
  readonly counts: string | null;
  /** Proved bounds of N there, W m⁻²; `null` where none are known. */
  readonly enclosure: readonly [number, number] | null;
  /**
   * For a fold or a corner: by how much each given would have to change for N to touch zero there, to first order; `null`
   * where N does not answer to it in a known direction.
   */
  readonly distances: { readonly [K in Givens<N>]: readonly [number, number] | null } | null;
}

/** What a search for states found, how sure it is, and what it cost. */
export interface FoundStates<N extends string = string> {
  /** By rising temperature. */
  readonly states: readonly State<N>[];
  /** True only if it is proved that no other equilibrium lies in the range. */
  readonly complete: boolean;
  readonly undecided: readonly Undecided<N>[];
  /**
   * `proved`: every state is in the list, each alone in its bracket. `partial`: the same outside of the stretches in
   * `undecided`. `sampled`: found by sampling, so states may be missing (only where a law is an ordinary function).
   */
  readonly proof: "proved" | "partial" | "sampled";
  readonly within: readonly [number, number];
  /** Boxes enclosed, and points at which the balance was read. */
  readonly cost: { readonly boxes: number; readonly points: number };
  readonly notes: readonly Note[];
  /** The set of constants behind the numbers. */
  readonly constants: string;
}
