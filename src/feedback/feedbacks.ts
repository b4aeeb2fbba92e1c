// What is said of the feedbacks that act in a state.
import type { Range } from "../ground/range.ts";
import type { Couplings, Givens } from "../loop/types.ts";
import type { FeedbackNote } from "./feedbackNote.ts";

/** How a small disturbance goes on, s. Both are `null` where λ is 0 or not told from 0, or the heat capacity is below 0. */
export interface DisturbanceTimes {
  /** −C/λ: the time in which it falls to 1/e; `null` if it does not fall. */
  readonly eFoldingTime: number | null;
  readonly eFoldingTimeRange: Range | null;
  /** C/λ: the time in which it grows by e; `null` if it does not grow. */
  readonly growthTime: number | null;
  readonly growthTimeRange: Range | null;
}

/** A part of λ. */
export interface FeedbackPart {
  /** λ_i, W m⁻² K⁻¹. */
  readonly feedbackParameter: number;
  readonly feedbackParameterRange: Range | null;
  /** f_i = λ_i/(−λ₀); `null` unless the reference response is known to be negative. */
  readonly feedbackFactor: number | null;
  readonly feedbackFactorRange: Range | null;
}

/** A feedback loop: temperature acts on the net flux through couplings, one after the other. */
export interface FeedbackLoop<N extends string = string> extends FeedbackPart {
  /** temperature → these, in order → net flux. */
  readonly through: readonly Couplings<N>[];
  /** `amplifies` (λ_i > 0) a disturbance, `counters` (λ_i < 0) it, `none` (λ_i = 0), or `undecided`: bounds on both sides of 0. */
  readonly effect: "amplifies" | "counters" | "none" | "undecided";
  /** The state as it would be without this loop: λ − λ_i. */
  readonly without: DisturbanceTimes & {
    readonly feedbackParameter: number;
    readonly feedbackParameterRange: Range | null;
  };
}

/**
 * The feedbacks that act in a state. A plain frozen object: it survives `JSON.stringify` and back.
 *
 * A number `x` has its proved bounds in `xRange`: the true value for the true state, wherever that lies in the state's bracket.
 * They are `null` where the number is, for a sampled loop, and where there are no finite ones.
 */
export interface Feedbacks<N extends string = string> extends DisturbanceTimes {
  /** K. */
  readonly temperature: number;
  readonly givens: { readonly [K in Givens<N>]: number };
  /** The couplings that are cut. */
  readonly through: readonly Couplings<N>[];
  /** λ = ∂N/∂T with other variables frozen, W m⁻² K⁻¹. */
  readonly feedbackParameter: number;
  readonly feedbackParameterRange: Range | null;
  /** λ with other variables in balance; the same number when there are none. */
  readonly settledFeedbackParameter: number;
  readonly reference: {
    /** `Planck response` only where all that answers directly goes as T⁴; `text` says why or why not. */
    readonly kind: "Planck response" | "reference response";
    /** λ₀: the response with all chosen couplings cut, W m⁻² K⁻¹. */
    readonly feedbackParameter: number;
    readonly feedbackParameterRange: Range | null;
    readonly text: string;
    /** Couplings that answer to temperature but were not chosen, so that they are part of λ₀. */
    readonly contains: readonly Couplings<N>[];
  };
  /** The strongest first; at most 64. λ₀ + Σ λ_i + `others` = λ. */
  readonly loops: readonly FeedbackLoop<N>[];
  /** The sum of the loops beyond the strongest; `null` where all are listed. */
  readonly others: (FeedbackPart & { readonly count: number }) | null;
  /** λ₀ + Σ λ_i + `others` − λ, W m⁻² K⁻¹: rounding and nothing else. */
  readonly residual: number;
  /** Σ f_i; `null` unless the reference response is known to be negative. */
  readonly feedbackFactor: number | null;
  readonly feedbackFactorRange: Range | null;
  /** 1/(1 − Σ f); `null` unless Σ f is known to be below 1, and where there are no factors. */
  readonly gain: number | null;
  readonly gainRange: Range | null;
  /** −1/λ: the change of the equilibrium for one more W m⁻², K; `null` where λ is not told from 0. */
  readonly sensitivity: number | null;
  readonly sensitivityRange: Range | null;
  /** What each given does. */
  readonly responses: {
    readonly [K in Givens<N>]: {
      /** ∂N/∂p with temperature held, W m⁻² per unit. */
      readonly flux: number;
      readonly fluxRange: Range | null;
      /** dT/dp = −(∂N/∂p)/λ along the branch, K per unit; `null` where λ is not told from 0. */
      readonly temperature: number | null;
      readonly temperatureRange: Range | null;
      /** The unit of the given. */
      readonly unit: string;
    };
  };
  /** True if the sign of λ, and with it everything that divides by λ, is proved. */
  readonly proved: boolean;
  readonly notes: readonly FeedbackNote[];
}
