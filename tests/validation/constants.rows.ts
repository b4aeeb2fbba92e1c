// Constants against two other libraries and a resolution.

import * as ours from "../../src/ground/constants.ts";
import { SOLAR_EFFECTIVE_TEMPERATURE, SOLAR_IRRADIANCE } from "../../src/ground/constants.ts";
import { CONSTANTS } from "../../src/ground/constantsTable.ts";
import table from "../reference/computed/constants.json" with { type: "json" };
import type { Check } from "./check.ts";
import { ASTROPY, IAU_B3, SCIPY } from "./sources.ts";

const unitOf = (name: string): string => CONSTANTS.find((c) => c.name === name)?.unit ?? "";

/** What is printed with ten digits may differ from a value of more digits by half a unit of the tenth. */
const TEN_DIGITS: Readonly<Record<string, number>> = { STEFAN_BOLTZMANN: 5e-18, GAS_CONSTANT: 5e-10 };

function rows(values: Readonly<Record<string, number>>, full: boolean): Check[] {
  return Object.entries(values).map(([name, published]) => {
    const tolerance = full ? (TEN_DIGITS[name] ?? 0) : 0;
    return {
      covers: [name],
      what: name,
      published,
      unit: unitOf(name),
      ours: () => (ours as unknown as Record<string, number>)[name] as number,
      tolerance,
      because: tolerance === 0 ? "the same number" : "half a unit of the tenth digit that CODATA prints",
      source: full ? ASTROPY : SCIPY,
      basis: "seen",
    };
  });
}

export const constantRows: readonly Check[] = [
  ...rows(table.scipy, false),
  ...rows(table.astropy, true),
  {
    covers: ["SOLAR_EFFECTIVE_TEMPERATURE"],
    what: "SOLAR_EFFECTIVE_TEMPERATURE",
    published: 5772,
    unit: "K",
    ours: () => SOLAR_EFFECTIVE_TEMPERATURE,
    tolerance: 0,
    because: "the same number",
    source: IAU_B3,
    basis: "from memory",
  },
  {
    covers: ["SOLAR_IRRADIANCE"],
    what: "SOLAR_IRRADIANCE",
    published: 1361,
    unit: "W m-2",
    ours: () => SOLAR_IRRADIANCE,
    tolerance: 0,
    because: "the same number",
    source: IAU_B3,
    basis: "from memory",
  },
];
