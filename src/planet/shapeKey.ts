// What two descriptions have in common that differ in nothing but their numbers.
import type { PlanetInput } from "./planetInput.ts";
import type { PlanetDescription } from "./planetShape.ts";
import { isWhole } from "./redistribution.ts";

/** Fields on which no budget depends. */
const APART = ["name", "source", "notes", "brightening"];

/**
 * The description with its values taken out: descriptions with one key close to one budget, up to the values of its givens.
 * Whether the redistribution is that of a whole planet counts, since flows have their standard names by it.
 */
export function shapeKey(description: PlanetDescription, inputs: readonly PlanetInput[]): string {
  const values = new Set(inputs.map(({ path }) => path));
  const bare = (value: unknown, path: string): unknown => {
    if (values.has(path)) return 0;
    if (Array.isArray(value)) return value.map((each, i) => bare(each, `${path}[${i}]`));
    if (typeof value !== "object" || value === null) return value;
    const fields = Object.entries(value).filter(([key]) => !APART.includes(key));
    return fields.map(([key, field]) => [key, bare(field, path === "" ? key : `${path}.${key}`)]);
  };
  return JSON.stringify([isWhole(description), bare(description, "")]);
}
