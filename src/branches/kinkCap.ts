// A box around the place where a fold comes to a kink of a law as the second given changes.
import type { Range } from "../ground/range.ts";
import { minus, over, plus, signOfRange, times } from "../search/interval.ts";
import type { CornerSystem } from "./cornerSystem.ts";
import { boxAt, type FoldBox, type FoldPlace, inside } from "./foldBox.ts";
import type { FoldCap } from "./foldCap.ts";
import { closer, type FoldSystem } from "./foldSystem.ts";
import { foldIn, foldTube, isPart, isWithin } from "./foldTube.ts";
import { speedsOf } from "./pairSystem.ts";
import { pointAt } from "./planeReader.ts";
import { solved3 } from "./solved3.ts";
import { middleOf, nearestProved } from "./stretch.ts";

const MOST_STEPS = 40;
/** The largest cap is tried first, and then smaller ones. */
const FIRST_SHARE = 0.03;
const MOST_CAPS = 24;
/** A cap is so much wider, in temperature and in p, than what moves in it. */
const ROOM = 2;
const CONTRACTIONS = 3;

/** A kink, and the side of it on which the fold is. */
interface Place {
  readonly system: FoldSystem;
  readonly corner: CornerSystem;
  readonly more: boolean;
}

/** Looks for places near another where a fold comes to a kink, and proves them. */
export function kinkCaps(
  system: FoldSystem,
  corner: CornerSystem,
  near: FoldPlace,
  space: FoldBox,
): FoldCap[] {
  return [false, true].flatMap((more) => {
    const place = { system, corner, more };
    const at = placeNear(place, near);
    const isInside = at && (["t", "p", "q"] as const).every((x) => inside(pointAt(at[x]), space[x]));
    const cap = isInside ? largestCap(place, at, space) : undefined;
    return cap ? [cap] : [];
  });
}

/** Newton's method on N = N_T = 0 on a side, at the kink; not proved. */
function placeNear({ corner, more }: Place, near: FoldPlace): FoldPlace | undefined {
  let at = near;
  for (let i = 0; i < MOST_STEPS; i++) {
    const box = boxAt(at);
    const { n, nt, np, nq, ntt, ntp, ntq } = corner.side(more, box);
    const { g, gt, gp, gq } = corner.kink(box);
    const three = (a: Range, b: Range, c: Range) => [middleOf(a), middleOf(b), middleOf(c)] as const;
    const step = solved3([three(nt, np, nq), three(ntt, ntp, ntq), three(gt, gp, gq)], three(n, nt, g));
    if (!step.every(Number.isFinite)) return undefined;
    at = { t: at.t - step[0], p: at.p - step[1], q: at.q - step[2] };
    const size = [at.t, at.p, at.q].map(Math.abs) as [number, number, number];
    if (step.every((s, j) => Math.abs(s) <= 1e-13 * (size[j] as number) + 1e-15)) return at;
  }
  return undefined;
}

function largestCap(place: Place, at: FoldPlace, space: FoldBox): FoldCap | undefined {
  const width = space.q[1] - space.q[0];
  let share = FIRST_SHARE;
  for (let i = 0; i < MOST_CAPS; i++, share /= 2) {
    const box = boxAround(place, at, share * width);
    if (!box || !isWithin(box, space) || !isPart(box.q, space.q)) continue;
    const cap = capIn(place, at, box);
    if (cap) return cap;
  }
  return undefined;
}

/** A box that reaches so far in the second given, and as far in the others as the fold and the kink move. */
function boxAround({ corner, more }: Place, at: FoldPlace, reach: number): FoldBox | undefined {
  const here = boxAt(at);
  const bounds = corner.side(more, here);
  const { nt, np, nq, ntt, ntp, ntq } = bounds;
  const speeds = speedsOf({ f: bounds.n, ft: nt, fp: np, fq: nq, ...corner.kink(here) });
  const [kinkT, kinkP] = [middleOf(speeds[0]), middleOf(speeds[1])];
  const drift = middleOf(ntq) + middleOf(ntt) * kinkT + middleOf(ntp) * kinkP;
  const foldT = kinkT - drift / middleOf(ntt);
  const spread = ROOM * reach * (Math.abs(kinkT) + Math.abs(foldT));
  // N changes by N_T with temperature, which is zero here on one side
  const other = corner.side(!more, here);
  const slope = Math.abs(middleOf(other.nt) / middleOf(np));
  const far = ROOM * (slope * spread + reach * (Math.abs(kinkP) + Math.abs(middleOf(nq) / middleOf(np))));
  if (!(spread > 0 && far > 0 && spread + far < Number.POSITIVE_INFINITY)) return undefined;
  const around = (x: number, r: number): Range => [x - r, x + r];
  return { t: around(at.t, spread), p: around(at.p, far), q: around(at.q, reach) };
}

/**
 * N = 0 is solved for p(T, q) all over the box, as N rises or falls with p and has opposite signs at both ends of p. Along it the
 * kink's difference only rises or only falls with T and has opposite signs at both ends of T: the kink has one place for each
 * q. On the side of the fold N_T along p(T, q) only rises or only falls with T and has, at the end of the box, the sign to
 * which it runs; on the other side N_T has one sign. On the path of the kink N_T of the fold's side rises or falls with q, and has
 * opposite signs at two values: so there, once, a fold comes to the kink.
 */
function capIn(place: Place, at: FoldPlace, box: FoldBox): FoldCap | undefined {
  const { system, corner, more } = place;
  const { np } = closer(system, box);
  const rises = signOfRange(np);
  const ends = box.p.map((v) => signOfRange(closer(system, { ...box, p: pointAt(v) }).n));
  if (rises === 0 || ends[0] !== -rises || ends[1] !== rises) return undefined;
  const narrow = contracted(system, box);
  const whole = system.read(narrow);
  const turn = minus(over(whole.nt, whole.np));
  const kink = corner.kink(narrow);
  const passes = signOfRange(plus(kink.gt, times(kink.gp, turn)));
  const kinkEnds = box.t.map((v) =>
    signOfRange(corner.kink(contracted(system, { ...box, t: pointAt(v) })).g),
  );
  if (passes === 0 || kinkEnds[0] !== -passes || kinkEnds[1] !== passes) return undefined;
  // the side on which the difference is above zero is the right one where it rises
  const end = more === passes > 0 ? 1 : 0;
  const near = corner.side(more, narrow);
  const slope = signOfRange(plus(near.ntt, times(near.ntp, minus(over(near.nt, near.np)))));
  const edge = contracted(system, { ...box, t: pointAt(box.t[end]) });
  const far = signOfRange(corner.side(more, edge).nt);
  const beyond = signOfRange(corner.side(!more, narrow).nt);
  if (slope === 0 || beyond === 0 || far !== (end === 0 ? -slope : slope)) return undefined;
  const [byT, byP] = speedsOf({ f: near.n, ft: near.nt, fp: near.np, fq: near.nq, ...kink });
  const drift = signOfRange(plus(near.ntq, plus(times(near.ntt, byT), times(near.ntp, byP))));
  if (drift === 0) return undefined;
  const signAt = (q: number): number => {
    const tube = foldTube(corner, at, pointAt(q));
    const here = tube && foldIn(tube, pointAt(q));
    return here && isWithin(here, box) ? signOfRange(corner.side(more, here).nt) : 0;
  };
  const low = nearestProved(at.q, -1, box.q, (q) => signAt(q) === -drift);
  const high = nearestProved(at.q, 1, box.q, (q) => signAt(q) === drift);
  if (signAt(low) !== -drift || signAt(high) !== drift) return undefined;
  return {
    kind: beyond === far ? "cusp" : "change",
    ...{ box, at, atBracket: [low, high] },
    // the fold is where N_T beside the kink has the other sign than at the end of the box
    exists: drift === far ? "below" : "above",
  };
}

/** A box with p narrowed to where N can be zero (interval Newton). */
function contracted(system: FoldSystem, box: FoldBox): FoldBox {
  let here = box;
  for (let i = 0; i < CONTRACTIONS; i++) {
    const middle = middleOf(here.p);
    const { n } = closer(system, { ...here, p: pointAt(middle) });
    const [low, high] = plus(pointAt(middle), minus(over(n, system.read(here).np)));
    const next: Range = [Math.max(low, here.p[0]), Math.min(high, here.p[1])];
    if (!(next[0] <= next[1])) break;
    here = { ...here, p: next };
  }
  return here;
}
