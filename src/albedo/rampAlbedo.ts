import { mix } from "../graph/operations.ts";
import { defineLaw } from "../law/defineLaw.ts";
import { albedoPort } from "../law/ports.ts";
import { openShare, RAMP_DEMANDS, RAMP_PORTS } from "./openShare.ts";

/**
 * Albedo that falls along a straight line: cold below `frozenBelow`, warm above `openAbove`,
 * α = cold + (warm − cold)·(T − frozenBelow)/(openAbove − frozenBelow) between, with a kink at each end.
 * Temperatures in K from 0 to 10⁵ (published: 200 to 340), openAbove at least 10⁻⁶ K above frozenBelow;
 * albedos between 0 and 1. Errors: as for every law.
 * Source: piecewise-linear form as in Kaper & Engler 2013, Mathematics and Climate (SIAM).
 */
export const rampAlbedo = /* @__PURE__ */ defineLaw({
  name: "rampAlbedo",
  about: "Albedo that falls along a straight line between a frozen and an open planet.",
  output: /* @__PURE__ */ albedoPort(),
  inputs: RAMP_PORTS,
  demands: RAMP_DEMANDS,
  published: { temperature: [200, 340] },
  source: "piecewise-linear form, Kaper & Engler 2013, Mathematics and Climate, SIAM",
  write: (ports) => mix(ports.cold, ports.warm, openShare(ports)),
});
