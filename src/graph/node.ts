// The expression graph of a loop: plain arrays of nodes, each stored once.
import { type Dimension, dimensionOf, showDimension } from "../ground/dimension.ts";
import { fail } from "../ground/errors.ts";
import type { LawCard } from "./card.ts";
import { checkCard } from "./checkCard.ts";
import { BARE, dimensionOfNode } from "./dimensionOfNode.ts";
import type { Compute, Meaning, Op } from "./op.ts";
import { type BodyValue, Quantity, type Recorder, type Wired } from "./quantity.ts";

/** The nodes of one loop. A node's arguments always have smaller ids, so ids are an order of evaluation. */
export class Graph implements Recorder {
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
    if (!(value instanceof Quantity))
      return fail("not-a-quantity", { path, value, allowed: "a number, or a quantity of this loop" });
    if (value.graph !== this)
      return fail("other-loop", { path, value: "one of another", allowed: "a quantity of this loop" });
    return value.id;
  }

  /** A function of numbers as a node. */
  call(compute: Compute, args: readonly number[]): number {
    let index = this.functions.indexOf(compute);
    if (index < 0) index = this.functions.push(compute) - 1;
    return this.node("call", args, { value: index });
  }

  record(op: Op, values: readonly unknown[]): Quantity {
    const ids = values.map((v) => this.lift(v, op));
    // a + b and b + a are the same bits, so they are one node
    if ((op === "add" || op === "mul") && (ids[1] as number) < (ids[0] as number)) ids.reverse();
    return new Quantity(this, this.node(op, ids, { dimension: dimensionOfNode(this, op, ids) }));
  }

  checkWire(value: Quantity, unit: string, path: string): void {
    const id = this.lift(value, path);
    if (this.dimensions[id] !== undefined) this.checkUnit(id, unit, path);
  }

  /** Throws if a node has another unit, or none that can be told. */
  checkUnit(id: number, unit: string, path: string): void {
    const found = this.dimensions[id];
    if (found !== BARE && found !== dimensionOf(unit, path)) {
      const value = found === undefined ? "an open unit" : showDimension(found);
      fail("unit-mismatch", { path, value, allowed: unit });
    }
  }

  lawNode(card: LawCard, wires: Wired, body: () => BodyValue): Quantity {
    checkCard(card);
    const { demands, result } = this.#inBody(body);
    const meaning: Meaning = {
      kind: "law",
      card,
      wires: Object.fromEntries(Object.entries(wires).map(([name, v]) => [name, this.lift(v)])),
      demands: Object.fromEntries(demands.map(([name, demand, v]) => [name, { node: this.lift(v), demand }])),
    };
    return new Quantity(
      this,
      this.mean(this.lift(result, card.name), meaning, dimensionOf(card.output.unit)),
    );
  }

  callNode(compute: Compute, wires: Wired): Quantity {
    return new Quantity(
      this,
      this.call(
        compute,
        Object.values(wires).map((v) => this.lift(v)),
      ),
    );
  }

  unitNode(value: Quantity, unit: string): Quantity {
    return new Quantity(this, this.mean(value.id, { kind: "unit", name: unit }, dimensionOf(unit)));
  }

  #inBody<T>(run: () => T): T {
    this.depth++;
    try {
      return run();
    } finally {
      this.depth--;
    }
  }

  #tagOf(meaning: Meaning): string {
    if (meaning.kind !== "law") return `${meaning.kind} ${meaning.name}`;
    let index = this.cards.indexOf(meaning.card);
    if (index < 0) index = this.cards.push(meaning.card) - 1;
    return `law ${index} ${Object.entries(meaning.wires).join()}`;
  }
}
