// An undecided stretch on its way to the result.

import type { Sign } from "./enclosed.ts";
import { greatestBetween, leastBetween } from "./endpointForm.ts";
import type { DoubtKind, UndecidedStretch } from "./enumeration.ts";
import type { Piece, Place } from "./reader.ts";

/** A stretch and what is known of it. */
export interface Stretch {
  readonly kind: DoubtKind;
  readonly interval: readonly [number, number];
  readonly enclosure: readonly [number, number];
  /** Proved signs at its ends. */
  readonly signs: readonly [Sign, Sign];
  readonly continuous: boolean;
  /** The most zeros that it can hold; infinite where that is not known. */
  readonly most: number;
}

/** The stretch between two places, over which `piece` was read. */
export function stretchOf(kind: DoubtKind, left: Place, right: Place, piece: Piece): Stretch {
  return {
    kind,
    interval: [left.x, right.x],
    enclosure: enclosureOf(left, right, piece),
    signs: [left.sign, right.sign],
    continuous: piece.continuous,
    most: piece.slopeSign !== 0 ? 1 : piece.bend !== 0 ? 2 : Number.POSITIVE_INFINITY,
  };
}

/** Bounds of the function between two places: of the box, tightened by what is known at the ends. */
function enclosureOf(left: Place, right: Place, piece: Piece): [number, number] {
  if (!piece.defined) return [Number.NEGATIVE_INFINITY, Number.POSITIVE_INFINITY];
  const slopes = { fall: piece.slopeLow, rise: piece.slopeHigh };
  const width = right.x - left.x;
  const least = leastBetween({ left: left.low, right: right.low }, slopes, width);
  const greatest = greatestBetween({ left: left.high, right: right.high }, slopes, width);
  const known = piece.continuous && least <= greatest;
  return [
    known && least > piece.low ? least : piece.low,
    known && greatest < piece.high ? greatest : piece.high,
  ];
}

/** Says in words how many zeros a stretch may hold; one that touches without crossing counts twice. */
function countsOf({ signs, continuous, most }: Stretch): string {
  const parity = continuous ? signs[0] * signs[1] : 0;
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
    most: Number.POSITIVE_INFINITY,
  };
}
