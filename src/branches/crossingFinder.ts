// Proves that two branches cross where the balance is a product: each factor has its own.
import { derivative } from "../graph/derivative.ts";
import { type Factored, factorsOf } from "../graph/factors.ts";
import type { Range } from "../ground/range.ts";
import { inputsOf } from "../loop/inputs.ts";
import type { Loop } from "../loop/types.ts";
import { minus, over, plus, signOfRange } from "../search/interval.ts";
import type { Meeting } from "./met.ts";
import { planeReader, pointAt } from "./planeReader.ts";
import { endOf, middleOf, nearestProved } from "./stretch.ts";

const MOST_STEPS = 30;

/**
 * N = A·B. Over the box both factors rise or fall with temperature and pass zero between its edges, for all parameters of the
 * stretch: so each has one zero, a(p) and b(p). Their distance only grows or only shrinks with p, and has opposite signs at
 * both ends: so they cross once. There N = N_T = N_p = 0, N_TT = 2·A_T·B_T is not zero, and
 * N_Tp² − N_TT·N_pp = (A_T·B_p − A_p·B_T)² is positive: a transcritical point, at which the two exchange their stability.
 */
export function crossingFinder(loop: Loop, place: number) {
  const inputs = inputsOf(loop);
  const ways = factorsOf(loop.graph, loop.net, inputs[0] as number).map((way) =>
    crossingOf(loop, place, way),
  );
  return (box: Range, parameters: Range, givens: readonly number[]): Meeting | undefined => {
    for (const way of ways) {
      const found = way(box, parameters, givens);
      if (found) return found;
    }
    return undefined;
  };
}

type Factor = readonly [value: Range, byTemperature: Range, byParameter: Range];

function crossingOf(loop: Loop, place: number, { factor, rest }: Factored) {
  const { graph } = loop;
  const inputs = inputsOf(loop);
  const [t, p] = [inputs[0] as number, inputs[loop.variables.length + place] as number];
  const outputs = [factor, rest].flatMap((node) => [
    node,
    ...[t, p].map((x) => derivative(graph, node, x, inputs)),
  ]);
  const plane = planeReader(loop, [place], outputs);
  const read = (x: Range, y: Range): readonly [Factor, Factor] => {
    const all = plane.over(x, y);
    return [all.slice(0, 3), all.slice(3)] as unknown as readonly [Factor, Factor];
  };
  /** Newton's method on A = B = 0. */
  const guess = (x: Range, y: Range): readonly [number, number] => {
    let [u, v] = [middleOf(x), middleOf(y)];
    for (let i = 0; i < MOST_STEPS; i++) {
      const [[a, at, ap], [b, bt, bp]] = read(pointAt(u), pointAt(v)).map((f) =>
        f.map(middleOf),
      ) as unknown as [Three, Three];
      const scale = at * bp - ap * bt;
      u = held(u - (a * bp - b * ap) / scale, x);
      v = held(v - (b * at - a * bt) / scale, y);
    }
    return [u, v];
  };
  return (box: Range, parameters: Range, givens: readonly number[]): Meeting | undefined => {
    plane.set(givens);
    const whole = read(box, parameters);
    const rises = whole.map(([, slope]) => signOfRange(slope));
    const passes = [0, 1].map((end) =>
      read(pointAt(box[end] as number), parameters).map(([value]) => signOfRange(value)),
    );
    if (rises.some((r, i) => r === 0 || passes[1]?.[i] !== r || passes[0]?.[i] !== -r)) return undefined;
    // how the distance a − b changes with the parameter
    const [toA, toB] = whole.map(([, byT, byP]) => minus(over(byP, byT))) as [Range, Range];
    const parts = signOfRange(plus(toA, minus(toB)));
    if (parts === 0) return undefined;
    const zeroOf = (i: 0 | 1, q: number): number => {
      let x = middleOf(box);
      for (let step = 0; step < MOST_STEPS; step++) {
        const [value, slope] = (read(pointAt(x), pointAt(q))[i] as Factor).map(middleOf) as [number, number];
        x = held(x - value / slope, box);
      }
      return x;
    };
    /** The sign of a − b: proved by a temperature between the two. */
    const order = (q: number): number => {
      const between = (zeroOf(0, q) + zeroOf(1, q)) / 2;
      const [beyondA, beyondB] = read(pointAt(between), pointAt(q)).map(
        ([v], i) => signOfRange(v) * (rises[i] as number),
      );
      return beyondA === 0 || beyondA !== -(beyondB as number) ? 0 : (beyondB as number);
    };
    const [x, y] = guess(box, parameters);
    const bracket = [-1, 1].map((side) =>
      nearestProved(y, side as 1 | -1, parameters, (q) => order(q) === side * parts),
    );
    if (order(bracket[0] as number) !== -parts || order(bracket[1] as number) !== parts) return undefined;
    const atBracket: Range = [bracket[0] as number, bracket[1] as number];
    // the crossing is a zero of A as well as of B
    const away = (side: 1 | -1) => (u: number) =>
      read(pointAt(u), atBracket).some(([v], i) => signOfRange(v) === side * (rises[i] as number));
    const cold = nearestProved(x, -1, box, away(-1));
    const hot = nearestProved(x, 1, box, away(1));
    return { kind: "crossing", end: endOf("transcritical", [cold, hot], atBracket, x, y) };
  };
}

type Three = readonly [number, number, number];

const held = (x: number, [low, high]: Range): number => (x > low ? (x < high ? x : high) : low);
