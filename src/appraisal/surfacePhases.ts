// What water and carbon dioxide do at a surface of known temperature and pressure.
import { co2FrostPoint } from "../water/co2FrostPoint.ts";
import { saturationPressureIce } from "../water/saturationPressureIce.ts";
import { saturationPressureLiquid } from "../water/saturationPressureLiquid.ts";
import { saturationTemperature } from "../water/saturationTemperature.ts";
import type { SurfacePhases } from "./appraisedState.ts";
import { rangeOf, takes } from "./portRange.ts";

/** The phases of pure water at a surface, and the frost point of an atmosphere of carbon dioxide. */
export function surfacePhases(place: { temperature: number; pressure: number }): SurfacePhases {
  const { temperature, pressure } = place;
  const frostPoint = takes(co2FrostPoint, "pressure", pressure) ? co2FrostPoint({ pressure }) : null;
  return {
    pressure,
    ...water(temperature, pressure),
    boilingTemperature: takes(saturationTemperature, "pressure", pressure)
      ? saturationTemperature({ pressure })
      : null,
    carbonDioxideFrostPoint: frostPoint,
    carbonDioxideFreezes: frostPoint === null ? null : temperature < frostPoint,
  };
}

/**
 * Ice melts at the triple point here: its own pressure moves that by less than 0.1 K per MPa. Where no line is published for
 * so cold a surface, water is ice.
 */
function water(temperature: number, pressure: number): Pick<SurfacePhases, "water" | "saturationPressure"> {
  const condensed = (saturationPressure: number, phase: "ice" | "liquid") => ({
    water: pressure >= saturationPressure ? phase : ("vapour" as const),
    saturationPressure,
  });
  if (takes(saturationPressureLiquid, "temperature", temperature))
    return condensed(saturationPressureLiquid({ temperature }), "liquid");
  if (takes(saturationPressureIce, "temperature", temperature))
    return condensed(saturationPressureIce({ temperature }), "ice");
  const hot = temperature > rangeOf(saturationPressureLiquid, "temperature")[1];
  if (!hot) return { water: "ice", saturationPressure: null };
  const supercritical = pressure > rangeOf(saturationTemperature, "pressure")[1];
  return { water: supercritical ? "supercritical" : "vapour", saturationPressure: null };
}
