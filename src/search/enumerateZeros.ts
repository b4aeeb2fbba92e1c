// All zeros of a function of one unknown, with proof. Knows nothing of what the function means.
import { fail } from "../ground/errors.ts";
import { decideBox } from "./decideBox.ts";
import { doubtKind } from "./doubtKind.ts";
import type { Ends } from "./enclosed.ts";
import type { DoubtKind, Enumeration } from "./enumeration.ts";
import type { Place } from "./reader.ts";
import { roundoffAt } from "./roundoff.ts";
import { Search } from "./search.ts";
import { splitPlace } from "./splitPlace.ts";
import { startPlaces } from "./startPlaces.ts";
import { stretchOf } from "./stretch.ts";

/** How a search is limited and helped. */
export interface EnumerationOptions {
  /** How many boxes may be read; what is left then is undecided. Closing in a fold may read one more for each. */
  readonly effort: number;
  /** Places of known kinks; where they are missing or wrong, the search takes longer. */
  readonly cuts?: readonly number[];
  /** Places at which the function may turn; numbers outside of the range and NaN are left out. */
  readonly guides?: ArrayLike<number>;
  /** A length over which the function changes little, in the unit of x; 8 unless said. */
  readonly fine?: number;
}

/** Boxes are halved down to this part of `fine`, or to a few units in the last place. */
const FINEST = 1e-13;
const NONE: readonly number[] = [];

/**
 * Finds every zero in the range, from left to right. A box between two places is decided by the sign of the value over it;
 * by monotony and the signs at its ends; by the end-point form; by the sign of the curvature. One that is not is split at a
 * place where the sign is proved, until it is too small or nothing inside it has a proved sign; then it is undecided.
 * The bracket of each zero holds exactly one; outside of brackets and undecided stretches there is none.
 *
 * Throws `out-of-range` if the range is not two rising finite numbers.
 */
export function enumerateZeros(
  f: Ends,
  range: readonly [number, number],
  options: EnumerationOptions,
): Enumeration {
  const search = searchZeros(f, range, options);
  const { reader, found } = search;
  return {
    zeros: search.zeros.slice(0, found).map((zero) => zero.proved),
    undecided: search.undecided,
    boxes: reader.boxes,
    points: reader.points,
  };
}

/** The same; what is found stays in the search, until the function is searched again. Allocates nothing unless in doubt. */
export function searchZeros(
  f: Ends,
  range: readonly [number, number],
  { effort, cuts = NONE, guides = NONE, fine = 8 }: EnumerationOptions,
): Search {
  const from = range[0];
  const to = range[1];
  if (!(from < to && to - from < Infinity))
    fail("out-of-range", { path: "range", value: range, allowed: "two rising finite numbers" });
  const search = Search.of(f);
  const { reader, ahead } = search;
  search.start(from, to, fine);
  startPlaces(search, cuts, guides);
  // the box under work lies between the last two places
  while (ahead.length > 1) {
    const left = ahead[ahead.length - 1] as Place;
    const right = ahead[ahead.length - 2] as Place;
    if (!(reader.boxes < effort)) {
      const end = ahead[0] as Place;
      reader.between(left, end);
      doubt(search, "effort", left, end);
      break;
    }
    reader.between(left, right);
    if (!decideBox(search, left, right)) {
      const coarse = isCoarse(left, right, search);
      const place = coarse ? splitPlace(search, left, right) : undefined;
      if (place) {
        ahead[ahead.length - 1] = place;
        ahead.push(left);
        continue;
      }
      const kind = doubtKind({ left, right, piece: reader.bend() }, search, coarse);
      doubt(search, kind, left, right);
    }
    ahead.pop();
    reader.give(left);
  }
  while (ahead.length > 0) reader.give(ahead.pop() as Place);
  return search;
}

/** Adds the stretch between two places, over which the last piece was read. */
function doubt({ reader, doubts }: Search, kind: DoubtKind, left: Place, right: Place): void {
  doubts.push(stretchOf(kind, left, right, reader.bend()));
}

/** Whether a box is wide enough to be split. */
function isCoarse(left: Place, right: Place, { fine }: Search): boolean {
  const width = right.x - left.x;
  return width > fine * FINEST && width > 16 * roundoffAt(left.x) && width > 16 * roundoffAt(right.x);
}
