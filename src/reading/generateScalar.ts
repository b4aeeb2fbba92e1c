// Prints a program of scalar steps as straight-line code.

import type { Compute } from "../graph/op.ts";
import { compiled } from "./generation.ts";
import type { Operation, RunOf, ScalarKernel, ScalarProgram, Source } from "./scalarProgram.ts";

type Functions = readonly Compute["value"][];
type Bind = (data: Float64Array, functions: Functions) => ScalarKernel;
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
  const read = args[id] as readonly number[];
  const a = texts[read[0] as number] as string;
  const b = texts[read[1] as number] as string;
  switch (op) {
    case "mul":
      return `${a}*${b}`;
    case "add":
      return `${a}+${b}`;
    case "sub":
      return `${a}-${b}`;
    case "div":
      return `${a}/${b}`;
    case "neg":
      return `-${a}`;
    case "pick":
      return `${a}<${b}?${texts[read[2] as number]}:${texts[read[3] as number]}`;
    case "min":
      return `${a}<${b}?${a}:${b}<=${a}?${b}:NaN`;
    case "max":
      return `${a}>${b}?${a}:${b}>=${a}?${b}:NaN`;
    // the name NaN is looked up, and what is looked up is an object
    case "literal":
      return Number.isNaN(value) ? "0/0" : `${value}`;
    case "low":
    case "high":
    case "data":
      return `${ARRAY[op]}[${value}]`;
    case "call":
      return `f[${value}](${read.map((a) => texts[a]).join()})`;
    // steps whose code is a call of the function of that name
    case "abs":
    case "sqrt":
    case "exp":
    case "log":
    case "tanh":
      return `${op}(${a})`;
  }
}
