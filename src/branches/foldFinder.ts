// Proves that two states meet in a fold in a narrow stretch of parameters, and brackets it.
import { derivative } from "../graph/derivative.ts";
import type { Range } from "../ground/range.ts";
import { inputsOf, rangesOf } from "../loop/inputs.ts";
import type { Loop } from "../loop/types.ts";
import { enclosureKernel } from "../reading/enclosureKernel.ts";
import { enumerateZeros } from "../search/enumerateZeros.ts";
import { rangeAt, signOfRange } from "../search/interval.ts";
import { balanceOf } from "../states/enclosedBalance.ts";
import type { BranchEnd } from "./diagram.ts";
import { endOf, LINE_EFFORT, middleOf, nearestProved, REACH, type Rest, type Stretch } from "./stretch.ts";

const MOST_STEPS = 20;

/**
 * Over the temperatures around both states and all parameters of the stretch N bends one way, so it has at most two zeros,
 * and it only rises or only falls with the parameter, so its extremum passes zero once: there is exactly one fold. Its place
 * is bracketed by a parameter with two states and one with none.
 */
export function foldFinder(loop: Loop, place: number) {
  const { graph, net } = loop;
  const inputs = inputsOf(loop);
  const [t, p] = [inputs[0] as number, inputs[loop.variables.length + place] as number];
  const by = (node: number, x: number) => derivative(graph, node, x, inputs);
  const slope = by(net, t);
  const outputs = [net, slope, by(net, p), by(slope, t), by(slope, p)];
  const kernel = enclosureKernel(graph, { inputs, outputs, wide: new Set([t, p]), ranges: rangesOf(loop) });
  const balance = balanceOf(loop);
  const [low, high] = [new Float64Array(inputs.length), new Float64Array(inputs.length)];
  const out = new Float64Array(3 * outputs.length);
  const read = (x: Range, y: Range): Read => {
    [low[0], high[0]] = x;
    [low[1 + place], high[1 + place]] = y;
    kernel(low, high, out);
    return outputs.map((_, i) => rangeAt(out, i)) as unknown as Read;
  };
  /** Newton's method on (N, ∂N/∂T). */
  const guess = (x: Range, y: Range): readonly [number, number] => {
    let [a, b] = [middleOf(x), middleOf(y)];
    for (let i = 0; i < MOST_STEPS; i++) {
      const [n, s, np, st, sp] = read([a, a], [b, b]).map(middleOf) as [
        number,
        number,
        number,
        number,
        number,
      ];
      const scale = s * sp - np * st;
      a = held(a - (n * sp - s * np) / scale, x);
      b = held(b - (s * s - n * st) / scale, y);
    }
    return [a, b];
  };
  /** True if it is proved that no state lies in a range of temperature at a parameter. */
  const isEmpty = (range: Range, parameter: number, givens: readonly number[]): boolean => {
    const set = givens.map((v, i) => (i === place ? parameter : v));
    balance.set(set, set);
    const { zeros, undecided } = enumerateZeros(balance.net, range, { effort: LINE_EFFORT });
    return zeros.length === 0 && undecided.length === 0;
  };
  return (stretch: Stretch, [cool, warm]: Range, rest: Rest): BranchEnd | undefined => {
    const { parameters, within, givens } = stretch;
    low.set(givens, 1);
    high.set(givens, 1);
    const box: Range = [cool - REACH * (warm - cool), warm + REACH * (warm - cool)];
    if (!(box[0] > within[0] && box[1] < within[1])) return undefined;
    const [, , answer, bend] = read(box, parameters);
    const [rises, bends] = [signOfRange(answer), signOfRange(bend)];
    if (rises === 0 || bends === 0 || !rest(stretch, box)) return undefined;
    const [x, y] = guess(box, parameters);
    // two states lie where N at its extremum has the sign against its bend
    const side = rises === bends ? 1 : -1;
    const two = nearestProved(
      y,
      side > 0 ? -1 : 1,
      parameters,
      (q) => signOfRange(read([x, x], [q, q])[0]) === -bends,
    );
    const none = nearestProved(y, side, parameters, (q) => isEmpty(box, q, givens));
    const atBracket: Range = side > 0 ? [two, none] : [none, two];
    const slopeAt = (q: number) => signOfRange(read([q, q], atBracket)[1]);
    const cold = nearestProved(x, -1, box, (q) => slopeAt(q) === -bends);
    const hot = nearestProved(x, 1, box, (q) => slopeAt(q) === bends);
    return endOf("fold", [cold, hot], atBracket, x, y);
  };
}

type Read = readonly [Range, Range, Range, Range, Range];

const held = (x: number, [low, high]: Range): number => (x > low ? (x < high ? x : high) : low);
