// What is said of the way from a state to the ends of its branch.
import type { Range } from "../ground/range.ts";
import type { Givens } from "../loop/types.ts";
import type { State } from "../states/state.ts";
import type { Brightening } from "./brightening.ts";
import type { BranchEnd, BranchPoint, Diagram, Jump } from "./diagram.ts";

/** Along which parameter, and where to look. */
export interface TippingMarginsOptions<N extends string = string> {
  /** The given that changes. */
  readonly along: Givens<N>;
  /** Lowest and highest temperature, K; [2.7, 2000] unless said. */
  readonly within?: Range;
  /** Lowest and highest value of the given; its declared range unless said. */
  readonly between?: Range;
  /**
   * The diagram along this given, if it was traced before: several states share one. Its ranges count then, and its other givens
   * must have the values of the state.
   */
  readonly diagram?: Diagram<Givens<N>>;
  /** How the star brightens or fades; then the time to the end of the branch is told, for a given that grows with luminosity. */
  readonly brightening?: Brightening;
  readonly effort?: number;
  readonly tolerance?: number;
}

/** The way to one end of a branch. */
export interface Margin<N extends string = string> {
  readonly direction: "rise" | "fall";
  /** The end of the branch; `between` and `within` mean that no fold was met inside the searched ranges. */
  readonly end: BranchEnd;
  /** The size of the change of the given to there, in its unit. */
  readonly distance: number;
  /** The same as a share of the given's value; `null` if that is 0. */
  readonly relative: number | null;
  /** The state after the jump, at the end of the branch; `null` without a jump, or where it leaves the range. */
  readonly after: State<N> | null;
  /** What happens at the end; `null` if it is no fold, or if the state is not stable. */
  readonly jump: Jump | null;
  /** The branch from the state to its end, with λ along the way. */
  readonly way: readonly BranchPoint[];
  /**
   * Until the star, as it brightens or fades, brings the given to the end of the branch, s; `null` where that is not asked,
   * never, or not before the end of its table.
   */
  readonly time: number | null;
}

/** How far a state is from the ends of its branch. A plain frozen object. */
export interface TippingMargins<N extends string = string> {
  readonly along: Givens<N>;
  readonly unit: string;
  /** The given at the state. */
  readonly at: number;
  /** K. */
  readonly temperature: number;
  readonly stability: State["stability"];
  readonly rise: Margin<N>;
  readonly fall: Margin<N>;
  /**
   * What bounds the basin of a stable state: unstable states, or leaps of the balance through zero (at a step of a law), K;
   * `null`: none on that side inside the range. `null` as a whole for a state that is not stable, and where something else that
   * is undecided lies next to it.
   */
  readonly basin: { readonly coldest: number | null; readonly hottest: number | null } | null;
  /** The values of the other givens, which are held. */
  readonly fixed: Readonly<Record<string, number>>;
  /** What is held, in words. */
  readonly held: string;
  readonly within: Range;
  readonly between: Range;
  readonly proof: Diagram["proof"];
}
