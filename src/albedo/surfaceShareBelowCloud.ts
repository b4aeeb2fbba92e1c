import { mul, sub } from "../graph/operations.ts";
import { defineLaw } from "../law/defineLaw.ts";
import { CLOUD_DEMANDS, CLOUD_PORTS, sunlightBelow } from "./cloudLayer.ts";

/**
 * Share of the sunlight above a cloud that the surface below absorbs: T(1 − α)/(1 − Rα), T = 1 − R − a.
 * With `cloudyAlbedo` and `cloudShareAbsorbed` it makes 1. All between 0 and 1, R + a up to 1, Rα below 1.
 * Errors: as for every law. Source: Donohoe & Battisti 2011, J. Climate 24, 4402.
 */
export const surfaceShareBelowCloud = /* @__PURE__ */ defineLaw({
  name: "surfaceShareBelowCloud",
  about: "Share of the sunlight above a cloud that the surface below absorbs.",
  output: { symbol: "f_s", unit: "1", within: [0, 1], about: "share that the surface absorbs" },
  inputs: CLOUD_PORTS,
  demands: CLOUD_DEMANDS,
  source: "Donohoe & Battisti 2011, J. Climate 24, 4402 (doi:10.1175/2011JCLI3946.1)",
  write: (layer) => mul(sub(1, layer.surface), sunlightBelow(layer)),
});
