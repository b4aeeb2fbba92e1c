// Decides a box, if what was read over it allows.
import { isClear } from "./isClear.ts";
import { judgeValley } from "./judgeValley.ts";
import type { Place } from "./reader.ts";
import type { Search } from "./search.ts";

/** In boxes wider than this many times `fine`, the curvature decides too little to be read. */
const BENT = 4;
/** The same where reading it is dear. */
const BENT_IF_DEAR = 0.015625;

/**
 * Tries, over the box between two places that the reader's piece was read over: the sign of the value; monotony with proved
 * signs at both ends; the end-point form; the sign of the curvature. True when the zeros of the box are known (and added).
 */
export function decideBox(search: Search, left: Place, right: Place): boolean {
  const { piece } = search.reader;
  if (piece.sign !== 0) return true;
  const s = left.sign;
  if (s === 0 || right.sign === 0 || !piece.continuous) return false;
  if (piece.slopeSign !== 0) {
    search.addZero(left, right);
    return true;
  }
  if (s === right.sign && isClear(left, right, piece, piece)) return true;
  const { reader } = search;
  if (right.x - left.x > (reader.bendIsDear ? BENT_IF_DEAR : BENT) * search.fine) return false;
  const { bend } = reader.bend();
  // strictly convex or concave: one zero where the signs differ, and none where a hill lies between equal ones
  if (s !== right.sign && bend !== 0) search.addZero(left, right);
  else if (bend === s) judgeValley(search, left, right);
  return bend !== 0;
}
