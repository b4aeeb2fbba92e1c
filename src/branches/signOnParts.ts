// The sign of a function over a range, read in parts.
import type { Range } from "../ground/range.ts";
import type { Sign } from "../search/enclosed.ts";
import { middleOf } from "./stretch.ts";

/** A range is halved so often until the sign is proved on each part. */
const MOST_HALVINGS = 6;

/** The sign of something over a range; 0 where it is not proved to be one on each of its parts. */
export function signOnParts(range: Range, signOver: (part: Range) => Sign, halvings = MOST_HALVINGS): Sign {
  const sign = signOver(range);
  if (sign !== 0 || halvings === 0) return sign;
  const middle = middleOf(range);
  const below = signOnParts([range[0], middle], signOver, halvings - 1);
  return below !== 0 && below === signOnParts([middle, range[1]], signOver, halvings - 1) ? below : 0;
}
