// All checks of a description, in the order in which their errors help most.
import { fail } from "../ground/errors.ts";
import { type Contradictions, checkAgreement } from "./agreement.ts";
import { checkTables } from "./brighteningTable.ts";
import { checkStack } from "./checkStack.ts";
import { checkCombinations } from "./combinations.ts";
import { checkCovers } from "./covers.ts";
import { allOf, failAll } from "./faults.ts";
import { plainCopy } from "./plainCopy.ts";
import { planetBudget } from "./planetBudget.ts";
import type { PlanetInput } from "./planetInput.ts";
import { planetInputs } from "./planetInputs.ts";
import type { PlanetNote } from "./planetNote.ts";
import { PLANET_SHAPE, type PlanetDescription } from "./planetShape.ts";
import { shapeFaults } from "./shapeError.ts";
import { valueFaultsBeside } from "./valueFaults.ts";
import type { Numbers } from "./wire.ts";

/** A temperature at which every law is tried with plain numbers, K. */
const TRIAL_TEMPERATURE = 288;

/** A description without a fault. */
export interface CheckedPlanet {
  readonly description: PlanetDescription;
  readonly inputs: readonly PlanetInput[];
  readonly numbers: Numbers;
  readonly agreeing: readonly PlanetNote[];
  /** What the budget reports at the trial temperature. */
  readonly trial: Readonly<Record<string, number>>;
  /** J m⁻² K⁻¹; 0 where it is not known. */
  readonly heatCapacity: number;
}

/** Checks size and kind of the data, then its shape, its units and ranges, its agreement, and its laws with numbers. */
export function checkedPlanet(value: unknown, contradictions: Contradictions): CheckedPlanet {
  if (typeof value !== "object" || value === null) {
    fail("unreadable", {
      path: "description",
      value,
      allowed: "a description: an object (a JSON text must be parsed first)",
    });
  }
  const plain = plainCopy(value);
  const shaped = PLANET_SHAPE.safeParse(plain);
  if (!shaped.success) {
    const faults = shapeFaults(PLANET_SHAPE, plain);
    failAll([...faults, ...valueFaultsBeside(faults, plain)]);
  }
  const description = plain as PlanetDescription;
  const [, inputs] = allOf([() => checkCombinations(description), () => planetInputs(description)]);
  const byPath = new Map(inputs.map((input) => [input.path, input.value]));
  const numbers: Numbers = (path) => byPath.get(path) as number;
  const [, , , agreeing] = allOf([
    () => checkAverage(description, numbers),
    () => checkAllCovers(description, numbers),
    () => checkStack(description, numbers),
    () => {
      checkTables(description, inputs);
      return checkAgreement(description, numbers, contradictions);
    },
  ]);
  const { report, heatCapacity } = planetBudget(description, {
    wire: numbers,
    temperature: TRIAL_TEMPERATURE,
    couple: (_, value) => value,
  });
  const trial = report as Record<string, number>;
  return { description, inputs, numbers, agreeing, trial, heatCapacity: heatCapacity as number };
}

/** On an eccentric orbit the mean flux and the mean temperature differ, so one must be chosen. */
function checkAverage({ orbit }: PlanetDescription, numbers: Numbers): void {
  if (orbit.eccentricity === undefined || orbit.average !== undefined) return;
  if (numbers("orbit.eccentricity") === 0) return;
  fail("missing", {
    path: "orbit.average",
    value: undefined,
    allowed: '"flux" or "temperature", because the eccentricity is not 0',
  });
}

function checkAllCovers(d: PlanetDescription, numbers: Numbers): void {
  for (const field of ["albedo", "surface"] as const) {
    const written = d[field];
    if (typeof written === "object" && "covers" in written)
      checkCovers(written.covers, `${field}.covers`, numbers);
  }
}
