// What nodes are: their operations, and the meaning that identity nodes carry.
import type { LawCard } from "./card.ts";

/**
 * What a node does. `step` is 0 below zero and 1 from zero on. `pick(a, b, x, y)` is x where a < b, else y: the slope at a kink. `jump` is the same for what does not
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
      | "step"
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
