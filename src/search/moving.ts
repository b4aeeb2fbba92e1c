// A function of one unknown that changes while it is followed, and what following it ends in.
import type { Enclosed, Sign } from "./enclosed.ts";
import type { ProvedZero } from "./enumeration.ts";

/** A function that changes along a path; its stage runs from 0, the start, to 1, the end. */
export interface Moving extends Enclosed {
  /** From now on what is read holds for every stage between these two. */
  between(from: number, to: number): void;
  /** True if it is proved to be continuous in x, from a to b, and in the stages that were set, together. */
  unbroken(a: number, b: number): boolean;
  /** True if what is read is sampled: then nothing is proved. */
  readonly sampled: boolean;
  /** False if it does not depend on x at all. */
  readonly responds: boolean;
}

/** A zero alone between two places with proved, opposite signs, and the sign of the slope there. */
export interface Start {
  readonly x: number;
  readonly low: number;
  readonly high: number;
  readonly slope: Sign;
}

/** A zero on its way: at this stage it is the only one between `low` and `high`. */
export interface Underway extends Start {
  readonly stage: number;
}

/** The place where a zero meets another and both vanish. */
export interface Turning {
  /** Best estimate. */
  readonly stage: number;
  readonly x: number;
  /** The zero is still there at the first stage and, near this place, gone at the second. */
  readonly stages: readonly [number, number];
  /** Where it is lost. */
  readonly around: readonly [number, number];
  /** The sign of the function once both are gone. */
  readonly sign: Sign;
  /** True at a kink. */
  readonly corner: boolean;
}

/** What becomes of a zero. */
export type Followed =
  | { readonly outcome: "arrived"; readonly zero: ProvedZero }
  | { readonly outcome: "turned"; readonly turning: Turning }
  /** It leaves the range, or nothing can be said beyond this stage. */
  | { readonly outcome: "left" | "undecided"; readonly stage: number; readonly x: number };
