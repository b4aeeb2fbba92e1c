// An undecided stretch, before neighbours are joined.

import type { Sign } from "./enclosed.ts";
import { greatestBetween, leastBetween } from "./endpointForm.ts";
import type { DoubtKind } from "./enumeration.ts";
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
    most: piece.slopeSign !== 0 ? 1 : piece.bend !== 0 ? 2 : Infinity,
  };
}

/** Bounds of the function between two places: of the box, tightened by what is known at the ends. */
function enclosureOf(left: Place, right: Place, piece: Piece): [number, number] {
  if (!piece.defined) return [-Infinity, Infinity];
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
