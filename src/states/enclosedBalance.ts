// Enclosures of a loop's balance, and of its kinks, as functions of temperature.
import { coneOf } from "../graph/cone.ts";
import { derivative } from "../graph/derivative.ts";
import { inputsOf, rangesOf } from "../loop/inputs.ts";
import type { Loop } from "../loop/types.ts";
import { type EnclosureKernel, enclosureKernel } from "../reading/enclosureKernel.ts";
import type { Enclosed } from "../search/enclosed.ts";

/** A balance that can be enclosed over boxes of temperature, for givens that can be set. */
export interface EnclosedBalance {
  readonly net: Enclosed;
  /** For every min(a, b) and max(a, b) behind the balance: a − b, which is zero at the kink. */
  readonly kinks: readonly Enclosed[];
  /** Sets the values of the givens, in order; `high` differs from `low` where they are intervals. */
  set(low: ArrayLike<number>, high: ArrayLike<number>): void;
}

/** Prepares the enclosures of a loop's balance; `wide` are the nodes of the givens that may be intervals. */
export function enclosedBalance(loop: Loop, wide: ReadonlySet<number> = new Set()): EnclosedBalance {
  const { graph, net } = loop;
  const inputs = inputsOf(loop);
  const temperature = inputs[0] as number;
  const ranges = rangesOf(loop);
  const slope = (node: number) => derivative(graph, node, temperature, inputs);
  const steady = new Set(inputs.slice(1));
  const kernels: EnclosureKernel[] = [];
  const low = new Float64Array(inputs.length);
  const high = new Float64Array(inputs.length);
  const enclosed = (node: number): Enclosed => {
    const first = slope(node);
    const over = (outputs: number[], intervals: Iterable<number>): EnclosureKernel => {
      const kernel = enclosureKernel(graph, { inputs, outputs, wide: new Set(intervals), steady, ranges });
      kernels.push(kernel);
      return kernel;
    };
    const box = over([node, first, slope(first)], [temperature, ...wide]);
    const point = over([node, first], wide);
    const read = (kernel: EnclosureKernel, a: number, b: number, out: Float64Array) => {
      low[0] = a;
      high[0] = b;
      kernel(low, high, out);
    };
    return { box: (a, b, out) => read(box, a, b, out), point: (x, out) => read(point, x, x, out) };
  };
  const pairs = coneOf(graph, [net], inputs).filter(
    (id) => graph.ops[id] === "min" || graph.ops[id] === "max",
  );
  const differences = new Set(pairs.map((id) => graph.node("sub", graph.args[id] as readonly number[])));
  return {
    net: enclosed(net),
    kinks: [...differences].map(enclosed),
    set(lows, highs) {
      low.set(lows, 1);
      high.set(highs, 1);
      for (const kernel of kernels) kernel.prepare(low, high);
    },
  };
}
