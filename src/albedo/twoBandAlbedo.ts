import { mix } from "../graph/operations.ts";
import { defineLaw } from "../law/defineLaw.ts";
import { albedoPort } from "../law/ports.ts";

/**
 * Albedo of a surface under a star's light in two bands: α = s·α_vis + (1 − s)·α_nir.
 * Albedos between 0 and 1; s between 0 and 1 is the share of the star's energy (not of its photons) below the wavelength
 * that divides the bands: a measured one, or `bandFraction({ temperature, to })` for a star taken as a black body.
 * Errors: as for every law. Source: reflected energy adds; two bands for ice as in Shields et al. 2013, Astrobiology 13, 715.
 */
export const twoBandAlbedo = /* @__PURE__ */ defineLaw({
  name: "twoBandAlbedo",
  about: "Albedo of a surface under a star's light in two bands, weighted by energy.",
  output: /* @__PURE__ */ albedoPort(),
  inputs: {
    visible: /* @__PURE__ */ albedoPort("α_vis", "albedo at shorter wavelengths"),
    nearInfrared: /* @__PURE__ */ albedoPort("α_nir", "albedo at longer wavelengths"),
    visibleShare: {
      symbol: "s",
      unit: "1",
      within: [0, 1],
      about: "share of the star's energy at shorter wavelengths",
    },
  },
  source: "reflected energy adds; Shields et al. 2013, Astrobiology 13, 715 (doi:10.1089/ast.2012.0961)",
  write: ({ visible, nearInfrared, visibleShare }) => mix(nearInfrared, visible, visibleShare),
});
