// Finds zeros of a function of one unknown by sampling. Nothing is proved: what lies between samples may be missed.
import { refineZero } from "./refineZero.ts";

/** A function with its slope, and the size below which its value cannot be told from zero. */
export interface Sampled {
  /** Writes value, slope and noise at x into `out`. */
  at(x: number, out: Float64Array): void;
}

/** A sign change, enclosed by two points with observed opposite signs. */
export interface Crossing {
  readonly at: number;
  readonly bracket: readonly [number, number];
  /** Sign of the function below the zero, minus its sign above, over two: 1 falls through zero, −1 rises. */
  readonly falling: boolean;
}

/** Where sampling cannot decide. */
export interface Doubt {
  readonly interval: readonly [number, number];
  /** `fold`: an extremum that cannot be told from zero; `flat`: zero on a stretch; `jump`: a change of sign without a zero; `edge`: a zero at an end of the range. */
  readonly kind: "fold" | "flat" | "jump" | "edge" | "undefined" | "effort";
}

/** What a scan found and what it spent. */
export interface Scan {
  readonly crossings: readonly Crossing[];
  readonly doubts: readonly Doubt[];
  readonly evaluations: number;
}

interface Point {
  readonly x: number;
  readonly value: number;
  readonly slope: number;
  /** 0 where the value cannot be told from zero, NaN where there is none. */
  readonly sign: number;
}

const FIRST_CELLS = 512;
const MOST_HALVINGS = 14;

/**
 * Samples [from, to] evenly, halves cells whose midpoint a cubic through the ends' values and slopes does not predict,
 * follows near-tangent minima of |f| to their extremum, and refines every sign change. Spends at most about `effort` evaluations.
 */
export function scanZeros(f: Sampled, [from, to]: readonly [number, number], effort: number): Scan {
  const out = new Float64Array(3);
  let evaluations = 0;
  const sample = (x: number): Point => {
    evaluations++;
    f.at(x, out);
    const [value, slope, noise] = out as unknown as [number, number, number];
    const sign = Number.isFinite(value) ? (Math.abs(value) <= noise ? 0 : Math.sign(value)) : NaN;
    return { x, value, slope, sign };
  };
  const cells = Math.max(1, Math.min(FIRST_CELLS, Math.floor(effort / 4)));
  const points: Point[] = [];
  let previous = sample(from);
  points.push(previous);
  let done = to;
  for (let i = 1; i <= cells; i++) {
    if (evaluations >= effort) {
      done = previous.x;
      break;
    }
    const next = sample(i === cells ? to : from + ((to - from) * i) / cells);
    halve(
      previous,
      next,
      MOST_HALVINGS,
      sample,
      (p) => points.push(p),
      () => evaluations < effort,
    );
    points.push(next);
    previous = next;
  }
  const found = judge(points, sample);
  if (done < to) found.doubts.push({ interval: [done, to], kind: "effort" });
  return { ...found, evaluations };
}

/** Pushes the points between a and b that are needed to know the function's shape there. */
function halve(
  a: Point,
  b: Point,
  left: number,
  sample: (x: number) => Point,
  push: (p: Point) => void,
  may: () => boolean,
): void {
  if (left === 0 || !may()) return;
  const m = sample(a.x + (b.x - a.x) / 2);
  const predicted = (a.value + b.value) / 2 + ((b.x - a.x) * (a.slope - b.slope)) / 8;
  const least = Math.min(Math.abs(a.value), Math.abs(m.value), Math.abs(b.value));
  const signs = [a.sign, m.sign, b.sign];
  const settled = signs.every((sign) => sign === 0) || signs.every(Number.isNaN);
  const plain = settled || Math.abs(m.value - predicted) <= 0.25 * least;
  if (!plain && m.x > a.x && m.x < b.x) halve(a, m, left - 1, sample, push, may);
  push(m);
  if (!plain && m.x > a.x && m.x < b.x) halve(m, b, left - 1, sample, push, may);
}

/** Goes through the samples from left to right and says what each stretch between two decided signs holds. */
function judge(
  points: readonly Point[],
  sample: (x: number) => Point,
): { crossings: Crossing[]; doubts: Doubt[] } {
  const crossings: Crossing[] = [];
  const doubts: Doubt[] = [];
  const doubt = (a: number, b: number, kind: Doubt["kind"]) => {
    const last = doubts.at(-1);
    if (last && last.kind === kind && last.interval[1] >= a)
      doubts[doubts.length - 1] = { kind, interval: [last.interval[0], b] };
    else doubts.push({ kind, interval: [a, b] });
  };
  const cross = (a: Point, b: Point) => {
    const { jump, ...crossing } = refineZero(sample, a, b);
    if (jump) doubt(...crossing.bracket, "jump");
    else crossings.push(crossing);
  };
  for (let i = 0; i + 1 < points.length; ) {
    const a = points[i] as Point;
    let j = i + 1;
    while (j + 1 < points.length && (points[j] as Point).sign === 0) j++;
    const b = points[j] as Point;
    if (Number.isNaN(a.sign) || Number.isNaN(b.sign)) doubt(a.x, b.x, "undefined");
    else if (a.sign === 0 || b.sign === 0) doubt(a.x, b.x, j - i > 1 ? "flat" : "edge");
    else if (j - i > 2) doubt(a.x, b.x, "flat");
    else if (a.sign !== b.sign) cross(a, b);
    else {
      const middle = turning(a, b, sample);
      if (middle?.sign === 0) doubt(a.x, b.x, "fold");
      else if (middle && middle.sign !== a.sign) {
        cross(a, middle);
        cross(middle, b);
      }
    }
    i = j;
  }
  return { crossings, doubts };
}

/** The extremum towards zero between two points of one sign, if the slopes there say that there is one. */
function turning(a: Point, b: Point, sample: (x: number) => Point): Point | undefined {
  if (!(a.slope * a.sign < 0 && b.slope * a.sign > 0)) return undefined;
  let low = a;
  let high = b;
  let best = Math.abs(a.value) < Math.abs(b.value) ? a : b;
  for (let i = 0; i < 80; i++) {
    const guess = low.x - (low.slope * (high.x - low.x)) / (high.slope - low.slope);
    const mid = low.x + (high.x - low.x) / 2;
    const m = sample(i % 2 === 0 && guess > low.x && guess < high.x ? guess : mid);
    if (Math.abs(m.value) < Math.abs(best.value) || m.sign !== a.sign) best = m;
    if (m.sign !== a.sign || m.x === low.x || m.x === high.x) return best;
    if (m.slope * a.sign < 0) low = m;
    else high = m;
  }
  return best;
}
