// A tube around a fold that moves with the second given: it holds exactly one fold at each value.
import type { Range } from "../ground/range.ts";
import { above, below } from "../search/enclosed.ts";
import { plus, times } from "../search/interval.ts";
import { boxAt, type FoldBox, type FoldPlace } from "./foldBox.ts";
import { middlesOf, type PairSystem } from "./pairSystem.ts";
import { pointAt } from "./planeReader.ts";
import { middleOf } from "./stretch.ts";

/** For every q in `q`: one fold within `reach` of the straight line through `at` with slopes `along`, and it is within `core`. */
export interface FoldTube {
  readonly q: Range;
  readonly at: FoldPlace;
  readonly along: readonly [t: number, p: number];
  readonly reach: readonly [t: number, p: number];
  readonly core: readonly [t: number, p: number];
}

const MOST_INFLATIONS = 10;
const MOST_ENLARGEMENTS = 60;
/** Tubes are widened by such a factor as long as that succeeds, then by the lesser. */
const FASTEST = 12;
const SLOWEST = 2;
/** The least reach, as a share of the place. */
const LEAST = 1e-12;

/**
 * Krawczyk's operator in coordinates that move along with the fold: with Y about the inverse of the Jacobian J of (f, g) in
 * (T, p), each fold in the tube is within |Y·(f, g)| on the line, plus |1 − Y·J|·reach, of the line; if that is less than the
 * reach, there is exactly one at each q. On the line f changes by (f_q + f_T·T′ + f_p·p′)·(q − q₀), and g likewise. For a fold they are N and N_T.
 */
export function foldTube(system: PairSystem, near: FoldPlace, q: Range): FoldTube | undefined {
  const middle = middleOf(q);
  const at = system.solve({ ...near, q: middle });
  if (!at) return undefined;
  const start = system.pair(boxAt(at));
  const m = middlesOf(start);
  const scale = m.ft * m.gp - m.fp * m.gt;
  const inverse = [m.gp / scale, -m.fp / scale, -m.gt / scale, m.ft / scale] as const;
  const along = [-(inverse[0] * m.fq + inverse[1] * m.gq), -(inverse[2] * m.fq + inverse[3] * m.gq)] as const;
  if (!Number.isFinite(along[0] + along[1])) return undefined;
  const line = system.pair(boxOf({ at, along, reach: [0, 0] }, q));
  const [dt, dp] = [pointAt(along[0]), pointAt(along[1])];
  const away: Range = [below(q[0] - middle), above(q[1] - middle)];
  const onLine = (value: Range, byQ: Range, byT: Range, byP: Range) =>
    plus(value, times(plus(byQ, plus(times(byT, dt), times(byP, dp))), away));
  const [f, g] = [onLine(start.f, line.fq, line.ft, line.fp), onLine(start.g, line.gq, line.gt, line.gp)];
  const row = (i: 0 | 2) => [pointAt(inverse[i]), pointAt(inverse[i + 1] as number)] as const;
  const miss = ([a, b]: readonly [Range, Range]) => size(plus(times(a, f), times(b, g)));
  const [missT, missP] = [miss(row(0)), miss(row(2))];
  /** How far a fold in the tube can be from its line. */
  const within = (reach: readonly [number, number]): readonly [number, number] => {
    const { ft, fp, gt, gp } = system.pair(boxOf({ at, along, reach }, q));
    const far = ([a, b]: readonly [Range, Range], own: 0 | 1) => {
      const byT = size(plus(pointAt(own === 0 ? -1 : 0), plus(times(a, ft), times(b, gt))));
      const byP = size(plus(pointAt(own === 1 ? -1 : 0), plus(times(a, fp), times(b, gp))));
      return above(above(byT * reach[0]) + above(byP * reach[1]));
    };
    return [above(missT + far(row(0), 0)), above(missP + far(row(2), 1))];
  };
  let reach: readonly [number, number] = [
    2 * missT + LEAST * Math.abs(at.t),
    2 * missP + LEAST * Math.abs(at.p) + 1e-250,
  ];
  let core = within(reach);
  for (let i = 0; !(core[0] < reach[0] && core[1] < reach[1]); i++) {
    if (i === MOST_INFLATIONS || !Number.isFinite(core[0] + core[1])) return undefined;
    reach = [Math.max(reach[0], 1.5 * core[0]), Math.max(reach[1], 1.5 * core[1])];
    core = within(reach);
  }
  // where the proof holds in a wider tube as well, it says that nothing else is there
  const factors: [number, number] = [FASTEST, FASTEST];
  for (let i = 0; i < MOST_ENLARGEMENTS && factors[0] + factors[1] > 2; i++) {
    const side = factors[0] > 1 && (i % 2 === 0 || factors[1] === 1) ? 0 : 1;
    const other = side === 0 ? 1 : 0;
    const factor = factors[side];
    const wider: readonly [number, number] =
      side === 0 ? [factor * reach[0], reach[1]] : [reach[0], factor * reach[1]];
    const wide = within(wider);
    if (wide[0] < wider[0] && wide[1] < wider[1]) {
      reach = wider;
      factors[side] = Math.min(2 * factor, FASTEST);
      // a wider tube on this side may leave room on the other
      factors[other] = Math.max(factors[other], SLOWEST);
    } else factors[side] = factor > SLOWEST ? SLOWEST : 1;
  }
  return { q, at, along, reach, core };
}

const size = (r: Range): number => Math.max(-r[0], r[1]);

type Around = Pick<FoldTube, "at" | "along" | "reach">;

/** Bounds of a tube over some values of the second given. */
export function boxOf({ at, along, reach }: Around, q: Range): FoldBox {
  const side = (x: number, slope: number, r: number): Range => {
    const moves = times(pointAt(slope), [below(q[0] - at.q), above(q[1] - at.q)]);
    return plus(plus(pointAt(x), moves), [-r, r]);
  };
  return { t: side(at.t, along[0], reach[0]), p: side(at.p, along[1], reach[1]), q };
}

/** What every section of a tube over some values of the second given holds; in the wrong order where that is nothing. */
export function commonOf({ at, along, reach }: Around, q: Range): Plane {
  const side = (x: number, slope: number, r: number): Range => {
    const [low, high] = times(pointAt(slope), [below(q[0] - at.q), above(q[1] - at.q)]);
    return [above(above(x - r) + high), below(below(x + r) + low)];
  };
  return { t: side(at.t, along[0], reach[0]), p: side(at.p, along[1], reach[1]) };
}

/** Closer bounds of the fold in a tube. */
export const foldIn = (tube: FoldTube, q: Range): FoldBox => boxOf({ ...tube, reach: tube.core }, q);

/** About where the fold of a tube is. */
export const placeIn = ({ at, along }: FoldTube, q: number): FoldPlace => ({
  ...{ t: at.t + along[0] * (q - at.q), p: at.p + along[1] * (q - at.q) },
  q,
});

/** The same, closer where Newton's method settles in the tube. */
export function foldOn(system: PairSystem, tube: FoldTube, q: number): FoldPlace {
  const about = placeIn(tube, q);
  const place = system.solve(about);
  return place && isWithin(boxAt(place), boxOf(tube, pointAt(q))) ? place : about;
}

/** Ranges of temperature and of the first given. */
export type Plane = Pick<FoldBox, "t" | "p">;

export const isPart = (a: Range, b: Range): boolean => a[0] >= b[0] && a[1] <= b[1];
export const isWithin = (a: Plane, b: Plane): boolean => isPart(a.t, b.t) && isPart(a.p, b.p);

/** The fold of a tube at one value, in tight bounds. */
export function sectionOf(system: PairSystem, tube: FoldTube, q: number): FoldBox {
  const fine = foldTube(system, placeIn(tube, q), pointAt(q));
  const tight = fine && foldIn(fine, pointAt(q));
  return tight && isWithin(tight, commonOf(tube, pointAt(q))) ? tight : foldIn(tube, pointAt(q));
}
