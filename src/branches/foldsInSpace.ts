// The folds in two givens of any loop, in ranges of both: followed in tubes, and proved to be all.
import type { Loop } from "../loop/types.ts";
import type { FoldCap } from "./foldCap.ts";
import type { ChainEnd, FoldChain } from "./foldChain.ts";
import { foldChains, type Space } from "./foldChains.ts";
import { foldCover } from "./foldCover.ts";
import type { FoldCurve, FoldMeeting, FoldPoint, FoldTouch, UndecidedFolds } from "./foldDiagram.ts";
import { type FoldPlace, type FoldSystem, foldSystem } from "./foldSystem.ts";
import type { FoldParts } from "./foldsOnLine.ts";
import { foldOn } from "./foldTube.ts";
import { joinedUndecided, lostEnd, openBox } from "./undecidedFolds.ts";

/** Which givens (their places), where, and how hard. */
export interface SpaceTask {
  readonly places: readonly [along: number, and: number];
  readonly space: Space;
  readonly givens: readonly number[];
  readonly effort: number;
}

/** Points of a curve in each tube. */
const POINTS = [0, 0.25, 0.5, 0.75];

/**
 * Folds are zeros of (N, N_T) in temperature and both givens. They are followed through values of the second given in tubes each
 * of which is proved to hold exactly one; where two meet, a box is proved to hold one meeting and nothing else. That there is no
 * other is proved by boxes that cover the ranges: without a fold, inside a tube, or inside such a box.
 */
export function foldsInSpace(loop: Loop, { places, space, givens, effort }: SpaceTask): FoldParts {
  const system = foldSystem(loop, places.join(" "));
  system.set(givens);
  const known = foldChains(system, space);
  const { open, boxes } = foldCover(system, space, known, known.follow, effort);
  const chains = [...known.chains]
    .map((chain) => ({ chain, curve: curveOf(system, chain) }))
    .sort((a, b) => coldest(a.curve) - coldest(b.curve));
  const meetings = known.caps.map((cap) => {
    const pair = chains.flatMap(({ chain }, i) =>
      [chain.low, chain.high].some((end) => end.cap === cap) ? [i] : [],
    );
    return { cap, pair };
  });
  const undecided: UndecidedFolds[] = [
    ...open.map((box) => openBox(system, box)),
    ...chains.flatMap(({ chain: { low, high } }) => [low, high].filter(isOpen).map(lostEnd)),
    // the proof of a meeting says that there are two
    ...meetings
      .filter(({ pair }) => pair.length !== 2)
      .map(({ cap }): UndecidedFolds => ({ and: cap.box.q, temperatures: cap.box.t, kind: "count" })),
  ];
  const proved = meetings.filter(({ pair }) => pair.length === 2);
  const of = (kinds: readonly FoldCap["kind"][]) =>
    proved.filter(({ cap }) => kinds.includes(cap.kind)).sort((a, b) => a.cap.at.t - b.cap.at.t);
  return {
    method: "space",
    curves: chains.map(({ curve }) => curve),
    cusps: of(["cusp"]).map(({ cap, pair }) => Object.freeze(meetingOf(cap, pair))),
    touches: of(["isola", "transcritical"]).map(({ cap, pair }) =>
      Object.freeze({ kind: cap.kind as FoldTouch["kind"], ...meetingOf(cap, pair) }),
    ),
    changes: [],
    undecided: joinedUndecided(undecided),
    cost: { boxes, points: 0 },
  };
}

const isOpen = ({ kind }: ChainEnd): boolean => kind === "undecided";
const coldest = ({ points }: FoldCurve): number => Math.min(...points.map((p) => p.temperature));

const pointOf = ({ t, p, q }: FoldPlace): FoldPoint => Object.freeze({ at: p, and: q, temperature: t });

function meetingOf({ box, at, atBracket, exists }: FoldCap, pair: readonly number[]): FoldMeeting {
  const temperatureBracket = Object.freeze([box.t[0], box.t[1]] as const);
  const curves = Object.freeze([pair[0] as number, pair[1] as number] as const);
  return { ...pointOf(at), andBracket: Object.freeze(atBracket), temperatureBracket, exists, curves };
}

function curveOf(system: FoldSystem, { tubes, low, high }: FoldChain): FoldCurve {
  const [from, to] = [low, high].map((end) => (end.cap ? end.cap.at.q : end.at.q)) as [number, number];
  const inner = tubes
    .flatMap((tube) =>
      POINTS.map((share) => foldOn(system, tube, tube.q[0] + share * (tube.q[1] - tube.q[0]))),
    )
    .filter(({ q }) => q > from && q < to)
    .sort((a, b) => a.q - b.q);
  const middle = inner[Math.floor(inner.length / 2)] ?? low.at;
  // N = N_TT·(T − T₀)²/2 + N_p·(p − p₀) near the fold
  const { np, ntt } = system.signs(middle);
  const points = from < to ? [low.at, ...inner, high.at] : [low.at];
  return Object.freeze({
    kind: "fold",
    exists: np * ntt < 0 ? "above" : "below",
    range: Object.freeze([from, to] as const),
    ends: Object.freeze([low.kind, high.kind] as const),
    points: Object.freeze(points.map(pointOf)),
  });
}
