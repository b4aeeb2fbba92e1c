// Says what is not decided in a diagram.
import type { Range } from "../ground/range.ts";
import type { DoubtKind } from "../search/enumeration.ts";
import { type Note, type NoteCode, searchNote } from "../states/note.ts";
import type { Critical } from "./criticals.ts";
import type { UndecidedStretch } from "./diagram.ts";
import type { Crossing } from "./runs.ts";

/** What a doubt about N at an end of the parameter's range is in the diagram. */
const AT_AN_END: Readonly<Record<DoubtKind | "level" | "leap", UndecidedStretch["kind"]>> = {
  fold: "edge",
  corner: "edge",
  edge: "edge",
  flat: "continuum",
  jump: "jump",
  leap: "jump",
  undefined: "undefined",
  effort: "effort",
  level: "level",
};

/** What a doubt about λ on the curve is in the diagram. */
const onTheCurve = (kind: Critical["kind"]): UndecidedStretch["kind"] =>
  kind === "fold" || kind === "corner" ? "cusp" : AT_AN_END[kind];

/** The undecided stretch of a crossing, if it is in doubt. */
export function crossingDoubt({ doubt, bracket, end }: Crossing, between: Range): UndecidedStretch[] {
  if (doubt === null) return [];
  const kind = AT_AN_END[doubt];
  const parameters: Range = kind === "edge" || kind === "continuum" ? [between[end], between[end]] : between;
  return [{ temperatures: bracket, parameters, kind }];
}

/** The undecided stretch of a critical place. */
export function criticalDoubt({ kind, bracket }: Critical, parameters: Range): UndecidedStretch {
  return { temperatures: bracket, parameters, kind: onTheCurve(kind) };
}

/** The notes of a diagram: that its search stopped, that it is sampled. */
export function diagramNotes(sampled: boolean, undecided: readonly UndecidedStretch[]): Note[] {
  const note = (code: NoteCode, text: string): Note => searchNote("traceBranches", code, "caution", text);
  const notes: Note[] = [];
  if (sampled) {
    const text = "found by sampling: branches and folds may be missing";
    notes.push(note("sampled-search", text));
  }
  if (undecided.some((u) => u.kind === "effort")) {
    notes.push(note("search-stopped", "the effort was spent before the ranges were searched"));
  }
  return notes;
}
