// The values of a parameter that give a temperature.
import type { Range } from "../ground/range.ts";
import type { DoubtKind } from "../search/enumeration.ts";
import type { State } from "../states/state.ts";

/** A value of the unknown for which the temperature is an equilibrium. */
export interface Solution {
  readonly value: number;
  /** Two values between which the balance changes sign: proved, and the solution is the only one between. */
  readonly bracket: Range;
  /** Of the state at the temperature. */
  readonly stability: State["stability"];
  /** λ there, W m⁻² K⁻¹. */
  readonly feedbackParameter: number;
}

/** All values of the unknown in a range, and how sure the list is. */
export interface Solutions<A extends string = string> {
  readonly unknown: A;
  readonly unit: string;
  /** K. */
  readonly temperature: number;
  /** By rising value. */
  readonly solutions: readonly Solution[];
  /** True only if it is proved that there is no other value in the range. */
  readonly complete: boolean;
  /** Stretches where the search cannot decide; a `flat` one is balanced throughout, as far as can be told. */
  readonly undecided: readonly { readonly interval: Range; readonly kind: DoubtKind }[];
  readonly proof: "proved" | "partial" | "sampled";
  readonly within: Range;
  /** The values of the other givens, which are held. */
  readonly fixed: Readonly<Record<string, number>>;
  readonly cost: { readonly boxes: number; readonly points: number };
  readonly constants: string;
}
