// Follows folds through values of the second given: chains of tubes, and what they end in.

import { type FoldBox, type FoldPlace, inside } from "./foldBox.ts";
import type { FoldCap } from "./foldCap.ts";
import type { ChainEnd, FoldChain } from "./foldChain.ts";
import { foldExit } from "./foldExit.ts";
import {
  commonOf,
  type FoldTube,
  foldIn,
  foldOn,
  foldTube,
  isPart,
  isWithin,
  type Plane,
  placeIn,
  sectionOf,
} from "./foldTube.ts";
import { mergeChains } from "./mergeChains.ts";
import type { PairSystem } from "./pairSystem.ts";
import { pointAt } from "./planeReader.ts";

/** Ranges of temperature and of both givens in which folds are sought. */
export type Space = FoldBox;

const FIRST_STEP = 0.05;
/** Below this step a meeting with another fold is looked for, and each time it has become so much smaller again. */
const SUSPECT = 0.003;
const FINEST_STEP = 1e-8;
const MOST_TUBES = 2000;

/** The places where folds meet, as far as they are known. */
export interface Meetings {
  readonly caps: readonly FoldCap[];
  /** Looks for one near a place. */
  look(near: FoldPlace): void;
}

/** Remembers meetings; `seek` looks for them near a place. */
export function meetingsOf(seek: (near: FoldPlace) => readonly FoldCap[], caps: FoldCap[] = []): Meetings {
  const isNew = ({ at, atBracket }: FoldCap) =>
    !caps.some((c) => isPart(atBracket, c.box.q) && isWithin(boxed(at), c.box));
  return {
    caps,
    look(near) {
      for (const cap of seek(near)) if (isNew(cap)) caps.push(cap);
    },
  };
}

/** Follows zeros of a system, folds or corners, up to where they meet others. */
export function foldChains(system: PairSystem, space: Space, { caps, look }: Meetings) {
  const chains: FoldChain[] = [];
  const plane = { t: space.t, p: space.p };
  const width = space.q[1] - space.q[0];

  const capAt = (box: FoldBox): FoldCap | undefined =>
    caps.find((c) => inside(box.t, c.box.t) && inside(box.p, c.box.p) && isPart(box.q, c.box.q));

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
      const here = last ? sectionOf(system, last, q) : undefined;
      const at = last ? foldOn(system, last, q) : start;
      const cap = here && capAt(here);
      if (cap) {
        const goesOn = system.kind === "fold" ? "corner" : "fold";
        const kind = cap.kind === "change" ? goesOn : cap.kind;
        return { tubes, end: { kind, at: cap.at, atBracket: cap.atBracket, cap } };
      }
      // a gap is what is left of a meeting that is not proved; beyond it nothing is followed twice
      if (
        here &&
        chains.some(({ tubes: known }) =>
          known.some((tube) => isPart([q, q], tube.q) && isWithin(here, commonOf(tube, [q, q]))),
        )
      )
        return { tubes, end: openEnd(at, q) };
      if (here && isApart(here, plane)) {
        const end = foldExit(system, plane, tubes.slice(sinceInside), direction);
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
      const isNext = tube && system.accepts(foldIn(tube, tube.q));
      if (isNext && (!here || isWithin(here, commonOf(tube, pointAt(q))))) {
        tubes.push(tube);
        last = tube;
        q = next;
        step *= 2;
        continue;
      }
      step = Math.abs(next - q) / 2;
      if (step < FINEST_STEP * width) return { tubes, end: openEnd(at, q) };
      if (step < suspect && last) {
        look(at);
        suspect /= 16;
      }
    }
    return { tubes, end: openEnd(start, q) };
  };

  return {
    chains: chains as readonly FoldChain[],
    /** Follows the fold near a place, if one is proved there. */
    follow(start: FoldPlace): void {
      const up = half(start, 1, undefined);
      const down = half(start, -1, up.tubes[0]);
      const tubes = [...down.tubes.reverse(), ...up.tubes];
      // one that began inside of a meeting that was found on the way is part of it, and of the curves that end there
      const meeting = up.end.cap === down.end.cap ? up.end.cap : null;
      const isInside = meeting && tubes.every((tube) => capAt(foldIn(tube, tube.q)) === meeting);
      if (tubes.length === 0 || isInside) return;
      // it may have come to one that is known
      let chain: FoldChain = { tubes, low: down.end, high: up.end };
      for (let i = chains.length - 1; i >= 0; i--) {
        const merged = mergeChains(system, chains[i] as FoldChain, chain);
        if (!merged) continue;
        chain = merged;
        chains.splice(i, 1);
      }
      chains.push(chain);
    },
  };
}

const openEnd = (at: FoldPlace, q: number): ChainEnd => ({
  kind: "undecided",
  at,
  atBracket: [q, q],
  cap: null,
});

const isApart = (a: Plane, b: Plane): boolean =>
  a.t[1] < b.t[0] || a.t[0] > b.t[1] || a.p[1] < b.p[0] || a.p[0] > b.p[1];
const boxed = ({ t, p }: FoldPlace): Plane => ({ t: [t, t], p: [p, p] });
