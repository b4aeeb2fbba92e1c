import { product } from "../graph/operations.ts";
import { defineLaw } from "../law/defineLaw.ts";

/**
 * Heat capacity of a well-mixed layer of water or rock: C = ρ·c_p·h, in J m⁻² K⁻¹ of the layer's area.
 * Depth in m from 0 to 10⁶, density in kg m⁻³ from 0 to 10⁵, specific heat in J kg⁻¹ K⁻¹ from 0 to 10⁶.
 * Errors: as for every law.
 * Source: definition; mixed-layer use as in Hartmann 2016, Global Physical Climatology.
 */
export const mixedLayerCapacity = /* @__PURE__ */ defineLaw({
  name: "mixedLayerCapacity",
  about: "Heat capacity of a well-mixed layer.",
  output: { symbol: "C", unit: "J m-2 K-1" },
  inputs: {
    depth: { symbol: "h", unit: "m", within: [0, 1e6], about: "depth of the layer" },
    density: { symbol: "ρ", unit: "kg m-3", within: [0, 1e5], about: "density" },
    specificHeat: { symbol: "c_p", unit: "J kg-1 K-1", within: [0, 1e6], about: "specific heat" },
  },
  source: "definition of heat capacity",
  write: ({ depth, density, specificHeat }) => product(density, specificHeat, depth),
});
