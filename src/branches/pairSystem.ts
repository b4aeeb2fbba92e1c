// Two equations in temperature T and two givens p and q, whose common zeros are followed.
import type { Range } from "../ground/range.ts";
import { minus, over, plus, signOfRange, times } from "../search/interval.ts";
import { boxAt, type FoldBox, type FoldPlace } from "./foldBox.ts";
import { middleOf } from "./stretch.ts";

/** Bounds of both over a box, with their slopes in T, p and q. */
export interface Pair {
  readonly f: Range;
  readonly ft: Range;
  readonly fp: Range;
  readonly fq: Range;
  readonly g: Range;
  readonly gt: Range;
  readonly gp: Range;
  readonly gq: Range;
}

/** How they are read. */
export interface PairSystem {
  readonly kind: "fold" | "corner";
  pair(box: FoldBox): Pair;
  /** How fast T and p of a zero in a box change with q. */
  speeds(box: FoldBox): readonly [t: Range, p: Range];
  /** Whether a zero in a box is what is sought. */
  accepts(box: FoldBox): boolean;
  /** About the zero near a place at its q; undefined where Newton's method does not settle. */
  solve(near: FoldPlace): FoldPlace | undefined;
}

const MOST_STEPS = 20;

/** Newton's method. */
export function solvedPair(read: PairSystem["pair"], { t, p, q }: FoldPlace): FoldPlace | undefined {
  let [u, v] = [t, p];
  let nearly: FoldPlace | undefined;
  for (let i = 0; i < MOST_STEPS; i++) {
    const bounds = read(boxAt({ t: u, p: v, q }));
    // rounding may keep the steps from vanishing
    if (signOfRange(bounds.f) === 0 && signOfRange(bounds.g) === 0) nearly = { t: u, p: v, q };
    const { f, ft, fp, g, gt, gp } = middlesOf(bounds);
    const scale = ft * gp - fp * gt;
    const [du, dv] = [(f * gp - g * fp) / scale, (g * ft - f * gt) / scale];
    u -= du;
    v -= dv;
    if (!Number.isFinite(u + v)) break;
    if (!(Math.abs(du) > 1e-14 * Math.abs(u) || Math.abs(dv) > 1e-14 * Math.abs(v))) return { t: u, p: v, q };
  }
  return nearly;
}

/** The middles of bounds. */
export const middlesOf = ({ f, ft, fp, fq, g, gt, gp, gq }: Pair): Record<keyof Pair, number> => ({
  ...{ f: middleOf(f), ft: middleOf(ft), fp: middleOf(fp), fq: middleOf(fq) },
  ...{ g: middleOf(g), gt: middleOf(gt), gp: middleOf(gp), gq: middleOf(gq) },
});

/** Cramer's rule for the speeds of a zero. */
export function speedsOf({ ft, fp, fq, gt, gp, gq }: Pair): readonly [t: Range, p: Range] {
  const det = (a: Range, b: Range, c: Range, d: Range) => plus(times(a, d), minus(times(b, c)));
  const scale = det(ft, fp, gt, gp);
  return [minus(over(det(fq, fp, gq, gp), scale)), minus(over(det(ft, fq, gt, gq), scale))];
}
