// What a proved search hands back.
import type { Sign } from "./enclosed.ts";

/** A zero, proved: exactly one lies in its bracket. */
export interface ProvedZero {
  readonly at: number;
  /** The signs at both ends are proved, and differ. */
  readonly bracket: readonly [number, number];
  /** Proved sign of the slope over the bracket; 0: not proved. */
  readonly slopeSign: Sign;
  /** 1: the function rises through zero; −1: it falls. Proved. */
  readonly direction: 1 | -1;
  /** A bound of the function's size at `at`. */
  readonly size: number;
  /** The slope at `at`, not proved, and bounds of the slope over the bracket. */
  readonly slope: number;
  readonly slopes: readonly [number, number];
}

/**
 * Why a stretch is undecided. `fold`: smooth, and two zeros about to merge cannot be told from none (or more of them
 * from fewer). `corner`: the same at a kink. `flat`: the function cannot be told from zero on a whole stretch.
 * `edge`: a zero at an end of the range, inside or outside. `jump`: continuous nowhere near, as far as is known: a leap,
 * or a vertical tangent. `undefined`: the function has no finite value somewhere. `effort`: not searched.
 */
export type DoubtKind = "fold" | "corner" | "flat" | "edge" | "jump" | "undefined" | "effort";

/** A stretch in which the zeros are not known. */
export interface UndecidedStretch {
  readonly interval: readonly [number, number];
  readonly kind: DoubtKind;
  /** How many zeros it may hold; one that touches without crossing counts twice. */
  readonly counts: string;
  /** Bounds of the function there. Infinite where none are known. */
  readonly enclosure: readonly [number, number];
}

/** All zeros in a range. The list is complete, and proved to be, if and only if nothing is undecided. */
export interface Enumeration {
  readonly zeros: readonly ProvedZero[];
  readonly undecided: readonly UndecidedStretch[];
  /** Readings of a box, and at a point. */
  readonly boxes: number;
  readonly points: number;
}
