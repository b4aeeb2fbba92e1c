// Where the laws and inputs of an appraisal are published; what rests on one source stands together.
import type { LawCard } from "../graph/card.ts";
import type { LawSource } from "../loop/sourcesOf.ts";
import type { PlanetInput } from "../planet/planetInput.ts";
import type { AppraisalSource } from "./appraisal.ts";

const DOI = /\b10\.\d{4,9}\/[^\s;,()]*[^\s;,().]/;

/** Sources of the laws in the loop, of those used beside it, of limits, and of the inputs that name theirs. */
export function sourcesOfAppraisal(
  laws: readonly LawSource[],
  beside: readonly { readonly card: LawCard }[],
  inputs: readonly PlanetInput[],
): AppraisalSource[] {
  const bySource = new Map<string, Set<string>>();
  const add = (name: string, source: string) => {
    if (source === "") return;
    const of = bySource.get(source) ?? new Set<string>();
    bySource.set(source, of.add(name));
  };
  for (const { law, source } of laws) add(law, source);
  for (const { card } of beside) add(card.name, card.source);
  for (const { path, source } of inputs) add(path, source ?? "");
  return [...bySource].map(([source, of]) => ({
    of: [...of],
    source,
    doi: DOI.exec(source)?.[0] ?? null,
  }));
}
