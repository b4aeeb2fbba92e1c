// The curve of a loop whose budget only rises or only falls with the parameter: N(T, p(T)) = 0, solved box by box.
import { derivative } from "../graph/derivative.ts";
import type { Range } from "../ground/range.ts";
import { inputsOf, rangesOf } from "../loop/inputs.ts";
import type { Loop } from "../loop/types.ts";
import { enclosureKernel } from "../reading/enclosureKernel.ts";
import { valueKernel } from "../reading/valueKernel.ts";
import { type Ends, endsOf, type Sign } from "../search/enclosed.ts";
import { meet, minus, over, plus, rangeAt, signOfRange, times } from "../search/interval.ts";
import { roundoffAt } from "../search/roundoff.ts";
import { enclosedNodes } from "../states/enclosedNodes.ts";
import { leapNodes } from "../states/kinkNodes.ts";
import { criticalsOf, signAt } from "./criticals.ts";
import type { Curve } from "./curve.ts";
import { placeOf } from "./gateValue.ts";
import { provedMonotone } from "./monotone.ts";

const MOST_STEPS = 60;
const MOST_NEWTON = 6;
const MOST_WIDENINGS = 12;
/** An interval Newton step must take away this share, or no other is made. */
const WORTHWHILE = 0.1;
const nowhere = (): Range => [Number.NaN, Number.NaN];

/** Prepares the curve along a given. */
export function impliedCurve(loop: Loop, along: string): Curve {
  const { graph, net } = loop;
  const inputs = inputsOf(loop);
  const place = placeOf(loop, along);
  const [temperature, parameter] = [inputs[0] as number, inputs[place] as number];
  const by = (node: number, x: number) => derivative(graph, node, x, inputs);
  const [first, answer] = [by(net, temperature), by(net, parameter)];
  const wide = new Set([temperature, parameter]);
  const ranges = rangesOf(loop);
  const outputs = [net, answer, first, by(first, temperature), by(first, parameter)];
  const kernel = enclosureKernel(graph, { inputs, outputs, wide, ranges });
  const value = valueKernel(graph, { inputs, outputs: [net, answer, first] });
  const nodes = enclosedNodes(loop, new Set([parameter]));
  const leaps = leapNodes(loop).map(nodes.of);
  const [low, high] = [new Float64Array(inputs.length), new Float64Array(inputs.length)];
  const out = new Float64Array(3 * outputs.length);
  const read = new Float64Array(3);
  let between: Range = [0, 1];
  let rising = true;

  const enclose = (t: Range, p: Range): void => {
    [low[0], high[0]] = t;
    [low[place], high[place]] = p;
    kernel(low, high, out);
  };
  const netOver = (t: Range, p: Range): Range => {
    enclose(t, p);
    return rangeAt(out, 0);
  };
  /** Newton's method kept inside the range of the parameter. */
  const at = (t: number): number => {
    let [from, to] = between;
    let p = from + (to - from) / 2;
    low[0] = t;
    for (let i = 0; i < MOST_STEPS; i++) {
      low[place] = p;
      value(low, read);
      const [n, slope] = read as unknown as [number, number];
      if (n === 0) break;
      if (n > 0 === slope > 0) to = p;
      else from = p;
      const newton = p - n / slope;
      const next = newton >= from && newton <= to ? newton : from + (to - from) / 2;
      const settled = Math.abs(next - p) <= roundoffAt(p);
      p = next;
      if (settled) break;
    }
    return p;
  };
  /** Proved bounds of the parameter at one temperature. */
  const near = (t: number): Range => {
    const p = at(t);
    enclose([t, t], [p, p]);
    const [n, slope] = [rangeAt(out, 0), rangeAt(out, 1)];
    let gap =
      roundoffAt(p) + (1.5 * Math.max(n[1], -n[0])) / Math.min(Math.abs(slope[0]), Math.abs(slope[1]));
    for (let i = 0; i < MOST_WIDENINGS; i++, gap *= 3) {
      const [from, to] = meet([p - gap, p + gap], between);
      const before = from <= between[0] || signOfRange(netOver([t, t], [from, from])) === (rising ? -1 : 1);
      const after = to >= between[1] || signOfRange(netOver([t, t], [to, to])) === (rising ? 1 : -1);
      if (before && after) return [from, to];
    }
    return between;
  };
  /** Proved bounds of the parameter over temperatures, by interval Newton steps and by the mean value form. */
  const bounds = (t: Range): Range => {
    if (t[0] === t[1]) return near(t[0]);
    let p = between;
    for (let i = 0; i < MOST_NEWTON; i++) {
      enclose(t, p);
      const slope = rangeAt(out, 1);
      const middle = p[0] + (p[1] - p[0]) / 2;
      const step = minus(over(netOver(t, [middle, middle]), slope));
      const next = meet(p, plus([middle, middle], step));
      if (!(next[0] <= next[1])) return Number.isNaN(step[0]) ? p : nowhere();
      const gained = next[1] - next[0] < (1 - WORTHWHILE) * (p[1] - p[0]);
      p = next;
      if (!gained) break;
    }
    enclose(t, p);
    const slope = minus(over(rangeAt(out, 2), rangeAt(out, 1)));
    const middle = t[0] + (t[1] - t[0]) / 2;
    const reach = times(slope, [t[0] - middle, t[1] - middle]);
    const mean = plus(near(middle), reach);
    return mean[0] <= mean[1] ? meet(p, mean) : p;
  };
  /** λ and its slope along the curve, λ′ = N_TT + N_Tp·p′ with p′ = −λ/N_p. */
  const feedbackOver = (t: Range, into: Float64Array): void => {
    const p = bounds(t);
    enclose(t, p);
    const [answering, feedback] = [rangeAt(out, 1), rangeAt(out, 2)];
    const turning = minus(over(feedback, answering));
    const slope = plus(rangeAt(out, 3), times(rangeAt(out, 4), turning));
    into.set([feedback[0], feedback[1], 0, slope[0], slope[1], 0]);
  };
  const feedback: Ends = endsOf({
    box(a, b, into) {
      feedbackOver([a, b], into);
      // the curvature is not read
      into.fill(Number.NaN, 6, 9);
    },
    point: (t, into) => feedbackOver([t, t], into),
  });
  return {
    method: "monotone",
    reachesBeyond: false,
    signAt: (t) => signAt(feedback, t),
    // p' = -lambda/N_p
    rises: (t) => (signAt(feedback, t) * (rising ? -1 : 1)) as Sign,
    criticals: (t, effort) => criticalsOf({ feedback, kinks: leaps, leaps }, t, effort),
    set(givens, range, within) {
      low.set(givens, 1);
      high.set(givens, 1);
      between = range;
      nodes.set(
        ...(range.map((p) => givens.map((v, i) => (i === place - 1 ? p : v))) as [number[], number[]]),
      );
      const signs = provedMonotone(
        { enclose, net: () => rangeAt(out, 0), answer: () => rangeAt(out, 1) },
        within,
        range,
      );
      rising = signs === 1;
      return signs !== 0;
    },
    at,
    feedbackAt(t) {
      low[0] = t;
      low[place] = at(t);
      value(low, read);
      return read[2] as number;
    },
    over: (a, b) => bounds([a, b]),
  };
}
