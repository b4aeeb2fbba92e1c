import { div, max, mul, sub } from "../graph/operations.ts";
import { defineLaw } from "../law/defineLaw.ts";
import { parabola, parabolaPorts } from "./parabola.ts";

/**
 * Share of the surface that one species of plants holds when it neither spreads nor retreats:
 * a = max(0, p − γ/β), β = max(0, 1 − ((T − best)/halfWidth)²), with p = available and γ = deathRate.
 * It is the cover at which growth on the ground that is left, β·(p − a), makes up for the deaths, γ; without growth it is 0.
 * Written a = p·(1 − c/max(β, c)) with c = γ/p, which is the same and finite everywhere: where β > c it is p − γ/β, and
 * elsewhere c/c = 1 and the cover exactly 0. A kink where the cover sets in.
 * Temperatures in K from 0 to 10⁵, the half-width from 10⁻⁶ K; deathRate over the greatest growth rate and
 * available from 10⁻⁶ to 1. Errors: as for every law. Source: Watson & Lovelock 1983, Tellus 35B, 284 (295.5
 * K, 17.5 K, 0.3, 1).
 */
export const steadyCover = /* @__PURE__ */ defineLaw({
  name: "steadyCover",
  about: "Share of the surface that one species of plants holds when growth and death are in balance.",
  output: { symbol: "a", unit: "1", within: [0, 1], about: "share of the surface" },
  inputs: /* @__PURE__ */ parabolaPorts({
    deathRate: {
      symbol: "γ",
      unit: "1",
      within: [1e-6, 1],
      about: "death rate over the greatest growth rate",
    },
    available: {
      symbol: "p",
      unit: "1",
      within: [1e-6, 1],
      about: "share of the surface that it can hold",
    },
  }),
  source: "Watson & Lovelock 1983, Tellus 35B, 284 (doi:10.1111/j.1600-0889.1983.tb00031.x)",
  write({ deathRate, available, ...around }) {
    const leastGrowth = div(deathRate, available);
    const growth = max(parabola(around), leastGrowth);
    return mul(available, sub(1, div(leastGrowth, growth)));
  },
});
