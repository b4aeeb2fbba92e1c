// Any result as tables: what they hold stands under the names of its fields, with the units that those have everywhere.
import type { Range } from "../ground/range.ts";
import { FEEDBACK, FLUX, numeral, rangeText, spaced, titled, unitText } from "./wording.ts";

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
  [/^values /, "1"],
  [/period$/, "s"],
  [/luminosity$/i, "W"],
  [/(axis|[es] distance)$/i, "m"],
  [/(^| )(at|parameters|between|distance|returnsAt|value|bracket)$/, "of"],
];

/** What belongs to pictures, or tells nobody anything in six digits. */
const SKIPPED =
  /^(found|points|way|variables|eigenvalues|standardName|description|notes|after|units)$|(Range|Bracket)$/;

/** Columns of an appraised climate, of which all is too wide to read. */
const CLIMATE = /^(temp|stab|feedback p|e f|albedo$|equi)/;

type Fields = Readonly<Record<string, unknown>>;
const isFields = (value: unknown): value is Fields =>
  typeof value === "object" && value !== null && !Array.isArray(value);

/** A value with its name, and the unit of the parameter where it stands. */
type Value = readonly [name: string, value: unknown, unit: unknown];

/** All tables of a result: its lists, then its other values. */
export function tablesOf(result: Fields): Table[] {
  const parts = partsOf(result, result.unit);
  const values = written(parts).map(([name, value]) => ({ name, value }));
  const lists = parts.filter(isList);
  return [...lists, ...(values[0] ? [["values", values, null] as const] : [])].map(listed);
}

/** Whether it is a list of records. */
const isList = ([, value]: Value): boolean => Array.isArray(value) && value.some(isFields);

/** What a record holds; what records in it hold stands under both names. */
const partsOf = (fields: Fields, unit: unknown, prefix = ""): Value[] =>
  Object.entries(fields).flatMap(([key, value]): Value[] => {
    if (SKIPPED.test(key) || ArrayBuffer.isView(value)) return [];
    const name = prefix + key;
    return isFields(value) ? partsOf(value, value.unit ?? unit, `${name} `) : [[name, value, unit]];
  });

/** Heads and cells of all but lists. */
const written = (values: readonly Value[], path = ""): [string, string][] =>
  values
    .filter((value) => !isList(value))
    .map(([name, value, unit]) => {
      const known = UNITS.find(([ends]) => ends.test(path + name))?.[1] ?? "1";
      const words = spaced(name.replace(/(couplings|givens|report|state) /g, ""));
      return [
        titled(words, known === "of" ? String(unit ?? "1") : known),
        name.endsWith("unit") ? unitText(cell(value)).trim() : cell(value),
      ];
    });

/** A list of records as a table. */
function listed([name, value, unit]: Value): Table {
  const records = value as readonly Fields[];
  const rows = records.slice(0, MOST).map((record) => new Map(written(partsOf(record, unit), `${name} `)));
  const head = [...new Set(rows.flatMap((row) => [...row.keys()]))].filter(
    (key) => !records[0]?.state || CLIMATE.test(key),
  );
  const more = records.length - MOST;
  return {
    title: spaced(name) + (more > 0 ? `, without ${more} more` : ""),
    head,
    rows: rows.map((row) => head.map((key) => row.get(key) ?? "–")),
  };
}

function cell(value: unknown): string {
  if (typeof value === "number") return numeral(value);
  if (!Array.isArray(value)) return String(value ?? "–");
  const [low, high] = value;
  // bounds that agree in most digits are told by those in which they do not
  const digits = Math.abs(high - low) < 1e-5 * Math.abs(low) ? 17 : 6;
  return value.length === 2 && value.every(Number.isFinite)
    ? rangeText(value as unknown as Range, digits)
    : value.map(cell).join(", ") || "none";
}
