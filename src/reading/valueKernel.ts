// Reads values of a graph.
import type { Graph } from "../graph/node.ts";
import { generateValue } from "./generateValue.ts";
import { mayGenerate } from "./generation.ts";
import { interpretValue } from "./interpretValue.ts";
import type { Kernel, ReadingOf } from "./readingOf.ts";

/** As generated straight-line code, or by the interpreter where code must not be generated: the same bits. */
export function valueKernel(g: Graph, reading: ReadingOf): Kernel {
  return mayGenerate() ? generateValue(g, reading) : interpretValue(g, reading);
}
