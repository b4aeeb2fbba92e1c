// Decides a stretch with one valley towards zero: it may dip through zero twice, or not at all.
import { doubtAround } from "./doubtAround.ts";
import { fallOf, isClear, riseOf } from "./isClear.ts";
import type { Place, Reader } from "./reader.ts";
import type { Search } from "./search.ts";

const MOST_STEPS = 60;

/**
 * Both places have the same proved sign s, and s·f is strictly convex between them. Closes in on the minimum of s·f until
 * it is proved to be above zero (nothing is there) or below (two zeros); otherwise the stretch around it is in doubt.
 */
export function judgeValley(search: Search, left: Place, right: Place): void {
  const { reader } = search;
  const bottom = bottomBetween(reader, left, right);
  if (!bottom) return;
  if (bottom.sign === -left.sign) {
    search.addZero(left, bottom);
    search.addZero(bottom, right);
  } else doubtAround(search, left, bottom, right);
  reader.give(bottom);
}

/** A place near the minimum that is not proved to have the sign of the ends, or as near as it gets; undefined: no zero. */
function bottomBetween(reader: Reader, left: Place, right: Place): Place | undefined {
  const s = left.sign;
  let a = left;
  let b = right;
  let bottom: Place | undefined;
  for (let i = 0; !isClear(a, b, a, b); i++) {
    const m = reader.take();
    aim(m, a, b, i);
    reader.readAt(m);
    if (m.sign === s && i < MOST_STEPS && isClear(a, m, a, m) && isClear(m, b, m, b)) {
      reader.give(m);
      break;
    }
    if (m.sign !== s || i === MOST_STEPS || m.slopeSign === 0 || m.x === a.x || m.x === b.x) {
      bottom = m;
      break;
    }
    const passed = m.slopeSign === s ? b : a;
    if (passed === b) b = m;
    else a = m;
    if (passed !== left && passed !== right) reader.give(passed);
  }
  if (a !== left) reader.give(a);
  if (b !== right) reader.give(b);
  return bottom;
}

/** Where the slope, taken as straight, passes zero; every third time the middle, so that the stretch surely shrinks. */
function aim(place: Place, a: Place, b: Place, i: number): void {
  const width = b.x - a.x;
  const fall = fallOf(a, a.sign);
  const rise = riseOf(b, a.sign);
  place.x = a.x + width * (fall / (fall - rise));
  if (i % 3 === 2 || !(place.x > a.x && place.x < b.x)) place.x = a.x + width / 2;
}
