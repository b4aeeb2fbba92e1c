// The inputs of an appraisal with the laws that take them.
import type { Appraisal } from "./appraisal.ts";
import { type Section, withUnit } from "./report.ts";

/** Fields in which a law may stand. */
const PLACES = ["albedo", "surface", "longwave", "heatCapacity", "forcing"] as const;

/** Every input as it is written and in SI, each law before its own. */
export function inputTable({ inputs, description }: Appraisal): Section {
  const rows = inputs.map(({ path, written, value, unit }) => {
    const si = withUnit(value, unit);
    return [path, written, si === written || written === String(value) ? "" : si];
  });
  for (const place of PLACES) {
    const law = lawAt(description, place);
    if (law === null) continue;
    const first = rows.findIndex(([path]) => path?.startsWith(`${place}.`));
    rows.splice(first < 0 ? rows.length : first, 0, [place, law, ""]);
  }
  return { title: "Inputs", blocks: [{ head: ["input", "as written", "in SI"], rows, right: [] }] };
}

function lawAt(description: unknown, place: string): string | null {
  const written = (description as Readonly<Record<string, unknown>>)[place];
  const law = typeof written === "object" && written !== null ? (written as { law?: unknown }).law : null;
  return typeof law === "string" ? law : null;
}
