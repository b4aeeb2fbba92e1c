// Reads values of a graph.
import { coneOf } from "../graph/cone.ts";
import type { Graph } from "../graph/node.ts";
import type { Compute, Op } from "../graph/op.ts";
import { type Kernel, missingInput, type ReadingOf } from "./readingOf.ts";
import { runScalar } from "./runScalar.ts";
import { ScalarProgram } from "./scalarProgram.ts";

/** As generated straight-line code, or by the interpreter where code must not be generated: the same bits. */
export function valueKernel(g: Graph, reading: ReadingOf): Kernel {
  const run = runScalar(valueProgram(g, reading));
  return (x, out) => run(x, x, out);
}

/** The program of a reading of values: one step for each node, in the order of the graph. */
export function valueProgram(
  g: Graph,
  { inputs, outputs }: ReadingOf,
): { program: ScalarProgram; outputs: number[] } {
  const program = new ScalarProgram();
  const known = new Map(inputs.map((id, i) => [id, program.input("low", i)]));
  const cone = coneOf(g, outputs, inputs);
  for (let i = 0; i < cone.length; i++) {
    const id = cone[i] as number;
    if (!known.has(id)) known.set(id, registerOf(g, id, program, known));
  }
  return { program, outputs: outputs.map((id) => known.get(id) as number) };
}

function registerOf(
  g: Graph,
  id: number,
  program: ScalarProgram,
  known: ReadonlyMap<number, number>,
): number {
  const op = g.ops[id] as Op;
  const args = (g.args[id] as readonly number[]).map((a) => known.get(a) as number);
  const value = g.values[id] as number;
  if (op === "input") return missingInput(g, id);
  if (op === "const") return program.datum(value);
  if (op === "call") return program.call((g.functions[value] as Compute).value, args);
  if (op === "mean") return args[0] as number;
  if (op === "step") return unitStep(program, args[0] as number);
  // a jump reads like a pick
  return program.again(op === "jump" ? "pick" : op, args);
}

/** 0 below zero, else 1; NaN for NaN, which alone has no size below 1 when that is negative. */
function unitStep(program: ScalarProgram, a: number): number {
  const zero = program.literal(0);
  const one = program.literal(1);
  const size = program.step("abs", a);
  const known = program.choose(program.step("neg", size), one, one, program.literal(NaN));
  return program.choose(a, zero, zero, known);
}
