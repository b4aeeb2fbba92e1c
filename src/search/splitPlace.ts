// Chooses where to split a box.
import type { Place, Reader } from "./reader.ts";
import type { Search } from "./search.ts";

/** From the middle outwards, off the places where symmetric problems have their zeros. */
const SHARES = [0.503, 0.371, 0.629, 0.247, 0.753, 0.129, 0.877];
/** Boxes wider than this many times `fine` are split even if no sign is proved inside. */
const WIDE = 8;
const MOST_HALVINGS = 60;
/** Part of a box that must be gained. */
const WORTHWHILE = 1e-3;

/**
 * A place between two others with a proved sign, as near the middle as it is found. If there is none, the last one that is
 * proved as seen from an end; if that takes away nothing worth it, undefined: splitting would not help.
 */
export function splitPlace({ reader, fine }: Search, left: Place, right: Place): Place | undefined {
  const width = right.x - left.x;
  const place = reader.take();
  for (let i = 0; i < SHARES.length; i++) {
    place.x = left.x + width * (SHARES[i] as number);
    if (reader.readAt(place).sign !== 0) return place;
  }
  if (width > WIDE * fine) return reader.read(left.x + width * (SHARES[0] as number), place);
  const inner = width * (SHARES[5] as number);
  for (let side = 1; side >= -1; side -= 2) {
    const end = side > 0 ? left : right;
    const reach = lastProved(reader, end, side * inner, place);
    if (Math.abs(reach) > width * WORTHWHILE) return reader.read(end.x + reach, place);
  }
  reader.give(place);
  return undefined;
}

/** How far from an end with a proved sign, at most as far as `inner`, signs are proved. */
function lastProved(reader: Reader, end: Place, inner: number, place: Place): number {
  if (end.sign === 0) return 0;
  let [near, far] = [0, inner];
  for (let i = 0; i < MOST_HALVINGS; i++) {
    const middle = (near + far) / 2;
    const x = end.x + middle;
    if (x === end.x + near || x === end.x + far) break;
    if (reader.read(x, place).sign !== 0) near = middle;
    else far = middle;
  }
  return near;
}
