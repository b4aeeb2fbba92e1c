// Encloses h(T) = g − (−a(T)/b(T)), the gate less its curve, which is N/b: it has the zeros of N, and h′ those of λ.
import { derivative } from "../graph/derivative.ts";
import type { Range } from "../ground/range.ts";
import { inputsOf, rangesOf } from "../loop/inputs.ts";
import type { Loop } from "../loop/types.ts";
import { type EnclosureKernel, enclosureKernel } from "../reading/enclosureKernel.ts";
import { type SpanKernel, spanKernel } from "../reading/spanKernel.ts";
import { above, atOnce, type Ends } from "../search/enclosed.ts";
import { minus, plus, rangeAt } from "../search/interval.ts";

/** The gate less its curve, over temperature. */
export interface GateLine {
  readonly distance: Ends;
  /** h′ = λ/b on the curve. */
  readonly slope: Ends;
  /** Sets the givens, in order, and bounds of the gate. */
  set(givens: ArrayLike<number>, gate: Range): void;
  /** Proved bounds of the curve over temperatures, the closer the nearer the gate is to it. */
  curveOver(low: number, high: number): Range;
}

/** Prepares both, with one kernel; `curve` is the node of −a/b. */
export function gateLine(loop: Loop, { gate, curve }: { gate: number; curve: number }): GateLine {
  const { graph } = loop;
  const given = inputsOf(loop);
  const inputs = given.includes(gate) ? given : [...given, gate];
  const place = inputs.indexOf(gate);
  const ranges = rangesOf(loop);
  const slopeOf = (node: number) => derivative(graph, node, inputs[0] as number, inputs);
  const h = graph.node("sub", [gate, curve]);
  const first = slopeOf(h);
  const second = slopeOf(first);
  const outputs = [h, first, second];
  const { size, point, prepare, over } = spanKernel(graph, {
    ...{ inputs, atEnds: outputs, over: [outputs], wide: new Set([gate]), ranges },
  });
  const readSpan = over[0] as SpanKernel["over"][number];
  const low = new Float64Array(inputs.length);
  const high = new Float64Array(inputs.length);
  const span = new Float64Array(9);
  const copy = (from: number, out: Float64Array, count: number): void => {
    for (let i = 0; i < count; i++) out[i] = span[from + i] as number;
  };
  const ends = { size, point };
  const distance: Ends = {
    ...{ ...ends, at: 1 },
    box(left, right, out) {
      readSpan(left, right, span);
      copy(0, out, 6);
    },
    bend: (_left, _right, out) => copy(6, out, 3),
  };
  // few diagrams need the curvature of λ
  let third: EnclosureKernel | undefined;
  const slope: Ends = {
    ...{ ...ends, at: 4, bendIsDear: true },
    box(left, right, out) {
      readSpan(left, right, span);
      copy(3, out, 6);
    },
    bend(left, right, out) {
      const wide = new Set([inputs[0] as number, gate]);
      third ??= enclosureKernel(graph, { inputs, outputs: [slopeOf(second)], wide, ranges });
      low[0] = left[0] as number;
      high[0] = right[0] as number;
      third(low, high, out);
    },
  };
  const read = atOnce(distance);
  const box = new Float64Array(9);
  const middle = new Float64Array(6);
  return {
    ...{ distance, slope },
    set(givens, [least, most]) {
      low.set(givens, 1);
      high.set(givens, 1);
      low[place] = least;
      high[place] = most;
      prepare(low, high);
    },
    // plain, or from the value in the middle and the slope (mean value form)
    curveOver(from, to) {
      const centre = from + (to - from) / 2;
      read.box(from, to, box);
      read.point(centre, middle);
      const [falling, rising] = rangeAt(box, 1);
      // the centre of a few units in the last place is rounded
      const half = above(Math.max(to - centre, centre - from));
      const reach = above(Math.max(-falling, rising) * half);
      const mean = plus(rangeAt(middle, 0), [-reach, reach]);
      const plain = rangeAt(box, 0);
      const bounds = mean[1] - mean[0] < plain[1] - plain[0] ? mean : plain;
      return plus([low[place] as number, high[place] as number], minus(bounds));
    },
  };
}
