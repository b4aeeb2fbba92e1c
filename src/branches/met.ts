// How two states meet in a narrow stretch of parameters.
import type { BranchEnd } from "./diagram.ts";

/**
 * `crossing`: the two branches cross, proved. `near`: they cross, or turn away from each other closer than rounding.
 * `apart`: they are two branches that never meet. `gap`: they end in folds on both sides of a parameter without the two.
 */
export type Meeting =
  | { readonly kind: "crossing" | "near"; readonly end: BranchEnd }
  | { readonly kind: "apart" }
  | { readonly kind: "gap"; readonly at: number; readonly ends: readonly [BranchEnd, BranchEnd] };
