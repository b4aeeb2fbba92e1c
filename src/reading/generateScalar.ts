// Prints a program of scalar steps as straight-line code.

import type { Compute } from "../graph/op.ts";
import { compiled } from "./generation.ts";
import type { Operation, ScalarKernel, ScalarProgram, Source, Step } from "./scalarProgram.ts";

type Functions = readonly Compute["value"][];
type Bind = (data: Float64Array, functions: Functions) => ScalarKernel;
type Emit = (a: string, b: string, c: string, d: string) => string;

/** One line of code for each step; a missing one does not compile. */
const EMIT: Readonly<Record<Step, Emit>> = {
  add: (a, b) => `${a}+${b}`,
  sub: (a, b) => `${a}-${b}`,
  mul: (a, b) => `${a}*${b}`,
  div: (a, b) => `${a}/${b}`,
  neg: (a) => `-${a}`,
  abs: (a) => `abs(${a})`,
  sqrt: (a) => `sqrt(${a})`,
  exp: (a) => `exp(${a})`,
  log: (a) => `log(${a})`,
  tanh: (a) => `tanh(${a})`,
  min: (a, b) => `${a}<${b}?${a}:${b}<=${a}?${b}:NaN`,
  max: (a, b) => `${a}>${b}?${a}:${b}>=${a}?${b}:NaN`,
  pick: (a, b, c, d) => `${a}<${b}?${c}:${d}`,
};
const ARRAY = { low: "x", high: "y", data: "k" };

/** A text up to this length that is needed once stands where it is needed; deeper nesting could exhaust a parser. */
const INLINE = 80;

/** A program as generated code; it reads `data` anew at each run. */
export function generateScalar(
  program: ScalarProgram,
  outputs: readonly number[],
  data: Float64Array = Float64Array.from(program.data),
): ScalarKernel {
  const uses = program.uses(outputs);
  const texts: string[] = [];
  let code = "";
  program.ops.forEach((op, id) => {
    if (!uses[id]) return;
    const text = textOf(program, op, id, texts);
    const inline = op === "literal" || (uses[id] === 1 && text.length < INLINE);
    texts[id] = inline ? `(${text})` : `r${id}`;
    if (!inline) code += `const r${id}=${text};`;
  });
  const results = outputs.map((id, i) => `o[${i}]=${texts[id]};`).join("");
  // in brackets, functions are compiled at once, without being read ahead first
  const text = `return(function(k,f){return(function(x,y,o){${code}${results}})})`;
  return compiled<Bind>(text)(data, program.functions);
}

function textOf(
  { args, values }: ScalarProgram,
  op: Operation | Source,
  id: number,
  texts: readonly string[],
): string {
  // the name NaN is looked up, and what is looked up is an object
  if (op === "literal") return Number.isNaN(values[id]) ? "0/0" : `${values[id]}`;
  if (op === "low" || op === "high" || op === "data") return `${ARRAY[op]}[${values[id]}]`;
  const names = (args[id] as readonly number[]).map((a) => texts[a]);
  if (op === "call") return `f[${values[id]}](${names.join()})`;
  return EMIT[op](...(names as [string, string, string, string]));
}
