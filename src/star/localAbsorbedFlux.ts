import { product, sub } from "../graph/operations.ts";
import { defineLaw } from "../law/defineLaw.ts";
import { albedoPort, fluxPort } from "../law/ports.ts";

/**
 * Starlight absorbed per unit of the area over which its heat is spread: F = f·S(1 − α), in W m⁻².
 * Flux normal to the beam in W m⁻² from 0 to 10¹², Bond albedo between 0 and 1, redistribution factor f
 * between 0 and 1: 1/4 for the whole sphere (the same as `absorbedFlux`), 1 for the substellar point. Errors:
 * as for every law.
 * Source: Hansen 2008; Cowan & Agol 2011, ApJ 729, 54.
 */
export const localAbsorbedFlux = /* @__PURE__ */ defineLaw({
  name: "localAbsorbedFlux",
  about: "Starlight absorbed per unit of the area over which its heat is spread.",
  output: { symbol: "F_abs", unit: "W m-2" },
  inputs: {
    flux: /* @__PURE__ */ fluxPort(),
    albedo: /* @__PURE__ */ albedoPort(),
    redistribution: { symbol: "f", unit: "1", within: [0, 1], about: "redistribution factor" },
  },
  source:
    "Hansen 2008, ApJS 179, 484 (doi:10.1086/591964); Cowan & Agol 2011, ApJ 729, 54 (doi:10.1088/0004-637X/729/1/54)",
  write({ flux, albedo, redistribution }) {
    const coAlbedo = sub(1, albedo);
    return product(redistribution, flux, coAlbedo);
  },
});
