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
  /** `fold`: λ passes zero; `corner`: λ leaps through zero, at a kink of a law. */
  readonly kind: "fold" | "corner";
  /** At parameters above the fold there are two more states (`above`), or below. */
  readonly exists: "above" | "below";
  /** Lowest and highest value of the second given. */
  readonly range: Range;
  /** Why it ends where it does. */
  readonly ends: readonly [FoldCurveEnd, FoldCurveEnd];
  /** By rising second given. */
  readonly points: readonly FoldPoint[];
}

/**
 * How a fold curve ends: with another fold in a `cusp`, at an `isola` or at a `transcritical` point; at a kink of a law, where it
 * goes on as a `corner`, or away from a kink, where it goes on as a smooth `fold`; at an end of the range of the second given
 * (`between`), of the first (`along`) or of temperature (`within`); or not decided.
 */
export type FoldCurveEnd =
  | ("cusp" | "isola" | "transcritical" | "fold" | "corner")
  | ("between" | "along" | "within" | "undecided");

/** A point at which two fold curves end. */
interface FoldJunction extends FoldPoint {
  /** Proved bounds of the second given. */
  readonly andBracket: Range;
  /** Proved bounds of the temperature, K. */
  readonly temperatureBracket: Range;
}

/** A point at which two folds meet and vanish as the second given changes. */
export interface FoldMeeting extends FoldJunction {
  /** The two folds exist at values of the second given above it, or below. */
  readonly exists: "above" | "below";
  /** Indices of the cooler and the warmer fold curve. */
  readonly curves: readonly [number, number];
}

/** A point at which a smooth fold comes to a kink of a law and goes on as a corner, or the other way round. */
export interface FoldChange extends FoldJunction {
  /** Indices of the curve at lower values of the second given, and of that at higher ones. */
  readonly curves: readonly [number, number];
}

/** Beyond a cusp the answer to the first given is unique there; one of the two may be a corner. */
export interface Cusp extends FoldMeeting {}

/**
 * Two folds at one temperature: an `isola` is an island of states that shrinks to a point and is gone; at a `transcritical` point
 * two branches cross, which pass each other on one side of it and turn back in two folds on the other.
 */
export interface FoldTouch extends FoldMeeting {
  readonly kind: "isola" | "transcritical";
}

/** Values of the second given at which something is not decided. */
export interface UndecidedFolds {
  readonly and: Range;
  /** Temperatures that it can concern, K. */
  readonly temperatures: Range;
  /**
   * `count`: the number of folds is not proved. `kink`: at a kink of a law, where the
   * signs of λ on both sides are not proved. `edge`: a fold on an end of a range, inside or outside. `lost`: a fold could not be
   * followed on. `continuum`: λ is zero, as far as can be told, on a whole stretch of temperatures. `jump`: λ has no value on one
   * side, as at a step of a law. `transcritical`: two folds cross, or turn away from each other closer than rounding. `undefined`:
   * the budget, or the first given that balances it, has no finite value somewhere. `effort`: the search stopped before.
   */
  readonly kind:
    | ("count" | "kink" | "edge" | "lost" | "continuum" | "jump" | "transcritical")
    | ("undefined" | "effort");
}

/** All folds in two givens. A plain frozen object. */
export interface FoldDiagram<A extends string = string> {
  readonly along: A;
  readonly and: A;
  readonly between: Range;
  /** The range of the first given; `null` where it takes any value. */
  readonly alongBetween: Range | null;
  readonly within: Range;
  /** By rising temperature. */
  readonly curves: readonly FoldCurve[];
  readonly cusps: readonly Cusp[];
  readonly touches: readonly FoldTouch[];
  /** By rising temperature. */
  readonly changes: readonly FoldChange[];
  /** `line`: the budget is a straight line in the first given, which takes any value; `space`: both have a range. */
  readonly method: "line" | "space";
  readonly undecided: readonly UndecidedFolds[];
  /** True only if it is proved that there is no other fold at temperatures of the range. */
  readonly complete: boolean;
  readonly proof: "proved" | "partial" | "sampled";
  readonly cost: { readonly boxes: number; readonly points: number };
  readonly constants: string;
}
