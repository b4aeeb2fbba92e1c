// The turning point at which a followed zero meets another and vanishes: found, then proved.
import { crossing } from "./crossing.ts";
import { endsOf, type Sign } from "./enclosed.ts";
import { enumerateZeros } from "./enumerateZeros.ts";
import type { Moving, Turning, Underway } from "./moving.ts";
import type { Reader } from "./reader.ts";

/** Where a turning point is thought to be. */
export interface TurningPlace {
  readonly stage: number;
  readonly x: number;
  /** On which side of the zero the other comes. */
  readonly side: 1 | -1;
  readonly stages: readonly [number, number];
}

/** The stages between which the zero is lost are this far from the turning point, and `BEYOND` times as far behind it. */
const NEAREST = 1e-9;
/** Difference quotients do not resolve a slope closer to its zero. */
const NEAREST_SAMPLED = 1e-6;
const FARTHEST = 1e-3;
/** The least reach of a box around a zero that is followed, relative to the place. */
export const LEAST_REACH = 1e-12;
const BEYOND = 8;
/** The function there exceeds its rounding by this. */
const CLEAR = 1e4;
const MOST_DOUBLINGS = 50;
const PROOF_EFFORT = 400;

interface Ahead {
  readonly at: Underway;
  readonly step: number;
  readonly range: readonly [number, number];
}

/** Looks for the stage at which the extremum next to the zero touches zero; `undefined` if there is none ahead. */
export function findTurning(f: Moving, reader: Reader, { at, step, range }: Ahead): TurningPlace | undefined {
  const place = reader.take();
  const read = (stage: number, x: number) => {
    f.between(stage, stage);
    reader.read(x, place);
    return { value: (place.low + place.high) / 2, slope: (place.slopeLow + place.slopeHigh) / 2 };
  };
  const side = read(at.stage + step, at.x).value * at.slope < 0 ? 1 : -1;
  const extremum = (stage: number): number | undefined => {
    const slopeAt = (x: number) => read(stage, x).slope;
    const first = slopeAt(at.x);
    const toward = first * at.slope > 0 ? side : -side;
    let gap = 1e-6 * Math.abs(at.x);
    for (let near = at.x, i = 0; i < MOST_DOUBLINGS; i++, gap *= 2) {
      const far = at.x + toward * gap;
      if (far < range[0] || far > range[1]) return undefined;
      if (slopeAt(far) * first < 0) return crossing(slopeAt, near, far);
      near = far;
    }
    return undefined;
  };
  const value = (stage: number): number => {
    const x = extremum(stage);
    return x === undefined ? NaN : read(stage, x).value;
  };
  let far = at.stage + step;
  for (let gap = step; !(value(far) * at.slope * side < 0); gap *= 2) {
    if (far >= 1 || Number.isNaN(value(far))) return undefined;
    far = Math.min(1, far + gap);
  }
  const stage = crossing(value, at.stage, far);
  const x = extremum(stage);
  if (x === undefined) return undefined;
  // how fast the extremum passes zero, to stay clear of rounding on both sides
  const speed = Math.abs((read(far, x).value - read(stage, x).value) / (far - stage));
  const noise = place.high - place.low;
  reader.give(place);
  // the last box must not reach over the turning point: at a kink the zero comes to it at a steady pace
  const pace = Math.abs(x - at.x) / (stage - at.stage);
  const away = Math.max(
    f.sampled ? NEAREST_SAMPLED : NEAREST,
    (CLEAR * noise) / speed,
    (4 * LEAST_REACH * Math.abs(x)) / pace,
  );
  if (!(away < FARTHEST)) return undefined;
  return {
    stage,
    x,
    side,
    stages: [Math.max(at.stage, stage - away), Math.min(1, stage + BEYOND * away)],
  };
}

/**
 * Proves that the zero, which is there at the first of the two stages, has vanished at the second: around the turning point the
 * function has the sign of a lost zero along both edges from stage to stage, and everywhere between at the last. So the zero
 * could not leave the box and has no place in it. As the function is continuous there, it met another and did not leap away.
 */
export function proveTurning(
  f: Moving,
  reader: Reader,
  at: Underway,
  { stage, x, side, stages }: TurningPlace,
): Turning | undefined {
  const sign = (-at.slope * side) as Sign;
  const edge = (toward: 1 | -1): number | undefined => {
    const place = reader.take();
    f.between(stages[0], stages[1]);
    let reach = 2 * Math.abs(at.x - x) + 1e-9 * Math.abs(x);
    for (let i = 0; i < 16; i++, reach *= 2) {
      if (reader.read(x + toward * reach, place).sign === sign) {
        reader.give(place);
        return x + toward * reach;
      }
    }
    return undefined;
  };
  const [low, high] = [edge(-1), edge(1)];
  if (low === undefined || high === undefined) return undefined;
  // the end of the last box on the side of the turning point: between it and the edge behind lies the zero
  const inner = side > 0 ? at.high : at.low;
  if (!(low < inner && inner < high)) return undefined;
  f.between(stages[0], stages[1]);
  if (!f.sampled && !f.unbroken(low, high)) return undefined;
  f.between(stages[1], stages[1]);
  const gone = f.sampled || isEmpty(f, [low, high]);
  return gone
    ? { stage, x, stages, around: [low, high], sign, corner: isCorner(f, reader, stage, x) }
    : undefined;
}

function isEmpty(f: Moving, around: readonly [number, number]): boolean {
  const { zeros, undecided } = enumerateZeros(endsOf(f), around, { effort: PROOF_EFFORT });
  return zeros.length === 0 && undecided.length === 0;
}

/** At a kink the slopes on both sides differ as much close by as farther away. */
function isCorner(f: Moving, reader: Reader, stage: number, x: number): boolean {
  f.between(stage, stage);
  const place = reader.take();
  const slope = (at: number) => {
    reader.read(at, place);
    return (place.slopeLow + place.slopeHigh) / 2;
  };
  const leap = (gap: number) => Math.abs(slope(x + gap) - slope(x - gap));
  const gap = 1e-8 * Math.abs(x);
  const found = leap(gap) > 0.5 * leap(64 * gap);
  reader.give(place);
  return found;
}
