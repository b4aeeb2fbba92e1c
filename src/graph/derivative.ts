// Symbolic derivatives: more nodes of the same graph, read like any other.
import { coneOf } from "./cone.ts";
import type { Graph } from "./node.ts";
import type { Op } from "./op.ts";

type Rule = (x: DerivativeOf) => number;
/** What a rule sees of its node: ids, and the derivatives of the arguments (`undefined`: zero). */
interface DerivativeOf {
  readonly w: Writer;
  readonly id: number;
  readonly args: readonly number[];
  readonly d: readonly (number | undefined)[];
  /** The first two of both. */
  readonly a: number;
  readonly b: number;
  readonly da: number;
  readonly db: number | undefined;
}

/**
 * Node of ∂ node / ∂ `wrt`, with the nodes in `held` taken as constant. It has no twin in numbers, so it simplifies
 * freely (0·x, 1·x, −−x). At a kink the derivative of min and max is a `pick`; that of a pick is a `jump`.
 */
export function derivative(g: Graph, node: number, wrt: number, held: Iterable<number> = []): number {
  const leaves = new Set(held);
  leaves.delete(wrt);
  const w = new Writer(g);
  const known = new Map<number, number>([[wrt, g.constant(1)]]);
  for (const id of coneOf(g, [node], [...leaves, wrt])) {
    if (known.has(id) || leaves.has(id)) continue;
    const args = g.args[id] as readonly number[];
    const d = args.map((a) => known.get(a));
    if (d.some((x) => x !== undefined))
      known.set(
        id,
        RULES[g.ops[id] as Op]({
          w,
          id,
          args,
          d,
          a: args[0] as number,
          b: args[1] as number,
          da: d[0] as number,
          db: d[1],
        }),
      );
  }
  return known.get(node) ?? g.constant(0);
}

/** Records the arithmetic of derivatives, with the simplifications that only they may use. */
export class Writer {
  declare readonly g: Graph;
  constructor(g: Graph) {
    this.g = g;
  }
  constant = (value: number): number => this.g.constant(value);
  zeroIfNone = (id: number | undefined): number => id ?? this.constant(0);
  is = (id: number, value: number): boolean => this.g.ops[id] === "const" && this.g.values[id] === value;
  mul(a: number, b: number): number {
    if (this.is(a, 1)) return b;
    if (this.is(b, 1)) return a;
    return this.g.node("mul", [Math.min(a, b), Math.max(a, b)]);
  }
  add(a: number | undefined, b: number | undefined): number {
    if (a === undefined || b === undefined) return (a ?? b) as number;
    return this.g.node("add", [Math.min(a, b), Math.max(a, b)]);
  }
  sub(a: number | undefined, b: number | undefined): number {
    if (b === undefined) return a as number;
    return a === undefined ? this.neg(b) : this.g.node("sub", [a, b]);
  }
  neg(a: number): number {
    if (this.g.ops[a] === "neg") return (this.g.args[a] as readonly number[])[0] as number;
    return this.g.ops[a] === "const" ? this.constant(-(this.g.values[a] as number)) : this.g.node("neg", [a]);
  }
  /** The product a d, where d may be zero. */
  times = (a: number, d: number | undefined): number | undefined =>
    d === undefined ? undefined : this.mul(a, d);
  /** The derivatives of what is chosen where a < b, and elsewhere. */
  choose = (op: "pick" | "jump", a: number, b: number, first?: number, second?: number): number =>
    this.g.node(op, [a, b, this.zeroIfNone(first), this.zeroIfNone(second)]);
}

/** One rule for each operation; a missing one does not compile. */
const RULES: Readonly<Record<Op, Rule>> = {
  const: () => 0,
  input: () => 0,
  mean: (x) => x.da,
  neg: (x) => x.w.neg(x.da),
  add: (x) => x.w.add(x.da, x.db),
  sub: (x) => x.w.sub(x.da, x.db),
  mul: (x) =>
    x.a === x.b
      ? x.w.mul(x.w.mul(x.w.constant(2), x.a), x.da)
      : x.w.add(x.w.times(x.b, x.da), x.w.times(x.a, x.db)),
  // (a/b)' = (a' - (a/b) b')/b
  div: (x) => x.w.g.node("div", [x.w.sub(x.da, x.w.times(x.id, x.db)), x.b]),
  sqrt: (x) => x.w.g.node("div", [x.da, x.w.mul(x.w.constant(2), x.id)]),
  exp: (x) => x.w.mul(x.id, x.da),
  log: (x) => x.w.g.node("div", [x.da, x.a]),
  // 1 - tanh^2, from the node itself
  tanh: (x) => x.w.mul(x.w.g.node("sub", [x.w.constant(1), x.w.mul(x.id, x.id)]), x.da),
  min: (x) => x.w.choose("pick", x.a, x.b, x.da, x.db),
  max: (x) => x.w.choose("pick", x.b, x.a, x.da, x.db),
  // zero on both sides, and none at the leap
  step: (x) => x.w.choose("jump", x.a, x.w.constant(0)),
  pick: (x) => x.w.choose("jump", x.a, x.b, x.d[2], x.d[3]),
  jump: (x) => x.w.choose("jump", x.a, x.b, x.d[2], x.d[3]),
  call(x) {
    const { g } = x.w;
    const { partial } = g.functions[g.values[x.id] as number] as Graph["functions"][number];
    let total: number | undefined;
    x.args.forEach((_, i) => {
      if (x.d[i] !== undefined) total = x.w.add(total, x.w.mul(g.call(partial(i), x.args), x.d[i] as number));
    });
    return total as number;
  },
};
