// Measuring in ulps: the high-precision tables, and the distance of a computed double from a row's exact
// result.
import fs from "node:fs";

const folder = new URL("../reference/elementary/", import.meta.url);

/**
 * arguments, the exact result rounded to a double, and what is missing from that in ulps of the exact
 * result.
 */
export interface Row {
  arguments: number[];
  result: number;
  missing: number;
}

const numbersOf = (line: string): number[] => line.split(",").map(Number);

/** The rows of a table by regime. */
export function readTable(name: string): Map<string, Row[]> {
  const regimes = new Map<string, Row[]>();
  let rows: Row[] = [];
  for (const line of linesOf(name)) {
    if (line.startsWith("# ")) {
      rows = [];
      regimes.set(line.slice(2), rows);
      continue;
    }
    const numbers = numbersOf(line);
    const [result, missing] = numbers.slice(-2) as [number, number];
    rows.push({ arguments: numbers.slice(0, -2), result, missing: missing / 1e5 });
  }
  return regimes;
}

/** The rows of a file of numbers, without its headings. */
export function readNumbers(name: string): number[][] {
  return linesOf(name)
    .filter((line) => !line.startsWith("#"))
    .map(numbersOf);
}

function linesOf(name: string): string[] {
  return fs
    .readFileSync(new URL(`${name}.csv`, folder), "utf8")
    .trim()
    .split("\n");
}

const number = new Float64Array(1);
const bits = new BigInt64Array(number.buffer);

/** Its place among all doubles, in order: neighbours differ by 1, and both zeros are at 0. */
export function placeOf(x: number): bigint {
  number[0] = x;
  const place = bits[0] as bigint;
  return place >= 0n ? place : -(place & 0x7fffffffffffffffn);
}

/** The double at a place. */
export function atPlace(place: bigint): number {
  bits[0] = place >= 0n ? place : -place;
  return place >= 0n ? (number[0] as number) : -(number[0] as number);
}

export const next = (x: number): number => atPlace(placeOf(x) + 1n);
export const previous = (x: number): number => atPlace(placeOf(x) - 1n);

/**
 * |computed − exact| in ulps of the exact result. From the result of the row to the computed value whole
 * steps between neighbouring doubles are counted with integers; the rest is the row's. Next to a power of
 * two, where the steps change, the smaller step counts.
 */
export function errorInUlps(computed: number, row: Row): number {
  const steps = Number(placeOf(computed) - placeOf(row.result));
  const outwards = row.result < 0 ? -1 : 1;
  const exactIsBelow = row.missing * outwards < 0 && isPowerOfTwo(row.result);
  // The exact result lies below a power of two, whose upper neighbours are two of the lower ulps apart.
  const ulps = exactIsBelow && steps * outwards > 0 ? 2 * steps : steps;
  return Math.abs(ulps - row.missing);
}

function isPowerOfTwo(x: number): boolean {
  number[0] = x;
  return ((bits[0] as bigint) & 0xfffffffffffffn) === 0n;
}
