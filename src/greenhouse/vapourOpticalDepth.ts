import { div, exp, mul, product, sub } from "../graph/operations.ts";
import { defineLaw } from "../law/defineLaw.ts";

/** Latent heat of vaporization, J kg⁻¹, taken as constant. */
const LATENT_HEAT = 2.5e6;
/** Gas constant of water vapour, J kg⁻¹ K⁻¹. */
const VAPOUR_GAS_CONSTANT = 461.5;

/**
 * Longwave optical depth of water vapour that scales with saturation pressure:
 * τ = h·τ₀·exp[(L/R_v)(1/T₀ − 1/T)], L = 2.5·10⁶ J kg⁻¹, R_v = 461.5 J kg⁻¹ K⁻¹. Ground temperature T in K
 * from 1 to 10⁵ (fitting at 230 to 320 K), T₀ from 100 to 1000 K, τ₀ from 0 to 10⁶ the depth of a saturated
 * column at T₀, h from 0 to 1 the relative humidity (1 unless said). With a constant L this is a scaling and
 * no saturation pressure: from 273 to 320 K it grows 6 % too much. Errors: as for every law.
 * Source: Clausius–Clapeyron relation; grey form as in Pierrehumbert 2010, Principles of Planetary Climate, ch. 4.
 */
export const vapourOpticalDepth = /* @__PURE__ */ defineLaw({
  name: "vapourOpticalDepth",
  about: "Longwave optical depth of water vapour that scales with saturation pressure.",
  output: { symbol: "τ", unit: "1", about: "longwave optical depth of the vapour" },
  inputs: {
    temperature: { symbol: "T", unit: "K", within: [1, 1e5], about: "temperature of the ground" },
    referenceTemperature: {
      symbol: "T_0",
      unit: "K",
      within: [100, 1000],
      about: "temperature of the ground under the known column",
    },
    referenceDepth: {
      symbol: "τ_0",
      unit: "1",
      within: [0, 1e6],
      about: "optical depth of the known column when saturated",
    },
    humidity: { symbol: "h", unit: "1", within: [0, 1], default: 1, about: "relative humidity" },
  },
  published: { temperature: [230, 320] },
  source: "Clausius–Clapeyron relation; Pierrehumbert 2010, Principles of Planetary Climate, ch. 4",
  write({ temperature, referenceTemperature, referenceDepth, humidity }) {
    const rise = sub(div(1, referenceTemperature), div(1, temperature));
    return product(humidity, referenceDepth, exp(mul(div(LATENT_HEAT, VAPOUR_GAS_CONSTANT), rise)));
  },
});
