// Reads a number with its unit, such as "0.61 au".
import { fail } from "../ground/errors.ts";
import { exampleOf } from "./examples.ts";
import { quantityHint } from "./quantityHint.ts";

const LONGEST = 100;

/** A number, white space, a unit; the same in the JSON Schema. */
export const QUANTITY_PATTERN =
  "^([+-]?(?:[0-9]+\\.?[0-9]*|\\.[0-9]+)(?:[eE][+-]?[0-9]{1,3})?) +([A-Za-z].*)$";

const QUANTITY = new RegExp(QUANTITY_PATTERN);

/** Splits a text into its number and its unit. Throws `unreadable`, `not-a-number`. */
export function quantityOf(
  text: string,
  { unit, difference }: { readonly unit: string; readonly difference: boolean },
  path: string,
): { value: number; unit: string } {
  const found = text.length > LONGEST ? null : QUANTITY.exec(text);
  const allowed = `a number with its unit, as in "${exampleOf(unit, difference)}"`;
  if (!found) return fail("unreadable", { path, value: text, allowed: allowed + quantityHint(text) });
  const value = Number(found[1]);
  if (!Number.isFinite(value)) fail("not-a-number", { path, value: text, allowed });
  return { value, unit: found[2] as string };
}
