// Proves that a state leaves the range of temperature in a narrow stretch of parameters, and brackets the place.
import { derivative } from "../graph/derivative.ts";
import { inputsOf, rangesOf } from "../loop/inputs.ts";
import type { Loop } from "../loop/types.ts";
import { enclosureKernel } from "../reading/enclosureKernel.ts";
import { enumerateZeros } from "../search/enumerateZeros.ts";
import { meet, rangeAt, signOfRange } from "../search/interval.ts";
import type { BranchEnd } from "./diagram.ts";
import { lineOf } from "./line.ts";
import { endOf, LINE_EFFORT, type Rest, type Stretch } from "./stretch.ts";

/** The least distance from the end of the range to which a leaving state is looked at, K. */
const LEAST_MARGIN = 1e-6;

/**
 * Close to the end of the range λ has one sign for all parameters of the stretch, so there is at most one state; at the end N
 * passes zero at one parameter, where the state enters or leaves.
 */
export function exitFinder(loop: Loop, place: number) {
  const { graph, net } = loop;
  const inputs = inputsOf(loop);
  const [t, p] = [inputs[0] as number, inputs[loop.variables.length + place] as number];
  const outputs = [derivative(graph, net, t, inputs)];
  const kernel = enclosureKernel(graph, { inputs, outputs, wide: new Set([t, p]), ranges: rangesOf(loop) });
  const line = lineOf(loop, net, loop.variables.length + place);
  const out = new Float64Array(3);
  return (stretch: Stretch, temperature: number, rest: Rest): BranchEnd | undefined => {
    const { within, parameters, givens } = stretch;
    const cold = temperature - within[0] < within[1] - temperature;
    const edge = cold ? within[0] : within[1];
    const margin = 2 * Math.abs(temperature - edge) + LEAST_MARGIN;
    const near = meet(cold ? [edge, edge + margin] : [edge - margin, edge], within);
    const [low, high] = [0, 1].map((end) =>
      Float64Array.of(
        near[end] as number,
        ...givens.map((v, i) => (i === place ? (parameters[end] as number) : v)),
      ),
    );
    kernel(low as Float64Array, high as Float64Array, out);
    if (signOfRange(rangeAt(out, 0)) === 0 || !rest(stretch, near)) return undefined;
    line.values.set([edge, ...givens]);
    const fine = parameters[1] - parameters[0];
    const { zeros, undecided } = enumerateZeros(line.ends, parameters, { effort: LINE_EFFORT, fine });
    const [zero] = zeros;
    if (!zero || zeros.length > 1 || undecided.length > 0) return undefined;
    return endOf("within", [edge, edge], zero.bracket);
  };
}
