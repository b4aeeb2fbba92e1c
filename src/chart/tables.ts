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

/** Units by the end of a field's name. */
const UNITS: readonly (readonly [RegExp, string])[] = [
  [/^responses .* flux$/, `${FLUX} per unit`],
  [/^responses .* temperature$/, "K per unit"],
  [/^imbalance/, FLUX],
  [/(temperatures?|Change(Held)?|interval|within|Warming|coldest|hottest)$/i, "K"],
  [/feedbackParameter$/i, FEEDBACK],
  [/(storage|flux)$/i, FLUX],
  [/time$/i, "s"],
];

/** Fields with the unit of the parameter that a result is about. */
const OF_PARAMETER = /(^| )(at|parameters|between|distance|returnsAt|value|bracket)$/;

/** What belongs to pictures, or tells nobody anything in six digits. */
const SKIPPED =
  /^(points|way|variables|cost|constants|eigenvalues|standardName|description|notes|after)$|(Range|Bracket)$/;

type Fields = Readonly<Record<string, unknown>>;
const isFields = (value: unknown): value is Fields =>
  Object.prototype.toString.call(value) === "[object Object]";
const isRecords = (value: unknown): value is Fields[] => Array.isArray(value) && value.some(isFields);
const fieldsOf = (fields: Fields) =>
  Object.entries(fields).filter(([key, value]) => !SKIPPED.test(key) && !ArrayBuffer.isView(value));

/** All tables of a result: its lists, then its other values. */
export function tablesOf(result: Fields): Table[] {
  const unit = String(result.unit ?? "1");
  const lists = (fields: Fields): Table[] =>
    fieldsOf(fields).flatMap(([key, value]) =>
      isRecords(value) ? [listed(key, value, unit)] : isFields(value) ? lists(value) : [],
    );
  const values = spread(result).map(([name, value]) => ({ name: headOf(name, unit), value }));
  return [...lists(result), ...(values.length > 0 ? [listed("values", values, "1")] : [])];
}

/** The values of a record, those of records in it under both names; lists of records are left out. */
const spread = (fields: Fields): [string, unknown][] =>
  fieldsOf(fields).flatMap(([key, value]): [string, unknown][] => {
    if (isFields(value)) return spread(value).map(([inner, v]) => [`${key} ${inner}`, v]);
    return isRecords(value) ? [] : [[key, value]];
  });

/** A list of records as a table. */
export function listed(title: string, records: readonly Fields[], unit: string): Table {
  const rows = records.slice(0, MOST).map((record) => Object.fromEntries(spread(record)));
  const keys = [...new Set(rows.flatMap(Object.keys))];
  const more = records.length - rows.length;
  const own = keys.includes("from") && keys.includes("value") ? FLUX : unit;
  return {
    title: spaced(title) + (more > 0 ? `, without ${more} more` : ""),
    head: keys.map((key) => headOf(key, own)),
    rows: rows.map((row) => keys.map((key) => (key === "unit" ? unitText(cell(row[key])) : cell(row[key])))),
  };
}

/** A field's name as words with its unit; couplings and givens stand under their own names. */
function headOf(name: string, unit: string): string {
  const own = UNITS.find(([ends]) => ends.test(name))?.[1] ?? (OF_PARAMETER.test(name) ? unit : "1");
  return titled(spaced(name.replace(/(couplings|givens|report) /, "")), own);
}

const spaced = (name: string): string =>
  name.replace(/(?<=[a-z])[A-Z]/g, (letter) => ` ${letter.toLowerCase()}`);

function cell(value: unknown): string {
  if (typeof value === "number") return numeral(value);
  if (!Array.isArray(value)) return String(value ?? "–");
  const [low, high, ...more] = value;
  // bounds that agree in most digits are told by those in which they do not
  const digits = Math.abs(high - low) < 1e-5 * Math.abs(low) ? 17 : 6;
  if (more.length === 0 && value.every(Number.isFinite) && high !== undefined)
    return rangeText([low, high], digits);
  return value.map(cell).join(", ") || "none";
}
