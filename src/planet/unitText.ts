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
  if (Object.hasOwn(OTHERS, text)) failUnit(path, text);
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

/** What others write for units of ours. */
const OTHERS: Readonly<Record<string, string>> = {
  AU: "au",
  Lsun: "solLum",
  L_sun: "solLum",
  Lsol: "solLum",
  Rsun: "solRad",
  R_sun: "solRad",
  Rsol: "solRad",
  Msun: "solMass",
  M_sun: "solMass",
  Msol: "solMass",
  Rearth: "earthRad",
  R_earth: "earthRad",
  Mearth: "earthMass",
  M_earth: "earthMass",
  Rjup: "jupiterRad",
  Mjup: "jupiterMass",
  "°C": "degC",
  C: "degC",
  day: "d",
  days: "d",
  year: "yr",
  years: "yr",
};

/** Throws `unknown-unit` with the nearest known unit, upper and lower case taken as the same. */
function failUnit(path: string, name: string): never {
  const known = Object.keys(UNITS);
  const near = nearestName(
    name.toLowerCase(),
    known.map((unit) => unit.toLowerCase()),
  );
  const nearest = OTHERS[name] ?? known.find((unit) => unit.toLowerCase() === near);
  const list = known.join(", ");
  return fail("unknown-unit", {
    path,
    value: name,
    allowed: nearest ? `${list} (nearest: ${nearest})` : list,
  });
}
