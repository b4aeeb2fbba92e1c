// What the graph knows of a law: the card it shows. Laws fill it in; printing, notes and documentation read it.
import type { Range } from "../ground/range.ts";

/** One input or the output of a law. */
export interface Port {
  /** The letter of the trade, such as `α`. */
  readonly symbol: string;
  /** A coherent SI unit, such as `W m-2`; `1` for a pure number. */
  readonly unit: string;
  /** What the port is, in a few words; for the documentation. */
  readonly about?: string;
  /** Outside this range the law has no meaning: a number is refused, a state is marked invalid. */
  readonly within?: Range;
  /** Taken when the port is left out. */
  readonly default?: number;
  /** May be left out without a default; the law then does without. */
  readonly optional?: true;
}

/** A port that takes a list of records, such as the covers of a surface. */
export interface ListPort {
  readonly each: Readonly<Record<string, Port>>;
}

/** The inputs of a law by name. */
export type Ports = Readonly<Record<string, Port | ListPort>>;

/** The plain facts of a law: no functions, so that a graph can be posted to a worker. */
export interface LawCard<I extends Ports = Ports> {
  readonly name: string;
  readonly about: string;
  readonly output: Port;
  readonly inputs: I;
  /** Ranges that the source covers; outside there is an answer, with a note. */
  readonly published: Readonly<Record<string, Range>>;
  readonly source: string;
  /** Set for a forcing: it reduces the cooling side of a budget, and is refused where it would do anything else. */
  readonly reduces?: "cooling";
  /** True for a law given as an ordinary function: it cannot be enclosed, its slope is a difference quotient. */
  readonly sampled: boolean;
}
