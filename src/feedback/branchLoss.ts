// How the end of a branch is told.
import type { Loop } from "../loop/types.ts";
import type { PathOutcome } from "../states/followPath.ts";
import type { BranchLoss, PathPlace } from "./heldComparison.ts";

/** Makes places on the straight path between two sets of givens. */
export type Places<N extends string> = (stage: number, temperature: number) => PathPlace<N>;

export function placesOn<N extends string>(
  loop: Loop<N>,
  before: readonly number[],
  after: readonly number[],
): Places<N> {
  return (stage, temperature) => {
    const givens = loop.givens.map(({ name }, i) => {
      const [p, q] = [before[i] as number, after[i] as number];
      return [name, stage === 1 ? q : p + stage * (q - p)];
    });
    return Object.freeze({ stage, givens: Object.freeze(Object.fromEntries(givens)), temperature });
  };
}

/** What is known of a branch that did not arrive. */
export function branchLoss<N extends string>(
  outcome: Exclude<PathOutcome, { outcome: "arrived" }>,
  places: Places<N>,
  sampled: boolean,
): BranchLoss<N> {
  if (outcome.outcome !== "lost") {
    const reason = outcome.outcome === "left" ? "range" : outcome.outcome;
    const nothing = { between: null, drift: null, next: null, nextIs: null };
    return Object.freeze({ reason, ...places(outcome.stage, outcome.x), ...nothing });
  }
  const { turning, next, nextIs } = outcome;
  return Object.freeze({
    reason: turning.corner ? "corner-fold" : "fold",
    ...places(turning.stage, turning.x),
    between: sampled ? null : Object.freeze([turning.stages[0], turning.stages[1]] as const),
    drift: turning.sign > 0 ? "warms" : "cools",
    next:
      next &&
      Object.freeze({
        ...places(turning.stages[1], next.at),
        bracket: Object.freeze([...next.bracket] as const),
      }),
    nextIs,
  });
}
