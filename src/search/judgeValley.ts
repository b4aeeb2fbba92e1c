// Decides a stretch with one valley towards zero: it may dip through zero twice, or not at all.
import { doubtAround } from "./doubtAround.ts";
import { leastBetween } from "./endpointForm.ts";
import type { Place, Reader } from "./reader.ts";
import type { Search } from "./search.ts";

const MOST_STEPS = 60;

/**
 * Both places have the same proved sign s, and s·f is strictly convex between them. Closes in on the minimum of s·f until
 * it is proved to be above zero (nothing is there) or below (two zeros); otherwise the stretch around it is in doubt.
 */
export function judgeValley(search: Search, left: Place, right: Place): void {
  const { reader } = search;
  const taken: Place[] = [];
  const bottom = bottomBetween(reader, left, right, taken);
  if (bottom && bottom.sign === -left.sign) {
    search.addZero(left, bottom);
    search.addZero(bottom, right);
  } else if (bottom) doubtAround(search, left, bottom, right);
  for (const place of taken) reader.give(place);
}

/** A place near the minimum that is not proved to have the sign of the ends, or as near as it gets; undefined: no zero. */
function bottomBetween(reader: Reader, left: Place, right: Place, taken: Place[]): Place | undefined {
  const s = left.sign;
  const fall = (p: Place): number => (s > 0 ? p.slopeLow : -p.slopeHigh);
  const rise = (p: Place): number => (s > 0 ? p.slopeHigh : -p.slopeLow);
  const floor = (p: Place): number => (s > 0 ? p.low : -p.high);
  // the slope between two places lies between their slopes
  const clear = (a: Place, b: Place): boolean =>
    leastBetween({ left: floor(a), right: floor(b) }, { fall: fall(a), rise: rise(b) }, b.x - a.x) > 0;
  let [a, b] = [left, right];
  for (let i = 0; ; i++) {
    if (clear(a, b)) return undefined;
    const m = reader.take();
    taken.push(m);
    reader.read(estimate(a, b, fall(a) / (fall(a) - rise(b)), i), m);
    if (m.sign !== s || i === MOST_STEPS) return m;
    if (clear(a, m) && clear(m, b)) return undefined;
    if (m.slopeSign === 0 || m.x === a.x || m.x === b.x) return m;
    if (m.slopeSign === s) b = m;
    else a = m;
  }
}

/** Where the slope, taken as straight, passes zero; every third time the middle, so that the stretch surely shrinks. */
function estimate(a: Place, b: Place, share: number, i: number): number {
  const x = a.x + (b.x - a.x) * share;
  return i % 3 !== 2 && x > a.x && x < b.x ? x : a.x + (b.x - a.x) / 2;
}
