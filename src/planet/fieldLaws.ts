// The laws that may stand in each place of a description, by the name under which they are exported.
import { quadraticAlbedo } from "../albedo/quadraticAlbedo.ts";
import { rampAlbedo } from "../albedo/rampAlbedo.ts";
import { tanhAlbedo } from "../albedo/tanhAlbedo.ts";
import type { Ports } from "../graph/card.ts";
import { greyColumnEmission } from "../greenhouse/greyColumnEmission.ts";
import { greyEmission } from "../greenhouse/greyEmission.ts";
import { linearEmission } from "../greenhouse/linearEmission.ts";
import { atmosphereCapacity } from "../heat/atmosphereCapacity.ts";
import { mixedLayerCapacity } from "../heat/mixedLayerCapacity.ts";

export const ALBEDO_LAWS = { tanhAlbedo, rampAlbedo, quadraticAlbedo } as const;
export const LONGWAVE_LAWS = { greyEmission, linearEmission, greyColumnEmission } as const;
export const HEAT_CAPACITY_LAWS = { mixedLayerCapacity, atmosphereCapacity } as const;

const LAWS: Readonly<Record<string, { readonly card: { readonly inputs: Ports } }>> = {
  ...ALBEDO_LAWS,
  ...LONGWAVE_LAWS,
  ...HEAT_CAPACITY_LAWS,
};

/** The ports of a law that a description may name. */
export const portsOf = (law: string): Ports => LAWS[law]?.card.inputs ?? {};

/** The port that a description never fills: it is bound to the temperature of the loop. */
export const BOUND_PORT = "temperature";

/** Ports that take a temperature difference, by law and port; a test compares this list with the ports' ranges. */
export const DIFFERENCES: readonly string[] = ["tanhAlbedo.width"];
