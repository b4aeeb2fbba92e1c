// A report as sections of lines and tables, before it is written in one notation or another.

/** A table: the first row is its head; columns named in `right` hold numbers. */
export interface Table {
  readonly head: readonly string[];
  readonly rows: readonly (readonly string[])[];
  readonly right: readonly number[];
}

/** A part of a report under a title. */
export interface Section {
  readonly title: string;
  readonly blocks: readonly (string | Table)[];
}

/** A whole report. */
export interface Report {
  readonly title: string;
  /** What it comes to. */
  readonly summary: string;
  /** Where the description comes from and what its author says; may be empty. */
  readonly about: string;
  readonly sections: readonly Section[];
  /** What the numbers are not. */
  readonly caution: string;
}

/** Julian year, s. */
export const YEAR = 365.25 * 86400;

/** A long time in s for reading. */
export function duration(time: number): string {
  const years = time / YEAR;
  if (years < 1e5) return `${shown(years, 3)} yr`;
  return years < 1e8 ? `${shown(years / 1e6, 3)} Myr` : `${(years / 1e9).toFixed(2)} Gyr`;
}

/** A temperature for reading, K. */
export const kelvin = (value: number): string => value.toFixed(2);

/** A number for reading: some significant digits, and powers of ten only where they help. */
export function shown(value: number, digits = 5): string {
  if (value === 0) return "0";
  const size = Math.abs(value);
  return size < 1e-3 || size >= 1e6
    ? value.toExponential(digits - 2)
    : String(Number(value.toPrecision(digits)));
}

/** The same with its sign. */
export const signed = (value: number, digits = 4): string =>
  value <= 0 ? shown(value, digits) : `+${shown(value, digits)}`;

/** A number with its unit; pure numbers have none. */
export const withUnit = (value: number, unit: string, digits = 5): string =>
  unit === "1" ? shown(value, digits) : `${shown(value, digits)} ${unit}`;

/** A flux for reading, W m⁻²; a faint one is no zero. */
export const fluxText = (flux: number): string =>
  flux > 0 && flux < 0.05 ? shown(flux, 3) : flux.toFixed(1);

/** So many things by name. */
export const counted = (count: number, name: string): string => `${count} ${name}${count === 1 ? "" : "s"}`;

/** A text of somebody else's on one line, without characters that steer a terminal or turn the direction of writing. */
export const oneLine = (text: string): string =>
  text
    .replace(/[\p{Cc}\u2028\u2029\u200e\u200f\u202a-\u202e\u2066-\u2069]+/gu, " ")
    .replace(/\s+/gu, " ")
    .trim();
