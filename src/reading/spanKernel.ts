// Reads enclosures of a graph along one input, over spans between two ends.
import type { Graph } from "../graph/node.ts";
import type { Range } from "../ground/range.ts";
import { encloseOutputs, limitsOf } from "./encloseOutputs.ts";
import type { Enclosure } from "./enclosure.ts";
import { boxTest } from "./enclosureKernel.ts";
import { EnclosureWriter } from "./enclosureWriter.ts";
import { runScalar } from "./runScalar.ts";
import { spanParts } from "./spanParts.ts";

/**
 * An end is an array of `size` numbers: the input there, which the caller writes; behind it (lo, hi, err) for each output
 * at ends, which `point` writes; then what spans need to know of their ends, so that it is computed once for all of them.
 * `over[k]` writes (lo, hi, err) for each output of group k over the span between two ends that have been read.
 *
 * What cannot be enclosed has an err that is NaN or infinite. That is also the answer where an input is NaN, infinite, out of
 * order or outside its declared range.
 */
export interface SpanKernel {
  readonly size: number;
  /** Reads the other inputs, from place 1 on; to be called before an end is read and whenever they change. */
  prepare(low: Float64Array, high: Float64Array): void;
  point(end: Float64Array): void;
  readonly over: readonly ((left: Float64Array, right: Float64Array, out: Float64Array) => void)[];
}

/** What is read of a graph. */
export interface SpansOf {
  /** The first is the one along which spans lie. */
  readonly inputs: readonly number[];
  readonly atEnds: readonly number[];
  readonly over: readonly (readonly number[])[];
  /** Those of the other inputs that may be intervals. */
  readonly wide: ReadonlySet<number>;
  /** Ranges that inputs are declared to keep. Signs are known from these only. */
  readonly ranges: ReadonlyMap<number, Range>;
}

/** As generated code or by the interpreter, with the bits of an enclosure kernel over the same box. */
export function spanKernel(g: Graph, { inputs, atEnds, over, wide, ranges }: SpansOf): SpanKernel {
  const w = new EnclosureWriter();
  const given = inputs.map((id, i): Enclosure => {
    const lo = w.input("low", i);
    const hi = i === 0 || wide.has(id) ? w.input("high", i) : lo;
    return { lo, hi, err: undefined, within: limitsOf(ranges.get(id)) };
  });
  const span = given[0] as Enclosure;
  const steps = (outputs: readonly number[], first: Enclosure): number[] =>
    encloseOutputs(g, outputs, w, new Map(inputs.map((id, i) => [id, i ? (given[i] as Enclosure) : first])));
  const end = [span.lo, ...steps(atEnds, { ...span, hi: span.lo })];
  const wanted = steps(over.flat(), span);
  const groups = over.map((outputs) => wanted.splice(0, 3 * outputs.length));
  const { ahead, point, spans } = spanParts(w, { left: span.lo, right: span.hi, end, groups });
  const data = Float64Array.from([...w.data, ...ahead.map(() => NaN)]);
  const results = data.subarray(w.data.length);
  const readAhead = runScalar({ program: w, outputs: ahead });
  const readPoint = runScalar({ program: w, data, ...point });
  const allowed = boxTest(given, 1);
  const [least, greatest] = span.within;
  let prepared = false;
  return {
    size: point.outputs.length,
    prepare(low, high) {
      prepared = allowed(low, high);
      if (prepared) readAhead(low, high, results);
    },
    point(end) {
      const x = end[0] as number;
      if (prepared && x >= least && x <= greatest) readPoint(end, end, end);
      else end.fill(NaN, 1);
    },
    over: spans.map((part) => {
      const read = runScalar({ program: w, data, ...part });
      return (left, right, out) => {
        const a = left[0] as number;
        const b = right[0] as number;
        if (prepared && a >= least && a <= b && b <= greatest) read(left, right, out);
        else out.fill(NaN, 0, part.outputs.length);
      };
    }),
  };
}
