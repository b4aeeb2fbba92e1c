// Reads a catalogue of planets from a CSV file, as far as the tests need it.
import fs from "node:fs";

/** A row by column name; empty cells are left out. */
export type Planet = Readonly<Record<string, string>>;

/** Reads a comma-separated table with a header, in which no cell is quoted. */
export function readCatalogue(path: string): Planet[] {
  const [names = [], ...rows] = fs
    .readFileSync(path, "utf8")
    .trimEnd()
    .split("\n")
    .map((line) => line.split(","));
  return rows.map((cells) => {
    if (cells.length !== names.length) throw new Error(`${cells.length} cells for ${names.length} columns`);
    const pairs = names.map((name, i) => [name, cells[i] as string] as const);
    return Object.fromEntries(pairs.filter(([, cell]) => cell !== ""));
  });
}

/** A positive number of a row, if it has one. */
export function positive(planet: Planet, column: string): number | undefined {
  const value = Number(planet[column]);
  return value > 0 ? value : undefined;
}
