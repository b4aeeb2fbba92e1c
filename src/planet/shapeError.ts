// Says in this library's words what the shape check of a description found.
import type { ZodMiniType } from "zod/mini";
import { fail, type ThermosteadError } from "../ground/errors.ts";
import { failUnknown, nearestName } from "../ground/names.ts";
import { faultsOf } from "./faults.ts";
import { pureHint } from "./pureHint.ts";
import { allowedBy } from "./wording.ts";

/** As much of a schema as is needed to find the part that an issue is about. */
interface Schema {
  readonly _zod: {
    readonly def: {
      readonly type: string;
      readonly innerType?: Schema;
      readonly options?: readonly Schema[];
      readonly discriminator?: string;
      readonly shape?: Readonly<Record<string, Schema>>;
      readonly element?: Schema;
      readonly values?: readonly unknown[];
    };
  };
}
type Path = readonly PropertyKey[];

/** The errors of a value that does not fit its schema, the one that explains most first. */
export const shapeFaults = (schema: ZodMiniType, value: unknown): ThermosteadError[] =>
  explain(schema as unknown as Schema, value, "");

function explain(schema: Schema, value: unknown, path: string): ThermosteadError[] {
  const inner = unwrapped(schema);
  if (inner._zod.def.type === "union") return explainUnion(inner, value, path);
  const issues = (schema as unknown as ZodMiniType).safeParse(value).error?.issues ?? [];
  if (issues.length === 0) return faultsOf(() => refuse(inner, value, path));
  const misspelt: ThermosteadError[] = [];
  const meant = new Set<string>();
  const others = issues.flatMap((issue) => {
    const { part, held, at } = follow(inner, value, path, issue.path);
    if (part._zod.def.type === "union") return explainUnion(part, held, at);
    if (issue.code !== "unrecognized_keys") return faultsOf(() => refuse(part, held, at));
    const known = Object.keys(part._zod.def.shape ?? {});
    for (const key of issue.keys) {
      misspelt.push(...faultsOf(() => failUnknown(joined(at, key), key, known)));
      meant.add(joined(at, nearestName(key, known)));
    }
    return [];
  });
  // a misspelt field stands before all others, and in place of the field that is missing because of it
  return [...misspelt, ...others.filter((fault) => fault.code !== "missing" || !meant.has(fault.path))];
}

/** A union is explained by the option that is meant: the law of that name, or the object that shares most fields. */
function explainUnion(union: Schema, value: unknown, path: string): ThermosteadError[] {
  const options = flattened(union);
  const list = options.find((o) => o._zod.def.type === "array");
  if (list && Array.isArray(value)) return explain(list, value, path);
  if (!isRecord(value)) {
    const single = options.find((o) => o._zod.def.type === typeof value && !o._zod.def.shape);
    return faultsOf(() => refuse(single ?? union, value, path));
  }
  const laws = options.filter((o) => o._zod.def.shape?.law);
  const named = laws.find((o) => lawOf(o) === value.law);
  if (named) return explain(named, value, path);
  const [only, another] = options.filter((o) => o._zod.def.shape);
  if (only && !another && laws.length === 0) return explain(only, value, path);
  const shared = (o: Schema) => Object.keys(o._zod.def.shape ?? {}).filter((key) => key in value).length;
  const meant = options.reduce((best, o) => (shared(o) > shared(best) ? o : best), union);
  if (laws.includes(meant)) return faultsOf(() => failLaw(laws.map(lawOf), value.law, joined(path, "law")));
  return meant === union ? faultsOf(() => refuse(union, value, path)) : explain(meant, value, path);
}

function failLaw(known: readonly string[], value: unknown, path: string): never {
  if (typeof value === "string") return failUnknown(path, value, known);
  const allowed = known.map((name) => `"${name}"`).join(", ");
  return fail(value === undefined ? "missing" : "unreadable", { path, value, allowed });
}

function refuse(schema: Schema, value: unknown, path: string): never {
  const details = { path: path || "description", value, allowed: allowedBy(schema) };
  if (value === undefined) fail("missing", details);
  const wantsNumber = schema._zod.def.type === "number" || flattened(schema)[0]?._zod.def.type === "number";
  if (wantsNumber && !isRecord(value) && !Array.isArray(value))
    fail("not-a-number", { ...details, allowed: details.allowed + pureHint(value) });
  return fail(typeof value === "number" && wantsText(schema) ? "unit-mismatch" : "unreadable", details);
}

/** True where a bare number stands in place of a number with its unit. */
const wantsText = (schema: Schema): boolean => allowedBy(schema).startsWith("a number with its unit");

/** Goes down a path of keys: the part of the schema, what stands there, and the path as text. */
function follow(schema: Schema, value: unknown, path: string, keys: Path) {
  let [part, held, at] = [schema, value, path];
  for (const key of keys) {
    if (part._zod.def.type === "union") break; // which option is meant is another question
    const { shape, element } = part._zod.def;
    part = unwrapped((typeof key === "number" ? element : shape?.[String(key)]) ?? part);
    held = isRecord(held) || Array.isArray(held) ? (held as Record<PropertyKey, unknown>)[key] : undefined;
    at = joined(at, key);
  }
  return { part, held, at };
}

const joined = (path: string, key: PropertyKey): string =>
  typeof key === "number" ? `${path}[${key}]` : path === "" ? String(key) : `${path}.${String(key)}`;

const unwrapped = (schema: Schema): Schema =>
  schema._zod.def.type === "optional" ? unwrapped(schema._zod.def.innerType as Schema) : schema;

const flattened = (schema: Schema): readonly Schema[] =>
  schema._zod.def.options ? schema._zod.def.options.flatMap(flattened) : [schema];

const lawOf = (schema: Schema): string => schema._zod.def.shape?.law?._zod.def.values?.[0] as string;

const isRecord = (value: unknown): value is Record<string, unknown> =>
  typeof value === "object" && value !== null && !Array.isArray(value);
