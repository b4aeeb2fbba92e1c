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
const NONE: readonly number[] = [];

/** A register that is read instead of computed: from which array, and where. */
export type Known = ReadonlyMap<number, { readonly from: Source; readonly place: number }>;
const NOTHING: Known = /* @__PURE__ */ new Map();

// Programs are mostly written by code that runs for the first time, when a loop over places is many times as fast as one over
// an iterator, a spread or a destructured list.

/** Each step fills one register, known by its number. */
export class ScalarProgram {
  readonly ops: (Operation | Source)[] = [];
  /** The registers that a step reads. */
  readonly args: (readonly number[])[] = [];
  /** The place that a source reads, or its number; the places of data, and those of functions, count from 0. */
  readonly values: number[] = [];
  readonly data: number[] = [];
  readonly functions: Compute["value"][] = [];
  readonly #literals = new Map<number, number>();
  readonly #known = new Map<string | number, number>();

  /** A number that is the same in all programs of one text. */
  literal(value: number): number {
    let id = this.#literals.get(value);
    if (id === undefined) {
      id = this.#add("literal", NONE, value);
      this.#literals.set(value, id);
    }
    return id;
  }
  /** A number that may differ between programs of one text; each has a place of its own, as the text must not depend on it. */
  datum(value: number): number {
    return this.#add("data", NONE, this.data.push(value) - 1);
  }
  input(from: "low" | "high", place: number): number {
    return this.#register(from + place, from, NONE, place);
  }

  /** The register of a step of one or two arguments; equal steps share one. */
  step(op: Exclude<Step, "pick">, a: number, b?: number): number {
    const key = (PLACE[op] * RADIX + a) * RADIX + (b ?? 0);
    return this.#register(key, op, b === undefined ? [a] : [a, b], 0);
  }

  /** The register of c where a < b, else of d. */
  choose(a: number, b: number, c: number, d: number): number {
    return this.#register(`${a},${b},${c},${d}`, "pick", [a, b, c, d], 0);
  }

  /** The register of a step whose arguments are in a list. */
  again(op: Step, args: readonly number[]): number {
    const arg = (i: number) => args[i] as number;
    return op === "pick" ? this.choose(arg(0), arg(1), arg(2), arg(3)) : this.step(op, arg(0), args[1]);
  }

  /** The register of an ordinary function's result. */
  call(value: Compute["value"], args: readonly number[]): number {
    return this.#add("call", args, this.functions.push(value) - 1);
  }

  /**
   * How often each register is read by others, if only `outputs` are wanted and nothing behind `known` ones; each output counts
   * once more. Min and max name their arguments more than once in a text, so these count twice.
   */
  uses(outputs: readonly number[], known: Known = NOTHING): Uint32Array {
    const { ops, args } = this;
    const uses = new Uint32Array(ops.length);
    const count = (id: number, times: number): void => {
      uses[id] = (uses[id] as number) + times;
    };
    for (let i = 0; i < outputs.length; i++) count(outputs[i] as number, 1);
    for (let id = uses.length - 1; id >= 0; id--) {
      if (!uses[id] || known.has(id)) continue;
      const times = ops[id] === "min" || ops[id] === "max" ? 2 : 1;
      const read = args[id] as readonly number[];
      for (let i = 0; i < read.length; i++) count(read[i] as number, times);
    }
    return uses;
  }

  #register(key: string | number, op: Operation | Source, args: readonly number[], value: number): number {
    let id = this.#known.get(key);
    if (id === undefined) {
      id = this.#add(op, args, value);
      this.#known.set(key, id);
    }
    return id;
  }

  #add(op: Operation | Source, args: readonly number[], value: number): number {
    this.args.push(args);
    this.values.push(value);
    return this.ops.push(op) - 1;
  }
}

/** Runs a program on two arrays of inputs and writes its outputs. */
export type ScalarKernel = (low: Float64Array, high: Float64Array, out: Float64Array) => void;

/** How a program is made to run. */
export interface RunOf {
  readonly program: ScalarProgram;
  readonly outputs: readonly number[];
  /** Read anew at each run; the program's own, unless said. */
  readonly data?: Float64Array;
  readonly known?: Known;
}
