// What a reading of a graph is asked for and what it gives, shared by the generator and the interpreter.

import type { Graph } from "../graph/node.ts";
import { fail } from "../ground/errors.ts";

/** Writes the outputs for the inputs; both keep the order in which they were asked for. */
export type Kernel = (inputs: Float64Array, outputs: Float64Array) => void;

/** Which nodes are taken as inputs (anything behind them is not read) and which are wanted. */
export interface ReadingOf {
  readonly inputs: readonly number[];
  readonly outputs: readonly number[];
}

/** A reading that needs an input which it was not given. */
export const missingInput = (g: Graph, id: number): never => {
  const { name } = g.meanings[id] as { name: string };
  return fail("missing", { path: name, value: undefined, allowed: "as an input of the reading" });
};
