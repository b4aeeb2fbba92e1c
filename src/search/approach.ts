// Finds the only zero between two places; nothing is proved but the signs of what is read.
import type { Bracket } from "./bracket.ts";
import type { Place } from "./reader.ts";
import { roundoffAt } from "./roundoff.ts";

const MOST_STEPS = 120;
/** A function that rises between two places is taken for steady if its slopes there are no less than this part of the chord's. */
const FLATTEST = 0.333;

/**
 * Reads ever closer to the zero in a bracket, until its sign cannot be told or no number is left between; returns the place read
 * last. Each step interpolates between the ends (Newton's method where that fails), with bisection where a step leaves the
 * bracket or does not halve the one before.
 */
export function approach(bracket: Bracket): Place {
  let step = bracket.high.x - bracket.low.x;
  let units = 1;
  interpolate(bracket);
  if (!bracket.holdsTrial()) aimBesideVertex(bracket);
  if (!bracket.holdsTrial()) halve(bracket);
  for (let i = 0; ; i++) {
    const place = bracket.readTrial();
    if (place.sign === 0 || i === MOST_STEPS) return place;
    const { trial } = bracket;
    interpolate(bracket);
    if (!bracket.holdsTrial())
      trial.x = place.x - (place.low + place.high) / (place.slopeLow + place.slopeHigh);
    // a step that rounding swallows is made long enough to pass the zero
    const least = units * roundoffAt(place.x);
    if (Math.abs(trial.x - place.x) <= least) {
      trial.x = place.x + (place === bracket.low ? least : -least);
      units *= 2;
    } else if (!(Math.abs(trial.x - place.x) <= step / 2)) halve(bracket);
    if (!bracket.holdsTrial()) halve(bracket);
    if (!bracket.holdsTrial()) return place;
    step = Math.abs(trial.x - place.x);
  }
}

/** Where the cubic through both ends, with their slopes, taken as x over the value, passes zero; NaN where it may turn. */
function interpolate({ low: a, high: b, trial }: Bracket): void {
  const from = a.low + a.high;
  const to = b.low + b.high;
  const width = b.x - a.x;
  const share = 1 / (to - from);
  const first = (a.slopeLow + a.slopeHigh) * width * share;
  const last = (b.slopeLow + b.slopeHigh) * width * share;
  const t = -from * share;
  const u = to * share;
  const tilt = t * u * (u / first - t / last);
  trial.x = !(first >= FLATTEST && last >= FLATTEST)
    ? NaN
    : t < u
      ? a.x + width * (t * t * (3 - 2 * t) + tilt)
      : b.x - width * (u * u * (3 - 2 * u) - tilt);
}

/** The parabola that has its vertex at the end with the lesser slope, as at the bottom of a valley. */
function aimBesideVertex({ low, high, trial }: Bracket): void {
  const flat = Math.abs(low.slopeLow) < Math.abs(high.slopeLow) ? low : high;
  const steep = flat === low ? high : low;
  trial.x = flat.x + (steep.x - flat.x) * Math.sqrt(flat.low / (flat.low - steep.low));
}

function halve({ low, high, trial }: Bracket): void {
  trial.x = low.x + (high.x - low.x) / 2;
}
