import { mix, step, sub } from "../graph/operations.ts";
import { defineLaw } from "../law/defineLaw.ts";
import { albedoPort, temperaturePort } from "../law/ports.ts";

/**
 * Albedo of a planet that is either frozen or open: α = cold below the threshold, warm at and above it. A leap: where the balance
 * changes its sign at the threshold there is no state, and a search says so (`jump`).
 * Temperatures in K from 0 to 10⁵; albedos between 0 and 1. Errors: as for every law.
 * Source: Budyko 1969, Tellus 21, 611 (0.62, 0.32, −10 °C).
 */
export const stepAlbedo = /* @__PURE__ */ defineLaw({
  name: "stepAlbedo",
  about: "Albedo that leaps from that of a frozen to that of an open planet.",
  output: /* @__PURE__ */ albedoPort(),
  inputs: {
    temperature: /* @__PURE__ */ temperaturePort(),
    cold: /* @__PURE__ */ albedoPort("α_c", "albedo of the frozen planet"),
    warm: /* @__PURE__ */ albedoPort("α_w", "albedo of the open planet"),
    threshold: /* @__PURE__ */ temperaturePort("T_t", "frozen below"),
  },
  source: "Budyko 1969, Tellus 21, 611",
  write: ({ temperature, cold, warm, threshold }) => mix(cold, warm, step(sub(temperature, threshold))),
});
