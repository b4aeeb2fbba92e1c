// The balance of a loop while its givens change along a straight path, with any of some couplings held.
import { adjoint } from "../graph/adjoint.ts";
import { substitute } from "../graph/substitute.ts";
import type { Range } from "../ground/range.ts";
import { kept } from "../loop/kept.ts";
import type { Loop } from "../loop/types.ts";
import { enclosureKernel } from "../reading/enclosureKernel.ts";
import { valueKernel } from "../reading/valueKernel.ts";
import { above, below, bounded } from "../search/enclosed.ts";
import type { Moving } from "../search/moving.ts";
import { leapFree } from "./leapFree.ts";

/** A change of givens (values in order), and the couplings that are held at a temperature meanwhile. */
export interface GivenPath {
  readonly from: ArrayLike<number>;
  readonly to: ArrayLike<number>;
  /** A bit for each coupling that can be held, in order. */
  readonly held: number;
  /** At which they are held, K. */
  readonly reference: number;
}

/** Makes the balance along a path; what was made before for the same loop is then no longer set. */
export type PathBalance = (path: GivenPath) => Moving;

const prepared = /* @__PURE__ */ kept(() => new Map<string, PathBalance>());

/** The balances of a loop in which `holdable` (nodes of couplings, at most 30) can be held and `changed` givens change. */
export function pathBalanceOf(
  loop: Loop,
  holdable: readonly number[],
  changed: readonly number[],
): PathBalance {
  const known = prepared(loop);
  const key = `${holdable.join()};${changed.join()}`;
  const found = known.get(key);
  if (found) return found;
  const made = pathBalance(loop, holdable, changed);
  known.set(key, made);
  return made;
}

/**
 * Temperature becomes several inputs, one for each set of holdable couplings that it acts through. Where one of these is held, its
 * input is the reference temperature; so one reading serves every choice of what is held.
 */
function pathBalance(loop: Loop, holdable: readonly number[], changed: readonly number[]): PathBalance {
  const temperature = loop.variables[0] as Loop["variables"][number];
  const contexts = new Map<number, number>();
  const { graph, nodeOf } = substitute(loop.graph, [loop.net, ...loop.givens.map((g) => g.node)], {
    inputs: new Set([temperature.node]),
    inside: new Map(holdable.map((node, i) => [node, 1 << i])),
    replace: (copy, input, marks) => {
      const meaning = { kind: "variable", name: `temperature ${marks}` } as const;
      const node = copy.node("input", [], {
        tag: meaning.name,
        meaning,
        dimension: loop.graph.dimensions[input],
      });
      contexts.set(marks, node);
      return node;
    },
  });
  const marks = [...contexts.keys()];
  const temperatures = [...contexts.values()];
  const givens = loop.givens.map((g) => nodeOf(g.node));
  const ranges = new Map<number, Range>(temperatures.map((node) => [node, temperature.within]));
  loop.givens.forEach(({ within }, i) => {
    if (within) ranges.set(givens[i] as number, within);
  });
  const net = nodeOf(loop.net);
  const inputs = [...temperatures, ...givens];
  const outputs = [net, ...adjoint(graph, net, temperatures)];
  const slopes = outputs.slice(1).map((id) => graph.ops[id] !== "const" || graph.values[id] !== 0);
  const low = new Float64Array(inputs.length);
  const high = new Float64Array(inputs.length);
  const setTemperature = (a: number, b: number, { held, reference }: GivenPath) => {
    for (let i = 0; i < marks.length; i++) {
      const isHeld = ((marks[i] as number) & held) !== 0;
      low[i] = isHeld ? reference : a;
      high[i] = isHeld ? reference : b;
    }
  };
  const rest = loop.sampled
    ? sampledReadings(valueKernel(graph, { inputs, outputs }), low, high, outputs.length)
    : enclosedReadings();
  function enclosedReadings(): Readings {
    const wide = changed.map((i) => givens[i] as number);
    const over = (intervals: Iterable<number>) =>
      enclosureKernel(graph, { inputs, outputs, wide: new Set(intervals), ranges });
    const box = over([...temperatures, ...wide]);
    const point = over(wide);
    let steady: ReturnType<typeof leapFree> | undefined;
    return {
      box: (out) => box(low, high, out),
      point: (out) => point(low, high, out),
      unbroken() {
        steady ??= leapFree(graph, net, { inputs, wide: new Set([...temperatures, ...wide]), ranges });
        return steady(low, high);
      },
    };
  }
  const out = new Float64Array(3 * outputs.length);
  /** N and ∂N/∂T as (lo, hi, err): the slopes in the temperatures that are not held, added outwards. */
  const write = (into: Float64Array, held: number) => {
    let [slopeLow, slopeHigh] = [0, 0];
    for (let i = 0; i < marks.length; i++) {
      if ((marks[i] as number) & held) continue;
      const k = 3 * (i + 1);
      const err = out[k + 2] as number;
      slopeLow = below(slopeLow + below((out[k] as number) - err));
      slopeHigh = above(slopeHigh + above((out[k + 1] as number) + err));
    }
    for (let k = 0; k < 3; k++) into[k] = out[k] as number;
    into[3] = slopeLow;
    into[4] = slopeHigh;
    into[5] = 0;
  };
  return (path) => {
    const valueAt = (i: number, stage: number): number => {
      const [p, q] = [path.from[i] as number, path.to[i] as number];
      if (stage === 1) return q;
      return Math.min(Math.max(p + stage * (q - p), Math.min(p, q)), Math.max(p, q));
    };
    return {
      sampled: loop.sampled,
      responds: marks.some((mark, i) => !(mark & path.held) && slopes[i]),
      between(from, to) {
        for (let i = 0; i < givens.length; i++) {
          const [p, q] = [valueAt(i, from), valueAt(i, to)];
          low[temperatures.length + i] = Math.min(p, q);
          high[temperatures.length + i] = Math.max(p, q);
        }
      },
      box(a, b, into) {
        setTemperature(a, b, path);
        rest.box(out);
        write(into, path.held);
        // the curvature is not read
        into.fill(NaN, 6, 9);
      },
      point(x, into) {
        setTemperature(x, x, path);
        rest.point(out);
        write(into, path.held);
      },
      unbroken(a, b) {
        setTemperature(a, b, path);
        rest.box(out);
        const [lo, hi, err] = out as unknown as [number, number, number];
        return bounded(lo - err, hi + err) && rest.unbroken();
      },
    };
  };
}

/** Writes (lo, hi, err) of the balance and of its slopes for the temperatures and givens that are set. */
interface Readings {
  readonly box: (out: Float64Array) => void;
  readonly point: (out: Float64Array) => void;
  /** Whether the balance is proved to be free of leaps there, where it is finite. */
  readonly unbroken: () => boolean;
}

/** Bounds of a few samples: proves nothing. */
function sampledReadings(
  kernel: (inputs: Float64Array, out: Float64Array) => void,
  low: Float64Array,
  high: Float64Array,
  size: number,
): Readings {
  const at = new Float64Array(low.length);
  const values = new Float64Array(size);
  const read = (shares: readonly number[]) => (out: Float64Array) => {
    for (let k = 0; k < size; k++) out.set([Infinity, -Infinity, 0], 3 * k);
    for (const share of shares) {
      for (let i = 0; i < at.length; i++)
        at[i] = (low[i] as number) + share * ((high[i] as number) - (low[i] as number));
      kernel(at, values);
      values.forEach((value, k) => {
        out[3 * k] = Math.min(out[3 * k] as number, value);
        out[3 * k + 1] = Math.max(out[3 * k + 1] as number, value);
      });
    }
  };
  const both = read([0, 0.5, 1]);
  return { box: both, point: both, unbroken: () => false };
}
