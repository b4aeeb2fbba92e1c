// The linear climate of assessed feedbacks.
import { neg } from "../graph/operations.ts";
import { fail } from "../ground/errors.ts";
import { checkKeys, checkRecord } from "../ground/names.ts";
import { checkedNumber } from "../ground/range.ts";
import { closeLoop } from "../loop/closeLoop.ts";
import type { Flow, Loop } from "../loop/types.ts";
import { assessedTerm } from "./assessedTerm.ts";
import type { FeedbackAssessment } from "./assessment.ts";

/** The names that such a loop has. */
export type AssessedNames<F extends string> = "variable temperature" | "given forcing" | `coupling ${F}`;

/**
 * A loop whose terms are the assessed feedbacks, each a straight line: N = F + λ₀(T − T₀) + Σ λ_i (T − T₀). The reference
 * response acts directly, every feedback is a coupling of its name, and the forcing F (W m⁻², positive when it warms; a
 * reduction of outgoing radiation) is the given `forcing`, 0 unless set. At F = 0 the state is T₀, `temperature`, 288 K
 * unless said; no answer depends on it. Heat capacity 0: there is no time in it.
 *
 * Estimates in W m⁻² K⁻¹ between −1000 and 1000, the reference at most 0: negative restores. Valid for changes small enough
 * for the feedbacks to stay constant. Throws `missing`, `not-a-number`, `out-of-range`, `unknown-name`, `unreadable`,
 * `repeated-name`.
 * Source: Gregory et al. 2004, Geophys. Res. Lett. 31, L03205.
 */
export function assessedLoop<F extends string>(
  assessment: FeedbackAssessment<F>,
  options: { readonly temperature?: number } = {},
): Loop<AssessedNames<F>> {
  checkRecord(assessment, "assessment", "reference and feedbacks");
  checkKeys(options, "assessedLoop", ["temperature"]);
  const { temperature: reference = 288 } = options;
  const { feedbacks, source } = assessment;
  checkRecord(feedbacks, "feedbacks", "estimates by name");
  if (typeof source !== "string")
    fail("unreadable", {
      path: "source",
      value: source,
      allowed: "where the assessment is published, as text",
    });
  const strength = (path: string, estimate: { readonly best: number } | undefined, most: number) =>
    checkedNumber(estimate?.best, `${path}.best`, "W m-2 K-1", [-1e3, most]);
  const origin = checkedNumber(reference, "temperature", "K", [0, 1e5]);
  const term = assessedTerm(source);
  const loop = closeLoop(({ temperature, given, couple }) => {
    const kept = (lambda: number) => term({ temperature, feedbackParameter: lambda, reference: origin });
    const cooling: Record<string, Flow> = {
      forcing: neg(given("forcing", 0, "W m-2")),
      // one that amplifies would be one of the other sign convention
      reference: neg(kept(strength("reference", assessment.reference, 0))),
    };
    for (const [name, estimate] of Object.entries<{ readonly best: number }>(feedbacks))
      cooling[`${name} feedback`] = neg(couple(name, kept(strength(`feedbacks.${name}`, estimate, 1e3))));
    return { heating: {}, cooling, heatCapacity: 0 };
  });
  return loop as unknown as Loop<AssessedNames<F>>;
}
