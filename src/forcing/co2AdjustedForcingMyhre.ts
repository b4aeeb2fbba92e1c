import { div, log, mul } from "../graph/operations.ts";
import { defineLaw } from "../law/defineLaw.ts";
import { co2Port, forcingPort, referenceOf } from "./ports.ts";

/**
 * Stratosphere-adjusted forcing of CO₂ in the older fit: F = 5.35·ln(C/C₀), in W m⁻². Mole fractions from 10⁻⁶ to 0.1,
 * fitted up to 1000 ppm. It reduces cooling: subtract it from an emission, as `forcedEmission` does.
 * Errors: as for every law. Source: Myhre et al. 1998, GRL 25, 2715.
 */
export const co2AdjustedForcingMyhre = /* @__PURE__ */ defineLaw({
  name: "co2AdjustedForcingMyhre",
  about: "Stratosphere-adjusted forcing of CO₂ as a logarithm.",
  output: /* @__PURE__ */ forcingPort("CO2", "adjusted"),
  inputs: {
    concentration: /* @__PURE__ */ co2Port(),
    reference: /* @__PURE__ */ co2Port("C_0", /* @__PURE__ */ referenceOf("CO₂")),
  },
  published: { concentration: [0, 1000e-6] },
  reduces: "cooling",
  source: "Myhre et al. 1998, GRL 25, 2715 (doi:10.1029/98GL01908)",
  write: ({ concentration, reference }) => mul(5.35, log(div(concentration, reference))),
});
