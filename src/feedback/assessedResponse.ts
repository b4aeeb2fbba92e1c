// What assessed feedbacks make of a forcing.
import { fail } from "../ground/errors.ts";
import { checkKeys } from "../ground/names.ts";
import { checkedNumber } from "../ground/range.ts";
import { compensatedSum } from "../ground/sum.ts";
import { findStates } from "../states/findStates.ts";
import { analyseFeedbacks } from "./analyseFeedbacks.ts";
import { type AssessedNames, assessedLoop } from "./assessedLoop.ts";
import type { Estimate, FeedbackAssessment } from "./assessment.ts";
import { compareHeld } from "./compareHeld.ts";
import { MOST_HELD } from "./comparisonInput.ts";
import { type FeedbackNote, feedbackNote } from "./feedbackNote.ts";
import type { Feedbacks } from "./feedbacks.ts";
import type { HeldComparison } from "./heldComparison.ts";

/** What is asked of assessed feedbacks. */
export interface AssessedResponseOptions<F extends string = string> {
  /** W m⁻², positive when it warms: an effective radiative forcing. */
  readonly forcing: number;
  /** The feedbacks to compare with and without; all unless said. */
  readonly hold?: readonly F[];
}

/** The linear answer to a forcing. */
export interface AssessedResponse<F extends string = string> {
  /** λ and its parts. */
  readonly feedbacks: Feedbacks<AssessedNames<F>>;
  /** ΔT = −F/λ with and without what is held, and the shares. */
  readonly response: HeldComparison<AssessedNames<F>>;
  readonly notes: readonly FeedbackNote[];
}

/**
 * The answer of assessed feedbacks to a forcing: λ = λ₀ + Σ λ_i, ΔT = −F/λ in K, with and without some of the feedbacks, and
 * the part that each has in it. Best estimates only; where the assessment states a climate sensitivity a note quotes it,
 * because a sensitivity is assessed from more lines of evidence than the sum of the feedbacks.
 *
 * Forcing in W m⁻² between −1000 and 1000, λ in W m⁻² K⁻¹. Throws `missing`, `not-a-number`, `out-of-range` (also if
 * reference and feedbacks cancel, λ = 0), `too-large` (more than 12 to hold), `unknown-name`, `unreadable`.
 * Sources: Gregory et al. 2004, Geophys. Res. Lett. 31, L03205; of the shares: Shapley 1953.
 *
 * @example assessedResponse(AR6_FEEDBACKS, { forcing: 3.93 }).response.temperatureChange // 3.388 K
 */
export function assessedResponse<F extends string>(
  assessment: FeedbackAssessment<F>,
  options: AssessedResponseOptions<F>,
): AssessedResponse<F> {
  checkKeys(options, "assessedResponse", ["forcing", "hold"]);
  const forcing = checkedNumber(options.forcing, "forcing", "W m-2", [-1e3, 1e3]);
  const loop = assessedLoop(assessment);
  const hold = options.hold ?? allOf(assessment);
  const state = findStates(loop, { within: [287, 289] }).states[0];
  if (!state) {
    const { reference, feedbacks } = assessment;
    const estimates: readonly Estimate[] = [reference, ...Object.values<Estimate>(feedbacks)];
    return fail("out-of-range", {
      path: "feedbacks",
      value: compensatedSum(estimates.map((e) => e.best)),
      allowed: "a sum with the reference that is not 0",
      unit: "W m-2 K-1",
    });
  }
  const change = { forcing } as { readonly [K in "forcing"]: number };
  const response = compareHeld(loop as never, { from: state, change, hold } as never) as HeldComparison<
    AssessedNames<F>
  >;
  const feedbacks = analyseFeedbacks(loop, state);
  return Object.freeze({ feedbacks, response, notes: Object.freeze(sensitivityNotes(assessment)) });
}

/** All feedbacks, to be held in every combination. */
function allOf<F extends string>({ feedbacks }: FeedbackAssessment<F>): F[] {
  const names = Object.keys(feedbacks) as F[];
  const path = "feedbacks";
  if (names.length === 0)
    fail("missing", { path, value: "no feedbacks", allowed: "at least one estimate by name" });
  if (names.length > MOST_HELD)
    fail("too-large", { path, value: names.length, allowed: `at most ${MOST_HELD}, unless hold names some` });
  return names;
}

function sensitivityNotes({ sensitivity, source }: FeedbackAssessment): FeedbackNote[] {
  if (!sensitivity) return [];
  const { best, likely } = sensitivity;
  const range = likely ? `, likely ${likely[0]} to ${likely[1]} K` : "";
  const text = `a straight line through best estimates; the assessed sensitivity to a doubling of CO₂ is ${best} K${range}, from several lines of evidence`;
  const about = "temperatureChange";
  return [feedbackNote("assessed-sensitivity", "caution", { about, text, value: best, unit: "K", source })];
}
