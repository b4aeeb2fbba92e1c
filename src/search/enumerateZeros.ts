// All zeros of a function of one unknown, with proof. Knows nothing of what the function means.
import { fail } from "../ground/errors.ts";
import { decideBox } from "./decideBox.ts";
import { doubtKind } from "./doubtKind.ts";
import type { Enclosed } from "./enclosed.ts";
import type { Enumeration } from "./enumeration.ts";
import { mergeDoubts } from "./mergeDoubts.ts";
import { type Place, Reader } from "./reader.ts";
import { roundoffAt } from "./roundoff.ts";
import type { Search } from "./search.ts";
import { splitPlace } from "./splitPlace.ts";
import { startPlaces } from "./startPlaces.ts";
import { stretchOf } from "./stretch.ts";

/** How a search is limited and helped. */
export interface EnumerationOptions {
  /** How many boxes may be read; what is left then is undecided. Closing in a fold may read one more for each. */
  readonly effort: number;
  /** Places of known kinks; where they are missing or wrong, the search takes longer. */
  readonly cuts?: readonly number[];
  /** A length over which the function changes little, in the unit of x; 8 unless said. */
  readonly fine?: number;
}

/** Boxes are halved down to this part of `fine`, or to a few units in the last place. */
const FINEST = 1e-13;

/**
 * Finds every zero in the range, from left to right. A box between two places is decided by the sign of the value over it;
 * by monotony and the signs at its ends; by the end-point form; by the sign of the curvature. One that is not is split at a
 * place where the sign is proved, until it is too small or nothing inside it has a proved sign; then it is undecided.
 * The bracket of each zero holds exactly one; outside of brackets and undecided stretches there is none.
 *
 * Throws `out-of-range` if the range is not two rising finite numbers.
 */
export function enumerateZeros(
  f: Enclosed,
  range: readonly [number, number],
  { effort, cuts = [], fine = 8 }: EnumerationOptions,
): Enumeration {
  const [from, to] = range;
  if (!(from < to && to - from < Number.POSITIVE_INFINITY))
    fail("out-of-range", { path: "range", value: range, allowed: "two rising finite numbers" });
  const reader = Reader.of(f);
  const search: Search = { reader, range, fine, zeros: [], doubts: [] };
  // places still to pass, from right to left: the box under work lies between the last two
  const ahead = startPlaces(reader, range, { cuts, fine }).reverse();
  while (ahead.length > 1) {
    const left = ahead.at(-1) as Place;
    const right = ahead.at(-2) as Place;
    if (!(reader.boxes < effort)) {
      const end = ahead[0] as Place;
      search.doubts.push(stretchOf("effort", left, end, reader.box(left.x, end.x)));
      break;
    }
    const piece = reader.box(left.x, right.x);
    if (!decideBox(search, left, right)) {
      const coarse = right.x - left.x > finest(left.x, right.x, fine);
      const place = coarse ? splitPlace(reader, left, right, fine) : undefined;
      if (place) {
        ahead[ahead.length - 1] = place;
        ahead.push(left);
        continue;
      }
      search.doubts.push(stretchOf(doubtKind({ left, right, piece }, search, coarse), left, right, piece));
    }
    ahead.pop();
    reader.give(left);
  }
  for (const place of ahead) reader.give(place);
  return {
    zeros: search.zeros,
    undecided: mergeDoubts(search.doubts),
    boxes: reader.boxes,
    points: reader.points,
  };
}

function finest(a: number, b: number, fine: number): number {
  return Math.max(fine * FINEST, 16 * roundoffAt(a), 16 * roundoffAt(b));
}
