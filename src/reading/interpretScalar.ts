// Runs a program of scalar steps one by one, without generating code.
import { exp } from "../ground/elementary/exp.ts";
import { log } from "../ground/elementary/log.ts";
import { max, min } from "../ground/elementary/minMax.ts";
import { tanh } from "../ground/elementary/tanh.ts";
import type { Operation, RunOf, ScalarKernel, Source } from "./scalarProgram.ts";

/** The register to fill, what fills it, and the registers that are read. */
interface Line {
  readonly to: number;
  readonly op: Operation | Source;
  readonly place: number;
  readonly a: number;
  readonly b: number;
  readonly c: number;
  readonly d: number;
}

/** A program as an interpreter; it reads `data` anew at each run. */
export function interpretScalar({ program, outputs, data, known }: RunOf): ScalarKernel {
  const { ops, args, values, functions } = program;
  const numbers = data ?? Float64Array.from(program.data);
  const uses = program.uses(outputs, known);
  const r = new Float64Array(ops.length);
  const lines = ops
    .map((own, to): Line => {
      const { from: op, place } = known?.get(to) ?? { from: own, place: values[to] as number };
      const [a = 0, b = 0, c = 0, d = 0] = args[to] as readonly number[];
      return { to, op, place, a, b, c, d };
    })
    .filter(({ to }) => uses[to]);
  return (low, high, out) => {
    const resultOf = ({ to, op, place, a, b, c, d }: Line): number => {
      const x = r[a] as number;
      const y = r[b] as number;
      switch (op) {
        case "mul":
          return x * y;
        case "add":
          return x + y;
        case "sub":
          return x - y;
        case "pick":
          return r[x < y ? c : d] as number;
        case "div":
          return x / y;
        case "neg":
          return -x;
        case "abs":
          return Math.abs(x);
        case "sqrt":
          return Math.sqrt(x);
        case "exp":
          return exp(x);
        case "log":
          return log(x);
        case "tanh":
          return tanh(x);
        case "min":
          return min(x, y);
        case "max":
          return max(x, y);
        case "low":
          return low[place] as number;
        case "high":
          return high[place] as number;
        case "data":
          return numbers[place] as number;
        case "literal":
          return place;
        case "call":
          return (functions[place] as (...inputs: number[]) => number)(
            ...(args[to] as readonly number[]).map((from) => r[from] as number),
          );
      }
    };
    for (const line of lines) r[line.to] = resultOf(line);
    outputs.forEach((id, i) => {
      out[i] = r[id] as number;
    });
  };
}
