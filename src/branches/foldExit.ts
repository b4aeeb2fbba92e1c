// How a fold leaves the ranges of temperature and of the first given.
import { signOfRange } from "../search/interval.ts";
import type { ChainEnd } from "./foldChain.ts";
import { type FoldTube, foldIn, foldOn, isPart, type Plane, sectionOf } from "./foldTube.ts";
import type { PairSystem } from "./pairSystem.ts";

/** A fold that has left the plane: through which side, and that it did so once. */
export function foldExit(
  system: PairSystem,
  plane: Plane,
  passed: readonly FoldTube[],
  direction: 1 | -1,
): ChainEnd | undefined {
  const last = passed.at(-1);
  if (!last) return undefined;
  const beyond = sectionOf(system, last, direction > 0 ? last.q[1] : last.q[0]);
  const sides = (["t", "p"] as const).filter((x) => beyond[x][1] < plane[x][0] || beyond[x][0] > plane[x][1]);
  const [x, other] = sides;
  if (!x || other) return undefined;
  const edge = beyond[x][1] < plane[x][0] ? plane[x][0] : plane[x][1];
  const outward = edge === plane[x][0] ? -1 : 1;
  for (const tube of passed) {
    const speed = system.speeds(foldIn(tube, tube.q))[x === "p" ? 1 : 0];
    if (signOfRange(speed) !== outward * direction) return undefined;
    const stays = foldIn(tube, tube.q)[x === "p" ? "t" : "p"];
    if (!isPart(stays, plane[x === "p" ? "t" : "p"])) return undefined;
  }
  const first = passed[0] as FoldTube;
  let [low, high] = direction > 0 ? [first.q[0], last.q[1]] : [last.q[0], first.q[1]];
  const holds = (v: number) => passed.find((tube) => tube.q[0] <= v && v <= tube.q[1]) as FoldTube;
  const sideOf = (v: number): number => {
    const [a, b] = sectionOf(system, holds(v), v)[x];
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
  return { kind, at: foldOn(system, holds(at), at), atBracket: [least, most], cap: null };
}

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
