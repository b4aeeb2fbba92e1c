import { div, mul } from "../graph/operations.ts";
import { defineLaw } from "../law/defineLaw.ts";

/**
 * Heat capacity of a whole atmosphere at constant pressure: C = c_p·p_s/g, in J m⁻² K⁻¹.
 * Surface pressure in Pa from 0 to 10¹², gravity in m s⁻² from 10⁻⁶ to 10⁶, specific heat in J kg⁻¹ K⁻¹ from
 * 0 to 10⁶. Errors: as for every law.
 * Source: hydrostatic balance, the column's mass is p_s/g.
 */
export const atmosphereCapacity = /* @__PURE__ */ defineLaw({
  name: "atmosphereCapacity",
  about: "Heat capacity of a whole atmosphere at constant pressure.",
  output: { symbol: "C", unit: "J m-2 K-1" },
  inputs: {
    surfacePressure: { symbol: "p_s", unit: "Pa", within: [0, 1e12], about: "surface pressure" },
    gravity: { symbol: "g", unit: "m s-2", within: [1e-6, 1e6], about: "gravity at the surface" },
    specificHeat: {
      symbol: "c_p",
      unit: "J kg-1 K-1",
      within: [0, 1e6],
      about: "specific heat at constant pressure",
    },
  },
  source: "hydrostatic balance",
  write: ({ surfacePressure, gravity, specificHeat }) => div(mul(specificHeat, surfacePressure), gravity),
});
