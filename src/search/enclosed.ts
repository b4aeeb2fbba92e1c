// What the proved search is given: enclosures of a function of one unknown.

/**
 * A function as enclosures. Each bound comes as (lo, hi, err): the truth lies in [lo − err, hi + err].
 *
 * Over a box [a, b], finite numbers are a promise. Value: the function is defined everywhere in the box. Slope: it is
 * continuous there, and every difference quotient lies in the enclosure; so a kink counts with both its slopes, and a
 * leap has no finite slope. Curvature: the same of the slope; so a kink has no finite curvature.
 * NaN and infinity promise nothing.
 */
export interface Enclosed {
  /** Writes value, slope and curvature for x in [a, b]: 9 numbers. */
  box(a: number, b: number, out: Float64Array): void;
  /** Writes value and slope at x: 6 numbers. Where boxes on both sides of x have curvatures, the slope is the one they share. */
  point(x: number, out: Float64Array): void;
}

/** The same readings by ends, which are read first, so that boxes share what is known of their ends. This is what is searched. */
export interface Ends {
  /** How many numbers an end takes: x, which the caller writes; value and slope at x; and what boxes need of their ends. */
  readonly size: number;
  /** Where in an end the value stands, 3 numbers, and the slope behind it. */
  readonly at: number;
  point(end: Float64Array): void;
  /** Writes value and slope over the box between two ends that were read: 6 numbers. */
  box(left: Float64Array, right: Float64Array, out: Float64Array): void;
  /** Writes the curvature, 3 numbers; only for the box that was read last. */
  bend(left: Float64Array, right: Float64Array, out: Float64Array): void;
  /** True where reading the curvature costs more than reading more points: it is then read only where nothing else decides. */
  readonly bendIsDear?: boolean;
}

/** Reads a function by ends that is read at once. */
export function endsOf(f: Enclosed): Ends {
  const [point, box] = [new Float64Array(6), new Float64Array(9)];
  return {
    ...{ size: 7, at: 1 },
    point(end) {
      f.point(end[0] as number, point);
      end.set(point, 1);
    },
    box(left, right, out) {
      f.box(left[0] as number, right[0] as number, box);
      for (let i = 0; i < 6; i++) out[i] = box[i] as number;
    },
    bend(_left, _right, out) {
      for (let i = 0; i < 3; i++) out[i] = box[6 + i] as number;
    },
  };
}

/** Reads a function at once that is read by ends. */
export function atOnce({ size, at, point, box, bend }: Ends): Enclosed {
  const left = new Float64Array(size);
  const right = new Float64Array(size);
  const curvature = new Float64Array(3);
  return {
    point(x, out) {
      left[0] = x;
      point(left);
      for (let i = 0; i < 6; i++) out[i] = left[at + i] as number;
    },
    box(a, b, out) {
      left[0] = a;
      right[0] = b;
      point(left);
      point(right);
      box(left, right, out);
      bend(left, right, curvature);
      out.set(curvature, 6);
    },
  };
}

/** A proved sign; 0: not proved. */
export type Sign = 1 | -1 | 0;

/** Whether both bounds are finite and in order; false for NaN. */
export const bounded = (low: number, high: number): boolean =>
  low > -Infinity && low <= high && high < Infinity;

/** The sign of everything in [lo − err, hi + err]. */
export function signOf(lo: number, hi: number, err: number): Sign {
  // a difference of doubles has the sign of the exact difference, so nothing needs rounding here
  const low = lo - err;
  const high = hi + err;
  if (!bounded(low, high)) return 0;
  return low > 0 ? 1 : high < 0 ? -1 : 0;
}

/** Two units of roundoff: more than a sum of two doubles can be wrong by, relative to itself. */
const ROUNDING = 2.3e-16;
/** More than what gradual underflow can lose. */
const TINY = 1e-300;

/** A bound moved outwards by more than the rounding of the sum that made it. */
export const below = (x: number): number => x - Math.abs(x) * ROUNDING - TINY;
export const above = (x: number): number => x + Math.abs(x) * ROUNDING + TINY;
