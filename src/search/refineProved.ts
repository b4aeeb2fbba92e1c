// Closes a bracket around the only zero of a stretch.
import { approach } from "./approach.ts";
import type { Bracket } from "./bracket.ts";
import { above, below } from "./enclosed.ts";
import { Piece, type Place } from "./reader.ts";
import { roundoffAt } from "./roundoff.ts";
import type { Zero } from "./zero.ts";

const MOST_WIDENINGS = 60;
/** Takes away more than the rounding of a few products. */
const SURELY = 1 - 1e-15;

/**
 * Writes down the zero between two places with proved, opposite signs, known to be the only one there. The reader's piece
 * must have been read over the stretch, or over more. The signs next to the zero follow from the mean value theorem, or
 * else are read.
 */
export function refineProved(bracket: Bracket, left: Place, right: Place, zero: Zero): void {
  bracket.start(left, right);
  const place = approach(bracket);
  const { reader } = bracket;
  zero.at = place.x;
  zero.direction = left.sign === 1 ? -1 : 1;
  zero.size = Math.max(place.high, -place.low);
  zero.slope = place.slopeLow + (place.slopeHigh - place.slopeLow) / 2;
  if (!closeByMeanValue(reader.bend(), place, zero)) closeByReading(bracket, zero);
  if (bracket.low.x > zero.low) zero.low = bracket.low.x;
  if (bracket.high.x < zero.high) zero.high = bracket.high.x;
}

/**
 * Near the place, the slope is what it is there, but for what the curvature can change. How far the function moves at least
 * tells from where on its sign is proved. False where that is not known.
 */
function closeByMeanValue({ smooth, bends }: Piece, place: Place, zero: Zero): boolean {
  if (!smooth) return false;
  const rising = zero.direction > 0;
  const steep = rising ? place.slopeLow : -place.slopeHigh;
  const reach = (2 * zero.size) / steep + 8 * roundoffAt(zero.at);
  const curvature = Math.max(-(bends[0] as number), bends[1] as number);
  const change = above(curvature * reach);
  zero.slopeLow = below(place.slopeLow - change);
  zero.slopeHigh = above(place.slopeHigh + change);
  const least = rising ? zero.slopeLow : -zero.slopeHigh;
  if (!(steep > 0 && least > 0)) return false;
  zero.low = awayFrom(zero.at, -reach, (rising ? place.high : -place.low) / (least * SURELY));
  zero.high = awayFrom(zero.at, reach, (rising ? -place.low : place.high) / (least * SURELY));
  return zero.low <= zero.at && zero.at <= zero.high;
}

/** The next number at least `gap` away from x, but nearer than `reach`, on its side; NaN if there is none. */
function awayFrom(x: number, reach: number, gap: number): number {
  if (gap < 0) return x;
  const side = reach > 0 ? 1 : -1;
  let wider = gap + roundoffAt(x);
  for (let i = 0; i < 4; i++, wider *= 1.25) {
    const end = x + side * wider;
    const apart = Math.abs(end - x);
    if (apart * SURELY > gap && apart < Math.abs(reach) * SURELY) return end;
  }
  return Number.NaN;
}

const around = /* @__PURE__ */ new Piece();

/** Reads the signs on both sides, and the slope between. */
function closeByReading(bracket: Bracket, zero: Zero): void {
  const noise = zero.size / Math.abs(zero.slope);
  const start = roundoffAt(zero.at) + (noise < bracket.high.x - bracket.low.x ? 1.25 * noise : 0);
  for (let side = -1; side <= 1; side += 2) {
    let gap = start;
    for (let i = 0; i < MOST_WIDENINGS && bracket.holds(zero.at + side * gap); i++, gap *= 3) {
      bracket.trial.x = zero.at + side * gap;
      bracket.readTrial();
    }
  }
  zero.low = bracket.low.x;
  zero.high = bracket.high.x;
  bracket.reader.between(bracket.low, bracket.high, around);
  zero.slopeLow = around.slopeLow;
  zero.slopeHigh = around.slopeHigh;
}
