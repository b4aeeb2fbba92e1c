// Symbolic derivatives of one node in many others, by one sweep backwards.
import { coneOf } from "./cone.ts";
import { Writer } from "./derivative.ts";
import type { Graph } from "./node.ts";
import type { Op } from "./op.ts";

/** What a rule sees of its node: its id and arguments, and the derivative of the target in it. */
interface Seeded {
  readonly w: Writer;
  readonly id: number;
  readonly args: readonly number[];
  readonly seed: number;
}

/**
 * Nodes of ∂ target / ∂ x for every x in `wrt`, in order (a constant 0 where the target does not depend on it). Each x is
 * an input of its own: what lies behind it does not count. The chain rule is gathered from the target down (reverse
 * accumulation), so that the cost does not grow with the number of inputs.
 */
export function adjoint(g: Graph, target: number, wrt: readonly number[]): number[] {
  const w = new Writer(g);
  const ends = new Set(wrt);
  const cone = coneOf(g, [target], ends);
  const dependent = new Set<number>();
  for (const id of cone) {
    if (ends.has(id) || argumentsOf(g, id).some((a) => dependent.has(a))) dependent.add(id);
  }
  const seeds = new Map<number, number>([[target, w.constant(1)]]);
  for (const id of cone.reverse()) {
    const seed = seeds.get(id);
    if (seed === undefined || ends.has(id) || !dependent.has(id)) continue;
    const args = argumentsOf(g, id);
    const shares = RULES[g.ops[id] as Op]({ w, id, args, seed });
    args.forEach((a, i) => {
      if (dependent.has(a) && shares[i] !== undefined) seeds.set(a, w.add(seeds.get(a), shares[i]));
    });
  }
  return wrt.map((x) => (dependent.has(x) ? seeds.get(x) : undefined) ?? w.constant(0));
}

const argumentsOf = (g: Graph, id: number): readonly number[] => g.args[id] as readonly number[];

type Rule = (x: Seeded) => readonly (number | undefined)[];
const arg = (x: Seeded, i: number): number => x.args[i] as number;
/** The seeds of two arguments: all of it for the first where a < b, else for the second. */
const chosen = (x: Seeded, op: "pick" | "jump", [a, b]: readonly number[]): number[] => {
  const zero = x.w.constant(0);
  const choose = (first: number, second: number) => x.w.g.node(op, [a as number, b as number, first, second]);
  return [choose(x.seed, zero), choose(zero, x.seed)];
};
const branch: Rule = (x) => [undefined, undefined, ...chosen(x, "jump", x.args)];

/** For each operation, the seed times the partial derivative in each argument; a missing one does not compile. */
const RULES: Readonly<Record<Op, Rule>> = {
  const: () => [],
  input: () => [],
  mean: (x) => [x.seed],
  neg: (x) => [x.w.neg(x.seed)],
  add: (x) => [x.seed, x.seed],
  sub: (x) => [x.seed, x.w.neg(x.seed)],
  mul: (x) => [x.w.mul(x.seed, arg(x, 1)), x.w.mul(x.seed, arg(x, 0))],
  // the slope of a/b in b is -(a/b)/b
  div: (x) => {
    const share = x.w.g.node("div", [x.seed, arg(x, 1)]);
    return [share, x.w.neg(x.w.mul(share, x.id))];
  },
  sqrt: (x) => [x.w.g.node("div", [x.seed, x.w.mul(x.w.constant(2), x.id)])],
  exp: (x) => [x.w.mul(x.seed, x.id)],
  log: (x) => [x.w.g.node("div", [x.seed, arg(x, 0)])],
  tanh: (x) => [x.w.mul(x.w.g.node("sub", [x.w.constant(1), x.w.mul(x.id, x.id)]), x.seed)],
  min: (x) => chosen(x, "pick", x.args),
  max: (x) => chosen(x, "pick", [arg(x, 1), arg(x, 0)]),
  step: (x) => [x.w.g.node("jump", [arg(x, 0), ...[0, 0, 0].map(x.w.constant)])],
  pick: branch,
  jump: branch,
  call: (x) => {
    const { partial } = x.w.g.functions[x.w.g.values[x.id] as number] as Graph["functions"][number];
    return x.args.map((_, i) => x.w.mul(x.seed, x.w.g.call(partial(i), x.args)));
  },
};
