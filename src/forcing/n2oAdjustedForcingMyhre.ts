import { mul, sqrt, sub } from "../graph/operations.ts";
import { defineLaw } from "../law/defineLaw.ts";
import { ppb } from "./concentration.ts";
import { overlapMyhre } from "./overlapMyhre.ts";
import { ch4Port, forcingPort, n2oPort, referenceOf } from "./ports.ts";

/**
 * Stratosphere-adjusted forcing of N₂O in the older fit: F = 0.12(√N − √N₀) − [f(M₀, N) − f(M₀, N₀)] in W m⁻², M₀ and N
 * in ppb, f the overlap with CH₄ at its reference. Mole fractions from 10⁻¹² to 2·10⁻⁶ (CH₄: 10⁻⁵).
 * It reduces cooling. Errors: as for every law. Source: Myhre et al. 1998, GRL 25, 2715; IPCC 2001, Table 6.2.
 */
export const n2oAdjustedForcingMyhre = /* @__PURE__ */ defineLaw({
  name: "n2oAdjustedForcingMyhre",
  about: "Stratosphere-adjusted forcing of N₂O less what CH₄ absorbs already.",
  output: /* @__PURE__ */ forcingPort("N2O", "adjusted"),
  inputs: {
    concentration: /* @__PURE__ */ n2oPort(),
    reference: /* @__PURE__ */ n2oPort("N_0", /* @__PURE__ */ referenceOf("N₂O")),
    methaneReference: /* @__PURE__ */ ch4Port("M_0", "mole fraction of CH₄ at the reference"),
  },
  reduces: "cooling",
  source: "Myhre et al. 1998, GRL 25, 2715 (doi:10.1029/98GL01908); IPCC 2001, WGI, Table 6.2",
  write({ concentration, reference, methaneReference }) {
    const alone = mul(0.12, sub(sqrt(ppb(concentration)), sqrt(ppb(reference))));
    const shared = sub(
      overlapMyhre(methaneReference, concentration),
      overlapMyhre(methaneReference, reference),
    );
    return sub(alone, shared);
  },
});
