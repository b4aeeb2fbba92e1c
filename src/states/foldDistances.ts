// How far each given is from the fold at which an undecided pair of states would merge.

import { derivative } from "../graph/derivative.ts";
import type { Range } from "../ground/range.ts";
import { inputsOf, rangesOf } from "../loop/inputs.ts";
import type { Loop } from "../loop/types.ts";
import { type EnclosureKernel, enclosureKernel } from "../reading/enclosureKernel.ts";
import { minus, over, rangeAt } from "../search/interval.ts";
import type { Undecided } from "./state.ts";

/** Distances for the givens' values, an interval of temperature, and the proved bounds of N there. */
export type FoldDistances = (
  givens: readonly number[],
  fold: { readonly interval: Range; readonly enclosure: Range },
) => Undecided["distances"];

/** −N/(∂N/∂p) over the interval for every given p, to first order; the kernel is made when it is first needed. */
export function foldDistances(loop: Loop): FoldDistances {
  const { graph, net, givens } = loop;
  const inputs = inputsOf(loop);
  let kernel: EnclosureKernel | undefined;
  return (values, { interval, enclosure }) => {
    kernel ??= enclosureKernel(graph, {
      inputs,
      outputs: givens.map((p) => derivative(graph, net, p.node, inputs)),
      wide: new Set([inputs[0] as number]),
      ranges: rangesOf(loop),
    });
    const out = new Float64Array(3 * givens.length);
    kernel(Float64Array.of(interval[0], ...values), Float64Array.of(interval[1], ...values), out);
    return Object.fromEntries(givens.map(({ name }, i) => [name, minusQuotient(enclosure, rangeAt(out, i))]));
  };
}

/** The range of −a/b; `null` if b may be zero. */
function minusQuotient(a: Range, b: Range): Range | null {
  const quotient = over(minus(a), b);
  return quotient.every(Number.isFinite) ? quotient : null;
}
