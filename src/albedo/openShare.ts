// The share of open surface between two temperatures, clamped: what the ramps have in common.

import { div, max, min, sub } from "../graph/operations.ts";
import type { Quantity, Value } from "../graph/quantity.ts";
import { albedoPort, temperaturePort } from "../law/ports.ts";

/** Port: the temperature below which all is frozen. */
export const FROZEN_BELOW = /* @__PURE__ */ temperaturePort("T_f", "all frozen below");
/** Port: the temperature above which all is open. */
export const OPEN_ABOVE = /* @__PURE__ */ temperaturePort("T_o", "all open above");

/** Ports of an albedo that changes between two temperatures. */
export const RAMP_PORTS = {
  temperature: /* @__PURE__ */ temperaturePort(),
  cold: /* @__PURE__ */ albedoPort("α_c", "albedo of the frozen planet"),
  warm: /* @__PURE__ */ albedoPort("α_w", "albedo of the open planet"),
  frozenBelow: FROZEN_BELOW,
  openAbove: OPEN_ABOVE,
} as const;

type Between = { readonly frozenBelow: Quantity; readonly openAbove: Quantity };

/** The two temperatures must differ and stand in order. */
export const RAMP_DEMANDS = {
  span: {
    unit: "K",
    within: [1e-6, 1e5],
    about: "openAbove − frozenBelow",
    write: ({ frozenBelow, openAbove }: Between) => sub(openAbove, frozenBelow),
  },
} as const;

/** 0 below `frozenBelow`, 1 above `openAbove`, a straight line between. */
export function openShare({
  temperature,
  frozenBelow,
  openAbove,
}: Between & { readonly temperature: Quantity }): Value {
  const along = div(sub(temperature, frozenBelow), sub(openAbove, frozenBelow));
  return min(1, max(0, along));
}
