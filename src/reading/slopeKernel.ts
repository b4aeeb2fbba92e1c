// Reads values together with their slopes in chosen inputs.
import { derivative } from "../graph/derivative.ts";
import type { Graph } from "../graph/node.ts";
import type { Kernel, ReadingOf } from "./readingOf.ts";
import { valueKernel } from "./valueKernel.ts";

/** A reading with slopes: `wrt` are nodes among the inputs. */
export interface SlopesOf extends ReadingOf {
  readonly wrt: readonly number[];
}

/** Writes each output's value, then for each output its slopes in the order of `wrt`; other inputs are held. */
export function slopeKernel(g: Graph, reading: SlopesOf): Kernel {
  return valueKernel(g, { inputs: reading.inputs, outputs: [...reading.outputs, ...slopeNodes(g, reading)] });
}

/** The slope nodes of a reading, output by output. */
export function slopeNodes(g: Graph, { inputs, outputs, wrt }: SlopesOf): number[] {
  return outputs.flatMap((output) => wrt.map((x) => derivative(g, output, x, inputs)));
}
