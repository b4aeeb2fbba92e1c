// A fold followed through values of the second given.
import type { Range } from "../ground/range.ts";
import type { FoldPlace } from "./foldBox.ts";
import type { FoldCap } from "./foldCap.ts";
import type { FoldCurveEnd } from "./foldDiagram.ts";
import type { FoldTube } from "./foldTube.ts";

/** Where a chain ends. */
export interface ChainEnd {
  readonly kind: FoldCurveEnd;
  readonly at: FoldPlace;
  /** Bounds of the second given there: proved unless the kind is `undecided`. */
  readonly atBracket: Range;
  readonly cap: FoldCap | null;
}

/** A fold from one end to the other: neighbouring tubes hold the same one where they meet. */
export interface FoldChain {
  /** By rising second given. */
  readonly tubes: readonly FoldTube[];
  readonly low: ChainEnd;
  readonly high: ChainEnd;
}
