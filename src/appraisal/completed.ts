// A description in which what is missing is filled with something that reads, so that all that is there can be checked.
import type { MissingField } from "./appraisal.ts";

/** A description that reads, and what had to be filled. */
export interface Completed {
  readonly description: unknown;
  readonly missing: readonly MissingField[];
  /** The fields that were filled: what follows from them means nothing. */
  readonly filled: ReadonlySet<string>;
}

type Fields = Readonly<Record<string, unknown>>;

/** Without these there is no budget. */
const BUDGET: readonly string[] = ["redistribution", "albedo", "surface", "longwave"];

/** False where a part of the budget was filled, so that its states mean nothing. */
export const hasBudget = ({ filled }: Completed): boolean => !BUDGET.some((field) => filled.has(field));

/** Fills the fields that an appraisal can do without; anything else is left to the checks of a description. */
export function completed(description: unknown): Completed {
  const missing: MissingField[] = [];
  const filled = new Set<string>();
  if (!isRecord(description)) return { description, missing, filled };
  const whole: Record<string, unknown> = { ...description };
  const fill = (field: string, value: unknown, text: string) => {
    if (whole[field] !== undefined) return;
    whole[field] = value;
    filled.add(field);
    missing.push({ path: field, text });
  };
  fill("redistribution", "global", "no states, and no equilibrium temperature but by convention");
  const dark = "no states, and no equilibrium temperature but by convention, nor those of places";
  if (whole.albedo === undefined) {
    // below air or clouds that act on sunlight it is the surface that is missing, and so it is where one is given
    if (whole.surface !== undefined || hasSky(whole)) fill("surface", 0, dark);
    else fill("albedo", 0, dark);
  }
  fill("longwave", { law: "greyEmission", emissivity: 1 }, "no states");
  const timeless = "no times, and no word on which average over the orbit suits";
  if (whole.heatCapacity === "unknown") missing.push({ path: "heatCapacity", text: timeless });
  fill("heatCapacity", "unknown", timeless);
  const { orbit } = whole;
  if (isRecord(orbit) && isEccentric(orbit.eccentricity) && orbit.average === undefined) {
    whole.orbit = { ...orbit, average: "flux" };
    const text = "the mean of the flux is taken, which suits a large thermal inertia";
    missing.push({ path: "orbit.average", text });
  }
  return { description: whole, missing, filled };
}

const isRecord = (value: unknown): value is Fields =>
  typeof value === "object" && value !== null && !Array.isArray(value);

function isEccentric(written: unknown): boolean {
  const value = isRecord(written) ? written.value : written;
  return value !== undefined && value !== 0;
}

const hasSky = ({ clouds, atmosphere }: Fields): boolean =>
  [clouds, atmosphere].some(
    (layer) => isRecord(layer) && (layer.reflectance !== undefined || layer.absorptance !== undefined),
  );
