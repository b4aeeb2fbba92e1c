// Tells how two states meet near a saddle of the balance: whether their branches turn back, pass by, or cross.
import { derivative } from "../graph/derivative.ts";
import type { Range } from "../ground/range.ts";
import { inputsOf } from "../loop/inputs.ts";
import type { Loop } from "../loop/types.ts";
import { above, below } from "../search/enclosed.ts";
import { minus, plus, signOfRange, times } from "../search/interval.ts";
import type { Meeting } from "./met.ts";
import { planeReader, pointAt } from "./planeReader.ts";
import { endOf, middleOf, nearestProved } from "./stretch.ts";

const MOST_STEPS = 30;

/**
 * Over the box s·N (s = 1 or −1) is convex in temperature and falls from one edge and rises to the other, for all
 * parameters: it has one least value m(p), and two states lie where m < 0. N_Tp² − N_TT·N_pp > 0 says that m is strictly
 * concave in p. So there are two states throughout (m < 0), or none between two folds (m > 0 somewhere), or, where m just
 * touches zero, one point at which both branches cross and exchange their stability. A number that is zero to within
 * rounding cannot be proved to be zero: then what is known is that no other of these three can be told from a crossing.
 */
export function saddleFinder(loop: Loop, place: number) {
  const { graph, net } = loop;
  const inputs = inputsOf(loop);
  const [t, p] = [inputs[0] as number, inputs[loop.variables.length + place] as number];
  const by = (node: number, x: number) => derivative(graph, node, x, inputs);
  const [slope, answer] = [by(net, t), by(net, p)];
  const plane = planeReader(loop, [place], [net, slope, answer, by(slope, t), by(slope, p), by(answer, p)]);
  const read = (x: Range, y: Range) => plane.over(x, y) as unknown as Read;
  /** Newton's method on N_T = N_p = 0. */
  const guess = (x: Range, y: Range): readonly [number, number] => {
    let [u, v] = [middleOf(x), middleOf(y)];
    for (let i = 0; i < MOST_STEPS; i++) {
      const [, nt, np, tt, tp, pp] = read(pointAt(u), pointAt(v)).map(middleOf) as unknown as Six;
      const scale = tt * pp - tp * tp;
      u = held(u - (nt * pp - np * tp) / scale, x);
      v = held(v - (np * tt - nt * tp) / scale, y);
    }
    return [u, v];
  };
  return (box: Range, parameters: Range, givens: readonly number[]): Meeting | undefined => {
    plane.set(givens);
    const [, , , bend, twist, curve] = read(box, parameters);
    const s = signOfRange(bend);
    if (s === 0 || signOfRange(plus(times(twist, twist), minus(times(bend, curve)))) !== 1) return undefined;
    const [cool, warm] = [0, 1].map((end) => read(pointAt(box[end] as number), parameters)) as [Read, Read];
    const valley = signOfRange(cool[1]) === -s && signOfRange(warm[1]) === s;
    if (!valley || signOfRange(cool[0]) !== s || signOfRange(warm[0]) !== s) return undefined;
    const [x, y] = guess(box, parameters);
    const slopeAt = (u: number, q: Range) => signOfRange(read(pointAt(u), q)[1]);
    const shift = -middleOf(twist) / middleOf(bend);
    /** About the temperature of the least value. */
    const lowest = (q: number): number => held(x + shift * (q - y), box);
    /** Around the temperature of the least value. */
    const bottom = (q: Range): Range => [
      nearestProved(lowest(middleOf(q)), -1, box, (u) => slopeAt(u, q) === -s),
      nearestProved(lowest(middleOf(q)), 1, box, (u) => slopeAt(u, q) === s),
    ];
    const isPositive = (q: number): boolean => signOfRange(read(bottom(pointAt(q)), pointAt(q))[0]) === s;
    const isNegative = (q: number): boolean => signOfRange(read(pointAt(lowest(q)), pointAt(q))[0]) === -s;
    if (isPositive(y)) {
      const ends = ([-1, 1] as const).map((side) => {
        const half: Range = side < 0 ? [parameters[0], y] : [y, parameters[1]];
        const [two, none] = signChange(half, side, isNegative, isPositive);
        const bracket: Range = side < 0 ? [two, none] : [none, two];
        return endOf("fold", bottom(bracket), bracket);
      });
      return {
        kind: "gap",
        at: y,
        ends: ends as unknown as readonly [ReturnType<typeof endOf>, ReturnType<typeof endOf>],
      };
    }
    // a concave function lies below its tangent
    const least = bottom(pointAt(y));
    const tilt = read(least, pointAt(y))[2];
    const most = above(Math.max(-tilt[0], tilt[1]) * above(parameters[1] - parameters[0]));
    const value = read(pointAt(x), pointAt(y))[0];
    if (s > 0 ? above(value[1] + most) < 0 : below(value[0] - most) > 0) return { kind: "apart" };
    return { kind: "near", end: endOf("undecided", least, parameters, x, y) };
  };
}

type Read = readonly [Range, Range, Range, Range, Range, Range];
type Six = readonly [number, number, number, number, number, number];

const held = (x: number, [low, high]: Range): number => (x > low ? (x < high ? x : high) : low);

const MOST_HALVINGS = 100;

/** The nearest two parameters found with proved signs, between the far end (negative) and the near one (positive). */
function signChange(
  [low, high]: Range,
  side: -1 | 1,
  isNegative: (q: number) => boolean,
  isPositive: (q: number) => boolean,
): Range {
  let [two, none] = side < 0 ? [low, high] : [high, low];
  let [outer, inner] = [two, none];
  for (let i = 0; i < MOST_HALVINGS; i++) {
    const middle = outer + (inner - outer) / 2;
    if (middle === outer || middle === inner) break;
    if (isPositive(middle)) none = inner = middle;
    else outer = middle;
  }
  [outer, inner] = [two, none];
  for (let i = 0; i < MOST_HALVINGS; i++) {
    const middle = outer + (inner - outer) / 2;
    if (middle === outer || middle === inner) break;
    if (isNegative(middle)) two = outer = middle;
    else inner = middle;
  }
  return [two, none];
}
