// What the diagram of temperature against one parameter holds.
import type { Range } from "../ground/range.ts";
import type { Note } from "../states/note.ts";
import type { State } from "../states/state.ts";

/** A point of a branch: a state. */
export interface BranchPoint {
  /** The parameter, in its own unit. */
  readonly at: number;
  /** K. */
  readonly temperature: number;
  /** λ = ∂N/∂T, W m⁻² K⁻¹. */
  readonly feedbackParameter: number;
}

/** Where a branch ends. */
export interface BranchEnd {
  /**
   * `fold`: it turns back smoothly and goes on as its neighbour; `corner`: the same at a kink of a law; `leap`: the balance
   * leaps through zero there, at a step of a law, and the branch on the other side ends at another parameter; `transcritical`:
   * another branch crosses, and both go on with each other's stability; `between`: at an end of the range of the parameter;
   * `within`: at an end of the range of temperature; `undecided`: next to a stretch where nothing is proved.
   */
  readonly kind: "fold" | "corner" | "leap" | "transcritical" | "between" | "within" | "undecided";
  readonly at: number;
  /** Proved bounds of the parameter there. */
  readonly atBracket: Range;
  /** K. */
  readonly temperature: number;
  /** Proved bounds of the temperature there, K. */
  readonly temperatureBracket: Range;
}

/** One state for every value of the parameter in a range. */
export interface Branch {
  readonly stability: State["stability"];
  /** Lowest and highest parameter. */
  readonly parameters: Range;
  /** Lowest and highest temperature, K. */
  readonly temperatures: Range;
  /** The end at the lowest parameter. */
  readonly low: BranchEnd;
  /** The end at the highest parameter. */
  readonly high: BranchEnd;
  /** For drawing: by rising parameter, ends included; straight lines between them keep the tolerance. */
  readonly points: readonly BranchPoint[];
}

/** A point at which two branches meet and end. */
export interface Fold {
  readonly kind: "fold" | "corner";
  readonly at: number;
  /** Proved bounds of the parameter. */
  readonly atBracket: Range;
  /** K. */
  readonly temperature: number;
  /** Proved bounds of the temperature, K. */
  readonly temperatureBracket: Range;
  /** The two branches exist at parameters above it (`above`) or below. */
  readonly exists: "above" | "below";
  /** Indices of the cooler and the warmer branch. */
  readonly branches: readonly [number, number];
}

/** A point at which two branches cross and exchange their stability (a transcritical point). Proved. */
export interface BranchCrossing {
  readonly kind: "transcritical";
  readonly at: number;
  /** Proved bounds of the parameter. */
  readonly atBracket: Range;
  /** K. */
  readonly temperature: number;
  /** Proved bounds of the temperature, K. */
  readonly temperatureBracket: Range;
  /** Indices of the cooler and the warmer branch at lower parameters. */
  readonly below: readonly [number, number];
  /** The same at higher parameters; the stable one of these goes on where the stable one below ends. */
  readonly above: readonly [number, number];
}

/** What happens when a slow change of the parameter passes the end of a stable branch. */
export interface Jump {
  /** `rise`: the parameter grows; `fall`: it shrinks. */
  readonly direction: "rise" | "fall";
  /** Index of the branch that is lost. */
  readonly from: number;
  readonly at: number;
  readonly atBracket: Range;
  /** The temperature that is lost, K. */
  readonly temperature: number;
  /** The branch that is reached and its temperature there, K; `null` where it leaves the searched range. */
  readonly to: { readonly branch: number; readonly temperature: number } | null;
  /** Where it goes if it leaves the searched range of temperature; `null` with `to` also `null`: something undecided lies on the way. */
  readonly leaves: "hotter" | "colder" | null;
  /** The parameter at which a slow way back returns to the branch that was lost; `null`: it does not, or that is not known. */
  readonly returnsAt: number | null;
  /** True where the slow way back is known up to the end of the parameter's range, and does not return. */
  readonly noReturn: boolean;
}

/** Parameters without a state in the searched range of temperature. */
export interface Gap {
  readonly parameters: Range;
  /** `hot`: N is positive throughout, so the planet warms beyond the range. `null`: not proved. */
  readonly too: "hot" | "cold" | null;
}

/** A part of the diagram that is not decided. */
export interface UndecidedStretch {
  /** K. */
  readonly temperatures: Range;
  /** Parameters that it can concern. */
  readonly parameters: Range;
  /**
   * `edge`: a fold or a state on an end of a range, inside or outside. `cusp`: two folds about to merge, or none.
   * `continuum`: balanced, as far as can be told, on a whole stretch of temperatures at one parameter. `level`: a temperature
   * that is balanced whatever the parameter is. `transcritical`: two branches cross and exchange their stability, or they turn
   * away from each other closer than rounding can tell. `jump`: the balance leaps through zero, at a step of a law. `count`: parameters at which the number of states is not proved.
   * `undefined`: the budget has no finite value somewhere. `effort`: the search stopped before. `other`: none of these.
   */
  readonly kind:
    | ("edge" | "cusp" | "continuum" | "level" | "transcritical" | "jump")
    | ("count" | "undefined" | "effort" | "other");
}

/** In which unit a given is shown. */
export interface GivenUnit {
  readonly name: string;
  readonly unit: string;
  /** The unit in that of the given's value; 1 unless said. */
  readonly size?: number;
}

/** The diagram of temperature against one parameter. A plain frozen object: it survives `JSON.stringify` and back. */
export interface Diagram<A extends string = string> {
  /** The parameter, and its unit. */
  readonly along: A;
  readonly unit: string;
  readonly between: Range;
  readonly within: Range;
  /** The values of the other givens, which are held. */
  readonly fixed: Readonly<Record<string, number>>;
  /** The units of all givens. */
  readonly units: readonly GivenUnit[];
  /**
   * How the parameter was followed: `line` (the budget is a straight line in it, or in a function of it alone), `monotone` (the
   * budget only grows or only falls with it), `tiles` (counts over tiles of parameters) or `samples`.
   */
  readonly method: "line" | "monotone" | "tiles" | "samples";
  /** By rising temperature. */
  readonly branches: readonly Branch[];
  /** By rising temperature. */
  readonly folds: readonly Fold[];
  /** By rising temperature. */
  readonly crossings: readonly BranchCrossing[];
  readonly jumps: readonly Jump[];
  readonly gaps: readonly Gap[];
  readonly undecided: readonly UndecidedStretch[];
  /** True only if it is proved that no other state lies in the two ranges. */
  readonly complete: boolean;
  readonly proof: "proved" | "partial" | "sampled";
  readonly cost: { readonly boxes: number; readonly points: number };
  readonly notes: readonly Note[];
  readonly constants: string;
}
