// A value of a table with its unit and errors.

/** A row of a table by column. */
export type CatalogueRow = Readonly<Record<string, string | number | null | undefined>>;

/** A column with numbers. Pure numbers have the unit "1", which may be left out. */
export type Column =
  | string
  | {
      readonly column: string;
      readonly unit?: string;
      /** Columns with the lower and the upper error, both as positive numbers. */
      readonly minus?: string;
      readonly plus?: string;
    };

/** A value as a description holds it. */
export interface Cell {
  readonly value: number;
  readonly unit: string;
  readonly minus?: number;
  readonly plus?: number;
}

/** A cell that cannot be used. */
export interface Refused {
  readonly column: string;
  readonly value: string | number;
  readonly reason: string;
}

/** The text in a column, if there is one. */
export function textOf(row: CatalogueRow, column: string | undefined): string | null {
  const value = column === undefined || !Object.hasOwn(row, column) ? null : row[column];
  return value === null || value === undefined || value === "" ? null : String(value);
}

/** All names of columns in a column with numbers. */
export const namesIn = (column: Column): string[] =>
  typeof column === "string"
    ? [column]
    : [column.column, column.minus, column.plus].filter((name) => name !== undefined);

/** The value of a column, or null where it is empty or no number; the reason of that goes into `refused`. */
export function cellOf(row: CatalogueRow, column: Column, refused: Refused[]): Cell | null {
  const { column: name, unit = "1", minus, plus } = typeof column === "string" ? { column } : column;
  const value = numberIn(row, name, refused);
  if (value === null) return null;
  const error = (of: string | undefined, side: "minus" | "plus") => {
    const width = of === undefined ? null : numberIn(row, of, refused);
    if (width === null) return {};
    if (width >= 0) return { [side]: width };
    refused.push({ column: of as string, value: width, reason: "an error below 0" });
    return {};
  };
  return { value, unit, ...error(minus, "minus"), ...error(plus, "plus") };
}

const NUMBER = /^\s*[-+]?(\d+\.?\d*|\.\d+)([eE][-+]?\d+)?\s*$/;

function numberIn(row: CatalogueRow, column: string, refused: Refused[]): number | null {
  const text = textOf(row, column);
  if (text === null) return null;
  const value = NUMBER.test(text) ? Number(text) : Number.NaN;
  if (Number.isFinite(value)) return value;
  refused.push({ column, value: row[column] as string | number, reason: "not a number" });
  return null;
}
