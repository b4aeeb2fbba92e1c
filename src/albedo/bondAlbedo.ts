import { mul } from "../graph/operations.ts";
import { defineLaw } from "../law/defineLaw.ts";
import { albedoPort } from "../law/ports.ts";

/**
 * Bond albedo from the brightness at full phase and a stated phase integral: A = p·q. Geometric albedo p up to 2 (it may
 * exceed 1), phase integral q up to 4 (3/2 for a Lambert sphere), both over the star's whole spectrum; a product above
 * 1 is refused, or marked in a state. Errors: as for every law. Source: Russell 1916, ApJ 43, 173; Hanel et al. 1981.
 */
export const bondAlbedo = /* @__PURE__ */ defineLaw({
  name: "bondAlbedo",
  about: "Bond albedo from the brightness at full phase and a phase integral.",
  output: /* @__PURE__ */ albedoPort("A"),
  inputs: {
    geometric: { symbol: "p", unit: "1", within: [0, 2], about: "geometric albedo" },
    phaseIntegral: { symbol: "q", unit: "1", within: [0, 4], about: "phase integral" },
  },
  demands: {
    reflected: {
      unit: "1",
      within: [0, 1],
      about: "geometric · phaseIntegral",
      write: ({ geometric, phaseIntegral }) => mul(geometric, phaseIntegral),
    },
  },
  source: "Russell 1916, ApJ 43, 173; Hanel et al. 1981, JGR 86, 8705",
  write: ({ geometric, phaseIntegral }) => mul(geometric, phaseIntegral),
});
