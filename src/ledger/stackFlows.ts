// The flows between neighbours in a stack of leaky layers.
import type { Streams } from "../greenhouse/stackStreams.ts";
import type { Ledger } from "../states/state.ts";
import type { CheckedStack } from "./readLeakyStack.ts";

type Flow = Ledger["flows"][number];

/** The reservoir of the layer with this index; `layer 1` is the highest. */
export const layerName = (index: number): string => `layer ${index + 1}`;

/** Sunlight, convection and internal heat, then longwave up and down at each interface from the top. */
export function stackFlows(stack: CheckedStack, interfaces: readonly Streams<number>[]): Flow[] {
  const flows: Flow[] = [];
  const put = (name: string, from: string, to: string, value: number, standardName: string | null = null) =>
    flows.push({ name, from, to, value, standardName });
  stack.layers.forEach(({ sunlight }, i) => {
    put(`sunlight to ${layerName(i)}`, "space", layerName(i), sunlight);
  });
  put("sunlight to surface", "space", "surface", stack.sunlight, "surface_net_downward_shortwave_flux");
  stack.layers.forEach(({ convection }, i) => {
    if (convection !== 0) put(`convection to ${layerName(i)}`, "surface", layerName(i), convection);
  });
  if (stack.internalFlux !== 0) put("internal heat", "interior", "surface", stack.internalFlux);
  const last = interfaces.length - 1;
  interfaces.forEach(({ up, down }, i) => {
    const above = i === 0 ? "space" : layerName(i - 1);
    const below = i === last ? "surface" : layerName(i);
    put(`longwave up at ${i}`, below, above, up, upward(i, last));
    // space sends no longwave
    if (i > 0) put(`longwave down at ${i}`, above, below, down, i === last ? DOWNWARD : null);
  });
  return flows;
}

const DOWNWARD = "surface_downwelling_longwave_flux_in_air";

function upward(i: number, last: number): string | null {
  if (i === 0) return "toa_outgoing_longwave_flux";
  return i === last ? "surface_upwelling_longwave_flux_in_air" : null;
}
