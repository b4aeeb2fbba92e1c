import { max, mul } from "../graph/operations.ts";
import { defineLaw } from "../law/defineLaw.ts";
import { parabola, parabolaPorts } from "./parabola.ts";

/**
 * Share of the surface under plants as a parabola in temperature: a = most·max(0, 1 − ((T − best)/halfWidth)²).
 * No balance of growth and death stands behind it; `steadyCover` has one. A kink at either end.
 * Temperatures in K from 0 to 10⁵, the half-width from 10⁻⁶ K; most between 0 and 1. Errors: as for every
 * law.
 * Source: a simplification used in teaching, no paper.
 */
export const parabolicCover = /* @__PURE__ */ defineLaw({
  name: "parabolicCover",
  about: "Share of the surface under plants as a parabola in temperature.",
  output: { symbol: "a", unit: "1", within: [0, 1], about: "share of the surface" },
  inputs: /* @__PURE__ */ parabolaPorts({
    most: { symbol: "a_m", unit: "1", within: [0, 1], about: "cover at the best temperature" },
  }),
  source: "a simplification used in teaching, no paper",
  write: ({ most, ...around }) => mul(most, max(0, parabola(around))),
});
