// The types of budgets and loops.
import type { Graph } from "../graph/node.ts";
import type { Quantity, Value } from "../graph/quantity.ts";
import type { Range } from "../ground/range.ts";

/** What the writer of a budget is given. */
export interface Tools {
  /** The temperature that closes the budget, K. */
  readonly temperature: Quantity<"variable temperature">;
  /**
   * A parameter that can be set, swept and differentiated. `within` is its allowed range: a value outside is refused,
   * and it fixes the sign that an enclosure may assume.
   */
  given<const M extends string>(
    name: M,
    value: number,
    unit: string,
    options?: { readonly within?: Range },
  ): Quantity<`given ${M}`>;
  /** A state variable besides temperature; its rate of change goes into `rates`. */
  variable<const M extends string>(
    name: M,
    options: { readonly within: Range; readonly unit?: string },
  ): Quantity<`variable ${M}`>;
  /** Declares a quantity through which the climate answers back: it can be read, held and analysed under this name. */
  couple<const M extends string, N extends string = never>(
    name: M,
    value: Value<N>,
  ): Quantity<`coupling ${M}` | N>;
}

/** A flow of energy, W m⁻² of the planet's whole area; a bare value goes between space and surface. */
export type Flow<N extends string = string> =
  | Value<N>
  | {
      readonly value: Value<N>;
      /** The reservoir that gives; `space` for heating and `surface` for cooling unless said. */
      readonly from?: string;
      /** The reservoir that takes. */
      readonly to?: string;
      /** The flow's CF standard name, where there is one. */
      readonly standardName?: string;
    };

/** Flows or other quantities by name. */
export type Named<F> = Readonly<Record<string, F>>;

/** The energy budget of a planet: N = Σ heating − Σ cooling, and C dT/dt = N. */
export interface Budget<N extends string = string> {
  readonly heating: Named<Flow<N>>;
  readonly cooling: Named<Flow<N>>;
  /** Flows between reservoirs that N does not count, such as from the surface to a layer without heat capacity. */
  readonly exchange?: Named<Exclude<Flow<N>, Value<N>> & { readonly from: string; readonly to: string }>;
  /** C, J m⁻² K⁻¹; 0 where temperature follows at once. */
  readonly heatCapacity: Value<N>;
  /** The rate of each further variable, in its unit per second. */
  readonly rates?: Named<Value<N>>;
  /** Other quantities to read in every state; they have no influence. */
  readonly report?: Named<Value<N>>;
}

/** The names of the givens among the names a loop depends on. */
export type Givens<N extends string> = string extends N ? string : N extends `given ${infer G}` ? G : never;
/** The names of the couplings. */
export type Couplings<N extends string> = string extends N
  ? string
  : N extends `coupling ${infer G}`
    ? G
    : never;
/** The names of the variables; temperature is always one. */
export type Variables<N extends string> = string extends N
  ? string
  : "temperature" | (N extends `variable ${infer G}` ? G : never);

/** A state variable of a loop. */
export interface VariableRecord {
  readonly name: string;
  readonly node: number;
  readonly unit: string;
  readonly within: Range;
  /** Node of the rate: N for temperature. */
  readonly rate: number;
}
/** A parameter of a loop. */
export interface GivenRecord {
  readonly name: string;
  readonly node: number;
  readonly value: number;
  readonly unit: string;
  readonly within: Range | undefined;
}
/** A flow of a loop. */
export interface FlowRecord {
  readonly name: string;
  readonly node: number;
  /** 1 heats, −1 cools, 0 is exchanged between other reservoirs. */
  readonly sign: 1 | -1 | 0;
  readonly from: string;
  readonly to: string;
  readonly standardName: string | null;
}

/**
 * A closed budget, ready to be searched. Its parts are for this library's own use; users pass it to `findStates` and its
 * companions. `JSON.stringify` gives its names and values.
 */
export interface Loop<out N extends string = string> {
  /** Never set: carries the names for the type checker. */
  readonly names?: N;
  /** @internal */
  readonly graph: Graph;
  /** @internal The node of N. */
  readonly net: number;
  /** @internal */
  readonly heatCapacity: number;
  /** @internal Temperature is the first. */
  readonly variables: readonly VariableRecord[];
  /** @internal */
  readonly givens: readonly GivenRecord[];
  /** @internal */
  readonly couplings: readonly { readonly name: string; readonly node: number }[];
  /** @internal */
  readonly flows: readonly FlowRecord[];
  /** @internal */
  readonly report: readonly { readonly name: string; readonly node: number }[];
  /** @internal True when a sampled law takes part, so that nothing can be enclosed. */
  readonly sampled: boolean;
  toJSON(): unknown;
}
