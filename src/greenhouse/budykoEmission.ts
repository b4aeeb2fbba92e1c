import { defineLaw } from "../law/defineLaw.ts";
import { outgoingPort, temperaturePort } from "../law/ports.ts";
import { STRAIGHT_RANGE, straightLine } from "./straightLine.ts";

/**
 * Outgoing longwave radiation of the Earth as Budyko drew it, half cloudy: F = 202 + 1.45·(T − 273.15 K), in W m⁻².
 * Surface temperature in K from 0 to 10⁵; fitted to monthly means of stations, so about 230 to 300 K. Errors:
 * as for every law.
 * Source: Budyko 1969, Tellus 21, 611.
 */
export const budykoEmission = /* @__PURE__ */ defineLaw({
  name: "budykoEmission",
  about: "Outgoing longwave radiation of the Earth as Budyko drew it.",
  output: /* @__PURE__ */ outgoingPort(),
  inputs: { temperature: /* @__PURE__ */ temperaturePort() },
  published: { temperature: STRAIGHT_RANGE },
  source: "Budyko 1969, Tellus 21, 611 (doi:10.1111/j.2153-3490.1969.tb00466.x)",
  write: ({ temperature }) => straightLine({ temperature, intercept: 202, slope: 1.45, reference: 273.15 }),
});
