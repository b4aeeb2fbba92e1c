// Names the reason why a box stays undecided.
import type { DoubtKind } from "./enumeration.ts";
import type { Piece, Place } from "./reader.ts";

/** A stretch narrower than this part of `fine` without a proved sign inside is a point seen through rounding. */
const POINT = 0.01;

/** The kind of an undecided box; `faint`: no sign could be proved at any place inside it. */
export function doubtKind(
  { left, right, piece }: { left: Place; right: Place; piece: Piece },
  { from, to, fine }: { from: number; to: number; fine: number },
  faint: boolean,
): DoubtKind {
  if (!piece.defined) return "undefined";
  if (!piece.continuous) return "jump";
  const atFrom = left.x === from && left.sign === 0 && right.sign !== 0;
  const atTo = right.x === to && right.sign === 0 && left.sign !== 0;
  if ((atFrom || atTo) && (piece.slopeSign !== 0 || !faint)) return "edge";
  if (left.sign === 0 || right.sign === 0) return "flat";
  if (faint && right.x - left.x > POINT * fine) return "flat";
  return piece.smooth ? "fold" : "corner";
}
