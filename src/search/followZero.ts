// Follows a zero of a function while the function changes, with proof.
import { Bracket } from "./bracket.ts";
import { endsOf, type Sign } from "./enclosed.ts";
import type { Followed, Moving, Start, Underway } from "./moving.ts";
import { readBox } from "./readBox.ts";
import { Reader } from "./reader.ts";
import { refineProved } from "./refineProved.ts";
import { findTurning, LEAST_REACH, proveTurning, type TurningPlace } from "./turning.ts";
import { Zero } from "./zero.ts";

/** Steps of the path below this are not tried; two zeros closer to meeting than this are not told apart. */
const FINEST_STEP = 1e-14;
/** A turning point is looked for when steps fall below this, and each time they have become so much smaller again. */
const SUSPECT = 0.015625;
/** How far a box reaches beyond its zeros, as a share of their distance; widened while its edges are not decided. */
const FIRST_SPREAD = 0.25;
const WIDEST_SPREAD = 64;
const MOST_TILES = 5000;

/**
 * Follows a zero from stage 0 to 1 by tiles, each a stretch of stages and a box. In a tile the slope has one proved sign, and
 * the function has proved, opposite signs along both edges: so at each stage there is exactly one zero in the box, and
 * boxes that overlap hold the same zero. Where steps become small the turning point ahead is found, the zero is followed to
 * just before it, and then proved to be gone just behind it.
 */
export function followZero(f: Moving, start: Start, range: readonly [number, number]): Followed {
  const reader = new Reader(endsOf(f));
  let at: Underway = { ...start, stage: 0 };
  let turning: TurningPlace | undefined;
  let [step, spread, suspect] = [1, FIRST_SPREAD, SUSPECT];
  let outside = false;
  for (let i = 0; i < MOST_TILES; i++) {
    const goal = turning ? turning.stages[0] : 1;
    if (at.stage >= goal) break;
    const next = Math.min(goal, at.stage + step);
    const tile = tileTo(f, reader, { at, next, spread, range });
    if (typeof tile !== "string") {
      at = tile;
      step *= 2;
      continue;
    }
    outside = tile === "outside";
    if (tile === "edges" && spread < WIDEST_SPREAD) {
      spread *= 4;
      continue;
    }
    spread = FIRST_SPREAD;
    step = (next - at.stage) / 2;
    if (step < FINEST_STEP) break;
    if (!turning && step < suspect && !outside) {
      turning = findTurning(f, reader, { at, step, range });
      suspect /= 64;
    }
  }
  if (at.stage === 1) return { outcome: "arrived", zero: refined(f, reader, at) };
  const proved = turning && at.stage === turning.stages[0] ? proveTurning(f, reader, at, turning) : undefined;
  if (proved) return { outcome: "turned", turning: proved };
  return { outcome: outside ? "left" : "undecided", stage: at.stage, x: at.x };
}

type Failure = "slope" | "edges" | "outside";

interface Tile {
  readonly at: Underway;
  readonly next: number;
  readonly spread: number;
  readonly range: readonly [number, number];
}

/** The zero at the next stage, or why it is not proved: the slope, the edges of the box, or the range. */
function tileTo(f: Moving, reader: Reader, { at, next, spread, range }: Tile): Underway | Failure {
  f.between(next, next);
  const x = newton(reader, at.x, at.slope);
  if (x === undefined) return "slope";
  f.between(at.stage, next);
  const [low, high] = boxAround(reader, x, spread);
  if (!(low < high)) return "slope";
  if (low < range[0] || high > range[1]) return "outside";
  if (readBox(reader, low, high).slopeSign !== at.slope) return "slope";
  // overlapping boxes share their zero: the ends of what they share have proved signs, too
  const overlap = Math.max(low, at.low) < Math.min(high, at.high);
  const proved = signAt(reader, low) === -at.slope && signAt(reader, high) === at.slope;
  return proved && overlap ? { x, low, high, slope: at.slope, stage: next } : "edges";
}

/** Where the zero may be during the stretch: what the function is at x tells how far it is from there. */
function boxAround(reader: Reader, x: number, spread: number): [number, number] {
  const place = reader.read(x, reader.take());
  const steep = (place.slopeLow + place.slopeHigh) / 2;
  const [a, b] = [-place.low / steep, -place.high / steep];
  reader.give(place);
  const reach = spread * Math.abs(b - a) + LEAST_REACH * Math.abs(x);
  return [x + Math.min(a, b) - reach, x + Math.max(a, b) + reach];
}

function signAt(reader: Reader, x: number): Sign {
  const place = reader.read(x, reader.take());
  reader.give(place);
  return place.sign;
}

/** Newton's method from the zero at the stage before; only a guess, the box around it is what is proved. */
function newton(reader: Reader, from: number, slope: Sign): number | undefined {
  const place = reader.take();
  let x = from;
  for (let i = 0; i < 12; i++) {
    reader.read(x, place);
    const steep = (place.slopeLow + place.slopeHigh) / 2;
    const step = (place.low + place.high) / 2 / steep;
    if (!(steep * slope > 0)) break;
    x -= step;
    if (Math.abs(step) <= 0.01 * Math.abs(x - from) + 0.1 * LEAST_REACH * Math.abs(x)) {
      reader.give(place);
      return x;
    }
  }
  reader.give(place);
  return undefined;
}

function refined(f: Moving, reader: Reader, at: Underway) {
  f.between(1, 1);
  const left = reader.read(at.low, reader.take());
  const right = reader.read(at.high, reader.take());
  reader.between(left, right);
  const zero = new Zero();
  refineProved(new Bracket(reader), left, right, zero);
  return zero.proved;
}
