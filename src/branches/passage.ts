// Proves what happens in a narrow stretch of parameters between two numbers of states: a fold, or a state that leaves the range.
import { derivative } from "../graph/derivative.ts";
import type { Range } from "../ground/range.ts";
import { inputsOf } from "../loop/inputs.ts";
import type { Loop } from "../loop/types.ts";
import { enclosureKernel } from "../reading/enclosureKernel.ts";
import { enumerateZeros } from "../search/enumerateZeros.ts";
import { roundoffAt } from "../search/roundoff.ts";
import { enclosedBalance, rangesOf } from "../states/enclosedBalance.ts";
import { enumerateBalance } from "../states/provedSearch.ts";
import { balanceOf } from "./balanceOf.ts";
import type { BranchEnd } from "./diagram.ts";
import { meet, rangeAt, signOfRange } from "./interval.ts";
import { kept } from "./kept.ts";
import { lineOf } from "./line.ts";

/** A stretch of parameters, the temperatures of the one or two states that one side has and the other not, and how many go on. */
export interface Stretch {
  readonly parameters: Range;
  readonly temperatures: readonly number[];
  readonly others: number;
  readonly within: Range;
  readonly givens: readonly number[];
}

/** The end of the branches of these states, if it is proved that nothing else happens in the stretch. */
export type Passage = (stretch: Stretch) => BranchEnd | undefined;

const REST_EFFORT = 400;
const LINE_EFFORT = 200;
const MOST_STEPS = 20;
/** How far the box of a fold reaches beyond its two states, as a share of their distance. */
const REACH = 1;
/** The least distance from the end of the range to which a leaving state is looked at, K. */
const LEAST_MARGIN = 1e-6;

/** Prepares the proofs for a loop along one of its givens. */
export const passageOf = /* @__PURE__ */ kept<Passage>((loop, along) => {
  const place = loop.givens.findIndex((g) => g.name === along);
  const rest = restCounter(loop, place);
  const fold = foldFinder(loop, place);
  const exit = exitFinder(loop, place);
  return (stretch) => {
    const [first, second] = stretch.temperatures as [number, number?];
    return second === undefined ? exit(stretch, first, rest) : fold(stretch, [first, second], rest);
  };
});

/** True if exactly `others` states are proved outside of a stretch of temperatures for all parameters. */
type Rest = (stretch: Stretch, except: Range) => boolean;

function restCounter(loop: Loop, place: number): Rest {
  const balance = enclosedBalance(loop, new Set([loop.givens[place]?.node as number]));
  return ({ parameters, others, within, givens }, [from, to]) => {
    const [low, high] = parameters.map((p) => givens.map((v, i) => (i === place ? p : v)));
    balance.set(low as number[], high as number[]);
    let count = 0;
    for (const range of [[within[0], from] as const, [to, within[1]] as const]) {
      if (!(range[0] < range[1])) continue;
      const { zeros, undecided } = enumerateBalance(balance, range, REST_EFFORT);
      if (undecided.length > 0) return false;
      count += zeros.length;
    }
    return count === others;
  };
}

/**
 * Over the temperatures around both states and all parameters of the stretch N bends one way, so it has at most two zeros,
 * and it only rises or only falls with the parameter, so its extremum passes zero once: there is exactly one fold. Its place
 * is bracketed by a parameter with two states and one with none.
 */
function foldFinder(loop: Loop, place: number) {
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
    const box = meet([cool - REACH * (warm - cool), warm + REACH * (warm - cool)], within);
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

/** The nearest place on a side where something is proved; at last the end of the range, where it is known. */
function nearestProved(at: number, side: 1 | -1, [low, high]: Range, proved: (x: number) => boolean): number {
  let gap = roundoffAt(at);
  for (let x = at + side * gap; x > low && x < high; gap *= 4, x = at + side * gap) if (proved(x)) return x;
  return side > 0 ? high : low;
}

const held = (x: number, [low, high]: Range): number => (x > low ? (x < high ? x : high) : low);

function exitFinder(loop: Loop, place: number) {
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
    const fine = widthOf(parameters);
    const { zeros, undecided } = enumerateZeros(line, parameters, { effort: LINE_EFFORT, fine });
    const [zero] = zeros;
    if (!zero || zeros.length > 1 || undecided.length > 0) return undefined;
    return endOf("within", [edge, edge], zero.bracket);
  };
}

const middleOf = (r: Range): number => r[0] + (r[1] - r[0]) / 2;
const widthOf = (r: Range): number => r[1] - r[0];

const endOf = (
  kind: BranchEnd["kind"],
  temperatures: Range,
  parameters: Range,
  temperature = middleOf(temperatures),
  at = middleOf(parameters),
): BranchEnd =>
  Object.freeze({
    ...{ kind, at, temperature },
    atBracket: Object.freeze([parameters[0], parameters[1]] as const),
    temperatureBracket: Object.freeze([temperatures[0], temperatures[1]] as const),
  });
