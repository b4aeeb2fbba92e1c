// A closed range of allowed values, and the one check that everything numeric passes.
import { fail } from "./errors.ts";

/** Lowest and highest allowed value, both included. */
export type Range = readonly [number, number];

export const holds = ([low, high]: Range, value: number): boolean => low <= value && value <= high;

/** No limits. */
export const ANY: Range = [-Infinity, Infinity];

/** "0 to 1": a range as error messages show it. */
export const showRange = (range: Range): string => range.join(" to ");

/** Returns `value` if it is a finite number in the range; otherwise an error names the field, the range and the unit. */
export function checkedNumber(value: unknown, path: string, unit: string, within?: Range): number {
  const finite = Number.isFinite(value);
  const [low, high] = within ?? ANY;
  // -0 becomes 0: it means nothing in an answer, and JSON does not keep it
  if (finite && low <= (value as number) && (value as number) <= high) return (value as number) + 0;
  const code = finite ? "out-of-range" : value === undefined ? "missing" : "not-a-number";
  return fail(code, { path, value, allowed: within ? showRange(within) : "a finite number", unit });
}

/** Returns `range` if it is two increasing finite numbers inside `inside`. */
export function checkedRange(range: unknown, path: string, unit: string, inside?: Range): Range {
  if (!Array.isArray(range) || range.length !== 2) {
    fail("unreadable", { path, value: range, allowed: "two numbers [lowest, highest]", unit });
  }
  const low = checkedNumber(range[0], `${path}[0]`, unit, inside);
  const high = checkedNumber(range[1], `${path}[1]`, unit, inside);
  if (!(low < high)) {
    fail("out-of-range", {
      path: `${path}[1]`,
      value: high,
      allowed: `above ${low}`,
      unit,
    });
  }
  return [low, high];
}
