// Writes a graph as straight-line code.
import { coneOf } from "../graph/cone.ts";
import type { Graph } from "../graph/node.ts";
import type { Compute, Op } from "../graph/op.ts";
import { compiled } from "./generation.ts";
import { functionOf, type Kernel, missingInput, type ReadingOf } from "./readingOf.ts";

type Raw = (x: Float64Array, k: Float64Array, f: readonly Compute["value"][], o: Float64Array) => void;
type Emit = (a: string, b: string, c: string, d: string) => string;

/** One line of code for each operation; a missing one does not compile. */
const EMIT: Readonly<Record<Exclude<Op, "const" | "input" | "mean" | "call">, Emit>> = {
  add: (a, b) => `${a}+${b}`,
  sub: (a, b) => `${a}-${b}`,
  mul: (a, b) => `${a}*${b}`,
  div: (a, b) => `${a}/${b}`,
  neg: (a) => `-${a}`,
  sqrt: (a) => `sqrt(${a})`,
  exp: (a) => `exp(${a})`,
  log: (a) => `log(${a})`,
  tanh: (a) => `tanh(${a})`,
  min: (a, b) => `${a}<${b}?${a}:${b}<=${a}?${b}:NaN`,
  max: (a, b) => `${a}>${b}?${a}:${b}>=${a}?${b}:NaN`,
  pick: (a, b, c, d) => `${a}<${b}?${c}:${d}`,
  jump: (a, b, c, d) => `${a}<${b}?${c}:${d}`,
};

/** A kernel as generated code. */
export function generateValue(g: Graph, { inputs, outputs }: ReadingOf): Kernel {
  const place = new Map(inputs.map((id, i) => [id, i]));
  const name = new Map<number, string>();
  const constants: number[] = [];
  const functions: Compute["value"][] = [];
  let code = "";
  for (const id of coneOf(g, outputs, inputs)) {
    const op = g.ops[id] as Op;
    const args = place.has(id) ? [] : (g.args[id] as readonly number[]).map((a) => name.get(a) as string);
    if (op === "mean" && !place.has(id)) {
      name.set(id, args[0] as string);
      continue;
    }
    let text: string;
    if (place.has(id)) text = `x[${place.get(id)}]`;
    else if (op === "const") text = `k[${constants.push(g.values[id] as number) - 1}]`;
    else if (op === "input") text = missingInput(g, id);
    else if (op === "call") text = `f[${functions.push(functionOf(g, id)) - 1}](${args.join()})`;
    else text = EMIT[op as keyof typeof EMIT](...(args as [string, string, string, string]));
    name.set(id, `n${name.size}`);
    code += `const ${name.get(id)}=${text};`;
  }
  const results = outputs.map((id, i) => `o[${i}]=${name.get(id)};`).join("");
  const run = compiled<Raw>(`return function(x,k,f,o){${code}${results}}`);
  const k = Float64Array.from(constants);
  return (x, o) => run(x, k, functions, o);
}
