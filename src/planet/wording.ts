// What a schema says of itself: what would have been allowed, for errors, and more for the JSON Schema.
import { registry } from "zod/mini";

/** A schema's keywords in the JSON Schema: description, ranges, patterns, examples. */
export const KEYWORDS = /* @__PURE__ */ registry<Record<string, unknown>>();

const ALLOWED = new WeakMap<object, string>();

interface Registering {
  register(registry: typeof KEYWORDS, keywords: Record<string, unknown>): unknown;
}

/** Gives a schema its words. Zod's own registry, which is shared by everybody, is left alone. */
export function worded<S>(schema: S, allowed: string, keywords: Readonly<Record<string, unknown>> = {}): S {
  ALLOWED.set(schema as object, allowed);
  (schema as Registering).register(KEYWORDS, { ...keywords });
  return schema;
}

/** What a schema allows, in words. */
export const allowedBy = (schema: object): string => ALLOWED.get(schema) ?? "a field of this format";
