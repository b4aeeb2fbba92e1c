// The curve of a loop with a law that cannot be enclosed: like that of a gate, but sampled, so nothing is proved.
import { inputsOf } from "../loop/inputs.ts";
import type { Loop } from "../loop/types.ts";
import { valueKernel } from "../reading/valueKernel.ts";
import type { Sign } from "../search/enclosed.ts";
import { scanZeros } from "../search/scanZeros.ts";
import type { Critical } from "./criticals.ts";
import type { Curve } from "./curve.ts";
import { gateNodes } from "./gateCurve.ts";
import { placeOf } from "./gateValue.ts";
import { sampledLine } from "./sampledLine.ts";

/** λ is a difference quotient: below this share of the largest flow, W m⁻² K⁻¹ over W m⁻², it cannot be told from zero. */
const NOISE = 1e-10;

/** Prepares the curve along a given that enters a budget as a straight line; undefined where it does not. */
export function sampledCurve(loop: Loop, along: string): Curve | undefined {
  const nodes = gateNodes(loop, along);
  const inputs = inputsOf(loop);
  if (!nodes || nodes.gate !== inputs[placeOf(loop, along)]) return undefined;
  const kernel = valueKernel(loop.graph, { inputs, outputs: [nodes.curve, nodes.feedback] });
  const line = sampledLine(loop, nodes.feedback, 0, NOISE);
  const out = new Float64Array(2);
  const read = (temperature: number): Float64Array => {
    line.values[0] = temperature;
    kernel(line.values, out);
    return out;
  };
  const at = (temperature: number) => read(temperature)[0] as number;
  const feedbackAt = (temperature: number) => read(temperature)[1] as number;
  return {
    method: "samples",
    reachesBeyond: true,
    set(givens) {
      line.values.set(givens, 1);
      return true;
    },
    at,
    feedbackAt,
    signAt: (temperature) => Math.sign(feedbackAt(temperature)) as Sign,
    rises: () => 0,
    over(low, high) {
      const samples = [low, low + (high - low) / 2, high].map(at);
      return [Math.min(...samples), Math.max(...samples)];
    },
    criticals(range, effort) {
      const { crossings, doubts, evaluations } = scanZeros(line, range, effort);
      const list = [
        ...crossings.map(
          (c): Critical => ({ kind: "fold", decided: true, temperature: c.at, bracket: c.bracket }),
        ),
        ...doubts.map(({ kind, interval }): Critical => {
          const temperature = interval[0] + (interval[1] - interval[0]) / 2;
          return {
            kind: kind === "jump" ? "corner" : kind,
            decided: kind === "jump",
            temperature,
            bracket: interval,
          };
        }),
      ];
      list.sort((a, b) => a.temperature - b.temperature);
      return { list, boxes: 0, points: evaluations };
    },
  };
}
