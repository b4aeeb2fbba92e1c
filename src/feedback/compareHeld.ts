// The finite answer of a climate to a change, with and without some of its couplings.
import { checkKeys } from "../ground/names.ts";
import type { Range } from "../ground/range.ts";
import { checkBelongs, type StateLike, type Taken } from "../loop/checkBelongs.ts";
import { couplingsNamed } from "../loop/holdFixed.ts";
import type { Couplings, Givens, Loop } from "../loop/types.ts";
import { followPath, type PathOutcome } from "../states/followPath.ts";
import type { Located } from "../states/located.ts";
import { pathBalanceOf } from "../states/pathBalance.ts";
import { checkOneVariable, readerOf } from "../states/prepared.ts";
import { rangeWith } from "../states/rangeWith.ts";
import type { State } from "../states/state.ts";
import { branchLoss, placesOn } from "./branchLoss.ts";
import { changedGivens, checkCount } from "./comparisonInput.ts";
import { comparisonNotes } from "./comparisonNotes.ts";
import type { HeldComparison, HeldResponse } from "./heldComparison.ts";
import { shapleyShares } from "./shapley.ts";

/** What changes, and what is held. */
export interface CompareHeldOptions<N extends string = string> {
  /** The state before; it may come from `JSON.parse`. */
  readonly from: StateLike<N>;
  /** New values of givens; the others keep those of the state. */
  readonly change: { readonly [K in Givens<N>]?: number };
  /** The couplings to compare with and without; at most 12. */
  readonly hold: readonly Couplings<N>[];
  /** Lowest and highest temperature to look at, K; [2.7, 2000] unless said. */
  readonly within?: Range;
}

/**
 * The change of temperature after a slow change of givens, with and without couplings: ΔT of the loop as it is, ΔT with all of
 * `hold` held at the state (as by `holdFixed`), the order-free shares of the couplings in the difference, and the regulation
 * 1 − ΔT/ΔT_held. These are finite changes, not slopes.
 *
 * Every choice of held couplings is followed on the branch of `from` along the straight path from the old to the new givens,
 * with proof that it stays the same branch. Where one crosses a fold there is no ΔT to share: `shares` is `null`, and `lost`
 * says which choices lose their state, at which givens and temperature, and to which state the climate goes from there.
 *
 * `regulation` is `null` where one of the two is lost, and where ΔT_held is not told from 0. Temperatures in K, givens in
 * their own units. Of n couplings all 2ⁿ choices are followed.
 *
 * Throws `unknown-name` (with the nearest), `missing` (no change, nothing to hold), `too-large`, `foreign-state`,
 * `out-of-range`, `not-a-number`, `unreadable`, `several-variables`. Source of the shares: Shapley 1953.
 *
 * @example compareHeld(loop, { from: state, change: { carbonDioxide: 560 }, hold: ["albedo", "opticalDepth"] })
 */
export function compareHeld<N extends string>(
  loop: Loop<N>,
  options: CompareHeldOptions<N>,
): HeldComparison<N> {
  checkKeys(options, "compareHeld", ["from", "change", "hold", "within"]);
  checkOneVariable(loop, "compareHeld");
  const couplings = couplingsNamed(loop, options.hold, "hold");
  checkCount(couplings.length, loop);
  const at = checkBelongs(loop, options.from, "from");
  const temperature = at.values[0] as number;
  const before = [...at.values.subarray(1)];
  const after = changedGivens(loop, before, options.change);
  const within = rangeWith(options.within, loop, temperature);
  const { outcomeOf, isUnstable } = follower(loop, couplings, { at, before, after, within });
  const hold = Object.freeze(couplings.map((c) => c.name as Couplings<N>));
  const places = placesOn<N>(loop, before, after);
  const outcomes = Array.from({ length: 1 << hold.length }, (_, held) => outcomeOf(held));
  const subsets = outcomes.map((outcome, held): HeldResponse<N> => {
    const arrived = outcome.outcome === "arrived";
    return Object.freeze({
      held: Object.freeze(hold.filter((_, i) => held & (1 << i))),
      temperatureChange: arrived ? outcome.located.at - temperature : null,
      lost: arrived ? null : branchLoss(outcome, places, loop.sampled),
    });
  });
  const [asItIs, allHeld] = [subsets[0], subsets.at(-1)] as [HeldResponse<N>, HeldResponse<N>];
  const [whole] = outcomes as [PathOutcome];
  const to = whole.outcome === "arrived" ? (readerOf(loop)(whole.located, after) as State<N>) : null;
  const last = outcomes.at(-1) as PathOutcome;
  const regulation =
    last.outcome === "arrived" && isMoved(at, last.located) ? regulationOf(asItIs, allHeld) : null;
  const lost = subsets.filter((s): s is HeldComparison<N>["lost"][number] => s.lost !== null);
  return Object.freeze({
    from: places(0, temperature),
    to,
    hold,
    temperatureChange: asItIs.temperatureChange,
    temperatureChangeHeld: allHeld.temperatureChange,
    regulation,
    shares: lost.length > 0 ? null : sharesOf(hold, subsets),
    subsets: Object.freeze(subsets),
    lost: Object.freeze(lost),
    evaluations: outcomes.length,
    within,
    proof: proofOf(loop, subsets),
    notes: Object.freeze(comparisonNotes(loop, { outcomes, regulation, isUnstable, within, to })),
  });
}

/** Follows the state with some couplings held. */
function follower(
  loop: Loop,
  couplings: Loop["couplings"],
  path: { at: Taken; before: readonly number[]; after: readonly number[]; within: Range },
): { readonly outcomeOf: (held: number) => PathOutcome; readonly isUnstable: boolean } {
  const { at, before, after, within } = path;
  const changed = before.flatMap((value, i) => (value === after[i] ? [] : [i]));
  const balance = pathBalanceOf(
    loop,
    couplings.map((c) => c.node),
    changed,
  );
  const value = at.values[0] as number;
  const bracket: Range = [at.low[0] as number, at.high[0] as number];
  const along = (held: number) => balance({ from: before, to: after, held, reference: value });
  const f = along(0);
  const read = new Float64Array(9);
  f.between(0, 0);
  f.box(bracket[0], bracket[1], read);
  return {
    outcomeOf: (held) => followPath(along(held), { value, bracket }, within),
    isUnstable: (read[3] as number) > 0,
  };
}

type Answer = Pick<HeldResponse, "temperatureChange">;
const regulationOf = ({ temperatureChange: change }: Answer, held: Answer): number | null =>
  change === null ? null : 1 - change / (held.temperatureChange as number);

/** Whether a temperature has changed by more than is not known of it: the brackets before and after are apart. */
const isMoved = ({ low, high }: Taken, { bracket }: Located): boolean =>
  bracket[0] > (high[0] as number) || bracket[1] < (low[0] as number);

function sharesOf<N extends string>(
  hold: readonly Couplings<N>[],
  subsets: readonly HeldResponse<N>[],
): HeldComparison<N>["shares"] {
  // a coupling takes part where it is not held
  const worth = subsets.map((_, active) => subsets[subsets.length - 1 - active]?.temperatureChange as number);
  const shares = shapleyShares(hold.length, worth);
  return Object.freeze(Object.fromEntries(hold.map((name, i) => [name, shares[i]]))) as never;
}

function proofOf<N extends string>(loop: Loop, subsets: readonly HeldResponse<N>[]): HeldComparison["proof"] {
  if (loop.sampled) return "sampled";
  const open = subsets.some(({ lost }) => lost?.reason === "undecided" || lost?.nextIs === "undecided");
  return open ? "partial" : "proved";
}
