// Makes one of two chains that follow the same fold.
import { meet } from "../search/interval.ts";
import type { FoldChain } from "./foldChain.ts";
import { commonOf, type FoldTube, foldTube, isWithin, placeIn, sectionOf } from "./foldTube.ts";
import type { PairSystem } from "./pairSystem.ts";
import { pointAt } from "./planeReader.ts";
import { middleOf } from "./stretch.ts";

/** Both as one, if it is proved that they follow the same fold. */
export function mergeChains(system: PairSystem, a: FoldChain, b: FoldChain): FoldChain | undefined {
  const shared = meet(rangeOf(a), rangeOf(b));
  if (!(shared[0] <= shared[1]) || !isSame(system, a, b, middleOf(shared))) return undefined;
  const [first, other] = isOpen(a.low) && !isOpen(b.low) ? [b, a] : [a, b];
  const low = rangeOf(first)[0] <= rangeOf(other)[0] ? first.low : other.low;
  const [last, another] = isOpen(a.high) && !isOpen(b.high) ? [b, a] : [a, b];
  const high = rangeOf(last)[1] >= rangeOf(another)[1] ? last.high : another.high;
  const [from, to] = rangeOf(a);
  const beyond = b.tubes.filter(({ q }) => q[0] < from || q[1] > to);
  const tubes = [...a.tubes, ...beyond].sort((x, y) => x.q[0] - y.q[0]);
  return { tubes, low, high };
}

const isOpen = ({ kind }: FoldChain["low"]): boolean => kind === "undecided";

/** The values of the second given over which a chain reaches; where tubes overlap the last is not always the longest. */
export function rangeOf({ tubes }: FoldChain): readonly [number, number] {
  return [Math.min(...tubes.map(({ q }) => q[0])), Math.max(...tubes.map(({ q }) => q[1]))];
}

/** Each tube holds one fold; two hold the same if it lies in both, or in a third. */
function isSame(system: PairSystem, a: FoldChain, b: FoldChain, q: number): boolean {
  const [one, two] = [a, b].map(({ tubes }) => tubes.find((tube) => tube.q[0] <= q && q <= tube.q[1]));
  if (!one || !two) return false;
  const [here, there] = [sectionOf(system, one, q), sectionOf(system, two, q)];
  const at = pointAt(q);
  const third = foldTube(system, placeIn(one, q), at);
  const holdsBoth = (tube: FoldTube) => [here, there].every((s) => isWithin(s, commonOf(tube, at)));
  return [one, two, ...(third ? [third] : [])].some(holdsBoth);
}
