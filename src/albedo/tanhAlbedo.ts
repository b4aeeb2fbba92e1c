import { add, div, mix, sub, tanh } from "../graph/operations.ts";
import { defineLaw } from "../law/defineLaw.ts";
import { albedoPort, temperaturePort } from "../law/ports.ts";

/**
 * Albedo that falls smoothly from a frozen to an open surface:
 * α = cold + (warm − cold)·½(1 + tanh((T − midpoint)/width)).
 * Temperatures in K from 0 to 10⁵ (published: 200 to 340); the width is a difference, from 10⁻⁶ K; albedos
 * between 0 and 1. Errors: as for every law.
 * Source: Kaper & Engler 2013, Mathematics and Climate (SIAM), with 0.7, 0.3, 265 K, 10 K.
 */
export const tanhAlbedo = /* @__PURE__ */ defineLaw({
  name: "tanhAlbedo",
  about: "Albedo that falls smoothly from a frozen to an open surface.",
  output: /* @__PURE__ */ albedoPort(),
  inputs: {
    temperature: /* @__PURE__ */ temperaturePort(),
    cold: /* @__PURE__ */ albedoPort("α_c", "albedo of the frozen planet"),
    warm: /* @__PURE__ */ albedoPort("α_w", "albedo of the open planet"),
    midpoint: /* @__PURE__ */ temperaturePort("T_m", "temperature halfway between"),
    width: {
      symbol: "w",
      unit: "K",
      within: [1e-6, 1e5],
      about: "over which it changes",
    },
  },
  published: { temperature: [200, 340] },
  source: "Kaper & Engler 2013, Mathematics and Climate, SIAM",
  write({ temperature, cold, warm, midpoint, width }) {
    const open = div(add(1, tanh(div(sub(temperature, midpoint), width))), 2);
    return mix(cold, warm, open);
  },
});
