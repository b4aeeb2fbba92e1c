// The types of laws: what callers give, what a body receives, what comes back.
import type { LawCard, ListPort, Port, Ports } from "../graph/card.ts";
import type { Of, Quantity, Value } from "../graph/quantity.ts";
import type { Range } from "../ground/range.ts";

type Optional = { readonly default: number } | { readonly optional: true };
type WireOf<P, V> = P extends ListPort ? readonly { readonly [K in keyof P["each"]]: V }[] : V;
type Flat<T> = { [K in keyof T]: T[K] } & {};

/** What a caller gives: one value for every port; a port with a default may be left out. */
export type Wires<I extends Ports, V> = Flat<
  { readonly [K in keyof I as I[K] extends Optional ? never : K]: WireOf<I[K], V> } & {
    readonly [K in keyof I as I[K] extends Optional ? K : never]?: WireOf<I[K], V>;
  }
>;

/** What a law's body receives: every port filled, optional ones perhaps not. */
export type Body<I extends Ports> = {
  readonly [K in keyof I]:
    | WireOf<I[K], Quantity>
    | (I[K] extends { readonly optional: true } ? undefined : never);
};

/** What a function of numbers receives. */
export type NumberBody<I extends Ports> = { readonly [K in keyof I]: WireOf<I[K], number> };

/**
 * A law: given numbers it returns a number, given a quantity of a loop for any port it returns a quantity.
 * Throws `missing`, `unknown-name`, `not-a-number`, `out-of-range`, `unit-mismatch`, `other-loop`, `not-finite`.
 */
export interface Law<I extends Ports = Ports> {
  <N extends string = never>(wires: Wires<I, Value<N>>): Of<N>;
  /** The plain facts: ports with units and ranges, source. */
  readonly card: LawCard<I>;
}

/** What every kind of law states. */
export interface LawFacts<I extends Ports> {
  /** The exported name; error messages begin with it. */
  readonly name: string;
  /** One sentence of meaning. */
  readonly about?: string;
  readonly output: Port;
  readonly inputs: I;
  /** Ranges that the source covers; outside there is an answer, with a note. */
  readonly published?: { readonly [K in keyof I]?: Range };
  readonly source?: string;
  /** For a forcing: a budget takes it on its cooling side only, subtracted. */
  readonly reduces?: "cooling";
}

/** The definition of a law. */
export interface LawSpec<I extends Ports> extends LawFacts<I> {
  /** Conditions on several ports together, each a combination and the range that it must keep. */
  readonly demands?: Readonly<Record<string, LawDemand<I>>>;
  /** The formula, from recordable operations with the steps named in the trade's words. */
  readonly write: (ports: Body<I>) => Value;
}

/** A combination of ports and the range that it must keep. */
export interface LawDemand<I extends Ports> {
  readonly unit: string;
  readonly within: Range;
  /** The combination in words, such as `openAbove − frozenBelow`. */
  readonly about: string;
  readonly write: (ports: Body<I>) => Value;
}
