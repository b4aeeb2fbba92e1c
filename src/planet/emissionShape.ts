// The shape of what leaves the planet: emission by one of several laws, and forcings that reduce it.
import { discriminatedUnion, union } from "zod/mini";
import { DEPTH_LAWS, EMISSION_LAWS, FORCING_LAWS, LONGWAVE_LAWS } from "./fieldLaws.ts";
import { lawSchema } from "./lawSchema.ts";
import { listOf } from "./listOf.ts";
import { pureSchema } from "./valueSchema.ts";
import { worded } from "./wording.ts";

const depthPort = EMISSION_LAWS.greyColumnEmission.card.inputs.opticalDepth;
const depthLaw = () =>
  discriminatedUnion("law", [
    lawSchema("vapourOpticalDepth", DEPTH_LAWS.vapourOpticalDepth),
    lawSchema("pressureOpticalDepth", DEPTH_LAWS.pressureOpticalDepth),
  ]);
const depthPart = worded(
  union([...pureSchema(depthPort).def.options, depthLaw()]),
  "a number from 0 to 1000000, or { law }",
);
const opticalDepth = worded(
  union([...pureSchema(depthPort).def.options, depthLaw(), listOf(depthPart, "optical depths", 20)]),
  "a number from 0 to 1000000, { law }, or a list of such, which add",
  { description: `${depthPort.about}; several of a list add` },
);

const emissions = () =>
  [
    lawSchema("greyEmission", EMISSION_LAWS.greyEmission),
    lawSchema("linearEmission", EMISSION_LAWS.linearEmission),
    lawSchema("greyColumnEmission", EMISSION_LAWS.greyColumnEmission, { opticalDepth }),
    lawSchema("budykoEmission", EMISSION_LAWS.budykoEmission),
    lawSchema("northEmission", EMISSION_LAWS.northEmission),
    lawSchema("kollCroninEmission", EMISSION_LAWS.kollCroninEmission),
    lawSchema("heightEmission", EMISSION_LAWS.heightEmission),
    lawSchema("leakyStackEmission", EMISSION_LAWS.leakyStackEmission),
  ] as const;
const EXAMPLE = '{ law }, as in { law: "greyEmission", emissivity: 0.6 }';
const emission = worded(discriminatedUnion("law", emissions()), EXAMPLE, {
  description: LONGWAVE_LAWS.ceilingEmission.card.inputs.emission.about,
});

/** What `longwave` may be. */
export const longwaveShape = worded(
  discriminatedUnion("law", [
    ...emissions(),
    lawSchema("ceilingEmission", LONGWAVE_LAWS.ceilingEmission, { emission }),
  ]),
  EXAMPLE,
  { description: "outgoing longwave radiation of the clear sky" },
);

const forcing = () =>
  worded(
    discriminatedUnion("law", [
      lawSchema("co2AdjustedForcingMyhre", FORCING_LAWS.co2AdjustedForcingMyhre),
      lawSchema("co2AdjustedForcingEtminan", FORCING_LAWS.co2AdjustedForcingEtminan),
      lawSchema("co2AdjustedForcingMeinshausen", FORCING_LAWS.co2AdjustedForcingMeinshausen),
      lawSchema("co2EffectiveForcingAr6", FORCING_LAWS.co2EffectiveForcingAr6),
      lawSchema("ch4AdjustedForcingMyhre", FORCING_LAWS.ch4AdjustedForcingMyhre),
      lawSchema("ch4AdjustedForcingEtminan", FORCING_LAWS.ch4AdjustedForcingEtminan),
      lawSchema("ch4AdjustedForcingMeinshausen", FORCING_LAWS.ch4AdjustedForcingMeinshausen),
      lawSchema("ch4EffectiveForcingAr6", FORCING_LAWS.ch4EffectiveForcingAr6),
      lawSchema("n2oAdjustedForcingMyhre", FORCING_LAWS.n2oAdjustedForcingMyhre),
      lawSchema("n2oAdjustedForcingEtminan", FORCING_LAWS.n2oAdjustedForcingEtminan),
      lawSchema("n2oAdjustedForcingMeinshausen", FORCING_LAWS.n2oAdjustedForcingMeinshausen),
      lawSchema("n2oEffectiveForcingAr6", FORCING_LAWS.n2oEffectiveForcingAr6),
    ]),
    '{ law }, as in { law: "co2EffectiveForcingAr6", concentration: 560e-6, … }',
  );

/** What `forcing` may be. */
export const forcingShape = worded(
  union([forcing(), listOf(forcing(), "{ law }", 20)]),
  "{ law }, or a list of such, which add",
  {
    description:
      "a reduction of outgoing longwave radiation against a stated reference; several of a list add",
  },
);
