import { sub } from "../graph/operations.ts";
import { defineLaw } from "../law/defineLaw.ts";
import { temperaturePort } from "../law/ports.ts";
import { FROZEN_BELOW, OPEN_ABOVE, openShare, RAMP_DEMANDS } from "./openShare.ts";

/**
 * Share of a surface that ice covers: 1 below `frozenBelow`, 0 above `openAbove`,
 * 1 − (T − frozenBelow)/(openAbove − frozenBelow) between, with a kink at each end. A fraction for `mixAlbedo`, so that
 * ice may cover sea and leave plants alone. Temperatures in K from 0 to 10⁵ (published: 200 to 340),
 * openAbove at least 10⁻⁶ K above frozenBelow. Errors: as for every law.
 * Source: the ramp of Kaper & Engler 2013, Mathematics and Climate (SIAM), read as a cover.
 */
export const iceShare = /* @__PURE__ */ defineLaw({
  name: "iceShare",
  about: "Share of a surface that ice covers.",
  output: { symbol: "f_i", unit: "1", within: [0, 1], about: "share under ice" },
  inputs: {
    temperature: /* @__PURE__ */ temperaturePort(),
    frozenBelow: FROZEN_BELOW,
    openAbove: OPEN_ABOVE,
  },
  demands: RAMP_DEMANDS,
  published: { temperature: [200, 340] },
  source: "ramp of Kaper & Engler 2013, Mathematics and Climate, SIAM",
  write: (ports) => sub(1, openShare(ports)),
});
