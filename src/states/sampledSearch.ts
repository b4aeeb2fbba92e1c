// The search for loops with a law that is an ordinary function: by sampling, without proof.
import { derivative } from "../graph/derivative.ts";
import { inputsOf } from "../loop/inputs.ts";
import { kept } from "../loop/kept.ts";
import type { Loop } from "../loop/types.ts";
import { valueKernel } from "../reading/valueKernel.ts";
import { type Sampled, scanZeros } from "../search/scanZeros.ts";
import type { Located, Method, StateSearch } from "./located.ts";
import { searchNote } from "./note.ts";

/** Rounding of a balance, relative to its largest flow: a few operations for each flow. */
const BALANCE_NOISE = 2e-15;
/** λT below this share of the largest flow cannot be told from zero. */
const SLOPE_NOISE = 1e-12;

/** Prepares the sampled search of a loop. */
function sampledSearch(loop: Loop): StateSearch {
  const inputs = inputsOf(loop);
  const slope = derivative(loop.graph, loop.net, inputs[0] as number, inputs);
  const flows = loop.flows.filter((f) => f.sign !== 0).map((f) => f.node);
  const kernel = valueKernel(loop.graph, { inputs, outputs: [loop.net, slope, ...flows] });
  const values = new Float64Array(2 + flows.length);
  const point = new Float64Array(inputs.length);
  const largest = () => values.subarray(2).reduce((most, flow) => Math.max(most, Math.abs(flow)), 0);
  const balance: Sampled = {
    at(x, out) {
      point[0] = x;
      kernel(point, values);
      out[0] = values[0] as number;
      out[1] = values[1] as number;
      out[2] = BALANCE_NOISE * largest();
    },
  };
  const located = (at: number, bracket: readonly [number, number]): Located => {
    point[0] = at;
    kernel(point, values);
    const [net, lambda] = values as unknown as [number, number];
    const decided = Math.abs(lambda) * at > SLOPE_NOISE * largest();
    const stability = decided ? (lambda < 0 ? "stable" : "unstable") : "undecided";
    return { at, bracket, stability, lambda, slope: null, imbalance: Math.abs(net) };
  };
  return (givens, within, effort) => {
    point.set(givens, 1);
    const scan = scanZeros(balance, within, effort);
    return {
      located: scan.crossings.map((c) => located(c.at, c.bracket)),
      undecided: scan.doubts.map((d) => ({ ...d, counts: null, enclosure: null, distances: null })),
      cost: { boxes: 0, points: scan.evaluations },
    };
  };
}

/** The sampled search; its effort is a number of evaluations of the balance. */
export const sampling: Method = {
  searchOf: /* @__PURE__ */ kept(sampledSearch),
  effort: 20_000,
  notes: /* @__PURE__ */ [
    [
      "sampled-search",
      "caution",
      "found by sampling: states that lie close together may be missing",
    ] as const,
    ["sampled-law", "info", "a law is an ordinary function; its slopes are difference quotients"] as const,
  ].map(([code, severity, text]) => searchNote("findStates", code, severity, text)),
};
