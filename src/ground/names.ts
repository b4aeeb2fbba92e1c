// Names that users choose or misspell: which are allowed, and which known one is nearest.
import { fail } from "./errors.ts";

/** The known name with the smallest edit distance (Levenshtein 1966) to a misspelt one; "" when none is known. */
export function nearestName(name: string, known: readonly string[]): string {
  let best = "";
  let least = Number.POSITIVE_INFINITY;
  const typed = name.slice(0, 60);
  for (const candidate of known) {
    const row = Array.from({ length: candidate.length + 1 }, (_, i) => i);
    for (let i = 1; i <= typed.length; i++) {
      let diagonal = row[0] as number;
      row[0] = i;
      for (let j = 1; j <= candidate.length; j++) {
        const above = row[j] as number;
        const change = diagonal + (typed[i - 1] === candidate[j - 1] ? 0 : 1);
        row[j] = Math.min(above + 1, (row[j - 1] as number) + 1, change);
        diagonal = above;
      }
    }
    const distance = row[candidate.length] as number;
    if (distance < least) {
      least = distance;
      best = candidate;
    }
  }
  return best;
}

/** Throws `unknown-name` with the known names and the nearest of them. */
export function failUnknown(path: string, name: string, known: readonly string[]): never {
  const near = nearestName(name, known);
  const allowed = near ? `${known.slice(0, 40).join(", ")} (nearest: ${near})` : "(none)";
  return fail("unknown-name", { path, value: name, allowed });
}

/** Throws `unknown-name` for the first key of `record` that is not known. */
export function checkKeys(record: object, path: string, known: readonly string[]): void {
  for (const key of Object.keys(record)) {
    if (!known.includes(key)) failUnknown(path ? `${path}.${key}` : key, key, known);
  }
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
