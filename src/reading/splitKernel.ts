// Splits a program: what depends on steady inputs alone is computed once, and read as data by the rest.
import { runScalar } from "./runScalar.ts";
import { type ScalarKernel, ScalarProgram } from "./scalarProgram.ts";

/** A program in two parts, with the same bits as in one. */
export interface SplitKernel {
  /** Computes what depends on the steady inputs; to be called when they change. */
  prepare(low: Float64Array, high: Float64Array): void;
  readonly run: ScalarKernel;
}

/** A program of which nothing is computed ahead. */
export const wholeKernel = (program: ScalarProgram, outputs: readonly number[]): SplitKernel => ({
  prepare: () => {},
  run: runScalar(program, outputs),
});

/** Splits a program whose inputs at the places in `steady` change rarely. */
export function splitKernel(
  program: ScalarProgram,
  outputs: readonly number[],
  steady: ReadonlySet<number>,
): SplitKernel {
  const { ops, args, values } = program;
  const isSteady = ops.map(() => false);
  const wanted = new Set<number>();
  ops.forEach((op, id) => {
    const from = args[id] as readonly number[];
    const input = op === "low" || op === "high";
    isSteady[id] = input ? steady.has(values[id] as number) : from.every((a) => isSteady[a]);
    if (!isSteady[id]) for (const a of from) wanted.add(a);
  });
  for (const id of outputs) wanted.add(id);
  const known = [...wanted].filter((id) => isSteady[id] && ops[id] !== "literal" && ops[id] !== "data");
  const rest = new ScalarProgram();
  rest.ops.push(...ops);
  rest.args.push(...args);
  rest.values.push(...values);
  rest.functions.push(...program.functions);
  known.forEach((id, i) => {
    rest.ops[id] = "data";
    rest.args[id] = [];
    rest.values[id] = program.data.length + i;
  });
  const data = Float64Array.from([...program.data, ...known.map(() => Number.NaN)]);
  const results = data.subarray(program.data.length);
  const first = runScalar(program, known);
  return { prepare: (low, high) => first(low, high, results), run: runScalar(rest, outputs, data) };
}
