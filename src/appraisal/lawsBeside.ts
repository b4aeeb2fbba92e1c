// Laws that an appraisal uses beside the planet's loop.
import type { LawCard } from "../graph/card.ts";
import { daysideRedistribution } from "../greenhouse/daysideRedistribution.ts";
import { equilibriumTemperature } from "../greenhouse/equilibriumTemperature.ts";
import { nightsideRedistribution } from "../greenhouse/nightsideRedistribution.ts";
import { habitableZoneFlux } from "../habitable/habitableZoneFlux.ts";
import { orbitMeanFlux } from "../orbit/orbitMeanFlux.ts";
import { temperatureMeanFlux } from "../orbit/temperatureMeanFlux.ts";
import { thermalInertiaRatio } from "../orbit/thermalInertiaRatio.ts";
import { stellarFlux } from "../star/stellarFlux.ts";
import { stellarLuminosity } from "../star/stellarLuminosity.ts";
import { co2FrostPoint } from "../water/co2FrostPoint.ts";
import { saturationPressureIce } from "../water/saturationPressureIce.ts";
import { saturationPressureLiquid } from "../water/saturationPressureLiquid.ts";
import { saturationTemperature } from "../water/saturationTemperature.ts";
import type { Appraisal } from "./appraisal.ts";

/** The laws that stand behind these parts of an appraisal. */
export function lawsBeside({
  starlight,
  equilibrium,
  habitableZone,
  states,
}: Pick<Appraisal, "starlight" | "equilibrium" | "habitableZone" | "states">): { readonly card: LawCard }[] {
  const when = (used: boolean, ...laws: readonly unknown[]) =>
    (used ? laws : []) as { readonly card: LawCard }[];
  return [
    ...when(starlight.luminosity !== null, stellarLuminosity, stellarFlux),
    ...when(starlight.eccentricity > 0, orbitMeanFlux, temperatureMeanFlux),
    ...when(true, equilibriumTemperature),
    ...when(equilibrium.places !== null, daysideRedistribution, nightsideRedistribution),
    ...when(
      states.some((s) => s.averaging.thermalInertiaRatio !== null),
      thermalInertiaRatio,
    ),
    ...when(habitableZone.length > 0, habitableZoneFlux),
    ...when(
      states.some((s) => s.surface !== null),
      ...[saturationPressureLiquid, saturationPressureIce, saturationTemperature, co2FrostPoint],
    ),
  ];
}
