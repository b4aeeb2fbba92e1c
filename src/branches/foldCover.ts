// Proves that no other fold is in a space of temperature and two givens: boxes without one, in a tube or in a cap.
import type { Range } from "../ground/range.ts";
import { meet, signOfRange } from "../search/interval.ts";
import type { FoldCap } from "./foldCap.ts";
import type { FoldChain } from "./foldChain.ts";
import type { Space } from "./foldChains.ts";
import {
  boxAt,
  closer,
  type Equations,
  type FoldBox,
  type FoldPlace,
  type FoldSystem,
  inside,
  middles,
} from "./foldSystem.ts";
import { commonOf } from "./foldTube.ts";
import { rangeOf } from "./mergeChains.ts";
import { pointAt } from "./planeReader.ts";
import { middleOf } from "./stretch.ts";
import type { OpenBox } from "./undecidedFolds.ts";

/** What is known of the folds. */
export interface KnownFolds {
  readonly chains: readonly FoldChain[];
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

/**
 * Branch and prune. `found` is called with the place of a fold that is not known yet; it may add to what is known. Returns
 * the boxes that are not decided.
 */
export function foldCover(
  system: FoldSystem,
  space: Space,
  known: KnownFolds,
  found: (place: FoldPlace) => void,
  effort: number,
): { open: OpenBox[]; boxes: number } {
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
    if (idle <= 0 && !isNearSingular(read)) {
      idle = IDLE;
      const place = system.fold({ t: middleOf(box.t), p: middleOf(box.p), q: middleOf(box.q) });
      const isHere = place && inside(pointAt(place.t), space.t) && inside(pointAt(place.p), space.p);
      if (isHere && !isKnown(boxAt(place), known)) found(place);
      if (isKnown(box, known)) continue;
    }
    const side = widest(box, space, read);
    if (side === undefined) open.push({ ...box, spent: false });
    else for (const half of halves(box[side])) waiting.push({ ...box, [side]: half, idle: idle - 1 });
  }
  return { open, boxes };
}

function isKnown(box: FoldBox, { chains, caps }: KnownFolds): boolean {
  const isPart = (a: Range, b: Range) => a[0] >= b[0] && a[1] <= b[1];
  return (
    caps.some(({ box: cap }) => isPart(box.t, cap.t) && isPart(box.p, cap.p) && isPart(box.q, cap.q)) ||
    chains.some((chain) => {
      if (!isPart(box.q, rangeOf(chain))) return false;
      return chain.tubes.every((tube) => {
        const shared = meet(tube.q, box.q);
        if (!(shared[0] <= shared[1])) return true;
        const common = commonOf(tube, shared);
        return isPart(box.t, common.t) && isPart(box.p, common.p);
      });
    })
  );
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
