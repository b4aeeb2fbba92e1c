// The curve p(T) on which a budget is balanced, where every temperature has at most one such parameter p.
import type { Range } from "../ground/range.ts";
import type { Enclosed } from "../search/enclosed.ts";

/** The curve of a loop along one of its givens, once the others are set. */
export interface Curve {
  readonly method: "line" | "monotone";
  /** λ = ∂N/∂T on the curve, as a function of temperature: a fold is a zero, or a kink where its sign changes. */
  readonly feedback: Enclosed;
  /** Differences that are zero at kinks, as functions of temperature. */
  readonly kinks: readonly Enclosed[];
  /** Sets the other givens and the range of the parameter. */
  set(givens: readonly number[], between: Range): void;
  /** The parameter at a temperature, not proved. */
  at(temperature: number): number;
  /** λ at a temperature on the curve, not proved. */
  feedbackAt(temperature: number): number;
  /** Proved bounds of the parameter for temperatures in [low, high]; not finite where there are none. */
  over(low: number, high: number): Range;
}
