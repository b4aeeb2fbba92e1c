// The shape of what reflects: a planet as a whole, or its surface below air and clouds.
import { discriminatedUnion, literal, optional, strictObject, string, union } from "zod/mini";
import { ALBEDO_LAWS, SHARE_LAWS, SURFACE_LAWS } from "./fieldLaws.ts";
import { ALBEDO_PORT, COVER_PORTS, SURFACE_PORT } from "./fieldPorts.ts";
import { lawSchema } from "./lawSchema.ts";
import { listOf } from "./listOf.ts";
import { pureSchema } from "./valueSchema.ts";
import { worded } from "./wording.ts";

const name = () => optional(worded(string(), "a text", { description: "name of the cover" }));
const share = () =>
  worded(
    union([
      worded(literal("rest"), '"rest"'),
      ...pureSchema(COVER_PORTS.share).def.options,
      discriminatedUnion("law", [lawSchema("iceShare", SHARE_LAWS.iceShare)]),
    ]),
    'a number from 0 to 1, "rest", or { law: "iceShare" }',
    {
      description:
        "share of the surface; ice lies over all others, whose shares are those of the open surface",
    },
  );
const grey = worded(
  strictObject({ name: name(), share: share(), albedo: pureSchema(COVER_PORTS.albedo) }),
  "{ share, albedo }",
);
const inTwoBands = worded(
  strictObject({
    name: name(),
    share: share(),
    visible: pureSchema(COVER_PORTS.visible),
    nearInfrared: pureSchema(COVER_PORTS.nearInfrared),
  }),
  "{ share, visible, nearInfrared }",
);
const cover = worded(union([grey, inTwoBands]), "{ share, albedo } or { share, visible, nearInfrared }");
const covers = () =>
  worded(
    strictObject({
      covers: listOf(cover, "{ share, albedo }", 100),
    }),
    "{ covers }",
  );

const laws = () =>
  [
    lawSchema("tanhAlbedo", SURFACE_LAWS.tanhAlbedo),
    lawSchema("rampAlbedo", SURFACE_LAWS.rampAlbedo),
    lawSchema("quadraticAlbedo", SURFACE_LAWS.quadraticAlbedo),
    lawSchema("stepAlbedo", SURFACE_LAWS.stepAlbedo),
  ] as const;
const WORDS = "a number from 0 to 1, { covers } or { law }";

/** What `albedo` may be. */
export const albedoShape = worded(
  union([
    ...pureSchema(ALBEDO_PORT).def.options,
    covers(),
    discriminatedUnion("law", [...laws(), lawSchema("bondAlbedo", ALBEDO_LAWS.bondAlbedo)]),
  ]),
  WORDS,
  { description: `${ALBEDO_PORT.about}; instead of surface` },
);

/** What `surface` may be. */
export const surfaceShape = worded(
  union([...pureSchema(SURFACE_PORT).def.options, covers(), discriminatedUnion("law", laws())]),
  WORDS,
  { description: `${SURFACE_PORT.about}; instead of albedo` },
);
