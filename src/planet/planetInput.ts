// One numeric value of a description, read in SI.
import type { Port } from "../graph/card.ts";
import { fail } from "../ground/errors.ts";
import { checkedNumber, type Range } from "../ground/range.ts";
import { inSI, mismatch } from "./inSI.ts";
import { quantityOf } from "./quantityText.ts";

/** A numeric value of a description. */
export interface PlanetInput {
  /** Where it stands, such as `star.luminosity`; the name under which it can be set and swept. */
  readonly path: string;
  readonly about: string;
  /** In `unit`, which is coherent SI. */
  readonly value: number;
  readonly unit: string;
  /** Lower and upper error in `unit`, where they are given. */
  readonly minus: number | null;
  readonly plus: number | null;
  /** The value as it is written, such as `0.61 au` or `4680 +60 -60 K`. */
  readonly written: string;
  readonly source: string | null;
  readonly within: Range | null;
}

/** A value as a description writes it. */
export type Written =
  | string
  | number
  | {
      readonly value: number;
      readonly unit?: string | undefined;
      readonly minus?: number | undefined;
      readonly plus?: number | undefined;
      readonly source?: string | undefined;
    };

/** Reads one value by its port. `difference` tells a temperature difference. Throws the error of what is wrong with it. */
export function readInput(path: string, port: Port, written: Written, difference = false): PlanetInput {
  const { unit, within, about = "" } = port;
  const wanted = { unit, difference };
  const described = typeof written === "object" ? written : null;
  const read = (value: number, of: string | undefined, at: string) =>
    unit === "1" ? value : of === undefined ? mismatch(value, wanted, at) : inSI(value, of, wanted, at);
  const plain = typeof written === "string" ? quantityOf(written, wanted, path) : null;
  const number = plain?.value ?? described?.value ?? written;
  const value = checkedNumber(
    read(number as number, plain?.unit ?? described?.unit, path),
    path,
    unit,
    within,
  );
  const error = (side: "minus" | "plus"): number | null => {
    const width = described?.[side];
    if (width === undefined) return null;
    const at = `${path}.${side}`;
    // the width of an error bar is a difference, in kelvin also where the value is in degrees Celsius
    const of = described?.unit === "degC" ? "K" : described?.unit;
    if (width < 0) fail("out-of-range", { path: at, value: width, allowed: "0 or more", unit: of });
    return checkedNumber(read(width, of, at), at, unit, [0, Number.MAX_VALUE]);
  };
  return {
    path,
    about,
    value,
    unit,
    minus: error("minus"),
    plus: error("plus"),
    written: writtenAs(written),
    source: described?.source ?? null,
    within: within ?? null,
  };
}

/** The value as a text, such as `4680 +60 -60 K`. */
export function writtenAs(written: Written): string {
  if (typeof written !== "object") return String(written);
  const { value, unit = "1", minus, plus } = written;
  const errors = `${plus === undefined ? "" : ` +${plus}`}${minus === undefined ? "" : ` -${minus}`}`;
  return `${value}${errors}${unit === "1" ? "" : ` ${unit}`}`;
}
