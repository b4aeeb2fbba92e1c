// Feedbacks as assessed from many studies, in numbers.
import type { Range } from "../ground/range.ts";

/** A best estimate with its range. */
export interface Estimate {
  readonly best: number;
  readonly veryLikely?: Range;
}

/** Feedback parameters that were assessed one by one, W m⁻² K⁻¹; they add up to λ. */
export interface FeedbackAssessment<F extends string = string> {
  /** The response that the others are measured against, such as Planck's; 0 or negative. */
  readonly reference: Estimate;
  readonly feedbacks: { readonly [K in F]: Estimate };
  /** Equilibrium warming for a doubling of CO₂ as assessed from all lines of evidence, K. */
  readonly sensitivity?: Estimate & { readonly likely?: Range };
  readonly source: string;
}

const estimate = (best: number, veryLikely: Range): Estimate =>
  Object.freeze({ best, veryLikely: Object.freeze(veryLikely) });

/**
 * Feedbacks of the present Earth, W m⁻² K⁻¹, and the assessed climate sensitivity, K. Source: IPCC 2021, sixth assessment
 * report, working group I, chapter 7: Table 7.10 and executive summary.
 */
export const AR6_FEEDBACKS = /* @__PURE__ */ Object.freeze({
  reference: /* @__PURE__ */ estimate(-3.22, [-3.4, -3]),
  feedbacks: /* @__PURE__ */ Object.freeze({
    waterVapourAndLapseRate: /* @__PURE__ */ estimate(1.3, [1.1, 1.5]),
    surfaceAlbedo: /* @__PURE__ */ estimate(0.35, [0.1, 0.6]),
    cloud: /* @__PURE__ */ estimate(0.42, [-0.1, 0.94]),
    biogeophysicalAndBiogeochemical: /* @__PURE__ */ estimate(-0.01, [-0.27, 0.25]),
  }),
  sensitivity: /* @__PURE__ */ Object.freeze({
    best: 3,
    likely: [2.5, 4] as const,
    veryLikely: [2, 5] as const,
  }),
  source: "IPCC 2021, AR6 WGI, chapter 7, Table 7.10 and executive summary",
});
