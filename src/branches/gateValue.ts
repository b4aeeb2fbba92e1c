// The value of a gate and the way back: which parameter gives it.
import { derivative } from "../graph/derivative.ts";
import { fail } from "../ground/errors.ts";
import type { Range } from "../ground/range.ts";
import { inputsOf } from "../loop/inputs.ts";
import type { Loop } from "../loop/types.ts";
import { valueKernel } from "../reading/valueKernel.ts";
import type { Sign } from "../search/enclosed.ts";
import { rangeAt } from "../search/interval.ts";
import { roundoffAt } from "../search/roundoff.ts";
import { type Line, lineOf } from "./line.ts";

/** A gate as a function of the parameter. */
export interface GateValue {
  /** Sets the other givens; false if the gate is not proved to rise or fall throughout the range. */
  set(givens: readonly number[], between: Range): boolean;
  /** 1: it rises with the parameter; −1: it falls. */
  direction(): Sign;
  /** Proved bounds of the gate at a parameter. */
  valueAt(parameter: number): Range;
  /** The parameter for a value of the gate, not proved. */
  inverse(value: number): number;
  /** Proved bounds of the parameters for values in [low, high], inside the range that was set. */
  inverseOver(low: number, high: number): Range;
}

/** A range is halved so often until the slope of the gate is proved on each part. */
const MOST_HALVINGS = 12;
const MOST_STEPS = 80;
const MOST_WIDENINGS = 60;

/** The gate that is the parameter itself. */
export const sameValue: GateValue = {
  set: () => true,
  direction: () => 1,
  valueAt: (p) => [p, p],
  inverse: (x) => x,
  inverseOver: (a, b) => [a, b],
};

/** A gate that is a function of the parameter; `along` is the place of the parameter among the loop's inputs. */
export function gateValue(loop: Loop, node: number, along: number): GateValue {
  const inputs = inputsOf(loop);
  const line = lineOf(loop, node, along);
  const slope = derivative(loop.graph, node, inputs[along] as number, inputs);
  const kernel = valueKernel(loop.graph, { inputs, outputs: [node, slope] });
  const out = new Float64Array(9);
  let [from, to]: Range = [0, 1];
  let rising = true;
  const read = (p: number): void => {
    line.values[along] = p;
    kernel(line.values, out);
  };
  const inverse = (value: number): number => {
    let [low, high] = [from, to];
    let p = low + (high - low) / 2;
    for (let i = 0; i < MOST_STEPS && low < high; i++) {
      read(p);
      const excess = (out[0] as number) - value;
      if (excess === 0) return p;
      if (excess < 0 === rising) low = p;
      else high = p;
      const newton = p - excess / (out[1] as number);
      const next = newton >= low && newton <= high ? newton : low + (high - low) / 2;
      if (Math.abs(next - p) <= roundoffAt(p)) return next;
      p = next;
    }
    return p;
  };
  /** The nearest parameter on one side of p at which the gate is proved to lie beyond a value; at last the end. */
  const beyond = (p: number, value: number, side: 1 | -1): number => {
    const end = side > 0 ? to : from;
    let gap = roundoffAt(p);
    for (let i = 0; i < MOST_WIDENINGS; i++, gap *= 3) {
      const x = p + side * gap;
      if (!(x > from && x < to)) break;
      line.point(x, out);
      const [lo, hi, err] = out as unknown as [number, number, number];
      if (side > 0 === rising ? lo - err > value : hi + err < value) return x;
    }
    return end;
  };
  return {
    set(givens, between) {
      line.values.set(givens, 1);
      [from, to] = between;
      const sign = slopeSign(line, between, out, MOST_HALVINGS);
      rising = sign > 0;
      return sign !== 0;
    },
    direction: () => (rising ? 1 : -1),
    valueAt(p) {
      line.point(p, out);
      return rangeAt(out, 0);
    },
    inverse,
    inverseOver(low, high) {
      if (!(low <= high)) return [Number.NaN, Number.NaN];
      const [first, last] = rising ? [low, high] : [high, low];
      return [beyond(inverse(first), first, -1), beyond(inverse(last), last, 1)];
    },
  };
}

/** The proved sign of the slope of a line over a range; 0 where it is not proved. */
function slopeSign(line: Line, [a, b]: Range, out: Float64Array, halvings: number): 1 | -1 | 0 {
  line.box(a, b, out);
  const [, , , low, high, error] = out as unknown as [0, 0, 0, number, number, number];
  if (low - error > 0 && high + error < Number.POSITIVE_INFINITY) return 1;
  if (high + error < 0 && low - error > Number.NEGATIVE_INFINITY) return -1;
  if (halvings === 0) return 0;
  const middle = a + (b - a) / 2;
  const left = slopeSign(line, [a, middle], out, halvings - 1);
  return left !== 0 && left === slopeSign(line, [middle, b], out, halvings - 1) ? left : 0;
}

/** The place of a given among the inputs of its loop. */
export function placeOf(loop: Loop, name: string): number {
  const index = loop.givens.findIndex((g) => g.name === name);
  if (index < 0) fail("unknown-name", { path: name, value: name, allowed: "a given of the loop" });
  return loop.variables.length + index;
}
