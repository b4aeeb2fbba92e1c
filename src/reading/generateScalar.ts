// Prints a program of scalar steps as straight-line code.

import type { Compute } from "../graph/op.ts";
import { compiled } from "./generation.ts";
import type { Operation, RunOf, ScalarKernel, ScalarProgram, Source, Step } from "./scalarProgram.ts";

type Functions = readonly Compute["value"][];
type Bind = (data: Float64Array, functions: Functions) => ScalarKernel;
type Emit = (a: string, b: string, c: string, d: string) => string;

/** Steps whose code is a call of the function of that name. */
type Called = "abs" | "sqrt" | "exp" | "log" | "tanh";

/** The code of each other step; a missing one does not compile. */
const EMIT: Readonly<Record<Exclude<Step, Called>, Emit>> = {
  add: (a, b) => `${a}+${b}`,
  sub: (a, b) => `${a}-${b}`,
  mul: (a, b) => `${a}*${b}`,
  div: (a, b) => `${a}/${b}`,
  neg: (a) => `-${a}`,
  min: (a, b) => `${a}<${b}?${a}:${b}<=${a}?${b}:NaN`,
  max: (a, b) => `${a}>${b}?${a}:${b}>=${a}?${b}:NaN`,
  pick: (a, b, c, d) => `${a}<${b}?${c}:${d}`,
};
const ARRAY = { low: "x", high: "y", data: "k" };

/** A text up to this length that is needed once stands where it is needed; deeper nesting could exhaust a parser. */
const INLINE = 80;

/** A program as generated code; it reads `data` anew at each run. */
export function generateScalar({ program, outputs, data, known }: RunOf): ScalarKernel {
  const { ops } = program;
  const uses = program.uses(outputs, known);
  const texts: string[] = [];
  let code = "";
  for (let id = 0; id < ops.length; id++) {
    if (!uses[id]) continue;
    const place = known?.get(id);
    const op = place?.from ?? (ops[id] as Operation | Source);
    const text = textOf(program, op, id, place?.place ?? (program.values[id] as number), texts);
    const inline = op === "literal" || (uses[id] === 1 && text.length < INLINE);
    texts[id] = inline ? `(${text})` : `r${id}`;
    if (!inline) code += `const r${id}=${text};`;
  }
  for (let i = 0; i < outputs.length; i++) code += `o[${i}]=${texts[outputs[i] as number]};`;
  // in brackets, functions are compiled at once, without being read ahead first
  const text = `return(function(k,f){return(function(x,y,o){${code}})})`;
  return compiled<Bind>(text)(data ?? Float64Array.from(program.data), program.functions);
}

function textOf(
  { args }: ScalarProgram,
  op: Operation | Source,
  id: number,
  value: number,
  texts: readonly string[],
): string {
  // the name NaN is looked up, and what is looked up is an object
  if (op === "literal") return Number.isNaN(value) ? "0/0" : `${value}`;
  if (op === "low" || op === "high" || op === "data") return `${ARRAY[op]}[${value}]`;
  const read = args[id] as readonly number[];
  if (op === "call") return `f[${value}](${read.map((a) => texts[a]).join()})`;
  const nameOf = (i: number): string => texts[read[i] as number] as string;
  const emit: Emit = EMIT[op as keyof typeof EMIT] ?? ((a) => `${op}(${a})`);
  return emit(nameOf(0), nameOf(1), nameOf(2), nameOf(3));
}
