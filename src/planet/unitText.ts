// Reads the text of a unit: products and integer powers of known names, nothing else.
import { fail } from "../ground/errors.ts";
import { nearestName } from "../ground/names.ts";
import { UNITS } from "./units.ts";

/** A unit's name with its exponent. */
export interface UnitFactor {
  readonly name: string;
  readonly exponent: number;
}

/** Longest text of a unit, and most factors in it. */
export const LONGEST_UNIT = 60;
const MOST_FACTORS = 8;

/** One factor: what joins it to the one before, its name, its exponent (`-2`, `2`, `**-2` or `^-2`). */
const FACTOR = /(\s*[./*]\s*|\s+)?([A-Za-z]+)(?:(?:\*\*|\^)?([+-]?\d)(?!\d))?/y;

/** Reads `W m-2`, `W.m**-2` or `W/m^2`; a slash divides by the one factor that follows it. */
export function unitFactors(text: string, path: string): UnitFactor[] {
  const unreadable = () =>
    fail("unreadable", { path, value: text, allowed: 'a unit such as "au", "W m-2", "W.m**-2" or "W/m^2"' });
  if (text.length > LONGEST_UNIT) unreadable();
  const factors: UnitFactor[] = [];
  let at = 0;
  while (at < text.length) {
    FACTOR.lastIndex = at;
    const [whole, join = "", name = "", power = "1"] = FACTOR.exec(text) ?? [""];
    const joined = factors.length === 0 ? join === "" : join !== "";
    if (whole === "" || !joined || factors.length === MOST_FACTORS) unreadable();
    if (!Object.hasOwn(UNITS, name)) failUnit(path, name);
    factors.push({ name, exponent: Number(power) * (join.includes("/") ? -1 : 1) });
    at = FACTOR.lastIndex;
  }
  return factors.length === 0 ? unreadable() : factors;
}

/** Throws `unknown-unit` with the nearest known unit, upper and lower case taken as the same. */
function failUnit(path: string, name: string): never {
  const known = Object.keys(UNITS);
  const near = nearestName(
    name.toLowerCase(),
    known.map((unit) => unit.toLowerCase()),
  );
  const nearest = known.find((unit) => unit.toLowerCase() === near);
  return fail("unknown-unit", { path, value: name, allowed: `${known.join(", ")} (nearest: ${nearest})` });
}
