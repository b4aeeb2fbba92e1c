// What an appraisal cannot say because a fact beside the budget is not known.
import type { Planet } from "../planet/planetTypes.ts";
import type { MissingField } from "./appraisal.ts";
import { hostOf } from "./hostOf.ts";

/** What is read as 0 where it is not given. */
export const ECCENTRICITY = "orbit.eccentricity";

/** Facts that are not given and do not follow, and what cannot be said without them. */
export function missingFacts(
  { facts, description }: Pick<Planet, "facts" | "description">,
  { hasBudget }: { hasBudget: boolean },
): MissingField[] {
  const host = hostOf(facts);
  const star = host?.path ?? "star";
  const missing: MissingField[] = [];
  const need = (value: unknown, path: string, text: string) => {
    if (value === null) missing.push({ path, text });
  };
  need(description.orbit.eccentricity ?? null, ECCENTRICITY, "taken as 0, which is a circular orbit");
  need(
    host?.effectiveTemperature ?? null,
    `${star}.effectiveTemperature`,
    "no published limits of the habitable zone",
  );
  if (host?.effectiveTemperature) need(host.luminosity, `${star}.luminosity`, "no distances of these limits");
  if (!hasBudget) return missing;
  need(facts.surfacePressure, "atmosphere.pressure", "no word on water and carbon dioxide at the surface");
  if (facts.heatCapacity !== null)
    need(facts.orbitalPeriod, "orbit.period", "no ratio of the thermal time to the orbital period");
  if (facts.stars.length === 1)
    need(host?.brighteningTable ?? host?.brightening ?? null, `${star}.brightening`, "margins without times");
  return missing;
}
