// Any result as tables: what they hold stands under the names of its fields, with the units that those have everywhere.
import { FEEDBACK, FLUX, numeral, rangeText, titled, unitText } from "./wording.ts";

/** A table of written cells. */
export interface Table {
  readonly title: string;
  readonly head: readonly string[];
  readonly rows: readonly (readonly string[])[];
}

/** More rows than this are counted, not listed. */
const MOST = 60;

/**
 * Units by the place and the name of a field, such as `habitableZone distance`; the first that fits is taken, and `of`
 * stands for that of the parameter.
 */
const UNITS: readonly (readonly [RegExp, string])[] = [
  [/^inputs /, "1"],
  [/responses .* flux$/, `${FLUX} per unit`],
  [/responses .* temperature$/, "K per unit"],
  [/^equilibrium .*(value|flux|time)$/i, "K"],
  [/imbalance|(flows value|storage|flux)$/i, FLUX],
  [/(temperatures?|Change(Held)?|interval|within|Warming|coldest|hottest)$/i, "K"],
  [/feedbackParameter$/i, FEEDBACK],
  [/time$/i, "s"],
  // other fields of rows are in units of their own
  [/^rows /, "1"],
  [/period$/, "s"],
  [/luminosity$/i, "W"],
  [/(axis|[es] distance)$/i, "m"],
  [/(^| )(at|parameters|between|distance|returnsAt|value|bracket)$/, "of"],
];

/** What belongs to pictures, or tells nobody anything in six digits. */
const SKIPPED = /^(points|way|variables|eigenvalues|standardName|description|notes|after)$|(Range|Bracket)$/;

type Fields = Readonly<Record<string, unknown>>;
const isFields = (value: unknown): value is Fields =>
  Object.prototype.toString.call(value) === "[object Object]";

/** A value with its name, and the unit of the parameter where it stands. */
type Value = readonly [name: string, value: unknown, unit: unknown];

/** All tables of a result: its lists, then its other values. */
export function tablesOf(result: Fields): Table[] {
  const parts = partsOf(result, result.unit);
  const rows = written(parts.values).map(([name, value]) => ({ name, value }));
  const tables = parts.lists.map(([name, records, unit]) => listed(name, records as Fields[], unit));
  return rows.length > 0 ? [...tables, listed("values", rows)] : tables;
}

/** What a record holds: values, those of records in it under both names, and lists of records. */
function partsOf(fields: Fields, unit: unknown, prefix = ""): Readonly<Record<"values" | "lists", Value[]>> {
  const parts = { values: [] as Value[], lists: [] as Value[] };
  for (const [key, value] of Object.entries(fields)) {
    const name = prefix + key;
    if (SKIPPED.test(key) || ArrayBuffer.isView(value)) continue;
    if (isFields(value)) {
      const inner = partsOf(value, value.unit ?? unit, `${name} `);
      parts.values.push(...inner.values);
      parts.lists.push(...inner.lists);
    } else parts[Array.isArray(value) && value.some(isFields) ? "lists" : "values"].push([name, value, unit]);
  }
  return parts;
}

/** Heads and cells. */
const written = (values: readonly Value[], path = ""): [string, string][] =>
  values.map(([name, value, unit]) => {
    const known = UNITS.find(([ends]) => ends.test(path + name))?.[1] ?? "1";
    const words = spaced(name.replace(/(couplings|givens|report|state) /g, ""));
    return [
      titled(words, known === "of" ? String(unit ?? "1") : known),
      name.endsWith("unit") ? unitText(cell(value)) : cell(value),
    ];
  });

/** A list of records as a table. */
function listed(name: string, records: readonly Fields[], unit?: unknown): Table {
  const rows = records
    .slice(0, MOST)
    .map((record) => new Map(written(partsOf(record, unit).values, `${name} `)));
  const head = [...new Set(rows.flatMap((row) => [...row.keys()]))];
  const more = records.length - MOST;
  return {
    title: spaced(name) + (more > 0 ? `, without ${more} more` : ""),
    head,
    rows: rows.map((row) => head.map((key) => row.get(key) ?? "–")),
  };
}

const spaced = (name: string): string =>
  name.replace(/(?<=[a-z])[A-Z]/g, (letter) => ` ${letter.toLowerCase()}`);

function cell(value: unknown): string {
  if (typeof value === "number") return numeral(value);
  if (!Array.isArray(value)) return String(value ?? "–");
  const [low, high] = value;
  // bounds that agree in most digits are told by those in which they do not
  const digits = Math.abs(high - low) < 1e-5 * Math.abs(low) ? 17 : 6;
  return value.length === 2 && value.every(Number.isFinite)
    ? rangeText([low, high], digits)
    : value.map(cell).join(", ") || "none";
}
