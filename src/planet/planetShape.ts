// The shape of a description. What values mean and whether they agree is checked after it.
import type { output } from "zod/mini";
import { array, boolean, discriminatedUnion, literal, optional, strictObject, string, union } from "zod/mini";
import { forcingShape, longwaveShape } from "./emissionShape.ts";
import { HEAT_CAPACITY_LAWS } from "./fieldLaws.ts";
import {
  ATMOSPHERE_PORTS,
  BODY_PORTS,
  CLOUD_PORTS,
  HEAT_CAPACITY_PORT,
  INTERNAL_HEAT_PORT,
  REDISTRIBUTION_PORT,
  REDISTRIBUTIONS,
  ROTATION_PORTS,
  TRANSPORT_PORTS,
} from "./fieldPorts.ts";
import { lawSchema } from "./lawSchema.ts";
import { orbitShape, starShape } from "./starShape.ts";
import { albedoShape, surfaceShape } from "./surfaceShape.ts";
import { measuredSchema, pureSchema } from "./valueSchema.ts";
import { worded } from "./wording.ts";

/** The format that this version reads. */
export const PLANET_FORMAT = "thermostead-planet-1";

const text = (description: string) => worded(string(), "a text", { description });
const texts = (description: string) => worded(array(text(description)), "a list of texts");

const names = Object.keys(REDISTRIBUTIONS) as (keyof typeof REDISTRIBUTIONS)[];
const named = worded(literal(names), names.map((name) => `"${name}"`).join(", "));
const side = strictObject({
  transport: pureSchema(TRANSPORT_PORTS.transport),
  side: worded(literal(["day", "night"]), '"day" or "night"'),
});
const redistribution = worded(
  union([
    named,
    ...pureSchema(REDISTRIBUTION_PORT).def.options,
    worded(side, "{ transport, side }", { description: "one side of a planet that keeps it to its star" }),
  ]),
  'a number from 0.25 to 1, "global", "dayside", "instant" or "substellar", or { transport, side }',
  { description: "share of the flux that a unit of area receives: 1/4, 1/2, 2/3 or 1" },
);

const clouds = worded(
  strictObject({
    share: pureSchema(CLOUD_PORTS.share),
    reflectance: optional(pureSchema(CLOUD_PORTS.reflectance)),
    absorptance: optional(pureSchema(CLOUD_PORTS.absorptance)),
    emissivity: optional(pureSchema(CLOUD_PORTS.emissivity)),
    temperature: optional(measuredSchema(CLOUD_PORTS.temperature)),
  }),
  "{ share } with { reflectance, absorptance } or { emissivity, temperature } or all of them",
  { description: "clouds over a share of the sky: what they do to sunlight, to longwave, or both" },
);

const atmosphere = worded(
  strictObject({
    pressure: optional(measuredSchema(ATMOSPHERE_PORTS.pressure)),
    lapseRate: optional(measuredSchema(ATMOSPHERE_PORTS.lapseRate)),
    reflectance: optional(pureSchema(ATMOSPHERE_PORTS.reflectance)),
    absorptance: optional(pureSchema(ATMOSPHERE_PORTS.absorptance)),
  }),
  "{ pressure, lapseRate, reflectance, absorptance }, all as known",
);

const rotation = worded(
  strictObject({
    period: optional(measuredSchema(ROTATION_PORTS.period)),
    locked: optional(
      worded(boolean(), "true or false", { description: "whether it always shows one side to its star" }),
    ),
  }),
  "{ period } or { locked }",
);

const heatCapacity = worded(
  union([
    worded(literal("unknown"), '"unknown"'),
    ...measuredSchema(HEAT_CAPACITY_PORT).def.options,
    discriminatedUnion("law", [
      lawSchema("mixedLayerCapacity", HEAT_CAPACITY_LAWS.mixedLayerCapacity),
      lawSchema("atmosphereCapacity", HEAT_CAPACITY_LAWS.atmosphereCapacity),
    ]),
  ]),
  'a number with its unit, as in "4.2e8 J m-2 K-1", or { law }, or "unknown"',
  { description: HEAT_CAPACITY_PORT.about },
);

/** The schema of a whole description. */
export const PLANET_SHAPE = worded(
  strictObject({
    format: worded(literal(PLANET_FORMAT), `"${PLANET_FORMAT}"`),
    name: optional(text("name of the planet")),
    source: optional(text("where the description comes from")),
    notes: optional(texts("anything a reader should know")),
    star: optional(starShape),
    orbit: orbitShape,
    redistribution,
    albedo: optional(albedoShape),
    surface: optional(surfaceShape),
    clouds: optional(clouds),
    atmosphere: optional(atmosphere),
    longwave: longwaveShape,
    forcing: optional(forcingShape),
    heatCapacity,
    internalHeat: optional(measuredSchema(INTERNAL_HEAT_PORT)),
    rotation: optional(rotation),
    mass: optional(measuredSchema(BODY_PORTS.mass)),
    radius: optional(measuredSchema(BODY_PORTS.radius)),
  }),
  "a description: an object (a JSON text must be parsed first)",
  { oneOf: [{ required: ["albedo"] }, { required: ["surface"] }] },
);

type Shape = output<typeof PLANET_SHAPE>;
type Reflecting =
  | { albedo: NonNullable<Shape["albedo"]>; surface?: undefined }
  | { surface: NonNullable<Shape["surface"]>; albedo?: undefined };

/**
 * A planet in the trade's words, in the format `thermostead-planet-1`. A value with a unit is a text such as `"0.61 au"`,
 * or `{ value, unit }` with `minus`, `plus` and `source`; a pure number is a number, or an object in the same way.
 */
export type PlanetDescription = Omit<Shape, "albedo" | "surface"> & Reflecting;
