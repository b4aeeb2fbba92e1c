// The folds in two givens of any loop, in ranges of both: followed in tubes, and proved to be all.
import type { Loop } from "../loop/types.ts";
import { type CornerSystem, cornerSystems } from "./cornerSystem.ts";
import { boxAt, type FoldPlace } from "./foldBox.ts";
import { type FoldCap, foldCaps } from "./foldCap.ts";
import type { ChainEnd, FoldChain } from "./foldChain.ts";
import { foldChains, meetingsOf, type Space } from "./foldChains.ts";
import { foldCover } from "./foldCover.ts";
import type { FoldCurve, FoldMeeting, FoldPoint, FoldTouch, UndecidedFolds } from "./foldDiagram.ts";
import { type FoldSystem, foldSystem } from "./foldSystem.ts";
import type { FoldParts } from "./foldsOnLine.ts";
import { foldOn } from "./foldTube.ts";
import { kinkCaps } from "./kinkCap.ts";
import { middlesOf, type PairSystem } from "./pairSystem.ts";
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
 * Folds are zeros of (N, N_T) in temperature and both givens, corners of N and of what is zero at a kink. They are followed through
 * values of the second given in tubes each of which is proved to hold exactly one; where two meet, a box is proved to hold one
 * meeting and nothing else. That there is no other is proved by boxes that cover the ranges: without a fold, inside a tube,
 * or inside such a box.
 */
export function foldsInSpace(loop: Loop, { places, space, givens, effort }: SpaceTask): FoldParts {
  const system = foldSystem(loop, places.join(" "));
  const kinks = cornerSystems(loop, places.join(" "));
  for (const each of [system, ...kinks]) each.set(givens);
  const meetings = meetingsOf((near) => [
    ...foldCaps(system, near, space),
    ...kinks.flatMap((kink) => kinkCaps(system, kink, near, space)),
  ]);
  const folds = { system, ...foldChains(system, space, meetings) };
  const corners = kinks.map((kink) => ({ system: kink, ...foldChains(kink, space, meetings) }));
  const { open, boxes } = foldCover(space, { folds, corners, caps: meetings.caps }, effort);
  const chains = [
    ...folds.chains.map((chain) => ({ chain, curve: curveOf(system, chain, foldExists(system)) })),
    ...corners.flatMap(({ system: kink, chains }) =>
      chains.map((chain) => ({ chain, curve: curveOf(kink, chain, cornerExists(kink)) })),
    ),
  ].sort((a, b) => coldest(a.curve) - coldest(b.curve));
  const met = meetings.caps.map((cap) => {
    const pair = chains.flatMap(({ chain }, i) =>
      [chain.low, chain.high].some((end) => end.cap === cap) ? [i] : [],
    );
    return { cap, pair };
  });
  const undecided: UndecidedFolds[] = [
    ...open.map((box) => openBox(system, box)),
    ...chains.flatMap(({ chain: { low, high } }) => [low, high].filter(isOpen).map(lostEnd)),
    // the proof of a meeting says that there are two
    ...met
      .filter(({ pair }) => pair.length !== 2)
      .map(({ cap }): UndecidedFolds => ({ and: cap.box.q, temperatures: cap.box.t, kind: "count" })),
  ];
  const proved = met.filter(({ pair }) => pair.length === 2);
  const of = (kinds: readonly FoldCap["kind"][]) =>
    proved.filter(({ cap }) => kinds.includes(cap.kind)).sort((a, b) => a.cap.at.t - b.cap.at.t);
  return {
    method: "space",
    curves: chains.map(({ curve }) => curve),
    cusps: of(["cusp"]).map(({ cap, pair }) => Object.freeze(meetingOf(cap, pair))),
    touches: of(["isola", "transcritical"]).map(({ cap, pair }) =>
      Object.freeze({ kind: cap.kind as FoldTouch["kind"], ...meetingOf(cap, pair) }),
    ),
    changes: of(["change"]).map(({ cap, pair }) => {
      const isBelow = (i: number) => chains[i]?.chain.high.cap === cap;
      const { exists: _, ...place } = meetingOf(
        cap,
        [...pair].sort((i) => (isBelow(i) ? -1 : 1)),
      );
      return Object.freeze(place);
    }),
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

type Exists = (at: FoldPlace) => FoldCurve["exists"];

function curveOf(system: PairSystem, { tubes, low, high }: FoldChain, exists: Exists): FoldCurve {
  const [from, to] = [low, high].map((end) => (end.cap ? end.cap.at.q : end.at.q)) as [number, number];
  const inner = tubes
    .flatMap((tube) =>
      POINTS.map((share) => foldOn(system, tube, tube.q[0] + share * (tube.q[1] - tube.q[0]))),
    )
    .filter(({ q }) => q > from && q < to)
    .sort((a, b) => a.q - b.q);
  const middle = inner[Math.floor(inner.length / 2)] ?? low.at;
  const points = from < to ? [low.at, ...inner, high.at] : [low.at];
  return Object.freeze({
    kind: system.kind,
    exists: exists(middle),
    range: Object.freeze([from, to] as const),
    ends: Object.freeze([low.kind, high.kind] as const),
    points: Object.freeze(points.map(pointOf)),
  });
}

/** N = N_TT·(T − T₀)²/2 + N_p·(p − p₀) near a fold. */
const foldExists =
  (system: FoldSystem): Exists =>
  (at) => {
    const { np, ntt } = system.signs(at);
    return np * ntt < 0 ? "above" : "below";
  };

/** At the kink, of difference d, N changes with p by N_p − N_T·d_p/d_T, and it rises on the right if it bends upwards. */
const cornerExists =
  (kink: CornerSystem): Exists =>
  (at) => {
    const box = boxAt(at);
    const { ft, fp, gt, gp } = middlesOf(kink.pair(box));
    const [less, more] = kink.slopes(box);
    return (fp - (ft * gp) / gt) * (gt > 0 ? more : less) < 0 ? "above" : "below";
  };
