// Whether a state at one parameter and a state at another are on one branch.
import type { Loop } from "../loop/types.ts";
import { followPath } from "../states/followPath.ts";
import { pathBalanceOf } from "../states/pathBalance.ts";
import type { BranchPoint } from "./diagram.ts";
import type { Task } from "./diagramOf.ts";

/** True if it is proved that the first state becomes the second while the parameter changes. */
export type GoesOn = (from: BranchPoint, to: BranchPoint) => boolean;

/** Relative to the temperature: two findings of one state are closer. */
const SAME = 1e-9;

/** Follows states of a loop along a given, the others set. */
export function goesOnOf(loop: Loop, { place, givens, within }: Task): GoesOn {
  const balance = pathBalanceOf(loop, [], [place]);
  const givensAt = (p: number) => givens.map((v, i) => (i === place ? p : v));
  return (from, to) => {
    const { temperature: value } = from;
    const path = balance({ from: givensAt(from.at), to: givensAt(to.at), held: 0, reference: value });
    const outcome = followPath(path, { value, bracket: [value, value] }, within);
    if (outcome.outcome !== "arrived") return false;
    return Math.abs(outcome.located.at - to.temperature) <= SAME * to.temperature;
  };
}
