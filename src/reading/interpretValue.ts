// Runs a graph node by node, without generating code: the same bits as the generated kernel.
import { coneOf } from "../graph/cone.ts";
import type { Graph } from "../graph/node.ts";
import type { Compute, Op } from "../graph/op.ts";
import { exp } from "../ground/elementary/exp.ts";
import { log } from "../ground/elementary/log.ts";
import { max, min } from "../ground/elementary/minMax.ts";
import { tanh } from "../ground/elementary/tanh.ts";
import { functionOf, type Kernel, missingInput, type ReadingOf } from "./readingOf.ts";

type Run = (a: number, b: number, c: number, d: number) => number;

/** One step for each operation; a missing one does not compile. */
const RUN: Readonly<Record<Exclude<Op, "const" | "input" | "call">, Run>> = {
  add: (a, b) => a + b,
  sub: (a, b) => a - b,
  mul: (a, b) => a * b,
  div: (a, b) => a / b,
  neg: (a) => -a,
  sqrt: Math.sqrt,
  exp,
  log,
  tanh,
  min,
  max,
  pick: (a, b, c, d) => (a < b ? c : d),
  jump: (a, b, c, d) => (a < b ? c : d),
  mean: (a) => a,
};

/** A kernel as an interpreter. */
export function interpretValue(g: Graph, { inputs, outputs }: ReadingOf): Kernel {
  const list = coneOf(g, outputs, inputs);
  const place = new Map(list.map((id, i) => [id, i]));
  const given = new Set(inputs);
  const work = new Float64Array(list.length);
  const steps: ((x: Float64Array) => void)[] = [];
  inputs.forEach((id, i) => {
    const to = place.get(id);
    if (to === undefined) return;
    steps.push((x) => {
      work[to] = x[i] as number;
    });
  });
  for (const id of list) {
    if (given.has(id)) continue;
    const to = place.get(id) as number;
    const op = g.ops[id] as Op;
    const from = (g.args[id] as readonly number[]).map((a) => place.get(a) as number);
    if (op === "input") missingInput(g, id);
    else if (op === "const") work[to] = g.values[id] as number;
    else if (op === "call") steps.push(callStep(functionOf(g, id), work, from, to));
    else steps.push(opStep(RUN[op as keyof typeof RUN], work, from, to));
  }
  const wanted = outputs.map((id) => place.get(id) as number);
  return (x, o) => {
    for (const step of steps) step(x);
    for (let i = 0; i < wanted.length; i++) o[i] = work[wanted[i] as number] as number;
  };
}

function opStep(run: Run, work: Float64Array, from: readonly number[], to: number): () => void {
  const [a = 0, b = 0, c = 0, d = 0] = from;
  return () => {
    work[to] = run(work[a] as number, work[b] as number, work[c] as number, work[d] as number);
  };
}
function callStep(
  value: Compute["value"],
  work: Float64Array,
  from: readonly number[],
  to: number,
): () => void {
  return () => {
    work[to] = value(...from.map((i) => work[i] as number));
  };
}
