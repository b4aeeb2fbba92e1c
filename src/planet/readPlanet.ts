// Reads a planet from its description.

import { fail } from "../ground/errors.ts";
import { checkKeys } from "../ground/names.ts";
import type { Contradictions } from "./agreement.ts";
import { assumptionNotes } from "./assumptionNotes.ts";
import { assumptionsOf } from "./assumptions.ts";
import { checkedPlanet } from "./checkedPlanet.ts";
import { factsOf } from "./facts.ts";
import { planetLoop } from "./planetLoop.ts";
import type { Planet } from "./planetTypes.ts";
import { unusedNotes } from "./unusedNotes.ts";
import { writtenUnits } from "./writtenUnits.ts";

/** How to read. */
export interface ReadPlanetOptions {
  /** What to do about two inputs for one quantity that differ by more than 2 %: refuse them, unless said. */
  readonly contradictions?: Contradictions;
}

/**
 * Reads a planet from its description in the format `thermostead-planet-1` and closes its energy budget:
 * C dT/dt = f·S(1 − α) + internal heat − longwave, each per unit of the area over which heat is spread.
 *
 * Nothing in a description is ever evaluated: laws are named, units are looked up. The whole description must be plain
 * data of moderate size. Every numeric input that counts becomes a given of the loop named by its path, such as
 * `star.luminosity`, `albedo.cold` or `albedo.covers[0].albedo`. Two inputs that say the same thing must agree within
 * 2 %; the first of them is used and a note says so. With `contradictions: "note"` two that do not agree are no error: the
 * first is used, and a caution says how far apart they are. The periastron is compared with the radius of the star here, not
 * when a given is changed later.
 *
 * The whole description is checked: the error is that of its first mistake, and carries those of the rest as `others`.
 * Throws `unreadable`, `too-large`, `reserved-name`, `unknown-name`, `missing`, `not-a-number`, `out-of-range`,
 * `unknown-unit`, `unit-mismatch`, `shares-not-one`, `repeated-name`, `contradiction`, `not-finite`.
 *
 * @example
 * const { loop, notes } = readPlanet({
 *   format: "thermostead-planet-1",
 *   star: { luminosity: "0.42 solLum" },
 *   orbit: { semiMajorAxis: "0.61 au" },
 *   redistribution: "global",
 *   albedo: 0.3,
 *   longwave: { law: "greyEmission", emissivity: 0.6 },
 *   heatCapacity: "4.2e8 J m-2 K-1",
 * });
 */
export function readPlanet(description: unknown, options: ReadPlanetOptions = {}): Planet {
  checkKeys(options, "readPlanet", ["contradictions"]);
  const { contradictions = "refuse" } = options;
  if (contradictions !== "refuse" && contradictions !== "note")
    fail("unreadable", { path: "contradictions", value: contradictions, allowed: '"refuse" or "note"' });
  const checked = checkedPlanet(description, contradictions);
  const { inputs, agreeing, trial } = checked;
  const loop = planetLoop(checked);
  const albedo = trial.albedo as number;
  const assumptions = assumptionsOf(checked);
  const value = trial.equilibriumTemperature as number;
  const { redistribution, internalHeat } = assumptions;
  const equilibriumTemperature = { value, unit: "K", albedo, redistribution, emissivity: 1 } as const;
  return {
    loop,
    ...frozen({
      description: checked.description,
      inputs,
      units: writtenUnits(inputs),
      flux: trial.flux as number,
      equilibriumTemperature:
        assumptions.albedo === null ? null : { ...equilibriumTemperature, internalFlux: internalHeat },
      assumptions,
      facts: factsOf(checked),
      notes: [...assumptionNotes(checked, assumptions), ...agreeing, ...unusedNotes(checked, loop)],
    }),
  };
}

function frozen<T>(value: T): T {
  if (typeof value === "object" && value !== null) Object.values(Object.freeze(value)).forEach(frozen);
  return value;
}
