// The handle by which users hold a node of a loop's graph, and what a handle may ask of its graph.
import { fail } from "../ground/errors.ts";
import type { LawCard } from "./card.ts";
import type { Compute, Demand, Op } from "./op.ts";

/** A combination of a law's ports with the range that it must keep, as recorded or folded. */
export type DemandValue = readonly [name: string, demand: Demand, value: unknown];

/** What the body of a law gives, recorded or folded. */
export interface BodyValue {
  readonly demands: readonly DemandValue[];
  readonly result: unknown;
}

/**
 * What laws and operations ask of a graph. They reach it only through a quantity, so that a program which uses a law as
 * a plain function does not carry the graph along.
 */
export interface Recorder {
  /** Records an operation on numbers and quantities. */
  record(op: Op, values: readonly unknown[]): Quantity;
  /** Throws if the value is of another graph or has another unit than a port. */
  checkWire(value: Quantity, unit: string, path: string): void;
  /** Runs a law's body, in which units are not compared; the identity node of the call around its result. */
  lawNode(card: LawCard, wires: Wired, body: () => BodyValue): Quantity;
  /** The call of an ordinary function on its wires, in order. */
  callNode(compute: Compute, wires: Wired): Quantity;
  /** The same value with a stated unit. */
  unitNode(value: Quantity, unit: string): Quantity;
}

/** What is connected to each port (`covers[0].albedo` in lists). */
export type Wired = Readonly<Record<string, number | Quantity>>;

declare const names: unique symbol;
/**
 * What a law returns as soon as one of its inputs is a quantity of a loop: a node of the loop's graph, not yet a number.
 * It has no methods, so that whatever accepts a quantity accepts a number as well. `N` is the set of variables, givens
 * and couplings it depends on, known to the type checker. Using it as a number throws `quantity-as-number`.
 */
export class Quantity<out N extends string = string> {
  declare readonly [names]: N;
  /** @internal */
  declare readonly graph: Recorder;
  /** @internal */
  declare readonly id: number;
  /** @internal */
  constructor(graph: Recorder, id: number) {
    this.graph = graph;
    this.id = id;
  }
  /** @internal */
  valueOf(): never {
    return fail("quantity-as-number", {
      path: "quantity",
      value: this,
      allowed: "operations such as add and mul",
    });
  }
  /** @internal */
  toString(): never {
    return this.valueOf();
  }
}

/** A number or a quantity. */
export type Value<N extends string = string> = number | Quantity<N>;
/** A number when no input was a quantity. */
export type Of<N extends string> = [N] extends [never] ? number : Quantity<N>;
