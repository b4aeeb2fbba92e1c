// Proves that two states meet at a kink in a narrow stretch of parameters, and brackets the place.
import { derivative } from "../graph/derivative.ts";
import type { Range } from "../ground/range.ts";
import { inputsOf } from "../loop/inputs.ts";
import type { Loop } from "../loop/types.ts";
import { enumerateZeros } from "../search/enumerateZeros.ts";
import { minus, over, plus, signOfRange, times } from "../search/interval.ts";
import type { EnclosedBalance } from "../states/enclosedBalance.ts";
import { kinkNodes } from "../states/kinkNodes.ts";
import type { BranchEnd } from "./diagram.ts";
import { type PlaneReader, planeReader, pointAt } from "./planeReader.ts";
import { endOf, LINE_EFFORT, middleOf, nearestProved, REACH, type Rest, type Stretch } from "./stretch.ts";
import { withoutKinks } from "./withoutKinks.ts";

const MOST_HALVINGS = 60;
const MOST_STEPS = 20;

/**
 * A kink is where the two arguments of a min or max are equal; it may move with the parameter, k(p). On either side of it N is
 * one of two balances without this kink. Left of it N falls (or rises) towards it and right of it rises (or falls) away, for all
 * parameters of the stretch: so its extremum lies at the kink. N(k(p), p) only rises or only falls with the parameter, so the
 * extremum passes zero once. `wide` is a balance for intervals of the parameter.
 */
export function cornerFinder(loop: Loop, place: number, wide: EnclosedBalance) {
  const kinks = kinkReaders(loop, place);
  /** The only kink in a range of temperature, for all parameters of another. */
  const kinkIn = (range: Range, parameters: Range, givens: readonly number[]) => {
    const [less, more] = parameters.map((q) => givens.map((v, i) => (i === place ? q : v)));
    wide.set(less as number[], more as number[]);
    const found = wide.kinks.map((kink) => enumerateZeros(kink, range, { effort: LINE_EFFORT }));
    if (found.some((f) => f.undecided.length > 0)) return undefined;
    const [zero, ...others] = found.flatMap(({ zeros }, which) => zeros.map((z) => ({ ...z, which })));
    return others.length === 0 ? zero : undefined;
  };
  return (stretch: Stretch, [cool, warm]: Range, rest: Rest): BranchEnd | undefined => {
    const { within, givens, parameters } = stretch;
    const box: Range = [cool - REACH * (warm - cool), warm + REACH * (warm - cool)];
    if (!(box[0] > within[0] && box[1] < within[1]) || !rest(stretch, box)) return undefined;
    const zero = kinkIn(box, parameters, givens);
    const reader = zero && kinks[zero.which];
    if (!reader || !(zero.bracket[0] > box[0] && zero.bracket[1] < box[1])) return undefined;
    reader.set(givens);
    const kink: Range = zero.bracket;
    const [left, right] = zero.direction > 0 ? (["less", "more"] as const) : (["more", "less"] as const);
    const before = signOfRange(reader.over([box[0], kink[1]], parameters)[left].slope);
    const after = signOfRange(reader.over([kink[0], box[1]], parameters)[right].slope);
    const here = reader.over(kink, parameters);
    const moves = minus(over(here.kink.answer, here.kink.slope));
    const answer = signOfRange(plus(here[left].answer, times(here[left].slope, moves)));
    if (after === 0 || before !== -after || answer === 0) return undefined;
    /** The sign of N all over the kink's bracket at one parameter. */
    const signAt = (q: number): number => {
      const bracket = kinkIn(box, pointAt(q), givens)?.bracket;
      reader.set(givens);
      return bracket ? signOfRange(reader.over(bracket, pointAt(q))[left].value) : 0;
    };
    // two states lie where N at the kink has the sign against its bend
    const side = answer === after ? 1 : -1;
    const y = crossing(reader, left, middleOf(kink), parameters);
    const two = nearestProved(y, side > 0 ? -1 : 1, parameters, (q) => signAt(q) === -after);
    const none = nearestProved(y, side, parameters, (q) => signAt(q) === after);
    const atBracket: Range = side > 0 ? [two, none] : [none, two];
    return endOf("corner", kinkIn(box, atBracket, givens)?.bracket ?? kink, atBracket, undefined, y);
  };
}

interface Arm {
  readonly value: Range;
  /** Slopes in temperature and in the parameter. */
  readonly slope: Range;
  readonly answer: Range;
}

/** The difference of the arguments of a kink, and N where it is `less` than zero and where it is `more`. */
interface KinkReader {
  readonly set: PlaneReader["set"];
  over(
    temperatures: Range,
    parameters: Range,
  ): { readonly kink: Arm; readonly less: Arm; readonly more: Arm };
}

/** A reader for each kink of a balance, in the order of `EnclosedBalance.kinks`. */
function kinkReaders(loop: Loop, place: number): KinkReader[] {
  const { graph } = loop;
  const inputs = inputsOf(loop);
  const [t, p] = [inputs[0] as number, inputs[loop.variables.length + place] as number];
  return kinkNodes(loop).map((kink) => {
    const sides = [true, false].map((less) => withoutKinks(loop, [{ kink, less }]));
    const outputs = [kink.node, ...sides].flatMap((node) => [
      node,
      ...[t, p].map((x) => derivative(graph, node, x, inputs)),
    ]);
    const plane = planeReader(loop, [place], outputs);
    return {
      set: plane.set,
      over(temperatures, parameters) {
        const all = plane.over(temperatures, parameters);
        const arm = (i: number): Arm => {
          const [value, slope, answer] = all.slice(i, i + 3) as [Range, Range, Range];
          return { value, slope, answer };
        };
        return { kink: arm(0), less: arm(3), more: arm(6) };
      },
    };
  });
}

/** About where N at the kink passes zero. */
function crossing(reader: KinkReader, side: "less" | "more", near: number, [from, to]: Range): number {
  const at = (q: number): number => {
    let x = near;
    for (let i = 0; i < MOST_STEPS; i++) {
      const { value, slope } = reader.over(pointAt(x), pointAt(q)).kink;
      const step = middleOf(value) / middleOf(slope);
      x -= step;
      if (!(Math.abs(step) > 1e-15 * Math.abs(x))) break;
    }
    return middleOf(reader.over(pointAt(x), pointAt(q))[side].value);
  };
  const rising = at(to) > at(from);
  let [a, b] = [from, to];
  for (let i = 0; i < MOST_HALVINGS; i++) {
    const middle = a + (b - a) / 2;
    if (at(middle) < 0 === rising) a = middle;
    else b = middle;
  }
  return a;
}
