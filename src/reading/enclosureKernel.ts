// Reads enclosures of a graph over boxes of its inputs.
import { coneOf } from "../graph/cone.ts";
import type { Graph } from "../graph/node.ts";
import type { Op } from "../graph/op.ts";
import type { Range } from "../ground/range.ts";
import type { Enclosure } from "./enclosure.ts";
import { ENCLOSE } from "./enclosureRules.ts";
import { EnclosureWriter } from "./enclosureWriter.ts";
import { missingInput, type ReadingOf } from "./readingOf.ts";
import { splitKernel, wholeKernel } from "./splitKernel.ts";

/**
 * Writes (lo, hi, err) for each output: over the box from `low` to `high` its true value lies in [lo − err, hi + err].
 * Inputs that are not wide are points, read from `low`.
 *
 * What cannot be enclosed has an err that is NaN or infinite. That is also the answer to a box that is not one: an input
 * that is NaN, infinite, out of order or outside its declared range.
 */
export interface EnclosureKernel {
  (low: Float64Array, high: Float64Array, out: Float64Array): void;
  /** Reads the steady inputs; to be called before the first box and whenever they change. */
  prepare(low: Float64Array, high: Float64Array): void;
}

/** An enclosure reading. */
export interface EnclosureOf extends ReadingOf {
  /** The inputs that may be intervals; fewer make a faster kernel. */
  readonly wide: ReadonlySet<number>;
  /** Inputs that change rarely: they are read by `prepare`, and what depends on them alone is computed there. */
  readonly steady?: ReadonlySet<number>;
  /** Ranges that inputs are declared to keep. Signs are known from these only. */
  readonly ranges?: ReadonlyMap<number, Range>;
}

/** All finite numbers. */
const ANY: Range = [-1.7976931348623157e308, 1.7976931348623157e308];

/** As generated code or by the interpreter: the same bits. Ordinary functions (sampled laws) cannot be enclosed. */
export function enclosureKernel(
  g: Graph,
  { inputs, outputs, wide, steady = new Set(), ranges = new Map() }: EnclosureOf,
): EnclosureKernel {
  const w = new EnclosureWriter();
  const known = new Map<number, Enclosure>();
  const limits = new Float64Array(2 * inputs.length);
  const isWide = inputs.map((id) => wide.has(id));
  inputs.forEach((id, i) => {
    const within = ranges.get(id) ?? ANY;
    limits.set([Math.max(within[0], ANY[0]), Math.min(within[1], ANY[1])], 2 * i);
    const lo = w.input("low", i);
    known.set(id, { lo, hi: isWide[i] ? w.input("high", i) : lo, err: undefined, within });
  });
  for (const id of coneOf(g, outputs, inputs)) {
    if (!known.has(id)) known.set(id, enclose(g, id, w, known));
  }
  const results = outputs.flatMap((id) => {
    const { lo, hi, err = w.literal(0) } = known.get(id) as Enclosure;
    return [lo, hi, err];
  });
  const places = inputs.map((_, i) => i);
  const rare = places.filter((i) => steady.has(inputs[i] as number));
  const frequent = places.filter((i) => !rare.includes(i));
  const whole = rare.length === 0;
  const { prepare, run } = whole ? wholeKernel(w, results) : splitKernel(w, results, new Set(rare));
  const allowed = (list: readonly number[], low: Float64Array, high: Float64Array): boolean => {
    for (let j = 0; j < list.length; j++) {
      const i = list[j] as number;
      const x = low[i] as number;
      const y = isWide[i] ? (high[i] as number) : x;
      if (!(x >= (limits[2 * i] as number) && x <= y && y <= (limits[2 * i + 1] as number))) return false;
    }
    return true;
  };
  let prepared = whole;
  const kernel = (low: Float64Array, high: Float64Array, out: Float64Array): void => {
    if (prepared && allowed(frequent, low, high)) run(low, high, out);
    else out.fill(NaN);
  };
  return Object.assign(kernel, {
    prepare(low: Float64Array, high: Float64Array): void {
      prepared = allowed(rare, low, high);
      if (prepared) prepare(low, high);
    },
  });
}

function enclose(g: Graph, id: number, w: EnclosureWriter, known: ReadonlyMap<number, Enclosure>): Enclosure {
  const op = g.ops[id] as Op;
  if (op === "input") return missingInput(g, id);
  if (op === "call") throw new Error("an ordinary function has no enclosure");
  const value = g.values[id] as number;
  if (op === "const") {
    const k = w.datum(value);
    return { lo: k, hi: k, err: undefined, within: [value, value] };
  }
  const args = (g.args[id] as readonly number[]).map((a) => known.get(a) as Enclosure);
  return ENCLOSE[op](w, ...(args as [Enclosure, Enclosure, Enclosure, Enclosure]));
}
