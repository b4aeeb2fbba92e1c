// Joins undecided neighbours and words the result.
import type { UndecidedStretch } from "./enumeration.ts";
import type { Stretch } from "./stretch.ts";

/** Says in words how many zeros a stretch may hold; one that touches without crossing counts twice. */
function countsOf({ kind, signs, continuous, most }: Stretch): string {
  const parity = continuous ? signs[0] * signs[1] : 0;
  // a continuum has no number of zeros that could be odd
  if (kind === "flat") return parity < 0 ? "1 or more" : "0 or more";
  if (parity > 0) return most <= 2 ? "0 or 2" : "0, or an even number";
  if (parity < 0) return "1, or an odd number";
  return most === 1 ? "0 or 1" : most === 2 ? "0, 1 or 2" : "0 or more";
}

/** Joins neighbours of one kind, and words the result. */
export function mergeDoubts(doubts: readonly Stretch[]): UndecidedStretch[] {
  const merged: Stretch[] = [];
  for (const next of doubts) {
    const last = merged.at(-1);
    if (last && last.kind === next.kind && last.interval[1] === next.interval[0])
      merged[merged.length - 1] = joined(last, next);
    else merged.push(next);
  }
  return merged.map((d) => ({
    interval: d.interval,
    kind: d.kind,
    counts: countsOf(d),
    enclosure: d.enclosure,
  }));
}

function joined(a: Stretch, b: Stretch): Stretch {
  return {
    kind: a.kind,
    interval: [a.interval[0], b.interval[1]],
    enclosure: [Math.min(a.enclosure[0], b.enclosure[0]), Math.max(a.enclosure[1], b.enclosure[1])],
    signs: [a.signs[0], b.signs[1]],
    continuous: a.continuous && b.continuous,
    most: Infinity,
  };
}
