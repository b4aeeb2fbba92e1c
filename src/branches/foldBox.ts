// Boxes of temperature and two givens.
import type { Range } from "../ground/range.ts";
import { pointAt } from "./planeReader.ts";

/** Ranges of temperature and of both givens. */
export interface FoldBox {
  readonly t: Range;
  readonly p: Range;
  readonly q: Range;
}

/** A temperature and both givens. */
export interface FoldPlace {
  readonly t: number;
  readonly p: number;
  readonly q: number;
}

/** A place as a box. */
export const boxAt = ({ t, p, q }: FoldPlace): FoldBox => ({ t: pointAt(t), p: pointAt(p), q: pointAt(q) });

/** Whether a range lies in the interior of another. */
export const inside = (a: Range, b: Range): boolean => a[0] > b[0] && a[1] < b[1];
