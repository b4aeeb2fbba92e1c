// The shape of a description. What values mean and whether they agree is checked after it.
import type { output } from "zod/mini";
import { array, discriminatedUnion, literal, optional, strictObject, string, union } from "zod/mini";
import { ALBEDO_LAWS, HEAT_CAPACITY_LAWS, LONGWAVE_LAWS } from "./fieldLaws.ts";
import {
  ALBEDO_PORT,
  COVER_PORTS,
  HEAT_CAPACITY_PORT,
  INTERNAL_HEAT_PORT,
  ORBIT_PORTS,
  REDISTRIBUTION_PORT,
  REDISTRIBUTIONS,
  STAR_PORTS,
} from "./fieldPorts.ts";
import { lawSchema } from "./lawSchema.ts";
import { measuredSchema, pureSchema } from "./valueSchema.ts";
import { worded } from "./wording.ts";

/** The format that this version reads. */
export const PLANET_FORMAT = "thermostead-planet-1";

const text = (description: string) => worded(string(), "a text", { description });
const texts = (description: string) => worded(array(text(description)), "a list of texts");

const star = strictObject({
  name: optional(text("name of the star")),
  luminosity: optional(measuredSchema(STAR_PORTS.luminosity)),
  radius: optional(measuredSchema(STAR_PORTS.radius)),
  effectiveTemperature: optional(measuredSchema(STAR_PORTS.effectiveTemperature)),
  mass: optional(measuredSchema(STAR_PORTS.mass)),
  brightening: optional(measuredSchema(STAR_PORTS.brightening)),
});

const orbit = strictObject({
  semiMajorAxis: optional(measuredSchema(ORBIT_PORTS.semiMajorAxis)),
  period: optional(measuredSchema(ORBIT_PORTS.period)),
  distanceInStellarRadii: optional(pureSchema(ORBIT_PORTS.distanceInStellarRadii)),
  flux: optional(measuredSchema(ORBIT_PORTS.flux)),
  eccentricity: optional(pureSchema(ORBIT_PORTS.eccentricity)),
  average: optional(
    worded(literal(["flux", "temperature"]), '"flux" or "temperature"', {
      description: "what is averaged over an eccentric orbit; required unless the eccentricity is 0",
    }),
  ),
});

const names = Object.keys(REDISTRIBUTIONS) as (keyof typeof REDISTRIBUTIONS)[];
const named = worded(literal(names), names.map((name) => `"${name}"`).join(", "));
const redistribution = worded(
  union([named, ...pureSchema(REDISTRIBUTION_PORT).def.options]),
  'a number from 0.25 to 1, or "global", "dayside", "instant" or "substellar"',
  { description: "share of the flux that a unit of area receives: 1/4, 1/2, 2/3 or 1" },
);

const share = worded(
  union([worded(literal("rest"), '"rest"'), ...pureSchema(COVER_PORTS.share).def.options]),
  'a number from 0 to 1, or "rest"',
  { description: "share of the surface" },
);
const cover = strictObject({
  name: optional(text("name of the cover")),
  share,
  albedo: pureSchema(COVER_PORTS.albedo),
});
const covers = worded(
  strictObject({
    covers: worded(array(cover), "a list of { share, albedo }", { minItems: 1, maxItems: 100 }),
  }),
  "{ covers }",
);
const albedo = worded(
  union([
    ...pureSchema(ALBEDO_PORT).def.options,
    covers,
    discriminatedUnion("law", [
      lawSchema("tanhAlbedo", ALBEDO_LAWS.tanhAlbedo),
      lawSchema("rampAlbedo", ALBEDO_LAWS.rampAlbedo),
      lawSchema("quadraticAlbedo", ALBEDO_LAWS.quadraticAlbedo),
    ]),
  ]),
  "a number from 0 to 1, { covers } or { law }",
  { description: "Bond albedo" },
);

const longwave = worded(
  discriminatedUnion("law", [
    lawSchema("greyEmission", LONGWAVE_LAWS.greyEmission),
    lawSchema("linearEmission", LONGWAVE_LAWS.linearEmission),
    lawSchema("greyColumnEmission", LONGWAVE_LAWS.greyColumnEmission),
  ]),
  '{ law }, as in { law: "greyEmission", emissivity: 0.6 }',
  { description: "outgoing longwave radiation" },
);

const heatCapacity = worded(
  union([
    ...measuredSchema(HEAT_CAPACITY_PORT).def.options,
    discriminatedUnion("law", [
      lawSchema("mixedLayerCapacity", HEAT_CAPACITY_LAWS.mixedLayerCapacity),
      lawSchema("atmosphereCapacity", HEAT_CAPACITY_LAWS.atmosphereCapacity),
    ]),
  ]),
  'a number with its unit, as in "4.2e8 J m-2 K-1", or { law }',
  { description: HEAT_CAPACITY_PORT.about },
);

/** The schema of a whole description. */
export const PLANET_SHAPE = worded(
  strictObject({
    format: worded(literal(PLANET_FORMAT), `"${PLANET_FORMAT}"`),
    name: optional(text("name of the planet")),
    source: optional(text("where the description comes from")),
    notes: optional(texts("anything a reader should know")),
    star: optional(worded(star, "{ luminosity } or { radius, effectiveTemperature }")),
    orbit: worded(orbit, "{ semiMajorAxis }, { period }, { distanceInStellarRadii } or { flux }"),
    redistribution,
    albedo,
    longwave,
    heatCapacity,
    internalHeat: optional(measuredSchema(INTERNAL_HEAT_PORT)),
  }),
  "a description: an object (a JSON text must be parsed first)",
);

/**
 * A planet in the trade's words, in the format `thermostead-planet-1`. A value with a unit is a text such as `"0.61 au"`,
 * or `{ value, unit }` with `minus`, `plus` and `source`; a pure number is a number, or an object in the same way.
 */
export type PlanetDescription = output<typeof PLANET_SHAPE>;
