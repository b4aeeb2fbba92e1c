// λ on the curve p(T) on either side of the kinks of laws.
import { derivative } from "../graph/derivative.ts";
import type { Range } from "../ground/range.ts";
import { inputsOf } from "../loop/inputs.ts";
import type { Loop } from "../loop/types.ts";
import type { Ends } from "../search/enclosed.ts";
import { enclosedNodes } from "../states/enclosedNodes.ts";
import type { Kink } from "../states/kinkNodes.ts";
import { straightNodes } from "./gateCurve.ts";
import { type PlaneReader, planeReader } from "./planeReader.ts";
import { placedKinks, withoutKinks } from "./withoutKinks.ts";

/** A function of temperature and of the second given over a box: bounds of its value and of its slopes in both. */
export interface Arm {
  readonly value: Range;
  readonly slope: Range;
  readonly drift: Range;
}

/** Reads a function over a box. */
export type ArmOver = (temperatures: Range, parameters: Range) => Arm;

/** A side of a kink: the first of the two equal arguments, by the order of their nodes, is the lesser one, or not. */
export interface Side {
  readonly kink: number;
  readonly less: boolean;
}

/** The kinks behind the balance of a loop that move a temperature. */
export interface KinkSides {
  /** For each kink what is zero there, along temperature, for the givens that are set. */
  readonly kinks: readonly { readonly ends: Ends; readonly node: number; readonly over: ArmOver }[];
  set(low: readonly number[], high: readonly number[]): void;
  /** λ on the curve of the balance that is on these sides of some kinks; undefined where that has no curve. */
  on(sides: readonly Side[]): ArmOver | undefined;
}

/** Prepares the kinks of a loop along one given; `place` is that of the second given, among its givens. */
export function kinkSides(loop: Loop, along: string, place: number): KinkSides {
  const { graph } = loop;
  const inputs = inputsOf(loop);
  const [t, q] = [inputs[0] as number, inputs[loop.variables.length + place] as number];
  const kinks = placedKinks(loop);
  const nodes = enclosedNodes(loop, new Set([q]));
  const readers: PlaneReader[] = [];
  const made = new Map<string, ArmOver | undefined>();
  let givens: readonly number[] = [];
  const armOf = (node: number): ArmOver => {
    const reader = planeReader(
      loop,
      [place],
      [node, ...[t, q].map((x) => derivative(graph, node, x, inputs))],
    );
    reader.set(givens);
    readers.push(reader);
    return (temperatures, parameters) => {
      const [value, slope, drift] = reader.over(temperatures, parameters) as [Range, Range, Range];
      return { value, slope, drift };
    };
  };
  const sideOf = (sides: readonly Side[]): ArmOver | undefined => {
    const without = withoutKinks(
      loop,
      sides.map(({ kink, less }) => ({ kink: kinks[kink] as Kink, less })),
    );
    const nodes = straightNodes({ ...loop, net: without }, along);
    return nodes && armOf(nodes.feedback);
  };
  return {
    kinks: kinks.map(({ node }) => ({ node, ends: nodes.of(node), over: armOf(node) })),
    set(low, high) {
      givens = low;
      nodes.set(low, high);
      for (const reader of readers) reader.set(low);
    },
    on(sides) {
      const name = sides.map(({ kink, less }) => `${kink}${less ? "-" : "+"}`).join("");
      if (!made.has(name)) made.set(name, sideOf(sides));
      return made.get(name);
    },
  };
}
