// Finds the only zero between two places; nothing is proved but the signs of what is read.
import type { Bracket } from "./bracket.ts";
import type { Place } from "./reader.ts";

const MOST_STEPS = 120;
/** The inverse of a function may leave its chord by this many times the chord's own slope, and still be taken for rising. */
const STEEPEST = 3;

/**
 * Reads ever closer to the zero in a bracket, until its sign cannot be told or no number is left between; returns the place read
 * last. Each step interpolates between the ends (Newton's method where that fails), with bisection where a step leaves the
 * bracket or does not halve the one before.
 */
export function approach(bracket: Bracket): Place {
  const { low, high } = bracket;
  let step = high.x - low.x;
  let x = interpolated(low, high);
  if (!bracket.holds(x)) x = vertexed(low, high);
  if (!bracket.holds(x)) x = bracket.middle();
  for (let i = 0; ; i++) {
    bracket.trial.x = x;
    const place = bracket.readTrial();
    if (place.sign === 0 || i === MOST_STEPS) return place;
    let next = interpolated(bracket.low, bracket.high);
    if (!bracket.holds(next)) next = newton(place);
    if (!(bracket.holds(next) && Math.abs(next - x) <= step / 2)) next = bracket.middle();
    if (!bracket.holds(next)) return place;
    step = Math.abs(next - x);
    x = next;
  }
}

/** Where the cubic through both places, with their slopes, taken as x over the value, passes zero; NaN if it turns. */
function interpolated(a: Place, b: Place): number {
  const from = a.low + a.high;
  const rise = b.low + b.high - from;
  const width = b.x - a.x;
  const first = rise / ((a.slopeLow + a.slopeHigh) * width);
  const last = rise / ((b.slopeLow + b.slopeHigh) * width);
  if (!(first > 0 && first <= STEEPEST && last > 0 && last <= STEEPEST)) return Number.NaN;
  const t = -from / rise;
  const u = (b.low + b.high) / rise;
  const tilt = t * u * (u * first - t * last);
  return t < u ? a.x + width * (t * t * (3 - 2 * t) + tilt) : b.x - width * (u * u * (3 - 2 * u) - tilt);
}

const newton = (p: Place): number => p.x - (p.low + p.high) / (p.slopeLow + p.slopeHigh);

/** The parabola that has its vertex at the end with the lesser slope, as at the bottom of a valley. */
function vertexed(low: Place, high: Place): number {
  const flat = Math.abs(low.slopeLow) < Math.abs(high.slopeLow) ? low : high;
  const steep = flat === low ? high : low;
  return flat.x + (steep.x - flat.x) * Math.sqrt(flat.low / (flat.low - steep.low));
}
