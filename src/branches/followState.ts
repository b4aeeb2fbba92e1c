// The state on the same branch at other givens.
import { branchLoss, placesOn } from "../feedback/branchLoss.ts";
import type { BranchLoss } from "../feedback/heldComparison.ts";
import { fail } from "../ground/errors.ts";
import { checkKeys, failUnknown } from "../ground/names.ts";
import { checkedNumber, type Range } from "../ground/range.ts";
import { checkBelongs, type StateLike } from "../loop/checkBelongs.ts";
import type { Givens, Loop } from "../loop/types.ts";
import { followPath, type PathOutcome } from "../states/followPath.ts";
import { pathBalanceOf } from "../states/pathBalance.ts";
import { checkOneVariable, readerOf } from "../states/prepared.ts";
import { rangeWith } from "../states/rangeWith.ts";
import type { State } from "../states/state.ts";
import { quickStepOf } from "./quickStep.ts";

/** Where to follow a state. */
export interface FollowStateOptions<N extends string = string> {
  /** New values of givens; the others keep those of the state. */
  readonly to: { readonly [K in Givens<N>]?: number };
  /** Lowest and highest temperature to look at, K; [2.7, 2000] unless said. */
  readonly within?: Range;
}

/** A state that was followed. A plain frozen object. */
export interface FollowedState<N extends string = string> {
  /** The state on the same branch at the new givens; `null` where the branch is lost. */
  readonly state: State<N> | null;
  /** Where and why the branch was lost, and to which state the climate goes from there; `null` where it was not. */
  readonly lost: BranchLoss<N> | null;
  /** `proved`: it is the same branch all the way, or it is proved to end. */
  readonly proof: "proved" | "partial" | "sampled";
}

/**
 * The state of the same branch after a slow change of givens along the straight path from the state's own to the new ones,
 * with proof that the branch does not end on the way; or where it was lost (givens, temperature) and what comes next. It is the
 * memory that a model needs which changes its givens step after step: of several states it keeps the one it is in.
 *
 * `state` may come from `JSON.parse`. Temperatures in K. Throws `foreign-state`, `unknown-name`, `missing`, `out-of-range`,
 * `not-a-number`, `unreadable`, `several-variables`.
 *
 * @example followState(loop, state, { to: { flux: 1400 } }).state
 */
export function followState<N extends string>(
  loop: Loop<N>,
  state: StateLike<N>,
  options: FollowStateOptions<N>,
): FollowedState<N> {
  checkKeys(options, "followState", ["to", "within"]);
  checkOneVariable(loop, "followState");
  return quickly(loop, state, options) ?? patiently(loop, state, options);
}

/** In one step, if all is well; whatever is wrong is left to the patient way, which says what it is. */
function quickly<N extends string>(
  loop: Loop<N>,
  state: StateLike<N>,
  { to, within }: FollowStateOptions<N>,
): FollowedState<N> | undefined {
  const place = (state as Partial<State> | null)?.variables?.temperature;
  const given = (state as Partial<State> | null)?.givens;
  if (loop.sampled || !Array.isArray(place?.bracket) || !given) return undefined;
  const before = loop.givens.map(({ name }) => given[name] as number);
  const { after, changed } = changedGivens(loop, before, to);
  const { value: temperature, bracket } = place;
  if (![temperature, ...bracket, ...before].every(Number.isFinite)) return undefined;
  if (!(temperature >= bracket[0] && temperature <= bracket[1])) return undefined;
  const step = { before, after, temperature, bracket, within: rangeWith(within, loop, temperature) };
  const located = quickStepOf(loop, changed.join())(step);
  if (!located) return undefined;
  return Object.freeze({ state: readerOf(loop)(located, after) as State<N>, lost: null, proof: "proved" });
}

function patiently<N extends string>(
  loop: Loop<N>,
  state: StateLike<N>,
  options: FollowStateOptions<N>,
): FollowedState<N> {
  const { values, low, high } = checkBelongs(loop, state, "state");
  const value = values[0] as number;
  const before = [...values.subarray(1)];
  const { after, changed } = changedGivens(loop, before, options.to);
  const within = rangeWith(options.within, loop, value);
  const balance = pathBalanceOf(loop, [], changed)({ from: before, to: after, held: 0, reference: value });
  const outcome = followPath(balance, { value, bracket: [low[0] as number, high[0] as number] }, within);
  const arrived = outcome.outcome === "arrived";
  return Object.freeze({
    state: arrived ? (readerOf(loop)(outcome.located, after) as State<N>) : null,
    lost: arrived ? null : branchLoss(outcome, placesOn<N>(loop, before, after), loop.sampled),
    proof: loop.sampled ? "sampled" : isProved(outcome) ? "proved" : "partial",
  });
}

function isProved(outcome: PathOutcome): boolean {
  return outcome.outcome === "arrived" || (outcome.outcome === "lost" && outcome.nextIs !== "undecided");
}

function changedGivens(loop: Loop, before: readonly number[], to: Readonly<Record<string, unknown>>) {
  if (typeof to !== "object" || to === null) {
    const allowed = `new values of ${loop.givens.map((g) => g.name).join(", ")}`;
    fail("missing", { path: "to", value: to, allowed });
  }
  const after = [...before];
  const changed: number[] = [];
  for (const name of Object.keys(to)) {
    const index = loop.givens.findIndex((g) => g.name === name);
    const given = loop.givens[index];
    if (!given)
      return failUnknown(
        `to.${name}`,
        name,
        loop.givens.map((g) => g.name),
      );
    const value = to[name];
    if (value === undefined || value === before[index]) continue;
    after[index] = checkedNumber(value, `to.${name}`, given.unit, given.within);
    changed.push(index);
  }
  return { after, changed: changed.sort((a, b) => a - b) };
}
