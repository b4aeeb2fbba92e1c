// A fold from the end that its two branches share.
import type { BranchEnd, Fold } from "./diagram.ts";

/** The fold at an end: on which side of it the branches exist, and which they are, the cooler first. */
export function foldAt(end: BranchEnd, exists: Fold["exists"], branches: Fold["branches"]): Fold {
  const { at, atBracket, temperature, temperatureBracket } = end;
  const kind = end.kind as Fold["kind"];
  return Object.freeze({ kind, at, atBracket, temperature, temperatureBracket, exists, branches });
}
