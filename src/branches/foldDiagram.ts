// What is said of the folds of a loop in two of its givens.
import type { Range } from "../ground/range.ts";

/** A fold, or a cusp, in both givens. */
export interface FoldPoint {
  /** The first given. */
  readonly at: number;
  /** The second given. */
  readonly and: number;
  /** K. */
  readonly temperature: number;
}

/** A fold that moves with the second given. */
export interface FoldCurve {
  /** At parameters above the fold there are two more states (`above`), or below. */
  readonly exists: "above" | "below";
  /** Lowest and highest value of the second given. */
  readonly range: Range;
  /** Why it ends where it does: `cusp`, `between`, `within` or `undecided`. */
  readonly ends: readonly [FoldCurveEnd, FoldCurveEnd];
  /** By rising second given. */
  readonly points: readonly FoldPoint[];
}

/** How a fold curve ends: in a cusp; at an end of the range of the second given, or of temperature; or not decided. */
export type FoldCurveEnd = "cusp" | "between" | "within" | "undecided";

/** A point at which two folds meet and vanish: beyond it the answer to the first given is smooth and unique. */
export interface Cusp extends FoldPoint {
  /** Proved bounds of the second given. */
  readonly andBracket: Range;
  /** Proved bounds of the temperature, K. */
  readonly temperatureBracket: Range;
  /** The two folds exist at values of the second given above it, or below. */
  readonly exists: "above" | "below";
  /** Indices of the cooler and the warmer fold curve. */
  readonly curves: readonly [number, number];
}

/** All folds in two givens. A plain frozen object. */
export interface FoldDiagram<A extends string = string> {
  readonly along: A;
  readonly and: A;
  readonly between: Range;
  readonly within: Range;
  /** By rising temperature. */
  readonly curves: readonly FoldCurve[];
  readonly cusps: readonly Cusp[];
  /** Values of the second given at which the number of folds is not proved. */
  readonly undecided: readonly Range[];
  /** True only if it is proved that there is no other fold at temperatures of the range. */
  readonly complete: boolean;
  readonly proof: "proved" | "partial" | "sampled";
  readonly cost: { readonly boxes: number; readonly points: number };
  readonly constants: string;
}
