// Closes a bracket around the only zero of a stretch.
import { Bracket } from "./bracket.ts";
import type { Sign } from "./enclosed.ts";
import type { ProvedZero } from "./enumeration.ts";
import type { Place, Reader } from "./reader.ts";
import { roundoffAt } from "./roundoff.ts";

const MOST_STEPS = 120;
const MOST_WIDENINGS = 60;

/**
 * The zero between two places with proved, opposite signs, known to be the only one there. Newton's method inside the
 * bracket finds it; then the signs are proved just below and just above. `slope`: the proved sign of the slope, if it is
 * known over the whole stretch; 0: the slope is monotone there, and its signs at both ends decide.
 */
export function refineProved(reader: Reader, left: Place, right: Place, slope: Sign): ProvedZero {
  const bracket = new Bracket(reader, left, right);
  const { at, noise } = approach(bracket, firstGuess(left, right, slope));
  prove(bracket, at, noise, -1);
  prove(bracket, at, noise, 1);
  const { low, high } = bracket;
  const zero: ProvedZero = {
    at: at >= low.x && at <= high.x ? at : bracket.middle(),
    bracket: [low.x, high.x],
    slopeSign: slope || (low.slopeSign === high.slopeSign ? low.slopeSign : 0),
    direction: left.sign === 1 ? -1 : 1,
  };
  bracket.close();
  return zero;
}

/**
 * Newton's step from the end where the function is smaller, if it stays inside; from the other; the middle. Where the
 * slope may vanish at an end, as at the bottom of a valley: the parabola that has its vertex there.
 */
function firstGuess(left: Place, right: Place, slope: Sign): number {
  const [flat, steep] = Math.abs(left.slopeLow) < Math.abs(right.slopeLow) ? [left, right] : [right, left];
  if (slope === 0) {
    const guess = flat.x + (steep.x - flat.x) * Math.sqrt(flat.low / (flat.low - steep.low));
    if (guess > left.x && guess < right.x) return guess;
  }
  const near = Math.abs(left.low) < Math.abs(right.low) ? left : right;
  for (const p of [near, near === left ? right : left]) {
    const guess = p.x - (p.low + p.high) / (p.slopeLow + p.slopeHigh);
    if (guess > left.x && guess < right.x) return guess;
  }
  return left.x + (right.x - left.x) / 2;
}

/** Newton's method, with bisection where a step leaves the bracket or does not halve the one before. */
function approach(bracket: Bracket, guess: number): { at: number; noise: number } {
  let x = guess;
  let at = guess;
  let noise = 0;
  let step = bracket.high.x - bracket.low.x;
  for (let i = 0; i < MOST_STEPS; i++) {
    const place = bracket.trial;
    const sign = bracket.read(x);
    const slope = (place.slopeLow + place.slopeHigh) / 2;
    const newton = x - (place.low + place.high) / 2 / slope;
    noise = (place.high - place.low) / 2 / Math.abs(slope);
    at = bracket.holds(newton) ? newton : x;
    if (sign === 0) break;
    const next = at === newton && Math.abs(newton - x) <= step / 2 ? newton : bracket.middle();
    if (!bracket.holds(next)) break;
    step = Math.abs(next - x);
    x = next;
  }
  return { at, noise };
}

/**
 * Moves one end close to the zero: as far from it as noise reaches, then three times as far until the sign is proved. Once
 * it is, what lies further out is no longer inside the bracket.
 */
function prove(bracket: Bracket, at: number, noise: number, side: 1 | -1): void {
  let gap = roundoffAt(at) + (noise < bracket.high.x - bracket.low.x ? 1.25 * noise : 0);
  for (let i = 0; i < MOST_WIDENINGS && bracket.holds(at + side * gap); i++, gap *= 3)
    bracket.read(at + side * gap);
}
