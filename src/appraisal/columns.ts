// Columns of a table in a description, whose entries are inputs of their own.
import type { PlanetInput } from "../planet/planetInput.ts";
import { shown, withUnit } from "./report.ts";

/** The column of which a path is an entry, such as `star.brightening.time`; undefined for all other paths. */
export const columnOf = (path: string): string | undefined => /^(.*)\.value\[\d+\]$/.exec(path)?.[1];

/** More entries than these are shown by their first and last. */
const MOST = 6;

/** An input that stands for itself, or all entries of a column. */
export interface InputRow {
  readonly path: string;
  readonly written: string;
  /** In SI. */
  readonly si: string;
}

/** Inputs as a table shows them: each by itself, and the entries of a column in one row. */
export function inputRows(inputs: readonly PlanetInput[]): InputRow[] {
  const rows = new Map<string, PlanetInput[]>();
  for (const input of inputs) {
    const path = columnOf(input.path) ?? input.path;
    rows.set(path, [...(rows.get(path) ?? []), input]);
  }
  return [...rows].map(([path, entries]) => {
    const [first] = entries as [PlanetInput];
    return path === first.path ? rowOf(first) : columnRow(path, entries);
  });
}

const rowOf = ({ path, written, value, unit }: PlanetInput): InputRow => {
  const si = withUnit(value, unit);
  return { path, written, si: si === written || written === String(value) ? "" : si };
};

function columnRow(path: string, entries: readonly PlanetInput[]): InputRow {
  const numbers = entries.map(({ written }) => written.split(" ")[0] as string);
  const unit = entries[0]?.written.slice(numbers[0]?.length) ?? "";
  const all = numbers.length <= MOST ? numbers.join(", ") : `${numbers[0]} ... ${numbers.at(-1)}`;
  const [first, last] = [entries[0], entries.at(-1)] as [PlanetInput, PlanetInput];
  const si = first.unit === "1" ? "" : `${shown(first.value)} ... ${withUnit(last.value, last.unit)}`;
  return { path, written: `${all}${unit} (${numbers.length} values)`, si };
}
