// A description in which what is missing is filled with something that reads, so that all that is there can be checked.
import type { MissingField } from "./appraisal.ts";

/** A description that reads, and what had to be filled. */
export interface Completed {
  readonly description: unknown;
  readonly missing: readonly MissingField[];
  /** False where a part of the budget was filled, so that its states mean nothing. */
  readonly hasBudget: boolean;
}

type Fields = Readonly<Record<string, unknown>>;

/** Fills the fields that an appraisal can do without; anything else is left to the checks of a description. */
export function completed(description: unknown): Completed {
  if (!isRecord(description)) return { description, missing: [], hasBudget: true };
  const missing: MissingField[] = [];
  const filled: Record<string, unknown> = { ...description };
  const fill = (path: string, value: unknown, text: string) => {
    if (filled[path] !== undefined) return;
    filled[path] = value;
    missing.push({ path, text });
  };
  fill("redistribution", "global", "no states, and equilibrium temperatures by convention only");
  if (filled.surface === undefined)
    fill("albedo", 0, "no states, and equilibrium temperatures by convention only");
  fill("longwave", { law: "greyEmission", emissivity: 1 }, "no states");
  const hasBudget = missing.length === 0;
  fill("heatCapacity", "unknown", "no times, and no word on which average over the orbit suits");
  const { orbit } = filled;
  if (isRecord(orbit) && isEccentric(orbit.eccentricity) && orbit.average === undefined) {
    filled.orbit = { ...orbit, average: "flux" };
    missing.push({
      path: "orbit.average",
      text: "the mean of the flux is taken, which suits a large thermal inertia",
    });
  }
  return { description: filled, missing, hasBudget };
}

const isRecord = (value: unknown): value is Fields =>
  typeof value === "object" && value !== null && !Array.isArray(value);

function isEccentric(written: unknown): boolean {
  const value = isRecord(written) ? written.value : written;
  return value !== undefined && value !== 0;
}
