// The influences between temperature, the chosen couplings and the net flux, each with everything else held.

import { adjoint } from "../graph/adjoint.ts";
import { derivative } from "../graph/derivative.ts";
import { fail } from "../ground/errors.ts";
import type { Taken } from "../loop/checkBelongs.ts";
import { inputsOf, rangesOf } from "../loop/inputs.ts";
import type { Loop } from "../loop/types.ts";
import { enclosureKernel } from "../reading/enclosureKernel.ts";
import { valueKernel } from "../reading/valueKernel.ts";
import { rangeAt } from "../search/interval.ts";
import { checksOf, notesFrom } from "../states/checkState.ts";
import type { Note } from "../states/note.ts";
import { type Bounded, type Bounds, exactly } from "./bounds.ts";

/** ∂ to / ∂ from. 0 is temperature, 1 to k are the chosen couplings in the order of the graph, k + 1 is the net flux. */
export interface Influence extends Bounded {
  readonly from: number;
  readonly to: number;
}

/** All slopes at a state. */
export interface Influences {
  /** The direct ∂N/∂T and every other influence that is there at all. */
  readonly edges: readonly Influence[];
  /** λ, taken along all ways at once. */
  readonly total: Bounded;
  readonly heatCapacity: Bounded;
  /** ∂N/∂p of every given, W m⁻² per unit. */
  readonly givens: readonly Bounded[];
  /** What the laws refuse at the state. */
  readonly refused: readonly Note[];
}

/**
 * Prepares the reading of all influences of a loop through `chosen` (nodes by rising id). Each chosen coupling is cut: it
 * counts as an input, and its own definition as a target. One sweep backwards from each target gives all its slopes.
 */
export function influencesOf(loop: Loop, chosen: readonly number[]): (at: Taken) => Influences {
  const { graph, net, heatCapacity } = loop;
  const inputs = inputsOf(loop);
  const temperature = inputs[0] as number;
  const sources = [temperature, ...chosen];
  const edges: { from: number; to: number; node: number }[] = [];
  const targets = [...chosen.map((c) => (graph.args[c] as readonly number[])[0] as number), net];
  targets.forEach((target, i) => {
    adjoint(graph, target, sources).forEach((node, from) => {
      const absent = graph.ops[node] === "const" && graph.values[node] === 0;
      if (!absent) edges.push({ from, to: i + 1, node });
    });
  });
  const total = derivative(graph, net, temperature, inputs);
  const givens = adjoint(graph, net, inputs).slice(loop.variables.length);
  const outputs = [total, ...edges.map((e) => e.node), heatCapacity, ...givens];
  const checks = checksOf(loop).filter(({ note }) => note.severity === "invalid");
  const kernel = valueKernel(graph, { inputs, outputs: [...outputs, ...checks.map((c) => c.node)] });
  const boundsAt = loop.sampled ? undefined : boundsReader(loop, inputs, outputs);
  const read = new Float64Array(outputs.length + checks.length);
  const [out, checked] = [read.subarray(0, outputs.length), read.subarray(outputs.length)];
  const failAt = (i: number): never => {
    const names = [
      "temperature",
      ...chosen.map((c) => loop.couplings.find((k) => k.node === c)?.name),
      "net",
    ];
    const slopes = edges.map(({ from, to }) => `∂${names[to]}/∂${names[from]}`);
    const asked = [
      "∂net/∂temperature",
      ...slopes,
      "heatCapacity",
      ...loop.givens.map((g) => `∂net/∂${g.name}`),
    ];
    return fail("not-finite", { path: `state: ${asked[i]}`, value: out[i], allowed: "a finite number" });
  };
  return (at) => {
    kernel(at.values, read);
    for (let i = 0; i < out.length; i++) if (!Number.isFinite(out[i])) failAt(i);
    const bounds = boundsAt?.(at);
    const all = outputs.map((_, i): Bounded => ({ value: out[i] as number, bounds: bounds?.[i] ?? null }));
    const numberAt = (i: number) => all[i] as Bounded;
    return {
      edges: edges.map(({ from, to }, i) => ({ from, to, ...numberAt(1 + i) })),
      total: numberAt(0),
      heatCapacity: numberAt(1 + edges.length),
      givens: all.slice(2 + edges.length),
      refused: notesFrom(checks, checked),
    };
  };
}

/** Bounds over the bracket of a state, where they are finite. A constant has no error. */
function boundsReader(loop: Loop, inputs: readonly number[], outputs: readonly number[]) {
  const { graph } = loop;
  const wide = new Set(loop.variables.map((v) => v.node));
  const constants = outputs.map((node): Bounds => {
    return graph.ops[node] === "const" ? exactly(graph.values[node] as number).bounds : null;
  });
  const kernel = enclosureKernel(graph, { inputs, outputs, wide, ranges: rangesOf(loop) });
  const out = new Float64Array(3 * outputs.length);
  return ({ low, high }: Taken): Bounds[] => {
    kernel(low, high, out);
    return constants.map((constant, i) => {
      const bounds = constant ?? rangeAt(out, i);
      return Number.isFinite(bounds[0]) && Number.isFinite(bounds[1]) ? bounds : null;
    });
  };
}
