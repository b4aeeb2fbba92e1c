// What is said of a change with and without couplings.
import type { Range } from "../ground/range.ts";
import type { Couplings, Givens } from "../loop/types.ts";
import type { State } from "../states/state.ts";
import type { FeedbackNote } from "./feedbackNote.ts";

/** A place on the path of the givens. */
export interface PathPlace<N extends string = string> {
  /** 0 at the old givens, 1 at the new. */
  readonly stage: number;
  readonly givens: { readonly [K in Givens<N>]: number };
  /** K. */
  readonly temperature: number;
}

/** Where and why a branch cannot be followed to the new givens. */
export interface BranchLoss<N extends string = string> extends PathPlace<N> {
  /**
   * `fold`: the branch meets another and ends; `corner-fold`: the same at a kink of a law. `range`: it leaves the range of
   * temperature. `no-response`: nothing that is left answers to temperature. `undecided`: not proved beyond this place.
   */
  readonly reason: "fold" | "corner-fold" | "range" | "no-response" | "undecided";
  /** For a fold: stages between which the state is lost, proved; `null` otherwise, and for a sampled loop. */
  readonly between: Range | null;
  /** Whether the climate then warms or cools; `null` if there is no fold. */
  readonly drift: "warms" | "cools" | null;
  /** The next state that way: where the climate goes. `null` if there is none in the range, or it is not known. */
  readonly next: (PathPlace<N> & { readonly bracket: Range }) | null;
  /** `found`, `outside` (no state that way inside the range) or `undecided`; `null` if there is no fold. */
  readonly nextIs: "found" | "outside" | "undecided" | null;
}

/** The answer with some of the couplings held. */
export interface HeldResponse<N extends string = string> {
  readonly held: readonly Couplings<N>[];
  /** ΔT, K; `null` where the branch is lost. */
  readonly temperatureChange: number | null;
  readonly lost: BranchLoss<N> | null;
}

/** The answer to a change of givens with and without couplings. A plain frozen object. */
export interface HeldComparison<N extends string = string> {
  readonly from: PathPlace<N>;
  /** The state on the same branch at the new givens, with everything known about it; `null` where the branch is lost. */
  readonly to: State<N> | null;
  readonly hold: readonly Couplings<N>[];
  /** ΔT of the loop as it is, K. */
  readonly temperatureChange: number | null;
  /** ΔT with all of `hold` held, K. */
  readonly temperatureChangeHeld: number | null;
  /**
   * 1 − ΔT/ΔT_held: 1 for a climate that stays, negative for one that amplifies, above 1 for one that turns the change round.
   * `null` where one of the two is lost, and where the brackets before and after do not tell ΔT_held from 0.
   */
  readonly regulation: number | null;
  /** What each coupling adds to ΔT, K: Shapley values, so that no order is preferred; they add up to ΔT − ΔT_held. */
  readonly shares: { readonly [K in Couplings<N>]?: number } | null;
  /** Every choice of what is held, from none to all. */
  readonly subsets: readonly HeldResponse<N>[];
  /** Those of the subsets whose branch is lost: the reason why `shares` is `null`. */
  readonly lost: readonly (HeldResponse<N> & { readonly lost: BranchLoss<N> })[];
  /** How many choices were followed. */
  readonly evaluations: number;
  readonly within: Range;
  /** `proved`: every branch was followed, or lost, with proof. */
  readonly proof: "proved" | "partial" | "sampled";
  readonly notes: readonly FeedbackNote[];
}
