// The curve p(T) on which a budget is balanced, where every temperature has at most one such parameter p.
import type { Range } from "../ground/range.ts";
import type { Sign } from "../search/enclosed.ts";
import type { Criticals } from "./criticals.ts";
import type { Diagram } from "./diagram.ts";
import type { ZeroReader } from "./zeroReader.ts";

/** The curve of a loop along one of its givens. */
export interface Curve {
  readonly method: Diagram["method"];
  /** Whether the curve can be read a little outside of the parameter's range. */
  readonly reachesBeyond: boolean;
  /** Sets the other givens and the ranges; false if it is not known that each temperature has at most one parameter. */
  set(givens: readonly number[], between: Range, within: Range): boolean;
  /** The parameter at a temperature, not proved. */
  at(temperature: number): number;
  /** λ = ∂N/∂T at a temperature on the curve, not proved. */
  feedbackAt(temperature: number): number;
  /** The sign of λ there, proved unless the curve is sampled. */
  signAt(temperature: number): Sign;
  /** Whether the parameter rises (1) or falls (−1) with temperature there, proved unless the curve is sampled; 0: not proved. */
  rises(temperature: number): Sign;
  /** Bounds of the parameter for temperatures between two, proved unless the curve is sampled; not finite where there are none. */
  over(low: number, high: number): Range;
  /** Reads a function that has the zeros of N and is known with the curve; undefined where N itself must be read. */
  reader?(): ZeroReader | undefined;
  /** Where λ passes zero between two temperatures: the folds, and what cannot be decided. */
  criticals(range: Range, effort: number): Criticals;
}
