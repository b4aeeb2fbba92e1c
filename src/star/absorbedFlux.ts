import { div, mul, sub } from "../graph/operations.ts";
import { defineLaw } from "../law/defineLaw.ts";
import { albedoPort, fluxPort } from "../law/ports.ts";

/**
 * Starlight that a sphere absorbs, per unit of its whole area: F = S(1 − α)/4, in W m⁻².
 * Flux normal to the beam in W m⁻² from 0 to 10¹², Bond albedo between 0 and 1. Errors: as for every law.
 * Source: a sphere's cross-section is a quarter of its area.
 */
export const absorbedFlux = /* @__PURE__ */ defineLaw({
  name: "absorbedFlux",
  about: "Starlight that a sphere absorbs, per unit of its whole area.",
  output: { symbol: "F_abs", unit: "W m-2" },
  inputs: { flux: /* @__PURE__ */ fluxPort(), albedo: /* @__PURE__ */ albedoPort() },
  source: "geometry of a sphere in a parallel beam",
  write({ flux, albedo }) {
    const coAlbedo = sub(1, albedo);
    return div(mul(flux, coAlbedo), 4);
  },
});
