// Where the laws and inputs of an appraisal are published; what rests on one source stands together.
import type { LawCard } from "../graph/card.ts";
import type { LawSource } from "../loop/sourcesOf.ts";
import type { PlanetInput } from "../planet/planetInput.ts";
import type { AppraisalSource } from "./appraisal.ts";
import type { AppraisalNote } from "./appraisalNote.ts";
import { columnOf } from "./columns.ts";

/** Parentheses belong to a DOI where they are balanced, a full stop at its end does not. */
const DOI = /\b10\.\d{4,9}\/(?:\([^\s()]*\)|[^\s;,()])*(?:\([^\s()]*\)|[^\s;,.()])/g;

/** Sources of the laws in the loop, of those used beside it, of limits, and of the inputs and cautions that name theirs. */
export function sourcesOfAppraisal(
  laws: readonly LawSource[],
  beside: readonly { readonly card: LawCard }[],
  inputs: readonly PlanetInput[],
  notes: readonly AppraisalNote[],
): AppraisalSource[] {
  const bySource = new Map<string, Set<string>>();
  const add = (name: string, source: string) => {
    if (source === "") return;
    const of = bySource.get(source) ?? new Set<string>();
    bySource.set(source, of.add(name));
  };
  for (const { law, source } of laws) add(law, source);
  for (const { card } of beside) add(card.name, card.source);
  for (const { path, source } of inputs) add(columnOf(path) ?? path, source ?? "");
  for (const { code, source } of notes) add(code, source ?? "");
  return [...bySource].map(([source, of]) => ({
    of: [...of],
    source,
    dois: source.match(DOI) ?? [],
  }));
}
