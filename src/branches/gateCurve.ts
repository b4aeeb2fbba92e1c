// The curve of a loop whose budget is a straight line in a gate: N = a(T) + b(T)·g(p), so that g = −a(T)/b(T).
import { derivative, Writer } from "../graph/derivative.ts";
import { type Gate, gateOf } from "../graph/gate.ts";
import type { Range } from "../ground/range.ts";
import { inputsOf, rangesOf } from "../loop/inputs.ts";
import type { Loop } from "../loop/types.ts";
import { enclosureKernel } from "../reading/enclosureKernel.ts";
import { valueKernel } from "../reading/valueKernel.ts";
import { above, below } from "../search/enclosed.ts";
import { over, rangeAt } from "../search/interval.ts";
import { balanceOf } from "./balanceOf.ts";
import { criticalsOf, signAt } from "./criticals.ts";
import type { Curve } from "./curve.ts";
import { gateValue, placeOf, sameValue } from "./gateValue.ts";
import { lineOf } from "./line.ts";

/** Stretches wider than this, K, are bounded in parts. */
const WIDE = 1e-3;
const PARTS = 256;

/** The nodes of a gate's curve. */
export interface GateNodes {
  readonly gate: number;
  /** g = −a/b. */
  readonly curve: number;
  /** λ = a′ + b′·g. */
  readonly feedback: number;
  /** b = ∂N/∂g. */
  readonly answer: number;
}

/** The nodes of the curve along a given, if there is a gate. */
export function gateNodes(loop: Loop, along: string): GateNodes | undefined {
  const { graph, net } = loop;
  const inputs = inputsOf(loop);
  const input = inputs[placeOf(loop, along)] as number;
  const unknowns = loop.variables.map((v) => v.node);
  const gate = gateOf(graph, { target: net, input, unknowns });
  if (!gate) return undefined;
  const curve = graph.node("div", [new Writer(graph).neg(gate.offset), gate.slope]);
  const feedback = feedbackOn(loop, gate, curve);
  return { gate: gate.node, curve, feedback, answer: gate.slope };
}

function feedbackOn(loop: Loop, { offset, slope }: Gate, curve: number): number {
  const inputs = inputsOf(loop);
  const w = new Writer(loop.graph);
  const [first, second] = [offset, slope].map((node) =>
    derivative(loop.graph, node, inputs[0] as number, inputs),
  ) as [number, number];
  return w.is(second, 0) ? first : w.add(first, w.mul(second, curve));
}

/** Prepares the curve along a given; undefined where the budget has no gate. */
export function gateCurve(loop: Loop, along: string): Curve | undefined {
  const nodes = gateNodes(loop, along);
  if (!nodes) return undefined;
  const { graph } = loop;
  const inputs = inputsOf(loop);
  const place = placeOf(loop, along);
  const gate = nodes.gate === inputs[place] ? sameValue : gateValue(loop, nodes.gate, place);
  const feedback = lineOf(loop, nodes.feedback, 0);
  const bounds = enclosureKernel(graph, {
    inputs,
    outputs: [nodes.curve, nodes.answer],
    wide: new Set([inputs[0] as number]),
    ranges: rangesOf(loop),
  });
  const kernel = valueKernel(graph, { inputs, outputs: [nodes.curve, nodes.feedback] });
  const { kinks, leaps, set: setKinks } = balanceOf(loop);
  const point = new Float64Array(inputs.length);
  const high = new Float64Array(inputs.length);
  const out = new Float64Array(6);
  const slopes = new Float64Array(9);
  const enclose = (low: number, top: number): void => {
    point[0] = low;
    high[0] = top;
    bounds(point, high, out);
  };
  /** Bounds of the gate: from its enclosure, and from its value in the middle and its slope (mean value form). */
  const valuesOver = (low: number, top: number): Range => {
    enclose(low, top);
    const [plain, answer] = [rangeAt(out, 0), rangeAt(out, 1)];
    // dg/dT = −λ/b
    feedback.box(low, top, slopes);
    const [fall, rise] = over(rangeAt(slopes, 0), answer);
    const reach = above(above(Math.max(-fall, rise) * above(top - low)) / 2);
    const middle = low + (top - low) / 2;
    enclose(middle, middle);
    const [atLow, atHigh] = rangeAt(out, 0);
    const mean: Range = [below(atLow - reach), above(atHigh + reach)];
    return mean[1] - mean[0] < plain[1] - plain[0] ? mean : plain;
  };
  const read = (temperature: number): void => {
    point[0] = temperature;
    kernel(point, out);
  };
  return {
    method: "line",
    reachesBeyond: true,
    signAt: (temperature) => signAt(feedback, temperature),
    criticals: (range, effort) => criticalsOf({ feedback, kinks, leaps }, range, effort),
    set(givens, between) {
      point.set(givens, 1);
      feedback.values.set(givens, 1);
      setKinks(givens, givens);
      return gate.set(givens, between);
    },
    at(temperature) {
      read(temperature);
      return gate.inverse(out[0] as number);
    },
    feedbackAt(temperature) {
      read(temperature);
      return out[1] as number;
    },
    over(low, top) {
      const parts = top - low > WIDE ? PARTS : 1;
      let [least, greatest] = [Number.POSITIVE_INFINITY, Number.NEGATIVE_INFINITY];
      for (let i = 0; i < parts; i++) {
        const [a, b] = [i, i + 1].map((j) => (j === parts ? top : low + ((top - low) * j) / parts));
        const [lo, hi] = valuesOver(a as number, b as number);
        [least, greatest] = [Math.min(least, lo), Math.max(greatest, hi)];
      }
      return gate.inverseOver(least, greatest);
    },
  };
}
