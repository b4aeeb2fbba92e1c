// What a search tells of the states it found, before everything about them is read.
import type { Range } from "../ground/range.ts";
import type { Loop } from "../loop/types.ts";
import type { Note } from "./note.ts";
import type { State, Undecided } from "./state.ts";

/** A state that a search found. */
export interface Located {
  readonly at: number;
  readonly bracket: Range;
  readonly stability: State["stability"];
  /** λ at the temperature, W m⁻² K⁻¹. */
  readonly lambda: number;
  /** Proved bounds of λ over the bracket; `null` where nothing is proved. */
  readonly slope: Range | null;
  /** Bound of |N| at the temperature, W m⁻². */
  readonly imbalance: number;
}

/** All that a search tells. */
export interface Search {
  readonly located: readonly Located[];
  readonly undecided: readonly Undecided[];
  readonly cost: { readonly boxes: number; readonly points: number };
}

/** A search prepared for one loop, for any values of its givens. */
export type StateSearch = (givens: readonly number[], within: Range, effort: number) => Search;

/** A way to search loops. */
export interface Method {
  /** The search of a loop, prepared once. */
  readonly searchOf: (loop: Loop) => StateSearch;
  /** What a search may spend unless said. */
  readonly effort: number;
  /** What must be known of everything that is found. */
  readonly notes: readonly Note[];
}
