// Encloses nodes of a loop over boxes of temperature and of one or two givens.
import type { Range } from "../ground/range.ts";
import { inputsOf, rangesOf } from "../loop/inputs.ts";
import type { Loop } from "../loop/types.ts";
import { enclosureKernel } from "../reading/enclosureKernel.ts";
import { rangeAt } from "../search/interval.ts";

/** Nodes over boxes. */
export interface PlaneReader {
  /** Sets the other givens. */
  set(givens: readonly number[]): void;
  /** Bounds of every node over a range of temperature and one of each given, in the order of `places`. */
  over(temperatures: Range, ...parameters: readonly Range[]): Range[];
}

/** The reader of some nodes; `places` are those of the givens that may be intervals, among the loop's givens. */
export function planeReader(loop: Loop, places: readonly number[], outputs: readonly number[]): PlaneReader {
  const inputs = inputsOf(loop);
  const at = [0, ...places.map((p) => p + loop.variables.length)];
  const wide = new Set(at.map((i) => inputs[i] as number));
  const kernel = enclosureKernel(loop.graph, { inputs, outputs, wide, ranges: rangesOf(loop) });
  const [low, high] = [new Float64Array(inputs.length), new Float64Array(inputs.length)];
  const out = new Float64Array(3 * outputs.length);
  return {
    set(givens) {
      low.set(givens, loop.variables.length);
      high.set(givens, loop.variables.length);
    },
    over(...sides) {
      sides.forEach((side, i) => {
        [low[at[i] as number], high[at[i] as number]] = side;
      });
      kernel(low, high, out);
      return outputs.map((_, i) => rangeAt(out, i));
    },
  };
}

/** One place as a range. */
export const pointAt = (x: number): Range => [x, x];
