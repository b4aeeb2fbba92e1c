// Random expressions for tests: run once over numbers (folded), once over quantities (recorded).
import { Graph } from "../../src/graph/node.ts";
import * as operations from "../../src/graph/operations.ts";
import { Quantity, type Value } from "../../src/graph/quantity.ts";
import { NO_DIMENSION } from "../../src/ground/dimension.ts";

/** An expression as data. */
export type Plan =
  | { readonly input: number }
  | { readonly constant: number }
  | { readonly op: string; readonly args: readonly Plan[] };

/** A generator of numbers in [0, 1) with a fixed seed (Park & Miller 1988). */
export function randomNumbers(seed: number): () => number {
  let state = seed;
  return () => {
    state = (state * 48271) % 2147483647;
    return state / 2147483647;
  };
}

const ONE = ["neg", "sqrt", "exp", "log", "tanh", "square", "fourth", "step"];
const TWO = ["add", "sub", "mul", "div", "min", "max"];
const SPECIAL = [0, -0, 1, -1, 0.5, 2, 1e-310, 1e300];

/** A random plan over `inputs` inputs, of at most this depth. */
export function randomPlan(random: () => number, depth: number, inputs: number): Plan {
  const pick = <T>(list: readonly T[]) => list[Math.floor(random() * list.length)] as T;
  if (depth === 0 || random() < 0.15) {
    if (random() < 0.55) return { input: Math.floor(random() * inputs) };
    return { constant: random() < 0.2 ? pick(SPECIAL) : (random() - 0.3) * 4 };
  }
  const draw = () => randomPlan(random, depth - 1, inputs);
  const kind = random();
  if (kind < 0.35) return { op: pick(ONE), args: [draw()] };
  if (kind < 0.93) return { op: pick(TWO), args: [draw(), draw()] };
  return kind < 0.97
    ? { op: "mix", args: [draw(), draw(), draw()] }
    : { op: "sum", args: [draw(), draw(), draw()] };
}

/** Runs a plan over numbers or quantities. */
export function runPlan(plan: Plan, inputs: readonly Value[]): Value {
  if ("input" in plan) return inputs[plan.input] as Value;
  if ("constant" in plan) return plan.constant;
  const op = (operations as unknown as Record<string, (...args: Value[]) => Value>)[plan.op];
  return (op as (...args: Value[]) => Value)(...plan.args.map((a) => runPlan(a, inputs)));
}

/** Records a plan; `undefined` where a constant part is not finite (refused) or no input takes part. */
export function recordPlan(
  plan: Plan,
  inputs: number,
): { graph: Graph; inputs: number[]; output: number } | undefined {
  const graph = new Graph();
  const ids = Array.from({ length: inputs }, (_, i) =>
    graph.input({ kind: "given", name: `x${i}` }, NO_DIMENSION),
  );
  graph.depth = 1;
  try {
    const result = runPlan(
      plan,
      ids.map((id) => new Quantity(graph, id)),
    );
    return result instanceof Quantity ? { graph, inputs: ids, output: result.id } : undefined;
  } catch {
    return undefined;
  }
}
