// Which average over the orbit suits a climate: that of the flux or that of the temperature.

import { inputsOf } from "../loop/inputs.ts";
import { kept } from "../loop/kept.ts";
import type { Loop } from "../loop/types.ts";
import { thermalInertiaRatio } from "../orbit/thermalInertiaRatio.ts";
import { slopeKernel } from "../reading/slopeKernel.ts";
import type { State } from "../states/state.ts";
import type { OrbitAveraging } from "./appraisal.ts";

/** Above this Π the mean flux is the better guide, below the other the temperature of the moment (Ji et al. 2023). */
const SLOW = 1;
const PROMPT = 0.01;

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
  if (heatCapacity === null) return unknown("the heat capacity is not given");
  if (period === null) return unknown("the orbital period is not known");
  const emissionSlope = emissionSlopeOf(loop)(state);
  if (!(emissionSlope > 0)) return unknown("emission does not rise with temperature here");
  const ratio = thermalInertiaRatio({ heatCapacity, period, emissionSlope });
  if (ratio >= SLOW)
    return {
      thermalInertiaRatio: ratio,
      favours: "flux",
      text: "slow against the orbit: the mean flux decides",
    };
  if (ratio <= PROMPT)
    return {
      thermalInertiaRatio: ratio,
      favours: "temperature",
      text: "prompt: temperature follows the flux",
    };
  return {
    thermalInertiaRatio: ratio,
    favours: null,
    text: "between the cases: neither average is a good guide",
  };
}
