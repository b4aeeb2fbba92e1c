// Closes in a minimum that cannot be told from zero.

import type { Place, Reader } from "./reader.ts";
import { roundoffAt } from "./roundoff.ts";
import type { Search } from "./search.ts";
import { stretchOf } from "./stretch.ts";

/**
 * Around `bottom`, near the minimum of a function convex towards zero between `left` and `right`, finds the nearest places
 * from which on it is proved to move away from zero. What lies between them is in doubt; if a place turns out to lie
 * beyond zero, there are two zeros after all.
 */
export function doubtAround(search: Search, left: Place, bottom: Place, right: Place): void {
  const { reader } = search;
  const s = left.sign;
  const start = firstGap(left, bottom, right);
  const low = reader.take();
  const high = reader.take();
  const a = leaving(reader, { bottom, end: left, spare: low }, start);
  const b = a.sign === -s ? a : leaving(reader, { bottom, end: right, spare: high }, start);
  if (b.sign === -s) {
    search.addZero(left, b);
    search.addZero(b, right);
  } else {
    const piece = reader.between(a, b);
    if (piece.sign === 0) search.doubts.push({ ...stretchOf("fold", a, b, piece), most: 2 });
  }
  reader.give(low);
  reader.give(high);
}

/** About as far as the value at the bottom takes a parabola. */
function firstGap(left: Place, bottom: Place, right: Place): number {
  const bend = Math.abs((right.slopeLow - left.slopeLow) / (right.x - left.x));
  const gap = Math.sqrt(Math.max(Math.abs(bottom.low), Math.abs(bottom.high)) / bend);
  return Math.max(roundoffAt(bottom.x), gap < right.x - left.x ? gap : 0);
}

/** From the bottom towards an end: the first place read beyond zero, or proved to move away from it; at last the end. */
function leaving(
  reader: Reader,
  { bottom, end, spare }: { bottom: Place; end: Place; spare: Place },
  start: number,
): Place {
  const s = end.sign;
  const side = end.x < bottom.x ? -1 : 1;
  for (let gap = start; gap < Math.abs(end.x - bottom.x); gap *= 3) {
    reader.read(bottom.x + side * gap, spare);
    if (spare.sign === -s || (spare.sign === s && spare.slopeSign === side * s)) return spare;
  }
  return end;
}
