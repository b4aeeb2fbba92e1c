// Proves that two states meet at a kink in a narrow stretch of parameters, and brackets the place.
import { derivative } from "../graph/derivative.ts";
import type { Range } from "../ground/range.ts";
import { inputsOf, rangesOf } from "../loop/inputs.ts";
import type { Loop } from "../loop/types.ts";
import { enclosureKernel } from "../reading/enclosureKernel.ts";
import { enumerateZeros } from "../search/enumerateZeros.ts";
import { rangeAt, signOfRange } from "../search/interval.ts";
import type { EnclosedBalance } from "../states/enclosedBalance.ts";
import type { BranchEnd } from "./diagram.ts";
import { endOf, LINE_EFFORT, middleOf, nearestProved, REACH, type Rest, type Stretch } from "./stretch.ts";

const MOST_ROUNDS = 6;
const MOST_HALVINGS = 60;

/**
 * Left of the kink N falls (or rises) towards it and right of it rises (or falls) away, for all parameters of the stretch: so
 * its extremum lies at the kink. N only rises or only falls with the parameter, so the extremum passes zero once. Where N has
 * one sign all over the kink's bracket there are two states or none. `wide` is a balance for intervals of the parameter.
 */
export function cornerFinder(loop: Loop, place: number, wide: EnclosedBalance) {
  const { graph, net } = loop;
  const inputs = inputsOf(loop);
  const [t, p] = [inputs[0] as number, inputs[loop.variables.length + place] as number];
  const outputs = [net, derivative(graph, net, t, inputs), derivative(graph, net, p, inputs)];
  const kernel = enclosureKernel(graph, { inputs, outputs, wide: new Set([t, p]), ranges: rangesOf(loop) });
  const [low, high] = [new Float64Array(inputs.length), new Float64Array(inputs.length)];
  const out = new Float64Array(3 * outputs.length);
  const signs = (x: Range, y: Range) => {
    [low[0], high[0]] = x;
    [low[1 + place], high[1 + place]] = y;
    kernel(low, high, out);
    return [0, 1, 2].map((i) => signOfRange(rangeAt(out, i))) as [Sign, Sign, Sign];
  };
  /** The bracket of the only kink in a range of temperature, for all parameters of another. */
  const kinkIn = (range: Range, parameters: Range): Range | undefined => {
    const [less, more] = parameters.map((q) => Array.from(low.subarray(1), (v, i) => (i === place ? q : v)));
    wide.set(less as number[], more as number[]);
    const found = wide.kinks.map((kink) => enumerateZeros(kink, range, { effort: LINE_EFFORT }));
    if (found.some((f) => f.undecided.length > 0)) return undefined;
    const [zero, ...others] = found.flatMap((f) => f.zeros);
    return others.length === 0 ? zero?.bracket : undefined;
  };
  /** About where N at a temperature passes zero. */
  const crossing = (x: number, [from, to]: Range): number => {
    const at = (q: number): number => {
      signs([x, x], [q, q]);
      return out[0] as number;
    };
    const rising = at(to) > at(from);
    let [a, b] = [from, to];
    for (let i = 0; i < MOST_HALVINGS; i++) {
      const middle = a + (b - a) / 2;
      if (at(middle) < 0 === rising) a = middle;
      else b = middle;
    }
    return a;
  };
  return (stretch: Stretch, [cool, warm]: Range, rest: Rest): BranchEnd | undefined => {
    const { within, givens } = stretch;
    low.set(givens, 1);
    high.set(givens, 1);
    const box: Range = [cool - REACH * (warm - cool), warm + REACH * (warm - cool)];
    if (!(box[0] > within[0] && box[1] < within[1]) || !rest(stretch, box)) return undefined;
    let parameters = stretch.parameters;
    let end: BranchEnd | undefined;
    for (let i = 0; i < MOST_ROUNDS; i++) {
      const kink = kinkIn(box, parameters);
      if (!kink || !(kink[0] > box[0] && kink[1] < box[1])) return end;
      const [, before] = signs([box[0], kink[0]], parameters);
      const [, after] = signs([kink[1], box[1]], parameters);
      const [, , answer] = signs(box, parameters);
      if (after === 0 || before !== -after || answer === 0) return end;
      // two states lie where N at the kink has the sign against its bend
      const side = answer === after ? 1 : -1;
      const y = crossing(middleOf(kink), parameters);
      const two = nearestProved(y, side > 0 ? -1 : 1, parameters, (q) => signs(kink, [q, q])[0] === -after);
      const none = nearestProved(y, side, parameters, (q) => signs(kink, [q, q])[0] === after);
      const bracket: Range = side > 0 ? [two, none] : [none, two];
      end = endOf("corner", kink, bracket);
      if (!(bracket[1] - bracket[0] < (parameters[1] - parameters[0]) / 2)) break;
      parameters = bracket;
    }
    return end;
  };
}

type Sign = 1 | -1 | 0;
