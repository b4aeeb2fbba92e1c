// Finds the equilibria of many planets of one loop: columns of givens in, typed arrays out.
import { type ErrorCode, fail, ThermosteadError } from "../ground/errors.ts";
import { checkKeys } from "../ground/names.ts";
import { checkedNumber, checkedRange, type Range } from "../ground/range.ts";
import type { GivenRecord, Givens, Loop } from "../loop/types.ts";
import { checkOneVariable } from "./prepared.ts";
import { proving } from "./provedSearch.ts";
import { provedRows, type RowResult, sampledRows } from "./rowSearch.ts";
import { sampling } from "./sampledSearch.ts";
import { StateCollector, type StateColumns } from "./stateColumns.ts";

/** Columns of givens, each with one value a planet; givens without a column keep the value of the loop. */
export type GivenColumns<N extends string = string> = { readonly [K in Givens<N>]?: ArrayLike<number> };

/** Where to look, and how. */
export interface FindStatesForOptions {
  /** Lowest and highest temperature, K. */
  readonly within: Range;
  /** False searches by sampling: nothing is proved. */
  readonly proof?: boolean;
  /** What the search may spend on one planet, as in `findStates`. */
  readonly effort?: number;
}

/**
 * Finds all equilibria of a loop for every row of its columns, with the same proof as `findStates`. All rows share one set
 * of compiled kernels. A row that cannot be searched, as with a NaN or a value outside its declared range, is flagged
 * `refused` with its reason and has no states; it is never dropped, and it does not stop the others.
 *
 * Columns are arrays or typed arrays of one length, each in the unit of its given. Temperatures in K and λ in W m⁻² K⁻¹
 * come out as typed arrays over all states: row i has those from `first[i]` to before `first[i + 1]`.
 *
 * Throws `missing` without a column, `contradiction` when columns differ in length, `unknown-name`, `unreadable`,
 * `out-of-range`, `not-a-number` (for `within`), `several-variables`.
 *
 * @example findStatesFor(loop, { flux: [1000, 1361] }, { within: [150, 400] }).counts
 */
export function findStatesFor<N extends string>(
  loop: Loop<N>,
  columns: GivenColumns<N>,
  options: FindStatesForOptions,
): StateColumns {
  checkKeys(options, "findStatesFor", ["within", "proof", "effort"]);
  checkOneVariable(loop, "findStatesFor");
  const within = checkedRange(options.within, "within", "K", loop.variables[0]?.within);
  const proof = (options.proof ?? true) && !loop.sampled;
  const { effort: standard } = proof ? proving : sampling;
  const effort = checkedNumber(options.effort ?? standard, "effort", "1", [10, 1e9]);
  const table = checkedColumns(loop, columns);
  const search = (proof ? provedRows : sampledRows)(loop, within, effort);
  const collector = new StateCollector(table.rows);
  const values = Float64Array.from(loop.givens, (g) => g.value);
  for (let row = 0; row < table.rows; row++) {
    const wrong = fillRow(values, table.columns, row);
    if (wrong) {
      collector.add(row, "refused", [], 0);
      collector.explain({ row, ...refusalOf(wrong.given, wrong.values[row]) });
      continue;
    }
    const result = search(values);
    collector.add(
      row,
      proof ? (result.decided ? "proved" : "partial") : "sampled",
      result.zeros,
      result.found,
    );
    if (!result.decided) explainDoubts(collector, row, result);
  }
  return collector.columns();
}

function explainDoubts(collector: StateCollector, row: number, { undecided }: RowResult): void {
  for (const { kind, interval } of undecided) {
    const text = `${kind} between ${interval[0]} and ${interval[1]} K`;
    collector.explain({ row, code: "undecided", text });
  }
}

/** A column and the given that it belongs to. */
interface Column {
  readonly given: GivenRecord;
  readonly index: number;
  readonly values: ArrayLike<number>;
  readonly low: number;
  readonly high: number;
}

function checkedColumns(
  loop: Loop,
  columns: GivenColumns,
): { readonly rows: number; readonly columns: readonly Column[] } {
  const known = loop.givens.map((g) => g.name);
  checkKeys(columns, "columns", known);
  const list = Object.entries(columns).map(([name, values]): Column => {
    const path = `columns.${name}`;
    const index = known.indexOf(name);
    const isList = Array.isArray(values) || (ArrayBuffer.isView(values) && "length" in values);
    if (!isList) fail("unreadable", { path, value: values, allowed: "a typed array or a list of numbers" });
    const given = loop.givens[index] as GivenRecord;
    const [low, high] = given.within ?? [-Number.MAX_VALUE, Number.MAX_VALUE];
    return { given, index, values: values as ArrayLike<number>, low, high };
  });
  const rows = list[0]?.values.length;
  if (rows === undefined)
    return fail("missing", {
      path: "columns",
      value: columns,
      allowed: `at least one of ${known.join(", ")}`,
    });
  for (const { given, values } of list) {
    if (values.length !== rows) {
      fail("contradiction", {
        path: `columns.${given.name}`,
        value: values.length,
        allowed: `${rows} rows, as in the first column`,
      });
    }
  }
  return { rows, columns: list };
}

/** Writes a row's values; returns the first column whose value is not allowed. */
function fillRow(values: Float64Array, columns: readonly Column[], row: number): Column | undefined {
  for (let i = 0; i < columns.length; i++) {
    const column = columns[i] as Column;
    const value = column.values[row];
    // a null or a text is compared as the number that it could be taken for, so its type must be asked
    if (typeof value === "number" && value >= column.low && value <= column.high)
      values[column.index] = value;
    else return column;
  }
  return undefined;
}

function refusalOf({ name, unit, within }: GivenRecord, value: unknown): { code: ErrorCode; text: string } {
  try {
    checkedNumber(value, name, unit, within);
  } catch (error) {
    if (error instanceof ThermosteadError) return { code: error.code, text: error.message };
    throw error;
  }
  return { code: "not-a-number", text: name };
}
