// Which average over the orbit suits a climate: that of the flux or that of the temperature.

import { inputsOf } from "../loop/inputs.ts";
import { kept } from "../loop/kept.ts";
import type { Loop } from "../loop/types.ts";
import {
  INSTANT_FLUX_INERTIA,
  MEAN_FLUX_INERTIA,
  thermalInertiaRatio,
} from "../orbit/thermalInertiaRatio.ts";
import { slopeKernel } from "../reading/slopeKernel.ts";
import type { State } from "../states/state.ts";
import type { OrbitAveraging } from "./appraisedState.ts";
import { takes } from "./portRange.ts";

/** Reads Σ ∂(cooling)/∂T in a state, W m⁻² K⁻¹. */
const emissionSlopeOf = /* @__PURE__ */ kept((loop: Loop) => {
  const outputs = loop.flows.filter((flow) => flow.sign < 0).map((flow) => flow.node);
  const inputs = inputsOf(loop);
  const kernel = slopeKernel(loop.graph, { inputs, outputs, wrt: [inputs[0] as number] });
  const out = new Float64Array(2 * outputs.length);
  return ({ temperature, givens }: State): number => {
    kernel(Float64Array.of(temperature, ...Object.values(givens)), out);
    return out.subarray(outputs.length).reduce((sum, slope) => sum + slope, 0);
  };
});

/** Π of a state, and what it says. `heatCapacity` in J m⁻² K⁻¹, `period` in s. */
export function orbitAveraging(
  loop: Loop,
  state: State,
  { heatCapacity, period }: { heatCapacity: number | null; period: number | null },
): OrbitAveraging {
  const unknown = (text: string): OrbitAveraging => ({ thermalInertiaRatio: null, favours: null, text });
  if (heatCapacity === null) return unknown("the heat capacity is not known");
  if (period === null) return unknown("the orbital period is not known");
  const emissionSlope = emissionSlopeOf(loop)(state);
  if (!(emissionSlope > 0)) return unknown("emission does not rise with temperature here");
  const ports = { heatCapacity, period, emissionSlope };
  const ranged = Object.entries(ports).every(([port, value]) => takes(thermalInertiaRatio, port, value));
  if (!ranged) return unknown("heat capacity, period or emission is beyond what the law takes");
  const ratio = thermalInertiaRatio(ports);
  const said = (favours: OrbitAveraging["favours"], text: string): OrbitAveraging => ({
    thermalInertiaRatio: ratio,
    favours,
    text,
  });
  if (ratio >= MEAN_FLUX_INERTIA)
    return said("flux", "slow against the orbit, the mean of the flux is the guide");
  if (ratio <= INSTANT_FLUX_INERTIA)
    return said(
      "temperature",
      "prompt, temperature follows the flux of the moment and its own mean is the guide",
    );
  return said(null, "between the cases, neither average is a good guide");
}
