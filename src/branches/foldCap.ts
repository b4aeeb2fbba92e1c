// A box around the place where two folds meet and vanish as the second given changes.
import type { Range } from "../ground/range.ts";
import { minus, over, plus, signOfRange } from "../search/interval.ts";
import { boxAt, type FoldBox, type FoldPlace, inside } from "./foldBox.ts";
import { CUSP, POINT, type Shape } from "./foldShape.ts";
import type { FoldSystem } from "./foldSystem.ts";
import { meetingNear } from "./meetingNear.ts";
import { pointAt } from "./planeReader.ts";
import { middleOf, nearestProved } from "./stretch.ts";

/**
 * How two folds meet: in a `cusp` their states become one; at an `isola` an island of states shrinks to a point; at a
 * `transcritical` point two branches cross; at a `change` a fold goes on as a corner.
 */
export type MeetingKind = "cusp" | "isola" | "transcritical" | "change";

/** A box in which two folds meet once, on one side of a value of the second given, and in which there is no other. */
export interface FoldCap {
  readonly kind: MeetingKind;
  readonly box: FoldBox;
  readonly at: FoldPlace;
  /** Proved bounds of the second given there. */
  readonly atBracket: Range;
  /** The two exist above it, or below; at a change, the smooth fold. */
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
