// How numbers, units and names are written in tables and pictures.
import type { Range } from "../ground/range.ts";

const raised = (digits: string): string =>
  digits.replace(/[-\d]/g, (digit) => "⁰¹²³⁴⁵⁶⁷⁸⁹"[Number(digit)] ?? "⁻");

/** A number with so many digits, a real minus sign, and a raised exponent from ten million on. */
export function numeral(value: number, digits = 6): string {
  const rounded = Number(value.toPrecision(digits));
  return (Math.abs(value) < 1e7 ? String(rounded) : rounded.toExponential())
    .replace(/e\+?(.*)/, (_, power: string) => `×10${raised(power)}`)
    .replace(/^-/, "−");
}

/** The same with its sign, also if that is +. */
export const signed = (value: number): string => (value > 0 ? "+" : "") + numeral(value, 4);

/** Lowest and highest value. */
export const rangeText = ([low, high]: Range, digits?: number): string =>
  `${numeral(low, digits)} to ${numeral(high, digits)}`;

/** "W m-2" and "W.m**-2" as W m⁻², after a space; nothing for "1". */
export const unitText = (unit: string): string =>
  unit === "1"
    ? ""
    : ` ${unit.replace(/\./g, " ").replace(/(?<=[a-z])(?:\*\*)?(-?\d+)/gi, (_, power) => raised(power))}`;

/** A name with its unit, as on an axis. */
export const titled = (name: string, unit: string): string => name + unitText(unit).replace(/ (.+)/, " ($1)");

/** `camelCase` as words. */
export const spaced = (name: string, gap = " "): string =>
  name.replace(/(?<=[a-z])[A-Z]/g, (letter) => gap + letter.toLowerCase());

/** The mark of the i-th of several things, as base 36 has them: a to z, then 10, 11 and so on. */
export const letterOf = (i: number): string => (i + 10).toString(36);

export const FLUX = "W m-2";
export const FEEDBACK = "W m-2 K-1";

/** A text without what XML cannot hold. */
export const clean = (text: unknown): string => String(text).replace(/[\p{Cc}\p{Cs}\ufffe\uffff]/gu, " ");

/** What HTML and SVG allow: no markup. */
export const escaped = (text: unknown): string =>
  clean(text).replace(/[&<>"']/g, (letter) => `&#${letter.charCodeAt(0)};`);
