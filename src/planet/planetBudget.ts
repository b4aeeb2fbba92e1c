// The energy budget of a described planet.
import { product } from "../graph/operations.ts";
import type { Value } from "../graph/quantity.ts";
import { equilibriumTemperature } from "../greenhouse/equilibriumTemperature.ts";
import type { Budget } from "../loop/types.ts";
import { localAbsorbedFlux } from "../star/localAbsorbedFlux.ts";
import { HEAT_CAPACITY_LAWS } from "./fieldLaws.ts";
import { outgoing } from "./outgoing.ts";
import type { PlanetDescription } from "./planetShape.ts";
import { isWhole, redistributionOf } from "./redistribution.ts";
import { meanFlux } from "./starlight.ts";
import { type SharedSunlight, sharedSunlight } from "./sunlight.ts";
import { callLaw, type Sources, type Wire } from "./wire.ts";

/** N = f·S(1 − α) + internal heat − longwave, with flux, albedo and equilibrium temperature as reports. */
export function planetBudget(d: PlanetDescription, from: Sources): Budget {
  const { wire } = from;
  const flux = meanFlux(d, wire);
  const light = sharedSunlight(d, from);
  const redistribution = redistributionOf(d, wire);
  const internalFlux = d.internalHeat === undefined ? 0 : wire("internalHeat");
  const { longwave, report } = outgoing(d, from);
  const { heating, exchange } = sunlightFlows(light, { flux, redistribution, whole: isWhole(d) });
  const { albedo, surfaceAlbedo } = light;
  return {
    heating: {
      ...heating,
      ...(d.internalHeat === undefined
        ? {}
        : { internalHeat: { value: internalFlux, from: "interior", to: "surface" } }),
    },
    cooling: { longwave: named(longwave, isWhole(d) && "toa_outgoing_longwave_flux") },
    exchange,
    heatCapacity: heatCapacityOf(d, wire),
    report: {
      flux,
      albedo,
      equilibriumTemperature: equilibriumTemperature({ flux, albedo, redistribution, internalFlux }),
      ...(surfaceAlbedo === null ? {} : { surfaceAlbedo }),
      ...report,
    },
  };
}

/** The standard names are those of means over the whole planet. */
const named = (value: Value, standardName: string | false) =>
  standardName ? { value, standardName } : { value };

interface Spread {
  readonly flux: Value;
  readonly redistribution: Value;
  readonly whole: boolean;
}

/** What is absorbed aloft goes on to the surface, to whose temperature the longwave answers. */
function sunlightFlows(
  { albedo, surface, aloft }: SharedSunlight,
  { flux, redistribution, whole }: Spread,
): Pick<Budget, "heating"> & Required<Pick<Budget, "exchange">> {
  if (surface === null || aloft === null) {
    const sunlight = localAbsorbedFlux({ flux, albedo, redistribution });
    return {
      heating: { sunlight: named(sunlight, whole && "toa_net_downward_shortwave_flux") },
      exchange: {},
    };
  }
  const incoming = product(redistribution, flux);
  const high = product(incoming, aloft);
  return {
    heating: {
      sunlight: named(product(incoming, surface), whole && "surface_net_downward_shortwave_flux"),
      sunlightAloft: { value: high, to: "atmosphere" },
    },
    exchange: { heatFromAloft: { value: high, from: "atmosphere", to: "surface" } },
  };
}

function heatCapacityOf({ heatCapacity }: PlanetDescription, wire: Wire): Value {
  if (heatCapacity === "unknown") return 0;
  if (typeof heatCapacity === "string" || "value" in heatCapacity) return wire("heatCapacity");
  const law = HEAT_CAPACITY_LAWS[heatCapacity.law];
  return callLaw(law, { path: "heatCapacity", written: heatCapacity, wire });
}
