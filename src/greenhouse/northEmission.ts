import { defineLaw } from "../law/defineLaw.ts";
import { outgoingPort, temperaturePort } from "../law/ports.ts";
import { STRAIGHT_RANGE, straightLine } from "./straightLine.ts";

/**
 * Outgoing longwave radiation of the Earth fitted to satellites outside the tropics: F = 203.3 + 2.09·(T − 273.15 K), in
 * W m⁻². Surface temperature in K from 0 to 10⁵; fitted at about 230 to 300 K. Errors: as for every law.
 * Source: North, Cahalan & Coakley 1981, Rev. Geophys. 19, 91, Eq. 6.
 */
export const northEmission = /* @__PURE__ */ defineLaw({
  name: "northEmission",
  about: "Outgoing longwave radiation of the Earth fitted to satellites outside the tropics.",
  output: /* @__PURE__ */ outgoingPort(),
  inputs: { temperature: /* @__PURE__ */ temperaturePort() },
  published: { temperature: STRAIGHT_RANGE },
  source: "North, Cahalan & Coakley 1981, Rev. Geophys. 19, 91 (doi:10.1029/RG019i001p00091)",
  write: ({ temperature }) => straightLine({ temperature, intercept: 203.3, slope: 2.09, reference: 273.15 }),
});
