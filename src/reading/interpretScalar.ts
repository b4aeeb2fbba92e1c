// Runs a program of scalar steps one by one, without generating code.
import { exp } from "../ground/elementary/exp.ts";
import { log } from "../ground/elementary/log.ts";
import { max, min } from "../ground/elementary/minMax.ts";
import { tanh } from "../ground/elementary/tanh.ts";
import type { Operation, RunOf, ScalarKernel, Step } from "./scalarProgram.ts";

/** A program as an interpreter; it reads `data` anew at each run. */
export function interpretScalar({ program, outputs, data, known }: RunOf): ScalarKernel {
  const { ops, args, values, functions } = program;
  const numbers = data ?? Float64Array.from(program.data);
  const uses = program.uses(outputs, known);
  const r = new Float64Array(ops.length);
  const steps: Operation[] = [];
  /** For each step the register to fill and up to four to read. */
  const places: number[] = [];
  const inputs: { from: "low" | "high" | "data"; place: number; to: number }[] = [];
  ops.forEach((own, id) => {
    if (!uses[id]) return;
    const { from: op, place: value } = known?.get(id) ?? { from: own, place: values[id] as number };
    if (op === "literal") r[id] = value;
    else if (op === "low" || op === "high" || op === "data") inputs.push({ from: op, place: value, to: id });
    else {
      const [a, b = 0, c = 0, d = 0] = args[id] as [number, number?, number?, number?];
      steps.push(op);
      places.push(id, a, b, c, d);
    }
  });
  const at = Uint32Array.from(places);
  return (low, high, out) => {
    const read = { low, high, data: numbers };
    for (const { from, place, to } of inputs) r[to] = read[from][place] as number;
    for (let i = 0; i < steps.length; i++) {
      const p = 5 * i;
      const a = r[at[p + 1] as number] as number;
      const b = r[at[p + 2] as number] as number;
      const to = at[p] as number;
      const step = steps[i] as Operation;
      if (step === "pick") r[to] = r[at[p + (a < b ? 3 : 4)] as number] as number;
      else if (step === "call") {
        const run = functions[values[to] as number] as (...inputs: number[]) => number;
        r[to] = run(...(args[to] as readonly number[]).map((from) => r[from] as number));
      } else r[to] = resultOf(step, a, b);
    }
    outputs.forEach((id, i) => {
      out[i] = r[id] as number;
    });
  };
}

function resultOf(step: Exclude<Step, "pick">, a: number, b: number): number {
  switch (step) {
    case "mul":
      return a * b;
    case "add":
      return a + b;
    case "sub":
      return a - b;
    case "div":
      return a / b;
    case "neg":
      return -a;
    case "abs":
      return Math.abs(a);
    case "sqrt":
      return Math.sqrt(a);
    case "exp":
      return exp(a);
    case "log":
      return log(a);
    case "tanh":
      return tanh(a);
    case "min":
      return min(a, b);
    case "max":
      return max(a, b);
  }
}
