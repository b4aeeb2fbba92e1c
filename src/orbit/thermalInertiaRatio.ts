import { div, mul } from "../graph/operations.ts";
import { defineLaw } from "../law/defineLaw.ts";

/** From about here on the mean flux over an eccentric orbit counts: Ji et al. 2023, abstract. */
export const MEAN_FLUX_INERTIA = 1;
/** Up to about here the instantaneous flux counts: Ji et al. 2023, abstract. */
export const INSTANT_FLUX_INERTIA = 0.01;

/**
 * Thermal time over orbital period: Π = C/(P·∂OLR/∂T), without unit. From about 1 (`MEAN_FLUX_INERTIA`) on a planet
 * answers to the mean flux over its orbit, up to about 0.01 (`INSTANT_FLUX_INERTIA`) to the flux of the moment; between
 * them neither average is right.
 * Heat capacity in J m⁻² K⁻¹ from 0 to 10¹⁵, period in s from 1 to 10¹³, slope of the outgoing longwave
 * radiation in W m⁻² K⁻¹ from 10⁻⁶ to 10⁶. Errors: as for every law. Source: Ji, Chatterjee, Park Coy & Kite
 * 2023, ApJL 943, L1.
 */
export const thermalInertiaRatio = /* @__PURE__ */ defineLaw({
  name: "thermalInertiaRatio",
  about: "Thermal time over orbital period: whether a planet answers to the mean flux over its orbit.",
  output: { symbol: "Π", unit: "1", about: "thermal time over orbital period" },
  inputs: {
    heatCapacity: { symbol: "C", unit: "J m-2 K-1", within: [0, 1e15], about: "heat capacity" },
    period: { symbol: "P", unit: "s", within: [1, 1e13], about: "orbital period" },
    emissionSlope: {
      symbol: "B",
      unit: "W m-2 K-1",
      within: [1e-6, 1e6],
      about: "slope of the outgoing longwave radiation with temperature",
    },
  },
  source: "Ji et al. 2023, ApJL 943, L1",
  write: ({ heatCapacity, period, emissionSlope }) => div(heatCapacity, mul(period, emissionSlope)),
});
