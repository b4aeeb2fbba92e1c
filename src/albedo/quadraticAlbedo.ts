import { mix, square, sub } from "../graph/operations.ts";
import { defineLaw } from "../law/defineLaw.ts";
import { albedoPort } from "../law/ports.ts";
import { openShare, RAMP_DEMANDS, RAMP_PORTS } from "./openShare.ts";

/**
 * Albedo that falls along a parabola: cold below `frozenBelow`, warm above `openAbove`,
 * α = warm + (cold − warm)·((T − openAbove)/(frozenBelow − openAbove))² between: smooth where the ice ends, a kink where
 * all is frozen. Temperatures in K from 0 to 10⁵ (published: 200 to 340), openAbove at least 10⁻⁶ K above
 * frozenBelow; albedos between 0 and 1. Errors: as for every law.
 * Source: Pierrehumbert 2010, Principles of Planetary Climate, ch. 3 (0.6, 0.2, 260 K, 290 K).
 */
export const quadraticAlbedo = /* @__PURE__ */ defineLaw({
  name: "quadraticAlbedo",
  about: "Albedo that falls along a parabola between a frozen and an open planet.",
  output: /* @__PURE__ */ albedoPort(),
  inputs: RAMP_PORTS,
  demands: RAMP_DEMANDS,
  published: { temperature: [200, 340] },
  source: "Pierrehumbert 2010, Principles of Planetary Climate, ch. 3",
  write(ports) {
    const frozen = square(sub(1, openShare(ports)));
    return mix(ports.warm, ports.cold, frozen);
  },
});
