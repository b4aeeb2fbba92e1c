import { add, mul } from "../graph/operations.ts";
import { defineLaw } from "../law/defineLaw.ts";
import { CLOUD_DEMANDS, CLOUD_PORTS, sunlightBelow } from "./cloudLayer.ts";

/**
 * Share of the sunlight above a cloud that the cloud absorbs, on the way down and of what the surface throws back:
 * a(1 + Tα/(1 − Rα)), T = 1 − R − a. With `cloudyAlbedo` and `surfaceShareBelowCloud` it makes 1.
 * All between 0 and 1, R + a up to 1, Rα below 1. Errors: as for every law.
 * Source: Donohoe & Battisti 2011, J. Climate 24, 4402.
 */
export const cloudShareAbsorbed = /* @__PURE__ */ defineLaw({
  name: "cloudShareAbsorbed",
  about: "Share of the sunlight above a cloud that the cloud absorbs.",
  output: { symbol: "f_c", unit: "1", within: [0, 1], about: "share that the cloud absorbs" },
  inputs: CLOUD_PORTS,
  demands: CLOUD_DEMANDS,
  source: "Donohoe & Battisti 2011, J. Climate 24, 4402 (doi:10.1175/2011JCLI3946.1)",
  write(layer) {
    const upward = mul(layer.surface, sunlightBelow(layer));
    return mul(layer.absorptance, add(1, upward));
  },
});
