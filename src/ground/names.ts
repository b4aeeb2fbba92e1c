// Names that users choose or misspell: which are allowed, and which known one is nearest.
import { fail } from "./errors.ts";

/** The known name with the smallest edit distance (Levenshtein 1966) to a misspelt one; "" when none has much in common. */
export function nearestName(name: string, known: readonly string[]): string {
  let best = "";
  // as many changes as it has letters make any name of any other; a single letter is but mistyped
  let least = Math.max(2, name.length);
  for (const candidate of known) {
    const distance = editDistance(name.slice(0, 60), candidate);
    if (distance < least) [best, least] = [candidate, distance];
  }
  return best;
}

function editDistance(a: string, b: string): number {
  let row = [0, ...b].map((_, j) => j);
  for (const letter of a) {
    let left = Infinity;
    row = row.map((above, j) => {
      left = Math.min(above, left, (row[j - 1] ?? Infinity) - Number(letter === b[j - 1])) + 1;
      return left;
    });
  }
  return row.at(-1) as number;
}

/** Throws `unknown-name` with the known names and the nearest of them. */
export function failUnknown(path: string, name: string, known: readonly string[]): never {
  const near = nearestName(name, known);
  const list = known.slice(0, 40).join(", ") || "(none)";
  return fail("unknown-name", { path, value: name, allowed: near ? `${list} (nearest: ${near})` : list });
}

/** Throws `unreadable` for what is no object, and `unknown-name` for the first key of `record` that is not known. */
export function checkKeys(record: unknown, path: string, known: readonly string[]): asserts record is object {
  checkRecord(record, path, known);
  for (const key of Object.keys(record)) {
    if (!known.includes(key)) failUnknown(`${path}.${key}`, key, known);
  }
}

/** Throws `unreadable` for what is no object. */
export function checkRecord(record: unknown, path: string, fields: unknown): asserts record is object {
  if (Object(record) !== record)
    fail("unreadable", { path, value: record, allowed: `an object with ${fields}` });
}

/** Refuses names that are empty or that every object already has, such as `__proto__`. */
export function checkedName(name: unknown, path: string): string {
  if (typeof name !== "string" || name === "" || name in Object.prototype) {
    fail("reserved-name", {
      path,
      value: name,
      allowed: "any text that is not empty and no property of every object",
    });
  }
  return name;
}
