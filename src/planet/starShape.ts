// The shape of a star, of several stars, and of the orbit.
import { literal, optional, strictObject, string, union } from "zod/mini";
import { brighteningShape } from "./brighteningShape.ts";
import { ORBIT_PORTS, STAR_PORTS } from "./fieldPorts.ts";
import { listOf } from "./listOf.ts";
import { measuredSchema, pureSchema } from "./valueSchema.ts";
import { worded } from "./wording.ts";

const fields = () => ({
  name: optional(worded(string(), "a text", { description: "name of the star" })),
  luminosity: optional(measuredSchema(STAR_PORTS.luminosity)),
  radius: optional(measuredSchema(STAR_PORTS.radius)),
  effectiveTemperature: optional(measuredSchema(STAR_PORTS.effectiveTemperature)),
  mass: optional(measuredSchema(STAR_PORTS.mass)),
  visibleShare: optional(pureSchema(STAR_PORTS.visibleShare)),
  brightening: optional(brighteningShape),
});
const WORDS = "{ luminosity } or { radius, effectiveTemperature }";
const listed = worded(
  strictObject({ ...fields(), distance: optional(measuredSchema(STAR_PORTS.distance)) }),
  WORDS,
);

/** What `star` may be. */
export const starShape = worded(
  union([worded(strictObject(fields()), WORDS), listOf(listed, "stars", 10)]),
  `${WORDS}, or a list of such`,
  { description: "the star, or all stars that light the planet" },
);

/** What `orbit` may be. */
export const orbitShape = worded(
  strictObject({
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
  }),
  "{ semiMajorAxis }, { period }, { distanceInStellarRadii } or { flux }",
);
