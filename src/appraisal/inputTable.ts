// The inputs of an appraisal with the laws that take them.
import type { Appraisal } from "./appraisal.ts";
import { inputRows } from "./columns.ts";
import type { Section } from "./report.ts";

/** Fields in which a law may stand, at any depth. */
const PLACES = ["albedo", "surface", "longwave", "forcing", "heatCapacity"] as const;

/** Every input as it is written and in SI, each law before its own. */
export function inputTable({ inputs, description: described }: Appraisal): Section {
  const description = described as Readonly<Record<string, unknown>>;
  const rows = inputRows(inputs).map(({ path, written, si }) => [path, written, si]);
  for (const field of PLACES)
    for (const { path: place, law } of lawsIn(description[field], field)) {
      const first = rows.findIndex(([path]) => path?.startsWith(`${place}.`));
      // a law without inputs comes last in its field
      const last = rows.map(([path]) => /^[a-zA-Z]+/.exec(path ?? "")?.[0] === field).lastIndexOf(true);
      rows.splice(first >= 0 ? first : last >= 0 ? last + 1 : rows.length, 0, [place, law, ""]);
    }
  return { title: "Inputs", blocks: [{ head: ["input", "as written", "in SI"], rows, right: [] }] };
}

/** Every law that stands in a value, with its path, the outer ones first. */
function lawsIn(value: unknown, path: string): { readonly path: string; readonly law: string }[] {
  if (typeof value !== "object" || value === null) return [];
  const { law } = value as { readonly law?: unknown };
  const inner = Object.entries(value).flatMap(([key, each]) =>
    lawsIn(each, Array.isArray(value) ? `${path}[${key}]` : `${path}.${key}`),
  );
  return typeof law === "string" ? [{ path, law }, ...inner] : inner;
}
