// The expression graph of a loop: plain arrays of nodes, each stored once, and the handle by which users hold a node.
import { type Dimension, NO_DIMENSION } from "../ground/dimension.ts";
import { fail } from "../ground/errors.ts";
import type { LawCard } from "./card.ts";

/**
 * What a node does. `pick(a, b, x, y)` is x where a < b, else y: the slope at a kink. `jump` is the same for what does not
 * exist at the kink (a curvature). `call` runs an ordinary function. `mean` passes its argument on and carries meaning.
 */
export type Op =
  | (
      | "const"
      | "input"
      | "add"
      | "sub"
      | "mul"
      | "div"
      | "neg"
      | "sqrt"
      | "exp"
      | "log"
      | "tanh"
      | "min"
      | "max"
    )
  | ("pick" | "jump" | "call" | "mean");

/** What an identity node says of its value; arithmetic nodes carry nothing and are shared. */
export type Meaning =
  | { readonly kind: "variable" | "given" | "coupling" | "flow" | "report" | "unit"; readonly name: string }
  | {
      readonly kind: "law";
      readonly card: LawCard;
      /** Port (`covers[0].albedo` in lists) → node. */
      readonly wires: Readonly<Record<string, number>>;
      /** Conditions that join several ports, checked like ports in every state. */
      readonly demands: Readonly<Record<string, { readonly node: number; readonly demand: Demand }>>;
    };

/** The range that a combination of ports must keep. */
export interface Demand {
  readonly unit: string;
  readonly within: readonly [number, number];
  /** The combination in words, such as `openAbove − frozenBelow`. */
  readonly about: string;
}

/** An ordinary function of numbers, with its partial derivatives. */
export interface Compute {
  readonly value: (...inputs: number[]) => number;
  readonly partial: (index: number) => Compute;
}

/** Dimension of a bare number: it takes the other operand's in a sum and has none in a product. */
export const BARE = "bare";

declare const names: unique symbol;
/**
 * What a law returns as soon as one of its inputs is a quantity of a loop: a node of the loop's graph, not yet a number.
 * It has no methods, so that whatever accepts a quantity accepts a number as well. `N` is the set of variables, givens
 * and couplings it depends on, known to the type checker. Using it as a number throws `quantity-as-number`.
 */
export class Quantity<out N extends string = string> {
  declare readonly [names]: N;
  /** @internal */
  readonly graph: Graph;
  /** @internal */
  readonly id: number;
  /** @internal */
  constructor(graph: Graph, id: number) {
    this.graph = graph;
    this.id = id;
  }
  /** @internal */
  [Symbol.toPrimitive](): never {
    return fail("quantity-as-number", {
      path: "quantity",
      value: this,
      allowed: "the operations add, sub, mul, div, exp, log, tanh, min, max ...",
    });
  }
}

/** A number or a quantity. */
export type Value<N extends string = string> = number | Quantity<N>;
/** A number when no input was a quantity. */
export type Of<N extends string> = [N] extends [never] ? number : Quantity<N>;

/** The nodes of one loop. A node's arguments always have smaller ids, so ids are an order of evaluation. */
export class Graph {
  readonly ops: Op[] = [];
  readonly args: (readonly number[])[] = [];
  /** The number of a `const`; the index of its function for a `call`. */
  readonly values: number[] = [];
  readonly meanings: (Meaning | undefined)[] = [];
  /** `undefined`: cannot be told (only inside law bodies, which are checked at their ports). */
  readonly dimensions: (Dimension | undefined)[] = [];
  readonly functions: Compute[] = [];
  readonly cards: LawCard[] = [];
  /** How many law bodies are being recorded; outside of them units must agree in every operation. */
  depth = 0;
  readonly #known = new Map<string, number>();

  /** The node of this kind with these arguments; made if it does not exist yet. */
  node(
    op: Op,
    args: readonly number[],
    more: { value?: number; tag?: string; meaning?: Meaning; dimension?: Dimension | undefined } = {},
  ): number {
    const { value = 0, tag = "" } = more;
    const key = `${op} ${args.join()} ${Object.is(value, -0) ? "-0" : value} ${tag}`;
    let id = this.#known.get(key);
    if (id === undefined) {
      id = this.ops.length;
      this.#known.set(key, id);
      this.ops.push(op);
      this.args.push(args);
      this.values.push(value);
      this.meanings.push(more.meaning);
      this.dimensions.push(more.dimension);
    }
    return id;
  }

  /** A constant. One that is not finite is refused: inside an enclosure it would hide behind a `min`. */
  constant(value: number): number {
    if (!Number.isFinite(value)) {
      fail("not-a-number", {
        path: "operation",
        value,
        allowed: "wherever a part of an expression is constant",
      });
    }
    return this.node("const", [], { value, dimension: BARE });
  }

  /** A free input: a variable or a given. */
  input(meaning: Meaning & { readonly name: string }, dimension: Dimension): number {
    return this.node("input", [], { tag: meaning.name, meaning, dimension });
  }

  /** An identity node around `of`. */
  mean(of: number, meaning: Meaning, dimension: Dimension | undefined): number {
    return this.node("mean", [of], { tag: this.#tagOf(meaning), meaning, dimension });
  }

  /** The id of a number or of a quantity of this graph. */
  lift(value: unknown, path = "operation"): number {
    if (typeof value === "number") return this.constant(value);
    if (!(value instanceof Quantity)) return fail("not-a-quantity", { path, value, allowed: "" });
    if (value.graph !== this)
      return fail("other-loop", { path, value: "one of another", allowed: "a quantity of this loop" });
    return value.id;
  }

  /** A function of numbers as a node. */
  call(compute: Compute, args: readonly number[], dimension?: Dimension): number {
    let index = this.functions.indexOf(compute);
    if (index < 0) index = this.functions.push(compute) - 1;
    return this.node("call", args, { value: index, dimension });
  }

  #tagOf(meaning: Meaning): string {
    if (meaning.kind !== "law") return `${meaning.kind} ${meaning.name}`;
    let index = this.cards.indexOf(meaning.card);
    if (index < 0) index = this.cards.push(meaning.card) - 1;
    return `law ${index} ${Object.entries(meaning.wires).join()}`;
  }
}

/** True for the dimension of a pure number. */
export const isPure = (d: Dimension | undefined): boolean => d === NO_DIMENSION || d === BARE;
