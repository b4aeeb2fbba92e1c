// The folds of a loop in two of its givens: the lines beyond which states appear or vanish.
import { CONSTANT_SET } from "../ground/constants.ts";
import { fail } from "../ground/errors.ts";
import { checkKeys } from "../ground/names.ts";
import { checkedNumber, checkedRange, type Range } from "../ground/range.ts";
import { givensAt } from "../loop/inputs.ts";
import type { GivenRecord, Givens, Loop } from "../loop/types.ts";
import { checkOneVariable } from "../states/prepared.ts";
import { checkedAlong } from "./checkedAlong.ts";
import type { FoldDiagram } from "./foldDiagram.ts";
import { foldedLoop } from "./foldedLoop.ts";
import { foldsInSpace } from "./foldsInSpace.ts";
import { foldsOnLine } from "./foldsOnLine.ts";
import { kinkedFolds } from "./kinkedFolds.ts";
import { turnReader } from "./turns.ts";

/** In which two givens, and where to look. */
export interface TraceFoldsOptions<N extends string = string> {
  /** The given in which a state meets a fold. */
  readonly along: Givens<N>;
  /**
   * Lowest and highest value of the first given. Where the budget is a straight line in it, it may be left out and takes any value
   * that the folds have; otherwise its declared range is taken unless this is said.
   */
  readonly alongBetween?: Range;
  /** The given with which the fold moves. */
  readonly and: Givens<N>;
  /** Lowest and highest value of the second given. */
  readonly between: Range;
  /** Lowest and highest temperature, K. */
  readonly within: Range;
  /** Values of other givens that differ from those the loop was closed with. */
  readonly at?: { readonly [K in Givens<N>]?: number };
  /** How many boxes may be enclosed; 20,000 unless said, 100,000 with a range of the first given. */
  readonly effort?: number;
}

/**
 * The fold curves of a loop in two givens, with the places in which they meet: cusps, isolas and transcritical points.
 *
 * Where the budget is a straight line in the first given p, the folds are the states of a balance of their own, λ(T, q) = 0 on
 * the curve p(T), and their cusps are its folds: both are proved as in `traceBranches`, over tiles of the second given q.
 * Otherwise, or with `alongBetween`, folds are zeros of N and ∂N/∂T in temperature and both givens, followed in tubes that are
 * proved to hold one each, and the rest of the three ranges is proved to hold none.
 *
 * At a kink of a law λ can leap through zero: a corner. Corners are followed like folds, and where λ on one side of the kink
 * passes zero one goes on as the other. Temperatures in K, both givens in their own units. Throws `contradiction` where the
 * budget does not depend on one of the givens, or where a loop with a sampled law is no straight line in `along`,
 * `missing` without a range of the first given, `unknown-name`, `out-of-range`, `not-a-number`, `unreadable`,
 * `several-variables`.
 *
 * @example traceFolds(loop, { along: "flux", and: "width", between: [2, 60], within: [150, 400] }).cusps
 */
export function traceFolds<N extends string>(
  loop: Loop<N>,
  options: TraceFoldsOptions<N>,
): FoldDiagram<Givens<N>> {
  const path = "traceFolds";
  checkKeys(options, path, ["along", "alongBetween", "and", "between", "within", "at", "effort"]);
  checkOneVariable(loop, path);
  const first = checkedAlong(loop, options.along, options.at, `${path}.along`);
  const second = checkedAlong(loop, options.and, options.at, `${path}.and`);
  if (first.name === second.name)
    fail("contradiction", { path: "and", value: second.name, allowed: "another given than `along`" });
  const within = checkedRange(options.within, "within", "K", loop.variables[0]?.within);
  const between = checkedRange(options.between, "between", second.given.unit, second.given.within);
  const givens = givensAt(loop, options.at);
  const places = [first, second].map(({ place }) => place - loop.variables.length) as [number, number];
  const line = options.alongBetween === undefined || loop.sampled ? foldedLoop(loop, first.name) : undefined;
  const alongBetween = line ? null : rangeOf(loop, first.given, options.alongBetween);
  const effort = checkedNumber(options.effort ?? (line ? 20_000 : 100_000), "effort", "1", [10, 1e9]);
  const task = { name: second.name, place: places[1], givens, between, within, effort, tolerance: 1 };
  const space = { t: within, p: alongBetween ?? within, q: between };
  const turns = line && !loop.sampled ? turnReader(loop, places.join(" ")) : undefined;
  const parts = turns
    ? kinkedFolds(loop, turns, task)
    : line
      ? foldsOnLine(loop, line, task)
      : foldsInSpace(loop, { places, space, givens, effort });
  const complete = parts.undecided.length === 0 && !loop.sampled;
  return Object.freeze({
    along: options.along,
    and: options.and,
    between: Object.freeze(between),
    alongBetween: alongBetween && Object.freeze(alongBetween),
    within: Object.freeze(within),
    curves: Object.freeze(parts.curves),
    cusps: Object.freeze(parts.cusps),
    touches: Object.freeze(parts.touches),
    changes: Object.freeze(parts.changes),
    method: parts.method,
    undecided: Object.freeze(parts.undecided.map((u) => Object.freeze(u))),
    complete,
    proof: loop.sampled ? "sampled" : complete ? "proved" : "partial",
    cost: Object.freeze(parts.cost),
    constants: CONSTANT_SET,
  });
}

/** The range of the first given. A sampled law has no enclosures, so it needs a straight line. */
function rangeOf(loop: Loop, { name, unit, within }: GivenRecord, range: Range | undefined): Range {
  if (loop.sampled) {
    const allowed = "a given in which the budget is a straight line, such as a flux, as a law is sampled";
    return fail("contradiction", { path: "traceFolds.along", value: name, allowed });
  }
  const wanted = range ?? within;
  if (wanted) return checkedRange(wanted, "alongBetween", unit, within);
  return fail("missing", { path: "alongBetween", value: range, allowed: "a range of the first given", unit });
}
