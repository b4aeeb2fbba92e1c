// The schema of one value of a description, made from the port that takes it.
import { literal, number, optional, strictObject, string, union } from "zod/mini";
import type { Port } from "../graph/card.ts";
import { showRange } from "../ground/range.ts";
import { exampleOf } from "./examples.ts";
import { QUANTITY_PATTERN } from "./quantityText.ts";
import { LONGEST_UNIT } from "./unitText.ts";
import { worded } from "./wording.ts";

/** The source of a value, which a description keeps. */
export const sourceSchema = () =>
  worded(string(), "a text", { description: "where the value was published" });

/** Error bars and the source of a value. */
const kept = () => ({
  minus: optional(worded(number(), "a number from 0", { minimum: 0, description: "lower error" })),
  plus: optional(worded(number(), "a number from 0", { minimum: 0, description: "upper error" })),
  source: optional(sourceSchema()),
});

/** A plain number, or the same with errors and a source. */
export function pureSchema(port: Port) {
  const [minimum, maximum] = port.within ?? [-Number.MAX_VALUE, Number.MAX_VALUE];
  const range = port.within ? `a number from ${showRange(port.within)}` : "a number";
  const value = () => worded(number(), range, { minimum, maximum });
  const unit = optional(worded(literal("1"), '"1"'));
  const described = worded(strictObject({ value: value(), unit, ...kept() }), "{ value }");
  return worded(union([value(), described]), range, aboutOf(port));
}

/**
 * A text with a number and a unit, or the same as an object with errors and a source. `difference` tells a temperature
 * difference.
 */
export function measuredSchema(port: Port, difference = false) {
  const example = exampleOf(port.unit, difference);
  const allowed = `a number with its unit, as in "${example}"`;
  const text = worded(string(), allowed, { pattern: QUANTITY_PATTERN, examples: [example] });
  const unit = worded(string(), `a unit of the same kind as ${port.unit}`, { maxLength: LONGEST_UNIT });
  const described = worded(
    strictObject({ value: worded(number(), "a number"), unit, ...kept() }),
    "{ value, unit }",
  );
  return worded(union([text, described]), allowed, aboutOf(port));
}

/** The type of a value is told by its port: a number where the unit is 1, else a number with its unit. */
export type ValueSchema<P> = P extends { readonly unit: "1" }
  ? ReturnType<typeof pureSchema>
  : ReturnType<typeof measuredSchema>;

/** The schema of a port's value. */
export function valueSchema<const P extends Port>(port: P, difference = false): ValueSchema<P> {
  return (port.unit === "1" ? pureSchema(port) : measuredSchema(port, difference)) as ValueSchema<P>;
}

/** What a port is about, as the description in a JSON Schema. */
export function aboutOf({ about = "", unit, within }: Port): { description: string } {
  const range = within ? `, ${showRange(within)}` : "";
  return { description: unit === "1" ? `${about}${range}` : `${about} (read in ${unit}${range})` };
}
