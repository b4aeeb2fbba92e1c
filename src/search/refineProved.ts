// Closes a bracket around the only zero of a stretch.
import { approach } from "./approach.ts";
import type { Bracket } from "./bracket.ts";
import { above, below } from "./enclosed.ts";
import { Piece, type Place } from "./reader.ts";
import { roundoffAt } from "./roundoff.ts";
import type { Zero } from "./zero.ts";

const MOST_WIDENINGS = 60;
/** Takes away more than the rounding of a few products. */
const SURELY = 0.999999999999999;

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
  if (reader.bendIsDear || !closeByMeanValue(reader.bend(), place, zero)) closeByReading(bracket, zero);
  if (bracket.low.x > zero.low) zero.low = bracket.low.x;
  if (bracket.high.x < zero.high) zero.high = bracket.high.x;
}

/**
 * Near the place, the slope is what it is there, but for what the curvature can change. So how far the function moves at least
 * tells from where on its sign is proved. False where that is not known.
 */
function closeByMeanValue({ smooth, bends }: Piece, place: Place, zero: Zero): boolean {
  if (!smooth) return false;
  const steep = zero.direction > 0 ? place.slopeLow : -place.slopeHigh;
  const reach = (2 * zero.size) / steep + 8 * roundoffAt(place.x);
  const curvature = Math.max(-(bends[0] as number), bends[1] as number);
  const change = above(curvature * reach);
  zero.slopeLow = below(place.slopeLow - change);
  zero.slopeHigh = above(place.slopeHigh + change);
  const least = zero.direction > 0 ? zero.slopeLow : -zero.slopeHigh;
  if (!(steep > 0 && least > 0)) return false;
  for (let side = -1; side <= 1; side += 2) {
    // how far the function may still be on the wrong side of zero
    const rest = side * zero.direction > 0 ? -place.low : place.high;
    const gap = rest / (least * SURELY);
    let end = rest < 0 ? place.x : NaN;
    for (let i = 1, far = gap + roundoffAt(place.x); Number.isNaN(end) && i < 5; i++, far *= 1.25) {
      const x = place.x + side * far;
      const apart = Math.abs(x - place.x);
      if (apart * SURELY > gap && apart < reach * SURELY) end = x;
    }
    if (side < 0) zero.low = end;
    else zero.high = end;
  }
  if (!(zero.low <= zero.at && zero.at <= zero.high)) return false;
  if (place.sign === 0) step(place, zero);
  return true;
}

/** One more step of Newton's method, so small that the function there need not be read. */
function step(place: Place, zero: Zero): void {
  const at = place.x - (place.low + place.high) / (2 * zero.slope);
  if (!(at >= zero.low && at <= zero.high)) return;
  const moved = at - place.x;
  const low = below(place.low + below((moved > 0 ? zero.slopeLow : zero.slopeHigh) * moved));
  const high = above(place.high + above((moved > 0 ? zero.slopeHigh : zero.slopeLow) * moved));
  zero.at = at;
  zero.size = Math.max(high, -low);
}

const around = /* @__PURE__ */ new Piece();

/** Reads the signs on both sides, and the slope between. */
function closeByReading(bracket: Bracket, zero: Zero): void {
  const noise = zero.size / Math.abs(zero.slope);
  const start = roundoffAt(zero.at) + (noise < bracket.high.x - bracket.low.x ? 1.25 * noise : 0);
  for (let side = -1; side <= 1; side += 2) {
    for (let gap = start, i = 0; i < MOST_WIDENINGS; i++, gap *= 3) {
      bracket.trial.x = zero.at + side * gap;
      if (!bracket.holdsTrial()) break;
      bracket.readTrial();
    }
  }
  zero.low = bracket.low.x;
  zero.high = bracket.high.x;
  bracket.reader.between(bracket.low, bracket.high, around);
  zero.slopeLow = around.slopeLow;
  zero.slopeHigh = around.slopeHigh;
}
