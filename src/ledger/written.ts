// Reads what callers write down of a ledger: records with known fields.
import { fail } from "../ground/errors.ts";
import { checkedName, checkKeys } from "../ground/names.ts";

type Fields = Readonly<Record<string, unknown>>;

/** The fields of an object; anything else is unreadable. */
export function record(value: unknown, path: string): Fields {
  if (typeof value !== "object" || value === null || Array.isArray(value)) {
    return fail("unreadable", { path, value, allowed: "an object with named fields" });
  }
  return value as Fields;
}

/** The fields of an object that may have these and no others. */
export function fieldsOf(value: unknown, path: string, known: readonly string[]): Fields {
  const fields = record(value, path);
  checkKeys(fields, path, known);
  return fields;
}

/** The records of a list, each with known fields. */
export function listed(value: unknown, path: string, known: readonly string[]): Fields[] {
  if (!Array.isArray(value)) return fail("unreadable", { path, value, allowed: "a list of records" });
  return value.map((row, i) => fieldsOf(row, `${path}[${i}]`, known));
}

/** A name or a citation: any text that is not empty. */
export function text(value: unknown, path: string): string {
  if (value === undefined) return fail("missing", { path, value, allowed: "a text that is not empty" });
  return checkedName(value, path);
}
