// How far each given is from the fold at which an undecided pair of states would merge.

import { derivative } from "../graph/derivative.ts";
import type { Range } from "../ground/range.ts";
import { inputsOf, rangesOf } from "../loop/inputs.ts";
import { kept } from "../loop/kept.ts";
import type { Loop } from "../loop/types.ts";
import { spanKernel } from "../reading/spanKernel.ts";
import { minus, over, rangeAt } from "../search/interval.ts";
import type { Undecided } from "./state.ts";

/** An interval of temperature, and the proved bounds of N there. */
interface Fold {
  readonly interval: Range;
  readonly enclosure: Range;
}

/** Encloses ∂N/∂p for every given p; made when it is first needed. */
const slopesOf = /* @__PURE__ */ kept((loop) => {
  const { graph, net, givens } = loop;
  const inputs = inputsOf(loop);
  const slopes = givens.map((p) => derivative(graph, net, p.node, inputs));
  return spanKernel(graph, { inputs, atEnds: [], over: [slopes], wide: new Set(), ranges: rangesOf(loop) });
});

/** −N/(∂N/∂p) over the interval for every given p, to first order, for values of the givens. */
export function foldDistances(
  loop: Loop,
  values: readonly number[],
  { interval, enclosure }: Fold,
): Undecided["distances"] {
  const slopes = slopesOf(loop);
  const end = (x: number): Float64Array => {
    const read = new Float64Array(slopes.size).fill(x);
    slopes.point(read);
    return read;
  };
  const at = Float64Array.of(0, ...values);
  const out = new Float64Array(3 * values.length);
  slopes.prepare(at, at);
  slopes.over[0]?.(end(interval[0]), end(interval[1]), out);
  return Object.fromEntries(
    loop.givens.map(({ name }, i) => [name, minusQuotient(enclosure, rangeAt(out, i))]),
  );
}

/** The range of −a/b; `null` if b may be zero. */
function minusQuotient(a: Range, b: Range): Range | null {
  const quotient = over(minus(a), b);
  return quotient.every(Number.isFinite) ? quotient : null;
}
