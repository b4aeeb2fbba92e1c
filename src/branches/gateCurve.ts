// The curve of a loop whose budget is a straight line in a gate: N = a(T) + b(T)·g(p), so that g = −a(T)/b(T).
import { derivative, Writer } from "../graph/derivative.ts";
import { type Gate, gateOf } from "../graph/gate.ts";
import type { Range } from "../ground/range.ts";
import { inputsOf, rangesOf } from "../loop/inputs.ts";
import type { Loop } from "../loop/types.ts";
import { enclosureKernel } from "../reading/enclosureKernel.ts";
import { valueKernel } from "../reading/valueKernel.ts";
import { type Sign, signOf } from "../search/enclosed.ts";
import type { EnclosedBalance } from "../states/enclosedBalance.ts";
import { kinksOf } from "../states/enclosedKinks.ts";
import { criticalsOf, signAt } from "./criticals.ts";
import type { Curve } from "./curve.ts";
import { gateLine } from "./gateLine.ts";
import { gateValue, placeOf, sameValue } from "./gateValue.ts";
import { signOnParts } from "./signOnParts.ts";
import { zeroReader } from "./zeroReader.ts";

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

/** The same where the gate is the given itself: the budget is a straight line in it. */
export function straightNodes(loop: Loop, along: string): GateNodes | undefined {
  const nodes = gateNodes(loop, along);
  return nodes?.gate === inputsOf(loop)[placeOf(loop, along)] ? nodes : undefined;
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
  const line = gateLine(loop, nodes);
  const answer = answerOf(loop, nodes.answer);
  const kernel = valueKernel(graph, { inputs, outputs: [nodes.curve, nodes.feedback] });
  const { kinks, leaps, set: setKinks } = kinksOf(loop);
  const values = new Float64Array(inputs.length);
  const out = new Float64Array(2);
  const set: number[] = [];
  let sign: Sign = 0;
  let gates: Range = [0, 0];
  let readAt = Number.NaN;
  const read = (temperature: number): void => {
    if (temperature === readAt) return;
    readAt = temperature;
    values[0] = temperature;
    kernel(values, out);
  };
  const balance: EnclosedBalance = {
    ...{ net: line.distance, kinks, leaps, limits: { effort: 0, cuts: [], guides: new Float64Array(0) } },
    // the reader sets the line itself
    set() {},
  };
  const reader = zeroReader({
    at(parameter) {
      line.set(set, gate.valueAt(parameter));
      return balance;
    },
    sign: () => sign,
  });
  return {
    method: "line",
    reachesBeyond: true,
    signAt: (temperature) => (signAt(line.slope, temperature) * answer.signAt(temperature)) as Sign,
    // h = g - curve
    rises: (temperature) => (-signAt(line.slope, temperature) * gate.direction()) as Sign,
    criticals: (range, effort) => criticalsOf({ feedback: line.slope, kinks, leaps }, range, effort),
    set(givens, between, within) {
      set.splice(0, set.length, ...givens);
      values.set(givens, 1);
      readAt = Number.NaN;
      setKinks(givens, givens);
      if (!gate.set(givens, between)) return false;
      const [first, last] = between.map(gate.valueAt) as [Range, Range];
      gates = [Math.min(first[0], last[0]), Math.max(first[1], last[1])];
      line.set(givens, first);
      sign = answer.set(givens, within);
      return true;
    },
    reader: () => (sign === 0 ? undefined : reader),
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
      read(low + (top - low) / 2);
      const near = Math.max(gates[0], Math.min(gates[1], out[0] as number));
      if (Number.isFinite(near)) line.set(set, [near, near]);
      let [least, greatest] = [Number.POSITIVE_INFINITY, Number.NEGATIVE_INFINITY];
      for (let i = 0; i < parts; i++) {
        const [a, b] = [i, i + 1].map((j) => (j === parts ? top : low + ((top - low) * j) / parts));
        const [lo, hi] = line.curveOver(a as number, b as number);
        [least, greatest] = [Math.min(least, lo), Math.max(greatest, hi)];
      }
      return gate.inverseOver(least, greatest);
    },
  };
}

/** The sign of b, the answer of N to the gate. */
function answerOf(loop: Loop, node: number) {
  const inputs = inputsOf(loop);
  const wide = new Set([inputs[0] as number]);
  const kernel = enclosureKernel(loop.graph, { inputs, outputs: [node], wide, ranges: rangesOf(loop) });
  const [low, high] = [new Float64Array(inputs.length), new Float64Array(inputs.length)];
  const out = new Float64Array(3);
  const signOver = ([from, to]: Range): Sign => {
    low[0] = from;
    high[0] = to;
    kernel(low, high, out);
    return signOf(out[0] as number, out[1] as number, out[2] as number);
  };
  return {
    signAt: (temperature: number) => signOver([temperature, temperature]),
    /** Sets the givens; the sign over all temperatures of a range, 0 where it is not proved to be one. */
    set(givens: readonly number[], within: Range): Sign {
      low.set(givens, 1);
      high.set(givens, 1);
      return signOnParts(within, signOver);
    },
  };
}
