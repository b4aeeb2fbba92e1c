import { add, div, mix, sub, tanh } from "../graph/operations.ts";
import { defineLaw } from "../law/defineLaw.ts";
import { ALBEDO, TEMPERATURE } from "../law/ports.ts";

/**
 * Albedo that falls smoothly from a frozen to an open surface:
 * α = cold + (warm − cold)·½(1 + tanh((T − midpoint)/width)).
 * Temperatures in K (the width is a temperature difference, above 0); albedos between 0 and 1. Errors: as for every law.
 * Source: Kaper & Engler 2013, Mathematics and Climate (SIAM), with 0.7, 0.3, 265 K, 10 K.
 */
export const tanhAlbedo = /* @__PURE__ */ defineLaw({
  name: "tanhAlbedo",
  about: "Albedo that falls smoothly from a frozen to an open surface.",
  output: ALBEDO,
  inputs: {
    temperature: TEMPERATURE,
    cold: { ...ALBEDO, symbol: "α_c", about: "albedo of the frozen planet" },
    warm: { ...ALBEDO, symbol: "α_w", about: "albedo of the open planet" },
    midpoint: { ...TEMPERATURE, symbol: "T_m", about: "temperature halfway between" },
    width: {
      symbol: "w",
      unit: "K",
      within: [1e-6, 1e5],
      about: "temperature difference over which it changes",
    },
  },
  published: { temperature: [200, 340] },
  source: "Kaper & Engler 2013, Mathematics and Climate, SIAM",
  write({ temperature, cold, warm, midpoint, width }) {
    const open = div(add(1, tanh(div(sub(temperature, midpoint), width))), 2);
    return mix(cold, warm, open);
  },
});
