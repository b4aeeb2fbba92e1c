// Laws that an appraisal uses beside the planet's loop.
import type { LawCard } from "../graph/card.ts";
import { daysideRedistribution } from "../greenhouse/daysideRedistribution.ts";
import { equilibriumTemperature } from "../greenhouse/equilibriumTemperature.ts";
import { nightsideRedistribution } from "../greenhouse/nightsideRedistribution.ts";
import { habitableZoneDistance } from "../habitable/habitableZoneDistance.ts";
import { habitableZoneFlux } from "../habitable/habitableZoneFlux.ts";
import { interpolatedRunawayFlux } from "../habitable/interpolatedRunawayFlux.ts";
import { apoastronFlux } from "../orbit/apoastronFlux.ts";
import { orbitalPeriod } from "../orbit/orbitalPeriod.ts";
import { orbitMeanFlux } from "../orbit/orbitMeanFlux.ts";
import { periastronFlux } from "../orbit/periastronFlux.ts";
import { temperatureMeanFlux } from "../orbit/temperatureMeanFlux.ts";
import { thermalInertiaRatio } from "../orbit/thermalInertiaRatio.ts";
import { combinedFlux } from "../star/combinedFlux.ts";
import { co2FrostPoint } from "../water/co2FrostPoint.ts";
import { saturationPressureIce } from "../water/saturationPressureIce.ts";
import { saturationPressureLiquid } from "../water/saturationPressureLiquid.ts";
import { saturationTemperature } from "../water/saturationTemperature.ts";
import type { Appraisal } from "./appraisal.ts";
import { INTERPOLATED } from "./limits.ts";

type Parts = Pick<Appraisal, "inputs" | "starlight" | "equilibrium" | "habitableZone" | "states">;

/** The laws that stand behind these parts of an appraisal. */
export function lawsBeside({
  inputs,
  starlight,
  equilibrium,
  habitableZone,
  states,
}: Parts): { readonly card: LawCard }[] {
  const when = (used: boolean, ...laws: readonly unknown[]) =>
    (used ? laws : []) as { readonly card: LawCard }[];
  const given = (path: string) => inputs.some((input) => input.path === path);
  return [
    ...when(starlight.eccentricity > 0, orbitMeanFlux, periastronFlux, apoastronFlux, temperatureMeanFlux),
    ...when(starlight.period !== null && !given("orbit.period"), orbitalPeriod),
    ...when(starlight.companions !== null, combinedFlux),
    ...when(true, equilibriumTemperature),
    ...when(
      equilibrium.places !== null || states.some((s) => s.places !== null),
      ...[daysideRedistribution, nightsideRedistribution],
    ),
    ...when(
      states.some((s) => s.averaging.thermalInertiaRatio !== null),
      thermalInertiaRatio,
    ),
    ...when(habitableZone.length > 0, habitableZoneFlux),
    ...when(
      habitableZone.some((limit) => limit.distance !== null),
      habitableZoneDistance,
    ),
    ...when(
      habitableZone.some((limit) => limit.name.endsWith(INTERPOLATED)),
      interpolatedRunawayFlux,
    ),
    ...when(
      states.some((s) => s.surface !== null),
      ...[saturationPressureLiquid, saturationPressureIce, saturationTemperature, co2FrostPoint],
    ),
  ];
}
