// Reads a graph in 300 bits.

import { coneOf } from "../../src/graph/cone.ts";
import type { Graph } from "../../src/graph/node.ts";
import * as big from "./bigNumber.ts";

const ARITHMETIC: Record<string, (a: big.Real, b: big.Real) => big.Big> = {
  ...{ add: big.add, sub: big.sub, mul: big.mul, div: big.div, min: big.min, max: big.max },
  ...{ neg: big.neg, sqrt: big.sqrt, exp: big.exp, log: big.log, tanh: big.tanh, mean: (a) => a },
  step: (a) => big.fromDouble(big.less(a, big.fromDouble(0) as big.Real) ? 0 : 1),
};

/** The values of `outputs` at a point; `null` where a value is not defined. */
export function exactReading(
  g: Graph,
  { inputs, outputs }: { inputs: readonly number[]; outputs: readonly number[] },
  point: ArrayLike<number>,
): big.Big[] {
  const known = new Map<number, big.Big>(inputs.map((id, i) => [id, big.fromDouble(point[i] as number)]));
  for (const id of coneOf(g, outputs, inputs)) {
    if (!known.has(id)) known.set(id, read(g, id, known));
  }
  return outputs.map((id) => known.get(id) as big.Big);
}

function read(g: Graph, id: number, known: ReadonlyMap<number, big.Big>): big.Big {
  const op = g.ops[id] as string;
  if (op === "const") return big.fromDouble(g.values[id] as number);
  const [a, b, x, y] = (g.args[id] as readonly number[]).map((arg) => known.get(arg) as big.Big);
  if (!a || b === null) return null;
  if (op !== "pick" && op !== "jump") return (ARITHMETIC[op] as (typeof ARITHMETIC)["add"])(a, b as big.Real);
  return (big.less(a, b as big.Real) ? x : y) as big.Big;
}
