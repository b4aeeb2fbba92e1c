// One step along a branch, proved in a dozen readings; where it does not succeed nothing is known.
import { derivative } from "../graph/derivative.ts";
import type { Range } from "../ground/range.ts";
import { inputsOf, rangesOf } from "../loop/inputs.ts";
import { kept } from "../loop/kept.ts";
import type { Loop } from "../loop/types.ts";
import { enclosureKernel } from "../reading/enclosureKernel.ts";
import { above, below, type Sign, signOf } from "../search/enclosed.ts";
import { roundoffAt } from "../search/roundoff.ts";
import type { Located } from "../states/located.ts";

/** A state and the givens before and after; the bracket holds the state. */
export interface Step {
  readonly before: ArrayLike<number>;
  readonly after: ArrayLike<number>;
  readonly temperature: number;
  readonly bracket: Range;
  readonly within: Range;
}

/** The state of the same branch after the step, if that is proved at once. */
export type QuickStep = (step: Step) => Located | undefined;

/** The box reaches so far beyond both temperatures, as a share of their distance and of the temperature. */
const SPREAD = 0.25;
const LEAST_REACH = 1e-10;
const MOST_NEWTON = 8;
const MOST_WIDENINGS = 4;
/** After a Newton step this small, relative to the place, the next is below rounding. */
const CONVERGED = 1e-9;

/**
 * Steps of a loop in which the givens at some places (as text, joined) change. Over a box of temperatures and the whole
 * path λ has one proved sign, and N has proved, opposite signs along both edges: so there is exactly one state in the box all
 * the way. The signs at the ends of the bracket say that it is the one that was given.
 */
export const quickStepOf = /* @__PURE__ */ kept((loop, changed) => quickStep(loop, changed));

function quickStep(loop: Loop, changed: string): QuickStep {
  const inputs = inputsOf(loop);
  const temperature = inputs[0] as number;
  const outputs = [loop.net, derivative(loop.graph, loop.net, temperature, inputs)];
  const ranges = rangesOf(loop);
  const moving = changed === "" ? [] : changed.split(",").map((i) => inputs[Number(i) + 1] as number);
  const over = (wide: readonly number[]) =>
    enclosureKernel(loop.graph, { inputs, outputs, ranges, wide: new Set(wide) });
  const [box, edge, point] = [over([temperature, ...moving]), over(moving), over([])];
  const [low, high, at] = [0, 0, 0].map(() => new Float64Array(inputs.length)) as [Values, Values, Values];
  const out = new Float64Array(6);
  const edgeSign = (x: number): Sign => {
    low[0] = x;
    high[0] = x;
    edge(low, high, out);
    return signOf(out[0] as number, out[1] as number, out[2] as number);
  };
  const pointSign = (x: number): Sign => {
    at[0] = x;
    point(at, at, out);
    return signOf(out[0] as number, out[1] as number, out[2] as number);
  };
  /** The nearest place on a side of x with a proved sign, at most a few noises away. */
  const proved = (x: number, gap: number, sign: Sign): number => {
    let reach = gap;
    for (let i = 0; i < MOST_WIDENINGS; i++, reach *= 3) if (pointSign(x + reach) === sign) return x + reach;
    return Number.NaN;
  };
  const set = (to: Values, values: ArrayLike<number>): void => {
    for (let i = 1; i < to.length; i++) to[i] = values[i - 1] as number;
  };
  return ({ before, after, temperature: start, bracket, within }) => {
    set(at, before);
    const sign = pointSign(bracket[1]);
    if (sign === 0 || pointSign(bracket[0]) !== -sign) return undefined;
    set(at, after);
    let x = start;
    for (let i = 0; ; i++) {
      if (i === MOST_NEWTON) return undefined;
      pointSign(x);
      const step = ((out[0] as number) + (out[1] as number)) / ((out[3] as number) + (out[4] as number));
      x -= step;
      if (!(Math.abs(step) > CONVERGED * x)) break;
    }
    const reach = SPREAD * Math.abs(x - start) + LEAST_REACH * x;
    const bottom = Math.min(x, bracket[0]) - reach;
    const top = Math.max(x, bracket[1]) + reach;
    if (!(bottom >= within[0] && top <= within[1])) return undefined;
    for (let i = 1; i < low.length; i++) {
      const [p, q] = [before[i - 1] as number, after[i - 1] as number];
      low[i] = Math.min(p, q);
      high[i] = Math.max(p, q);
    }
    if (edgeSign(top) !== sign || edgeSign(bottom) !== -sign) return undefined;
    low[0] = bottom;
    high[0] = top;
    box(low, high, out);
    if (signOf(out[3] as number, out[4] as number, out[5] as number) !== sign) return undefined;
    pointSign(x);
    const [net, netTop, error, slope, slopeTop] = out as unknown as [number, number, number, number, number];
    const imbalance = above(Math.max(error - net, netTop + error));
    const lambda = slope + (slopeTop - slope) / 2;
    const gap = roundoffAt(x) + (1.25 * imbalance) / Math.abs(lambda);
    const ends: Range = [proved(x, -gap, -sign as Sign), proved(x, gap, sign)];
    if (!(ends[0] >= bottom && ends[1] <= top)) return undefined;
    set(low, after);
    set(high, after);
    low[0] = ends[0];
    high[0] = ends[1];
    box(low, high, out);
    const [, , , least, greatest, slack] = out as unknown as [0, 0, 0, number, number, number];
    const stability = sign < 0 ? "stable" : "unstable";
    const bounds: Range = [below(least - slack), above(greatest + slack)];
    return { at: x, bracket: ends, stability, lambda, slope: bounds, imbalance };
  };
}

type Values = Float64Array;
