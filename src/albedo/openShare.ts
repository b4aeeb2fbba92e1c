// The share of open surface between two temperatures, clamped: what the ramps have in common.
import type { Quantity, Value } from "../graph/node.ts";
import { div, max, min, sub } from "../graph/operations.ts";
import { ALBEDO, TEMPERATURE } from "../law/ports.ts";

/** Ports of an albedo that changes between two temperatures. */
export const RAMP_PORTS = {
  temperature: TEMPERATURE,
  cold: { ...ALBEDO, symbol: "α_c", about: "albedo of the frozen planet" },
  warm: { ...ALBEDO, symbol: "α_w", about: "albedo of the open planet" },
  frozenBelow: { ...TEMPERATURE, symbol: "T_f", about: "all frozen below" },
  openAbove: { ...TEMPERATURE, symbol: "T_o", about: "all open above" },
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
