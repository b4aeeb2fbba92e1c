// A box around the place where two folds meet and vanish as the second given changes.
import type { Range } from "../ground/range.ts";
import { minus, over, plus, signOfRange, times } from "../search/interval.ts";
import {
  boxAt,
  closer,
  type FoldBox,
  type FoldPlace,
  type FoldSystem,
  inside,
  middles,
} from "./foldSystem.ts";
import { pointAt } from "./planeReader.ts";
import { middleOf, nearestProved } from "./stretch.ts";

/**
 * How two folds meet: in a `cusp` their states become one; at an `isola` an island of states shrinks to a point; at a
 * `transcritical` point two branches cross.
 */
export type MeetingKind = "cusp" | "isola" | "transcritical";

/** A box in which two folds meet once, on one side of a value of the second given, and in which there is no other. */
export interface FoldCap {
  readonly kind: MeetingKind;
  readonly box: FoldBox;
  readonly at: FoldPlace;
  /** Proved bounds of the second given there. */
  readonly atBracket: Range;
  /** The two exist above it, or below. */
  readonly exists: "above" | "below";
}

const MOST_STEPS = 40;
/** The largest cap is tried first, and then smaller ones. */
const FIRST_SHARE = 0.03;
const MOST_CAPS = 24;
/** A cap is so much higher than what the solved equation moves in it: room for its enclosures, not too much for the others. */
const ROOM = [4, 1.5];

/** Looks for places near another where folds meet, of either kind, and proves them. */
export function foldCaps(system: FoldSystem, near: FoldPlace, space: FoldBox): FoldCap[] {
  return [CUSP, POINT].flatMap((shape) => {
    const at = meetingNear(system, near, shape);
    const cap = at && inside(pointAt(at.q), space.q) ? largestCap(system, at, shape, space) : undefined;
    return cap ? [cap] : [];
  });
}

function largestCap(system: FoldSystem, at: FoldPlace, shape: Shape, space: FoldBox): FoldCap | undefined {
  const [width, height] = [space.q[1] - space.q[0], space[shape.y][1] - space[shape.y][0]];
  let share = FIRST_SHARE;
  for (let i = 0; i < MOST_CAPS; i++, share /= 2) {
    for (const room of ROOM) {
      const size = { reach: share * width, least: share * share * height, room };
      const cap = capAround(system, at, size, shape, space.q);
      if (cap && within(cap.box.t, space.t) && within(cap.box.p, space.p)) return cap;
    }
  }
  return undefined;
}

const within = (a: Range, b: Range): boolean => a[0] >= b[0] && a[1] <= b[1];

/**
 * Both kinds of meeting have one shape. One equation is solved for y, as a function y(x, q), wherever its slope in y has one sign
 * and it has opposite signs at both ends of y. What is left is φ(x, q), bent one way in x and at both ends of x on the side to
 * which it bends, so that it has two zeros, or none, as its extremum lies on one side of zero or the other; and as φ only
 * rises or only falls with q, the extremum passes zero once.
 */
interface Shape {
  readonly x: "t" | "p";
  readonly y: "t" | "p";
  /** The third equation: zero where folds meet, and its slopes in T, p, q. */
  readonly third: (system: FoldSystem, box: FoldBox) => readonly [Range, Range, Range, Range];
  /** The solved equation and its slope in y. */
  readonly solved: (system: FoldSystem, box: FoldBox) => readonly [Range, Range];
  /** φ, its slope in q and its bend in x. */
  readonly left: (system: FoldSystem, box: FoldBox) => readonly [Range, Range, Range];
}

/** N = 0 gives p(T, q); φ = N_T with φ_q = N_Tq − N_Tp·N_q/N_p and the second derivative of N_T along p(T, q). */
const CUSP: Shape = {
  x: "t",
  y: "p",
  third(system, box) {
    const { ntt } = system.read(box);
    const { nttt, nttp, nttq } = system.further(box);
    return [ntt, nttt, nttp, nttq];
  },
  solved(system, box) {
    const { n, np } = closer(system, box);
    return [n, np];
  },
  left(system, box) {
    const { nt, np, nq, ntt, ntp, ntq } = closer(system, box);
    const { npp, nttt, nttp, ntpp } = system.further(box);
    const turn = minus(over(nt, np));
    const twice = (r: Range) => times([2, 2], r);
    const turning = minus(over(plus(ntt, plus(twice(times(ntp, turn)), times(npp, squared(turn)))), np));
    const bend = plus(
      plus(nttt, twice(times(nttp, turn))),
      plus(times(ntpp, squared(turn)), times(ntp, turning)),
    );
    return [nt, plus(ntq, minus(over(times(ntp, nq), np))), bend];
  },
};

/** N_T = 0 gives T(p, q); φ = N with φ_q = N_q and φ_pp = N_pp − N_Tp²/N_TT along it. */
const POINT: Shape = {
  x: "p",
  y: "t",
  third(system, box) {
    const { np, ntp } = system.read(box);
    const { npp, npq } = system.further(box);
    return [np, ntp, npp, npq];
  },
  solved(system, box) {
    const { nt, ntt } = closer(system, box);
    return [nt, ntt];
  },
  left(system, box) {
    const { n, nq, ntt, ntp } = closer(system, box);
    return [n, nq, plus(system.further(box).npp, minus(over(squared(ntp), ntt)))];
  },
};

const squared = ([low, high]: Range): Range => {
  const [a, b] = [times([low, low], [low, low]), times([high, high], [high, high])];
  return low <= 0 && high >= 0 ? [0, Math.max(a[1], b[1])] : [Math.min(a[0], b[0]), Math.max(a[1], b[1])];
};

function meetingNear(system: FoldSystem, near: FoldPlace, shape: Shape): FoldPlace | undefined {
  let at = near;
  for (let i = 0; i < MOST_STEPS; i++) {
    const box = boxAt(at);
    const m = middles(system.read(box));
    const [f, ft, fp, fq] = shape.third(system, box).map(middleOf) as [number, number, number, number];
    const step = solved3(
      [
        [m.nt, m.np, m.nq],
        [m.ntt, m.ntp, m.ntq],
        [ft, fp, fq],
      ],
      [m.n, m.nt, f],
    );
    if (!step.every(Number.isFinite)) return undefined;
    at = { t: at.t - step[0], p: at.p - step[1], q: at.q - step[2] };
    const size = [at.t, at.p, at.q].map(Math.abs) as [number, number, number];
    if (step.every((s, j) => Math.abs(s) <= 1e-13 * (size[j] as number) + 1e-15)) return at;
  }
  return at;
}

type Three = readonly [number, number, number];

/** Cramer's rule. */
function solved3(rows: readonly [Three, Three, Three], right: Three): Three {
  const det = (m: readonly [Three, Three, Three]) =>
    m[0][0] * (m[1][1] * m[2][2] - m[1][2] * m[2][1]) -
    m[0][1] * (m[1][0] * m[2][2] - m[1][2] * m[2][0]) +
    m[0][2] * (m[1][0] * m[2][1] - m[1][1] * m[2][0]);
  const whole = det(rows);
  const replaced = (column: number) =>
    det(
      rows.map((row, i) => row.map((v, j) => (j === column ? right[i] : v))) as unknown as [
        Three,
        Three,
        Three,
      ],
    );
  return [replaced(0) / whole, replaced(1) / whole, replaced(2) / whole];
}

/** Tries a cap that reaches so far in the second given. */
function capAround(
  system: FoldSystem,
  at: FoldPlace,
  { reach, least, room }: { readonly reach: number; readonly least: number; readonly room: number },
  shape: Shape,
  range: Range,
): FoldCap | undefined {
  const { x, y } = shape;
  const q: Range = [at.q - reach, at.q + reach];
  if (!inside(q, range)) return undefined;
  const [, byQ, bend] = shape.left(system, boxAt(at)).map(middleOf) as [number, number, number];
  // the two folds are this far from the middle at the end of the cap
  const spread = 1.5 * Math.sqrt(Math.abs((2 * reach * byQ) / bend));
  if (!(spread > 0 && spread < Number.POSITIVE_INFINITY)) return undefined;
  const sides: Range = [at[x] - spread, at[x] + spread];
  const corners = sides.flatMap((u) => q.map((v) => solvedFor(system, shape, { ...at, [x]: u, q: v })));
  const far = Math.max(...corners.map((v) => Math.abs(v - at[y])), least);
  if (!Number.isFinite(far)) return undefined;
  const box: FoldBox = { q, [x]: sides, [y]: [at[y] - room * far, at[y] + room * far] } as unknown as FoldBox;
  const [, slope] = shape.solved(system, box);
  const rises = signOfRange(slope);
  const ends = box[y].map((v) => signOfRange(shape.solved(system, { ...box, [y]: pointAt(v) })[0]));
  if (rises === 0 || ends[0] !== -rises || ends[1] !== rises) return undefined;
  const [, drift, curve] = shape.left(system, box);
  const [moves, bends] = [signOfRange(drift), signOfRange(curve)];
  if (moves === 0 || bends === 0) return undefined;
  for (const u of sides) {
    const side = { ...box, [x]: pointAt(u) } as FoldBox;
    if (signOfRange(shape.left(system, contracted(system, shape, side))[0]) !== bends) return undefined;
  }
  // two where the extremum has the sign against the bend
  const exists = moves === bends ? "below" : "above";
  const toward = exists === "below" ? 1 : -1;
  const valueAt = (v: number, u: Range): number => {
    const line = { ...box, q: pointAt(v), [x]: u } as FoldBox;
    return signOfRange(shape.left(system, contracted(system, shape, line))[0]);
  };
  const two = nearestProved(at.q, toward > 0 ? -1 : 1, q, (v) => valueAt(v, pointAt(at[x])) === -bends);
  const none = nearestProved(at.q, toward, q, (v) =>
    isBeyond(system, shape, { ...box, q: pointAt(v) }, bends),
  );
  if (
    valueAt(two, pointAt(at[x])) !== -bends ||
    !isBeyond(system, shape, { ...box, q: pointAt(none) }, bends)
  )
    return undefined;
  const kind =
    shape === CUSP
      ? "cusp"
      : signOfRange(curve) * signOfRange(system.read(box).ntt) < 0
        ? "transcritical"
        : "isola";
  return { kind, box, at, atBracket: toward > 0 ? [two, none] : [none, two], exists };
}

/** y(x, q) by Newton's method. */
function solvedFor(system: FoldSystem, shape: Shape, from: FoldPlace): number {
  let at = from;
  for (let i = 0; i < MOST_STEPS; i++) {
    const [value, slope] = shape.solved(system, boxAt(at)).map(middleOf) as [number, number];
    const next = at[shape.y] - value / slope;
    const settled = Math.abs(next - at[shape.y]) <= 1e-14 * Math.abs(next);
    at = { ...at, [shape.y]: next };
    if (settled || !Number.isFinite(next)) break;
  }
  return at[shape.y];
}

/** A box with y narrowed to where the solved equation can hold (interval Newton). */
function contracted(system: FoldSystem, shape: Shape, box: FoldBox): FoldBox {
  let here = box;
  for (let i = 0; i < 3; i++) {
    const middle = middleOf(here[shape.y]);
    const [value] = shape.solved(system, { ...here, [shape.y]: pointAt(middle) });
    const [, slope] = shape.solved(system, here);
    const [low, high] = plus(pointAt(middle), minus(over(value, slope)));
    const next: Range = [Math.max(low, here[shape.y][0]), Math.min(high, here[shape.y][1])];
    if (!(next[0] <= next[1])) break;
    here = { ...here, [shape.y]: next };
  }
  return here;
}

/** Whether φ is proved to have the sign of its bend throughout, at one value of q. */
function isBeyond(system: FoldSystem, shape: Shape, box: FoldBox, bends: number, halvings = 14): boolean {
  const narrow = contracted(system, shape, box);
  if (signOfRange(shape.left(system, narrow)[0]) === bends) return true;
  if (halvings === 0) return false;
  const [low, high] = box[shape.x];
  const middle = middleOf([low, high]);
  return (
    [
      [low, middle],
      [middle, high],
    ] as const
  ).every((half) => isBeyond(system, shape, { ...box, [shape.x]: half } as FoldBox, bends, halvings - 1));
}
