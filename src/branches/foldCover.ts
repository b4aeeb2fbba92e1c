// Proves that no other fold is in a space of temperature and two givens: boxes without one, in a tube or in a cap.
import type { Range } from "../ground/range.ts";
import { meet, signOfRange } from "../search/interval.ts";
import type { CornerSystem } from "./cornerSystem.ts";
import { boxAt, type FoldBox, type FoldPlace, inside } from "./foldBox.ts";
import type { FoldCap } from "./foldCap.ts";
import type { FoldChain } from "./foldChain.ts";
import type { Space } from "./foldChains.ts";
import { closer, type FoldSystem, middles } from "./foldSystem.ts";
import { commonOf, isPart, type Plane } from "./foldTube.ts";
import { rangeOf } from "./mergeChains.ts";
import { pointAt } from "./planeReader.ts";
import type { Equations } from "./planeSlopes.ts";
import { middleOf } from "./stretch.ts";
import type { OpenBox } from "./undecidedFolds.ts";

/** Zeros of a system, followed; `follow` is called with the place of one that is not known yet. */
interface Followed<S> {
  readonly system: S;
  readonly chains: readonly FoldChain[];
  follow(place: FoldPlace): void;
}

/** What is known of folds, of the corners of each kink, and of the places where they meet. */
export interface KnownFolds {
  readonly folds: Followed<FoldSystem>;
  readonly corners: readonly Followed<CornerSystem>[];
  readonly caps: readonly FoldCap[];
}

/** Off the middle, where symmetric problems have their folds. */
const SPLIT = 0.503;
/** Boxes are halved down to this share of the space. */
const FINEST = 1e-6;
/** After a fold was looked for in a box so many halvings pass before the next time. */
const IDLE = 4;

interface Waiting extends FoldBox {
  readonly idle: number;
}

/** Branch and prune: follows what it comes upon, and returns the boxes that are not decided. */
export function foldCover(
  space: Space,
  known: KnownFolds,
  effort: number,
): { open: OpenBox[]; boxes: number } {
  const { system } = known.folds;
  const waiting: Waiting[] = [{ ...space, idle: 0 }];
  const open: OpenBox[] = [];
  let boxes = 0;
  for (let box = waiting.pop(); box; box = waiting.pop()) {
    if (isKnown(box, known)) continue;
    if (boxes >= effort) {
      open.push({ ...box, spent: true });
      continue;
    }
    boxes++;
    const read = system.read(box);
    if (isEmpty(system, box, read)) continue;
    let { idle } = box;
    if (idle <= 0) {
      const sought = [...(isNearSingular(read) ? [] : [known.folds]), ...known.corners.filter(isAt(box))];
      if (sought.length > 0) idle = IDLE;
      for (const { system, chains, follow } of sought) {
        const place = system.solve({ t: middleOf(box.t), p: middleOf(box.p), q: middleOf(box.q) });
        const isHere = place && inside(pointAt(place.t), space.t) && inside(pointAt(place.p), space.p);
        if (!isHere || !system.accepts(boxAt(place))) continue;
        // the tube of another kink may reach as far as here
        const isNew = ![...chains, ...known.caps].some((one) => isPartOf(boxAt(place), one));
        if (isNew) follow(place);
      }
      if (isKnown(box, known)) continue;
    }
    const side = widest(box, space, read);
    if (side === undefined) open.push({ ...box, spent: false });
    else for (const half of halves(box[side])) waiting.push({ ...box, [side]: half, idle: idle - 1 });
  }
  return { open, boxes };
}

/** Whether a kink may be in a box. */
const isAt =
  (box: FoldBox) =>
  ({ system }: Followed<CornerSystem>): boolean =>
    signOfRange(system.kink(box).g) === 0;

/** In a tube, or in a cap. In the tube of a corner there is no fold where N_T has a sign on either side of the kink. */
function isKnown(box: FoldBox, { folds, corners, caps }: KnownFolds): boolean {
  return (
    [...caps, ...folds.chains].some((one) => isPartOf(box, one)) ||
    corners.some(
      ({ system, chains }) =>
        chains.some((chain) => isPartOf(box, chain)) && system.slopes(box).every((sign) => sign !== 0),
    )
  );
}

function isPartOf(box: FoldBox, whole: FoldChain | FoldCap): boolean {
  const holds = ({ t, p }: Plane) => isPart(box.t, t) && isPart(box.p, p);
  if ("box" in whole) return holds(whole.box) && isPart(box.q, whole.box.q);
  if (!isPart(box.q, rangeOf(whole))) return false;
  return whole.tubes.every((tube) => {
    const shared = meet(tube.q, box.q);
    return !(shared[0] <= shared[1]) || holds(commonOf(tube, shared));
  });
}

/** No fold in the box: N or its slope has one sign. */
function isEmpty(system: FoldSystem, box: FoldBox, read: Equations): boolean {
  if (signOfRange(read.n) !== 0 || signOfRange(read.nt) !== 0) return true;
  const { n, nt } = closer(system, box, read);
  return signOfRange(n) !== 0 || signOfRange(nt) !== 0;
}

/** Whether the Jacobian in the middle is so small beside its bounds that looking for a fold would be of no use. */
function isNearSingular(read: Equations): boolean {
  const { np, ntt } = middles(read);
  const spread = (r: Range) => r[1] - r[0];
  return !(Math.abs(np) > 0.25 * spread(read.np) && Math.abs(ntt) > 0.25 * spread(read.ntt));
}

type Side = "t" | "p" | "q";

/** The side over which both equations change most; undefined for a box that is not to be halved any more. */
function widest(box: FoldBox, space: Space, { nt, np, nq, ntt, ntp, ntq }: Equations): Side | undefined {
  const size = (r: Range) => r[1] - r[0];
  const sides = (["t", "p", "q"] as const).filter((x) => size(box[x]) > FINEST * size(space[x]));
  const slopes = { t: [nt, ntt], p: [np, ntp], q: [nq, ntq] } as const;
  const change = (x: Side, i: 0 | 1) => Math.max(-slopes[x][i][0], slopes[x][i][1]) * size(box[x]);
  const totals = ([0, 1] as const).map((i) => change("t", i) + change("p", i) + change("q", i)) as [
    number,
    number,
  ];
  const share = (x: Side) => change(x, 0) / totals[0] + change(x, 1) / totals[1];
  const known = totals.every((v) => v > 0 && v < Number.POSITIVE_INFINITY);
  const measure = known ? share : (x: Side) => size(box[x]) / size(space[x]);
  return sides.reduce<Side | undefined>(
    (best, x) => (best === undefined || measure(x) > measure(best) ? x : best),
    undefined,
  );
}

function halves(r: Range): readonly Range[] {
  const middle = r[0] + (r[1] - r[0]) * SPLIT;
  return [
    [r[0], middle],
    [middle, r[1]],
  ];
}
