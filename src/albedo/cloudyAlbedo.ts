import { add, min, product } from "../graph/operations.ts";
import { defineLaw } from "../law/defineLaw.ts";
import { albedoPort } from "../law/ports.ts";
import { CLOUD_DEMANDS, CLOUD_PORTS, sunlightBelow, transmittance } from "./cloudLayer.ts";

/**
 * Albedo of a cloud over a surface, with every reflection between the two: A = R + T²α/(1 − Rα), T = 1 − R − a.
 * The same from above and from below; light is diffuse and of one band. It also holds for a clear sky of given
 * reflectance and absorptance; a sky partly covered is `mixAlbedo` of its clear and its cloudy share.
 * All between 0 and 1, R + a up to 1, Rα below 1. Errors: as for every law.
 * Source: Donohoe & Battisti 2011, J. Climate 24, 4402 (the sum of reflections is Stokes's of 1862).
 */
export const cloudyAlbedo = /* @__PURE__ */ defineLaw({
  name: "cloudyAlbedo",
  about: "Albedo of a cloud over a surface, with every reflection between the two.",
  output: /* @__PURE__ */ albedoPort("A", "planetary albedo below the cloud's top"),
  inputs: CLOUD_PORTS,
  demands: CLOUD_DEMANDS,
  source: "Donohoe & Battisti 2011, J. Climate 24, 4402 (doi:10.1175/2011JCLI3946.1)",
  write(layer) {
    const fromSurface = product(transmittance(layer), layer.surface, sunlightBelow(layer));
    // rounding must not reflect more than all light
    return min(1, add(layer.reflectance, fromSurface));
  },
});
