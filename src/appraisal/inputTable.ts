// The inputs of an appraisal with the laws that take them, and the words between them.
import type { Appraisal } from "./appraisal.ts";
import { inputRows } from "./columns.ts";
import type { Section } from "./report.ts";

/** The fields of a description in the order in which their values are listed. */
const ORDER: readonly string[] = [
  ...["star", "orbit", "redistribution", "albedo", "surface", "clouds", "atmosphere"],
  ...["longwave", "forcing", "heatCapacity", "internalHeat", "rotation", "mass", "radius"],
];

/** Fields that hold a word or a truth; texts and units are no inputs. */
const WORDS: readonly string[] = ["name", "average", "side", "share", "heatCapacity", "locked"];

type Row = readonly [path: string, written: string, si: string];

/** Every input as it is written and in SI, each law before its own, each word behind what stands beside it. */
export function inputTable({ inputs, description: described }: Appraisal): Section {
  const rows: Row[] = inputRows(inputs).map(({ path, written, si }) => [path, written, si]);
  const fields = ORDER.map(
    (field) => [field, (described as Readonly<Record<string, unknown>>)[field]] as const,
  );
  for (const [field, value] of fields) {
    for (const [path, law] of leavesIn(value, field, "law")) {
      const place = above(path);
      const first = rows.findIndex(([known]) => known.startsWith(`${place}.`));
      rows.splice(first >= 0 ? first : placeFor(place, rows), 0, [place, law, ""]);
    }
    for (const word of WORDS)
      for (const [path, told] of leavesIn(value, field, word))
        if (!rows.some(([known]) => known === path)) rows.splice(placeFor(path, rows), 0, [path, told, ""]);
  }
  return { title: "Inputs", blocks: [{ head: ["input", "as written", "in SI"], rows, right: [] }] };
}

/** Behind the last row of the nearest part that has any, and of the fields before it. */
function placeFor(path: string, rows: readonly Row[]): number {
  const behind = (isBefore: (known: string) => boolean) =>
    rows.map(([known]) => isBefore(known)).lastIndexOf(true) + 1;
  for (let part = above(path); part !== ""; part = above(part)) {
    const at = behind(
      (known) => known === part || known.startsWith(`${part}.`) || known.startsWith(`${part}[`),
    );
    if (at > 0) return at;
  }
  const rank = rankOf(path);
  return behind((known) => rankOf(known) <= rank);
}

const rankOf = (path: string): number => ORDER.indexOf(path.split(/[.[]/)[0] as string);

/** The part in which something stands; empty for a whole field. */
const above = (path: string): string =>
  path.slice(0, Math.max(0, path.lastIndexOf("."), path.lastIndexOf("[")));

/** Every word and truth under one key, with its path. */
function leavesIn(value: unknown, path: string, key: string): (readonly [path: string, word: string])[] {
  if (typeof value !== "object" || value === null) {
    const isWord = typeof value === "string" || typeof value === "boolean";
    return isWord && path.slice(path.lastIndexOf(".") + 1) === key ? [[path, String(value)]] : [];
  }
  const at = (inner: string) => (Array.isArray(value) ? `${path}[${inner}]` : `${path}.${inner}`);
  return Object.entries(value).flatMap(([inner, each]) => leavesIn(each, at(inner), key));
}
