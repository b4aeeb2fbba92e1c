// Units of the core (coherent SI only) and the dimensions by which wires are compared.
import { fail } from "./errors.ts";

/** Exponents of metre, kilogram, second, kelvin and mole, joined by commas so that dimensions compare with ===. */
export type Dimension = string;

const BASES = ["m", "kg", "s", "K", "mol"] as const;
const UNITS: Readonly<Record<string, readonly number[]>> = {
  "1": [0, 0, 0, 0, 0],
  m: [1, 0, 0, 0, 0],
  kg: [0, 1, 0, 0, 0],
  s: [0, 0, 1, 0, 0],
  K: [0, 0, 0, 1, 0],
  mol: [0, 0, 0, 0, 1],
  N: [1, 1, -2, 0, 0],
  Pa: [-1, 1, -2, 0, 0],
  J: [2, 1, -2, 0, 0],
  W: [2, 1, -3, 0, 0],
};
const FACTOR = /^([A-Za-z]+|1)(?:\*\*|\^)?([+-]?\d+(?:\.\d+)?)?$/;

/** The dimension of a pure number. */
export const NO_DIMENSION: Dimension = "0,0,0,0,0";

/** Reads a coherent SI unit, written `W m-2` or `W.m**-2`; exponents may be fractions. `path` names it. Throws `unknown-unit`. */
export function dimensionOf(unit: string, path = "unit"): Dimension {
  const exponents = [0, 0, 0, 0, 0];
  for (const factor of String(unit).split(/ +|\.(?=[A-Za-z1])/)) {
    const found = FACTOR.exec(factor);
    const base = found && Object.hasOwn(UNITS, found[1] as string) ? UNITS[found[1] as string] : undefined;
    if (!base) {
      return fail("unknown-unit", {
        path,
        value: unit,
        allowed: `products of ${Object.keys(UNITS).join(", ")} with exponents, as in W m-2`,
      });
    }
    base.forEach((e, i) => {
      exponents[i] = (exponents[i] as number) + e * Number(found?.[2] ?? 1);
    });
  }
  return exponents.join();
}

const exponentsOf = (d: Dimension): number[] => d.split(",").map(Number);

/** Dimension of a product (`sign` 1) or a quotient (`sign` -1). */
export function multiplyDimensions(a: Dimension, b: Dimension, sign: 1 | -1): Dimension {
  const other = exponentsOf(b);
  return exponentsOf(a)
    .map((e, i) => e + sign * (other[i] as number))
    .join();
}

/** Dimension of a square root. */
export const rootDimension = (d: Dimension): Dimension =>
  exponentsOf(d)
    .map((e) => e / 2)
    .join();

/** A dimension as error messages show it, in base units. */
export const showDimension = (d: Dimension): string =>
  exponentsOf(d)
    .map((e, i) => (e === 0 ? "" : `${BASES[i]}${e === 1 ? "" : e}`))
    .filter(Boolean)
    .join(" ") || "1";
