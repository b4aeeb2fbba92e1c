// Encloses what depends on which of two values is the lesser.
import { type Enclosure, isPoint } from "./enclosure.ts";
import type { EnclosureWriter } from "./enclosureWriter.ts";

/**
 * x where a < b, y where a ≥ b. Undecided, it is the hull of both: a kink counts with both its slopes. It is a failure
 * where there is no such hull (`exists` false: a curvature at a kink) and where a or b has failed. Two points that are
 * equal are undecided too.
 */
export function encloseBranch(
  w: EnclosureWriter,
  exists: boolean,
  [a, b, x, y]: readonly [Enclosure, Enclosure, Enclosure, Enclosure],
): Enclosure {
  const zero = w.literal(0);
  const failed = w.literal(NaN);
  const error = w.widened(w.sum(a.err, b.err));
  // Exact ends are compared. Others must differ by more than their errors; rounding the difference is in these.
  const isFirst = error === undefined ? [a.hi, b.lo] : [error, w.sub(b.lo, a.hi)];
  const isSecond =
    error !== undefined ? [error, w.sub(a.lo, b.hi)] : isPoint(a) && isPoint(b) ? [b.hi, a.lo] : undefined;
  const branch = (first: number, second: number, either: number): number => {
    const rest = isSecond
      ? w.pick(isSecond[0] as number, isSecond[1] as number, second, either)
      : w.pick(a.lo, b.hi, either, second);
    return w.pick(isFirst[0] as number, isFirst[1] as number, first, rest);
  };
  const either = w.sum(w.sum(x.err, y.err), w.times(zero, error));
  const exact = exists && either === undefined;
  return {
    lo: branch(x.lo, y.lo, exists ? w.least(x.lo, y.lo) : failed),
    hi: branch(x.hi, y.hi, exists ? w.greatest(x.hi, y.hi) : failed),
    err: exact ? undefined : branch(x.err ?? zero, y.err ?? zero, exists ? (either as number) : failed),
    within: [Math.min(x.within[0], y.within[0]), Math.max(x.within[1], y.within[1])],
  };
}
