// Reads enclosures of a graph over boxes of its inputs.
import type { Graph } from "../graph/node.ts";
import type { Range } from "../ground/range.ts";
import { encloseOutputs, limitsOf } from "./encloseOutputs.ts";
import type { Enclosure } from "./enclosure.ts";
import { EnclosureWriter } from "./enclosureWriter.ts";
import type { ReadingOf } from "./readingOf.ts";
import { runScalar } from "./runScalar.ts";
import type { ScalarKernel } from "./scalarProgram.ts";

/**
 * Writes (lo, hi, err) for each output: over the box from `low` to `high` its true value lies in [lo − err, hi + err].
 * Inputs that are not wide are points, read from `low`.
 *
 * What cannot be enclosed has an err that is NaN or infinite. That is also the answer to a box that is not one: an input
 * that is NaN, infinite, out of order or outside its declared range.
 */
export type EnclosureKernel = ScalarKernel;

/** An enclosure reading. */
export interface EnclosureOf extends ReadingOf {
  /** The inputs that may be intervals; fewer make a faster kernel. */
  readonly wide: ReadonlySet<number>;
  /** Ranges that inputs are declared to keep. Signs are known from these only. */
  readonly ranges?: ReadonlyMap<number, Range>;
}

/** As generated code or by the interpreter: the same bits. */
export function enclosureKernel(
  g: Graph,
  { inputs, outputs, wide, ranges = new Map() }: EnclosureOf,
): EnclosureKernel {
  const w = new EnclosureWriter();
  const known = new Map<number, Enclosure>();
  inputs.forEach((id, i) => {
    const lo = w.input("low", i);
    const hi = wide.has(id) ? w.input("high", i) : lo;
    known.set(id, { lo, hi, err: undefined, within: limitsOf(ranges.get(id)) });
  });
  const run = runScalar({ program: w, outputs: encloseOutputs(g, outputs, w, known) });
  const allowed = boxTest([...known.values()]);
  return (low, high, out) => {
    if (allowed(low, high)) run(low, high, out);
    else out.fill(NaN);
  };
}

/** Tells whether all inputs from place `from` on are finite, in order and in their ranges. */
export function boxTest(
  inputs: readonly Enclosure[],
  from = 0,
): (low: Float64Array, high: Float64Array) => boolean {
  const limits = Float64Array.from(inputs.flatMap(({ within }) => within));
  const isWide = inputs.map(({ lo, hi }) => lo !== hi);
  return (low, high) => {
    for (let i = from; i < isWide.length; i++) {
      const x = low[i] as number;
      const y = isWide[i] ? (high[i] as number) : x;
      if (!(x >= (limits[2 * i] as number) && x <= y && y <= (limits[2 * i + 1] as number))) return false;
    }
    return true;
  };
}
