// A program of small steps on numbers. Every reading of a graph is written once, as such steps; a program is then printed
// as code or run step by step, so that both give the same bits.
import type { Compute } from "../graph/op.ts";

/** `pick(a, b, c, d)` is c where a < b, else d, so also where one is NaN. */
export type Step = keyof typeof PLACE;
/** What no step makes: a place in one of the two arrays of inputs, in the array of data, or a number of the text itself. */
export type Source = "low" | "high" | "data" | "literal";
/** `call` runs an ordinary function of any number of registers. */
export type Operation = Step | "call";

/** Tells steps apart in a key. */
const PLACE = {
  add: 0,
  sub: 1,
  mul: 2,
  div: 3,
  neg: 4,
  abs: 5,
  sqrt: 6,
  exp: 7,
  log: 8,
  tanh: 9,
  pick: 10,
  min: 11,
  max: 12,
} as const;
/** 2^24: more registers than a Map can tell apart, so that keys of two arguments stay exact and different. */
const RADIX = 0x1000000;

/** Each step fills one register, known by its number. */
export class ScalarProgram {
  readonly ops: (Operation | Source)[];
  /** The registers that a step reads. */
  readonly args: (readonly number[])[];
  /** The place that a source reads, or its number; the places of data, and those of functions, count from 0. */
  readonly values: number[];
  readonly data: number[] = [];
  readonly functions: Compute["value"][];
  readonly #known = new Map<string | number, number>();

  /** Empty, or with the steps of another program. */
  constructor(from?: ScalarProgram) {
    this.ops = from ? from.ops.slice() : [];
    this.args = from ? from.args.slice() : [];
    this.values = from ? from.values.slice() : [];
    this.functions = from ? from.functions.slice() : [];
  }

  /** A number that is the same in all programs of one text. */
  literal = (value: number): number => this.#register(`${value}`, "literal", [], value);
  /** A number that may differ between programs of one text; each has a place of its own, as the text must not depend on it. */
  datum(value: number): number {
    const place = this.data.push(value) - 1;
    return this.#register(`d${place}`, "data", [], place);
  }
  input = (from: "low" | "high", place: number): number => this.#register(from + place, from, [], place);

  /** The register of a step; equal steps share one. */
  step(op: Step, ...args: readonly number[]): number {
    const [a, b = 0] = args as [number, number?];
    return this.#register(op === "pick" ? args.join() : (PLACE[op] * RADIX + a) * RADIX + b, op, args, 0);
  }

  /** The register of an ordinary function's result. */
  call(value: Compute["value"], args: readonly number[]): number {
    const place = this.functions.push(value) - 1;
    return this.#register(`f${place}`, "call", args, place);
  }

  /**
   * How often each register is read by others, if only `outputs` are wanted; each of them counts once more. Min and max
   * name their arguments more than once in a text, so these count twice.
   */
  uses(outputs: readonly number[]): Uint32Array {
    const uses = new Uint32Array(this.ops.length);
    for (const id of outputs) uses[id] = (uses[id] as number) + 1;
    for (let id = uses.length - 1; id >= 0; id--) {
      if (!uses[id]) continue;
      const times = this.ops[id] === "min" || this.ops[id] === "max" ? 2 : 1;
      for (const a of this.args[id] as readonly number[]) uses[a] = (uses[a] as number) + times;
    }
    return uses;
  }

  #register(key: string | number, op: Operation | Source, args: readonly number[], value: number): number {
    let id = this.#known.get(key);
    if (id === undefined) {
      id = this.ops.push(op) - 1;
      this.#known.set(key, id);
      this.args.push(args);
      this.values.push(value);
    }
    return id;
  }
}

/** Runs a program on two arrays of inputs and writes its outputs. */
export type ScalarKernel = (low: Float64Array, high: Float64Array, out: Float64Array) => void;
