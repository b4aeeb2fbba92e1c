import { div, exp, log, mul } from "../graph/operations.ts";
import { defineLaw } from "../law/defineLaw.ts";

const surfacePressure = (symbol: string, about: string) =>
  ({ symbol, unit: "Pa", within: [1e-3, 1e10], about }) as const;

/**
 * Longwave optical depth of a well-mixed absorber that scales with surface pressure: τ = τ₀(p/p₀)ⁿ. The exponent is 1
 * where absorption per mass does not depend on pressure and 2 where lines broaden with it or colliding molecules absorb;
 * it must be given, between 0.5 and 3 (published: 1 to 2). Pressures in Pa from 10⁻³ to 10¹⁰, depth τ₀ at p₀
 * from 0 to 10⁶. Errors: as for every law.
 * Source: Robinson & Catling 2012, ApJ 757, 104.
 */
export const pressureOpticalDepth = /* @__PURE__ */ defineLaw({
  name: "pressureOpticalDepth",
  about: "Longwave optical depth of a well-mixed absorber that scales with surface pressure.",
  output: { symbol: "τ", unit: "1", about: "longwave optical depth of the whole column" },
  inputs: {
    pressure: /* @__PURE__ */ surfacePressure("p", "surface pressure"),
    referencePressure: /* @__PURE__ */ surfacePressure("p_0", "surface pressure of the known column"),
    referenceDepth: {
      symbol: "τ_0",
      unit: "1",
      within: [0, 1e6],
      about: "optical depth of the known column",
    },
    exponent: { symbol: "n", unit: "1", within: [0.5, 3], about: "exponent of pressure" },
  },
  published: { exponent: [1, 2] },
  source: "Robinson & Catling 2012, ApJ 757, 104 (doi:10.1088/0004-637X/757/1/104)",
  write: ({ pressure, referencePressure, referenceDepth, exponent }) =>
    mul(referenceDepth, exp(mul(exponent, log(div(pressure, referencePressure))))),
});
