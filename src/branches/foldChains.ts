// Follows folds through values of the second given: chains of tubes, and what they end in.
import type { Range } from "../ground/range.ts";
import { minus, over, plus, signOfRange, times } from "../search/interval.ts";
import { type FoldCap, foldCaps } from "./foldCap.ts";
import type { FoldCurveEnd } from "./foldDiagram.ts";
import { type FoldBox, type FoldPlace, type FoldSystem, inside } from "./foldSystem.ts";
import { boxOf, commonOf, type FoldTube, foldIn, foldTube, placeIn } from "./foldTube.ts";
import { pointAt } from "./planeReader.ts";

/** Where a chain ends. */
export interface ChainEnd {
  readonly kind: FoldCurveEnd;
  readonly at: FoldPlace;
  /** Bounds of the second given there: proved unless the kind is `undecided`. */
  readonly atBracket: Range;
  readonly cap: FoldCap | null;
}

/** A fold from one end to the other: neighbouring tubes hold the same one where they meet. */
export interface FoldChain {
  /** By rising second given. */
  readonly tubes: readonly FoldTube[];
  readonly low: ChainEnd;
  readonly high: ChainEnd;
}

/** Ranges of temperature and of both givens in which folds are sought. */
export type Space = FoldBox;

const FIRST_STEP = 0.05;
/** Below this step a meeting with another fold is looked for, and each time it has become so much smaller again. */
const SUSPECT = 0.003;
const FINEST_STEP = 1e-8;
const MOST_TUBES = 2000;

/** Follows folds, and remembers where they meet. */
export function foldChains(system: FoldSystem, space: Space) {
  const chains: FoldChain[] = [];
  const caps: FoldCap[] = [];
  const plane = { t: space.t, p: space.p };
  const width = space.q[1] - space.q[0];

  /** The fold at one value, in tight bounds. */
  const section = (tube: FoldTube, q: number): FoldBox => {
    const fine = foldTube(system, placeIn(tube, q), pointAt(q));
    const tight = fine && foldIn(fine, pointAt(q));
    const known = foldIn(tube, pointAt(q));
    return tight && isWithin(tight, commonOf(tube, pointAt(q))) ? tight : known;
  };
  const capAt = (box: FoldBox): FoldCap | undefined =>
    caps.find((c) => inside(box.t, c.box.t) && inside(box.p, c.box.p) && isPart(box.q, c.box.q));
  const newCap = (near: FoldPlace): void => {
    for (const cap of foldCaps(system, near, space)) {
      if (!caps.some((c) => isPart(cap.atBracket, c.box.q) && isWithin(boxed(cap.at), c.box))) caps.push(cap);
    }
  };

  /** The tubes from a place on in one direction, and the end. */
  const half = (
    start: FoldPlace,
    direction: 1 | -1,
    before: FoldTube | undefined,
  ): { tubes: FoldTube[]; end: ChainEnd } => {
    const tubes: FoldTube[] = [];
    const limit = direction > 0 ? space.q[1] : space.q[0];
    let last = before;
    let q = start.q;
    let [step, suspect] = [FIRST_STEP * width, SUSPECT * width];
    let sinceInside = 0;
    for (let i = 0; i < MOST_TUBES; i++) {
      const here = last ? section(last, q) : undefined;
      const at = last ? system.fold(placeIn(last, q)) : start;
      const cap = here && capAt(here);
      if (cap) return { tubes, end: { kind: cap.kind, at: cap.at, atBracket: cap.atBracket, cap } };
      // a gap is what is left of a meeting that is not proved; beyond it nothing is followed twice
      if (
        here &&
        chains.some(({ tubes: known }) =>
          known.some((tube) => isPart([q, q], tube.q) && isWithin(here, commonOf(tube, [q, q]))),
        )
      )
        return { tubes, end: openEnd(at, q) };
      if (here && isApart(here, plane)) {
        const end = exitOf(tubes.slice(sinceInside), direction);
        return { tubes, end: end ?? openEnd(at, q) };
      }
      if (here && isWithin(here, plane)) sinceInside = tubes.length;
      if (q === limit) {
        const kind = here && isWithin(here, plane) ? "between" : "undecided";
        return { tubes, end: { kind, at, atBracket: [q, q], cap: null } };
      }
      const next = direction > 0 ? Math.min(limit, q + step) : Math.max(limit, q - step);
      const tube = foldTube(
        system,
        last ? placeIn(last, (q + next) / 2) : at,
        direction > 0 ? [q, next] : [next, q],
      );
      if (tube && (!here || isWithin(here, commonOf(tube, pointAt(q))))) {
        tubes.push(tube);
        last = tube;
        q = next;
        step *= 2;
        continue;
      }
      step = Math.abs(next - q) / 2;
      if (step < FINEST_STEP * width) return { tubes, end: openEnd(at, q) };
      if (step < suspect && last) {
        newCap(at);
        suspect /= 16;
      }
    }
    return { tubes, end: openEnd(start, q) };
  };

  /** A fold that has left the plane: through which side, and that it did so once. */
  const exitOf = (passed: readonly FoldTube[], direction: 1 | -1): ChainEnd | undefined => {
    const last = passed.at(-1);
    if (!last) return undefined;
    const beyond = section(last, direction > 0 ? last.q[1] : last.q[0]);
    const sides = (["t", "p"] as const).filter(
      (x) => beyond[x][1] < plane[x][0] || beyond[x][0] > plane[x][1],
    );
    const [x, other] = sides;
    if (!x || other) return undefined;
    const edge = beyond[x][1] < plane[x][0] ? plane[x][0] : plane[x][1];
    const outward = edge === plane[x][0] ? -1 : 1;
    for (const tube of passed) {
      const { nt: _, np, nq, ntt, ntp, ntq } = system.read(boxOf(tube, tube.q));
      const byP = minus(over(nq, np));
      const speed = x === "p" ? byP : minus(over(plus(ntq, times(ntp, byP)), ntt));
      if (signOfRange(speed) !== outward * direction) return undefined;
      const stays = foldIn(tube, tube.q)[x === "p" ? "t" : "p"];
      if (!isPart(stays, plane[x === "p" ? "t" : "p"])) return undefined;
    }
    const first = passed[0] as FoldTube;
    let [low, high] = direction > 0 ? [first.q[0], last.q[1]] : [last.q[0], first.q[1]];
    const holds = (v: number) => passed.find((tube) => tube.q[0] <= v && v <= tube.q[1]) as FoldTube;
    const sideOf = (v: number): number => {
      const [a, b] = section(holds(v), v)[x];
      return a > edge ? 1 : b < edge ? -1 : 0;
    };
    const below = sideOf(low);
    let [least, most] = [low, high];
    for (let i = 0; i < 60; i++) {
      const middle = low + (high - low) / 2;
      if (middle === low || middle === high) break;
      const side = sideOf(middle);
      if (side === 0) {
        // rounding: the bounds close in from both sides
        least = nearest(low, middle, (v) => sideOf(v) === below);
        most = nearest(high, middle, (v) => sideOf(v) === -below);
        break;
      }
      if (side === below) least = low = middle;
      else most = high = middle;
    }
    const at = (least + most) / 2;
    const kind = x === "t" ? "within" : "along";
    return { kind, at: system.fold(placeIn(holds(at), at)), atBracket: [least, most], cap: null };
  };

  return {
    caps: caps as readonly FoldCap[],
    chains: chains as readonly FoldChain[],
    /** Follows the fold near a place, if one is proved there. */
    follow(start: FoldPlace): void {
      const up = half(start, 1, undefined);
      const down = half(start, -1, up.tubes[0]);
      const tubes = [...down.tubes.reverse(), ...up.tubes];
      if (tubes.length > 0) chains.push({ tubes, low: down.end, high: up.end });
    },
  };
}

const openEnd = (at: FoldPlace, q: number): ChainEnd => ({
  kind: "undecided",
  at,
  atBracket: [q, q],
  cap: null,
});

const isPart = (a: Range, b: Range): boolean => a[0] >= b[0] && a[1] <= b[1];
type Plane = Pick<FoldBox, "t" | "p">;
const isWithin = (a: Plane, b: Plane): boolean => isPart(a.t, b.t) && isPart(a.p, b.p);
const isApart = (a: Plane, b: Plane): boolean =>
  a.t[1] < b.t[0] || a.t[0] > b.t[1] || a.p[1] < b.p[0] || a.p[0] > b.p[1];
const boxed = ({ t, p }: FoldPlace): Plane => ({ t: [t, t], p: [p, p] });

/** The last place from one towards another at which something holds, to rounding. */
function nearest(from: number, to: number, holds: (v: number) => boolean): number {
  let [good, bad] = [from, to];
  for (let i = 0; i < 60; i++) {
    const middle = good + (bad - good) / 2;
    if (middle === good || middle === bad) break;
    if (holds(middle)) good = middle;
    else bad = middle;
  }
  return good;
}
