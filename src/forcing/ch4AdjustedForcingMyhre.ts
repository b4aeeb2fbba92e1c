import { mul, sqrt, sub } from "../graph/operations.ts";
import { defineLaw } from "../law/defineLaw.ts";
import { ppb } from "./concentration.ts";
import { overlapMyhre } from "./overlapMyhre.ts";
import { ch4Port, forcingPort, n2oPort, referenceOf } from "./ports.ts";

/**
 * Stratosphere-adjusted forcing of CH₄ in the older fit, without its shortwave absorption:
 * F = 0.036(√M − √M₀) − [f(M, N₀) − f(M₀, N₀)] in W m⁻², M and N₀ in ppb, f the overlap with N₂O at its reference.
 * Mole fractions from 10⁻¹² to 10⁻⁵ (N₂O: 2·10⁻⁶), fitted up to 5 ppm. It reduces cooling.
 * Errors: as for every law. Source: Myhre et al. 1998, GRL 25, 2715; IPCC 2001, Table 6.2.
 */
export const ch4AdjustedForcingMyhre = /* @__PURE__ */ defineLaw({
  name: "ch4AdjustedForcingMyhre",
  about: "Stratosphere-adjusted forcing of CH₄ less what N₂O absorbs already.",
  output: /* @__PURE__ */ forcingPort("CH4", "adjusted"),
  inputs: {
    concentration: /* @__PURE__ */ ch4Port(),
    reference: /* @__PURE__ */ ch4Port("M_0", /* @__PURE__ */ referenceOf("CH₄")),
    nitrousOxideReference: /* @__PURE__ */ n2oPort("N_0", "mole fraction of N₂O at the reference"),
  },
  published: { concentration: [0, 5e-6] },
  reduces: "cooling",
  source: "Myhre et al. 1998, GRL 25, 2715 (doi:10.1029/98GL01908); IPCC 2001, WGI, Table 6.2",
  write({ concentration, reference, nitrousOxideReference }) {
    const alone = mul(0.036, sub(sqrt(ppb(concentration)), sqrt(ppb(reference))));
    const shared = sub(
      overlapMyhre(concentration, nitrousOxideReference),
      overlapMyhre(reference, nitrousOxideReference),
    );
    return sub(alone, shared);
  },
});
