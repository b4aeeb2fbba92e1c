// Enclosures of a loop's balance, and of its kinks, as functions of temperature.
import { coneOf } from "../graph/cone.ts";
import { derivative } from "../graph/derivative.ts";
import { inputsOf, rangesOf } from "../loop/inputs.ts";
import { kept } from "../loop/kept.ts";
import type { Loop } from "../loop/types.ts";
import { type SpanKernel, spanKernel } from "../reading/spanKernel.ts";
import type { Enclosed } from "../search/enclosed.ts";
import { enclosedBy } from "./enclosedBy.ts";
import { type Shoulders, shouldersOf } from "./shoulders.ts";

/** A balance that can be enclosed over boxes of temperature, for givens that can be set. */
export interface EnclosedBalance {
  readonly net: Enclosed;
  /** For every min(a, b) and max(a, b) behind the balance: a − b, which is zero at the kink; then the leaps. */
  readonly kinks: readonly Enclosed[];
  /** For every step(a) behind the balance: a, which is zero at the leap. */
  readonly leaps: readonly Enclosed[];
  /** For searches of the balance, which write down here where it is to be cut; the guides change with the givens. */
  readonly limits: { effort: number; readonly cuts: number[]; readonly guides: Float64Array };
  /** Sets the values of the givens, in order; `high` differs from `low` where they are intervals. */
  set(low: ArrayLike<number>, high: ArrayLike<number>): void;
}

/** The balance of a loop, made once; whoever reads it sets the givens first. */
export const balanceOf: (loop: Loop) => EnclosedBalance = /* @__PURE__ */ kept((loop) =>
  enclosedBalance(loop),
);

/** Prepares the enclosures of a loop's balance; `wide` are the nodes of the givens that may be intervals. */
export function enclosedBalance(loop: Loop, wide: ReadonlySet<number> = new Set()): EnclosedBalance {
  const { graph, net } = loop;
  const inputs = inputsOf(loop);
  const ranges = rangesOf(loop);
  const slope = (node: number) => derivative(graph, node, inputs[0] as number, inputs);
  const kernels: SpanKernel[] = [];
  const low = new Float64Array(inputs.length);
  const high = new Float64Array(inputs.length);
  const enclosed = (node: number): Enclosed => {
    const first = slope(node);
    const outputs = [node, first];
    const over = [outputs, [slope(first)]];
    const kernel = spanKernel(graph, { inputs, atEnds: outputs, over, wide, ranges });
    kernels.push(kernel);
    return enclosedBy(kernel);
  };
  const behind = coneOf(graph, [net], inputs);
  const pairs = behind.filter((id) => graph.ops[id] === "min" || graph.ops[id] === "max");
  const steps = behind
    .filter((id) => graph.ops[id] === "step")
    .flatMap((id) => graph.args[id] as readonly number[]);
  const differences = new Set(pairs.map((id) => graph.node("sub", graph.args[id] as readonly number[])));
  const leaps = [...new Set(steps)].map(enclosed);
  const kinks = [...[...differences].map(enclosed), ...leaps];
  // a diagram may need the kinks alone
  let whole: { net: Enclosed; shoulders: Shoulders; limits: EnclosedBalance["limits"] } | undefined;
  const wholeOf = () => {
    if (!whole) {
      const shoulders = shouldersOf(loop);
      whole = { net: enclosed(net), shoulders, limits: { effort: 0, cuts: [], guides: shoulders.places } };
      prepare();
    }
    return whole;
  };
  const prepare = (): void => {
    for (let i = 0; i < kernels.length; i++) kernels[i]?.prepare(low, high);
    whole?.shoulders.set(low);
  };
  return {
    ...{ kinks, leaps },
    get net() {
      return wholeOf().net;
    },
    get limits() {
      return wholeOf().limits;
    },
    set(lows, highs) {
      for (let i = 1; i < low.length; i++) {
        low[i] = lows[i - 1] as number;
        high[i] = highs[i - 1] as number;
      }
      prepare();
    },
  };
}
