// The energy budget of a described planet.
import type { Value } from "../graph/quantity.ts";
import { equilibriumTemperature, REDISTRIBUTION_GLOBAL } from "../greenhouse/equilibriumTemperature.ts";
import type { Budget } from "../loop/types.ts";
import { localAbsorbedFlux } from "../star/localAbsorbedFlux.ts";
import { coverAlbedo } from "./coverAlbedo.ts";
import { ALBEDO_LAWS, HEAT_CAPACITY_LAWS, LONGWAVE_LAWS } from "./fieldLaws.ts";
import type { PlanetDescription } from "./planetShape.ts";
import { meanFlux } from "./starlight.ts";
import { callLaw, type Wire } from "./wire.ts";

/** What a budget is written from. */
export interface Sources {
  readonly wire: Wire;
  readonly temperature: Value;
  /** Declares what answers to the climate. */
  readonly couple: (name: "albedo", value: Value) => Value;
  /** The redistribution factor of the description. */
  readonly redistribution: number;
}

/** N = f·S(1 − α) + internal heat − longwave, with flux, albedo and equilibrium temperature as reports. */
export function planetBudget(d: PlanetDescription, from: Sources): Budget {
  const { wire, temperature } = from;
  const flux = meanFlux(d, wire);
  const albedo = albedoOf(d, from);
  const redistribution = wire("redistribution");
  const sunlight = localAbsorbedFlux({ flux, albedo, redistribution });
  // the standard names are those of means over the whole planet
  const whole = from.redistribution === REDISTRIBUTION_GLOBAL;
  const named = (value: Value, standardName: string) => (whole ? { value, standardName } : { value });
  const internalFlux = d.internalHeat === undefined ? 0 : wire("internalHeat");
  const law = LONGWAVE_LAWS[d.longwave.law];
  const longwave = callLaw(law, { path: "longwave", written: d.longwave, wire, bound: { temperature } });
  return {
    heating: {
      sunlight: named(sunlight, "toa_net_downward_shortwave_flux"),
      ...(d.internalHeat === undefined
        ? {}
        : { internalHeat: { value: internalFlux, from: "interior", to: "surface" } }),
    },
    cooling: { longwave: named(longwave, "toa_outgoing_longwave_flux") },
    heatCapacity: heatCapacityOf(d, wire),
    report: {
      flux,
      albedo,
      equilibriumTemperature: equilibriumTemperature({ flux, albedo, redistribution, internalFlux }),
    },
  };
}

/** Only an albedo that answers to temperature is a coupling. */
function albedoOf(d: PlanetDescription, { wire, temperature, couple }: Sources): Value {
  const { albedo } = d;
  if (typeof albedo === "number" || "value" in albedo) return wire("albedo");
  if ("covers" in albedo) return coverAlbedo(albedo.covers, wire);
  const law = ALBEDO_LAWS[albedo.law];
  return couple("albedo", callLaw(law, { path: "albedo", written: albedo, wire, bound: { temperature } }));
}

function heatCapacityOf({ heatCapacity }: PlanetDescription, wire: Wire): Value {
  if (typeof heatCapacity === "string" || "value" in heatCapacity) return wire("heatCapacity");
  const law = HEAT_CAPACITY_LAWS[heatCapacity.law];
  return callLaw(law, { path: "heatCapacity", written: heatCapacity, wire });
}
