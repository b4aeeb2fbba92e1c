// The laws that may stand in each place of a description, by the name under which they are exported.
import { bondAlbedo } from "../albedo/bondAlbedo.ts";
import { iceShare } from "../albedo/iceShare.ts";
import { quadraticAlbedo } from "../albedo/quadraticAlbedo.ts";
import { rampAlbedo } from "../albedo/rampAlbedo.ts";
import { stepAlbedo } from "../albedo/stepAlbedo.ts";
import { tanhAlbedo } from "../albedo/tanhAlbedo.ts";
import { ch4AdjustedForcingEtminan } from "../forcing/ch4AdjustedForcingEtminan.ts";
import { ch4AdjustedForcingMeinshausen } from "../forcing/ch4AdjustedForcingMeinshausen.ts";
import { ch4AdjustedForcingMyhre } from "../forcing/ch4AdjustedForcingMyhre.ts";
import { ch4EffectiveForcingAr6 } from "../forcing/ch4EffectiveForcingAr6.ts";
import { co2AdjustedForcingEtminan } from "../forcing/co2AdjustedForcingEtminan.ts";
import { co2AdjustedForcingMeinshausen } from "../forcing/co2AdjustedForcingMeinshausen.ts";
import { co2AdjustedForcingMyhre } from "../forcing/co2AdjustedForcingMyhre.ts";
import { co2EffectiveForcingAr6 } from "../forcing/co2EffectiveForcingAr6.ts";
import { n2oAdjustedForcingEtminan } from "../forcing/n2oAdjustedForcingEtminan.ts";
import { n2oAdjustedForcingMeinshausen } from "../forcing/n2oAdjustedForcingMeinshausen.ts";
import { n2oAdjustedForcingMyhre } from "../forcing/n2oAdjustedForcingMyhre.ts";
import { n2oEffectiveForcingAr6 } from "../forcing/n2oEffectiveForcingAr6.ts";
import type { LawCard } from "../graph/card.ts";
import { budykoEmission } from "../greenhouse/budykoEmission.ts";
import { ceilingEmission } from "../greenhouse/ceilingEmission.ts";
import { greyColumnEmission } from "../greenhouse/greyColumnEmission.ts";
import { greyEmission } from "../greenhouse/greyEmission.ts";
import { heightEmission } from "../greenhouse/heightEmission.ts";
import { kollCroninEmission } from "../greenhouse/kollCroninEmission.ts";
import { leakyStackEmission } from "../greenhouse/leakyStackEmission.ts";
import { linearEmission } from "../greenhouse/linearEmission.ts";
import { northEmission } from "../greenhouse/northEmission.ts";
import { pressureOpticalDepth } from "../greenhouse/pressureOpticalDepth.ts";
import { vapourOpticalDepth } from "../greenhouse/vapourOpticalDepth.ts";
import { atmosphereCapacity } from "../heat/atmosphereCapacity.ts";
import { mixedLayerCapacity } from "../heat/mixedLayerCapacity.ts";

/** What a surface reflects. */
export const SURFACE_LAWS = { tanhAlbedo, rampAlbedo, quadraticAlbedo, stepAlbedo } as const;
/** What a whole planet reflects. */
export const ALBEDO_LAWS = { ...SURFACE_LAWS, bondAlbedo } as const;
export const SHARE_LAWS = { iceShare } as const;
export const DEPTH_LAWS = { vapourOpticalDepth, pressureOpticalDepth } as const;
/** Emissions that stand for themselves, and one that stands on another of them. */
export const EMISSION_LAWS = {
  greyEmission,
  linearEmission,
  greyColumnEmission,
  budykoEmission,
  northEmission,
  kollCroninEmission,
  heightEmission,
  leakyStackEmission,
} as const;
export const LONGWAVE_LAWS = { ...EMISSION_LAWS, ceilingEmission } as const;
export const FORCING_LAWS = {
  co2AdjustedForcingMyhre,
  co2AdjustedForcingEtminan,
  co2AdjustedForcingMeinshausen,
  co2EffectiveForcingAr6,
  ch4AdjustedForcingMyhre,
  ch4AdjustedForcingEtminan,
  ch4AdjustedForcingMeinshausen,
  ch4EffectiveForcingAr6,
  n2oAdjustedForcingMyhre,
  n2oAdjustedForcingEtminan,
  n2oAdjustedForcingMeinshausen,
  n2oEffectiveForcingAr6,
} as const;
export const HEAT_CAPACITY_LAWS = { mixedLayerCapacity, atmosphereCapacity } as const;

/** As much of a law as a description needs. */
export interface NamedLaw {
  readonly card: Pick<LawCard, "name" | "inputs" | "output">;
}

/** All laws that a description may name. */
export const DESCRIPTION_LAWS: Readonly<Record<string, NamedLaw>> = {
  ...ALBEDO_LAWS,
  ...SHARE_LAWS,
  ...DEPTH_LAWS,
  ...LONGWAVE_LAWS,
  ...FORCING_LAWS,
  ...HEAT_CAPACITY_LAWS,
};

/** The law of that name. */
export const lawNamed = (name: string): NamedLaw => DESCRIPTION_LAWS[name] as NamedLaw;

/** Ports that take what stands elsewhere in the description, by law and port. */
const ELSEWHERE: Readonly<Record<string, string>> = {
  "pressureOpticalDepth.pressure": "atmosphere.pressure",
  "heightEmission.lapseRate": "atmosphere.lapseRate",
};

/** The path of what a port takes from elsewhere in the description. */
export const elsewhere = (law: string, port: string): string | undefined => ELSEWHERE[`${law}.${port}`];

/** Ports that a law in a description does not fill: temperature is that of the loop. */
export const isBound = (law: string, port: string): boolean =>
  port === "temperature" || elsewhere(law, port) !== undefined;

/** Ports that take a temperature difference, by law and port; a test compares this list with the ports' ranges. */
export const DIFFERENCES: readonly string[] = ["tanhAlbedo.width"];

/** Whether a port of a law takes a temperature difference. */
export const isDifference = (law: unknown, port: string): boolean => DIFFERENCES.includes(`${law}.${port}`);

/** True for `{ law, … }`. */
export const isLaw = (value: unknown): value is { readonly law: string } =>
  typeof value === "object" && value !== null && "law" in value;
