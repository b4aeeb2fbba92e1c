// What leaves the planet as longwave: emission of the clear sky, clouds over it, forcings.

import { forcedEmission } from "../forcing/forcedEmission.ts";
import { add } from "../graph/operations.ts";
import type { Value } from "../graph/quantity.ts";
import { cloudyEmission } from "../greenhouse/cloudyEmission.ts";
import { isLaw } from "./fieldLaws.ts";
import type { PlanetDescription } from "./planetShape.ts";
import { answersToTemperature, callLaw, callWritten, type Sources, type WrittenLaw } from "./wire.ts";

type Longwave = PlanetDescription["longwave"];
type Forcing = NonNullable<PlanetDescription["forcing"]>;
type Depth = Extract<Longwave, { opticalDepth: unknown }>["opticalDepth"];

/** Outgoing longwave radiation, and what is worth reading of its making. */
export interface Outgoing {
  readonly longwave: Value;
  readonly report: Readonly<Record<string, Value>>;
}

/** The outgoing longwave radiation of a description. */
export function outgoing(d: PlanetDescription, from: Sources): Outgoing {
  const report: Record<string, Value> = {};
  const clear = emission(d.longwave, "longwave", from, report);
  const cloudy = withClouds(d, clear, from);
  if (d.forcing === undefined) return { longwave: cloudy, report };
  const forcing = forcingsOf(d.forcing)
    .map(({ written, path }) => callWritten(written, path, from))
    .reduce((all, one) => add(all, one));
  return { longwave: forcedEmission({ clear: cloudy, forcing }), report: { ...report, forcing } };
}

/** Each forcing with its path. */
export const forcingsOf = (forcing: Forcing): { readonly written: WrittenLaw; readonly path: string }[] =>
  Array.isArray(forcing)
    ? forcing.map((written: WrittenLaw, i) => ({ written, path: `forcing[${i}]` }))
    : [{ written: forcing as WrittenLaw, path: "forcing" }];

function emission(written: Longwave, path: string, from: Sources, report: Record<string, Value>): Value {
  if ("emission" in written) {
    const inner = emission(written.emission as Longwave, `${path}.emission`, from, report);
    return callWritten(written, path, from, { emission: inner });
  }
  if (!("opticalDepth" in written)) return callWritten(written, path, from);
  const opticalDepth = depth(written.opticalDepth, `${path}.opticalDepth`, from);
  if (depthLaws(written.opticalDepth).length > 0) report.opticalDepth = opticalDepth;
  return callWritten(written, path, from, { opticalDepth });
}

/** The sum of all optical depths; a coupling where one of them answers to temperature. */
function depth(written: Depth, path: string, from: Sources): Value {
  const parts = Array.isArray(written)
    ? written.map((part, i) => depthPart(part, `${path}[${i}]`, from))
    : [depthPart(written, path, from)];
  const whole = parts.reduce((all, one) => add(all, one));
  return depthLaws(written).some(answersToTemperature) ? from.couple("opticalDepth", whole) : whole;
}

function depthPart(written: unknown, path: string, from: Sources): Value {
  if (!isLaw(written)) return from.wire(path);
  return callWritten(written, path, from);
}

/** The emission without a ceiling, and where it stands. */
export const innerEmission = (longwave: Longwave) =>
  "emission" in longwave
    ? ({ written: longwave.emission, path: "longwave.emission" } as const)
    : ({ written: longwave, path: "longwave" } as const);

/** True where not all of an optical depth is that of vapour. */
export const isDry = (written: Depth): boolean =>
  (Array.isArray(written) ? written : [written]).some(
    (part) => !isLaw(part) || part.law !== "vapourOpticalDepth",
  );

/** The laws among the optical depths. */
export const depthLaws = (written: Depth): WrittenLaw[] =>
  (Array.isArray(written) ? written : [written]).filter((part): part is WrittenLaw & typeof part =>
    isLaw(part),
  );

function withClouds({ clouds }: PlanetDescription, clear: Value, { wire }: Sources): Value {
  if (clouds?.emissivity === undefined) return clear;
  const { share, emissivity, temperature } = clouds;
  return callLaw(cloudyEmission, {
    path: "clouds",
    written: { share, emissivity, temperature },
    wire,
    bound: { clear },
  });
}
