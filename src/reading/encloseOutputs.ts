// Encloses outputs of a graph from enclosures of its inputs.
import { coneOf } from "../graph/cone.ts";
import type { Graph } from "../graph/node.ts";
import type { Op } from "../graph/op.ts";
import type { Range } from "../ground/range.ts";
import type { Enclosure } from "./enclosure.ts";
import { ENCLOSE } from "./enclosureRules.ts";
import type { EnclosureWriter } from "./enclosureWriter.ts";
import { missingInput } from "./readingOf.ts";

/** All finite numbers. */
const ANY: Range = [-1.7976931348623157e308, 1.7976931348623157e308];

/** The numbers that an input may take: finite ones, in its declared range if it has one. */
export const limitsOf = ([low, high]: Range = ANY): Range => [Math.max(low, ANY[0]), Math.min(high, ANY[1])];

/** The steps that compute lo, hi and err of each output. Ordinary functions (sampled laws) cannot be enclosed. */
export function encloseOutputs(
  g: Graph,
  outputs: readonly number[],
  w: EnclosureWriter,
  inputs: ReadonlyMap<number, Enclosure>,
): number[] {
  const known = new Map(inputs);
  const cone = coneOf(g, outputs, inputs.keys());
  for (let i = 0; i < cone.length; i++) {
    const id = cone[i] as number;
    if (!known.has(id)) known.set(id, enclose(g, id, w, known));
  }
  const written: number[] = [];
  for (let i = 0; i < outputs.length; i++) {
    const { lo, hi, err } = known.get(outputs[i] as number) as Enclosure;
    written.push(lo, hi, w.widened(err) ?? w.literal(0));
  }
  return written;
}

function enclose(g: Graph, id: number, w: EnclosureWriter, known: ReadonlyMap<number, Enclosure>): Enclosure {
  const op = g.ops[id] as Op;
  if (op === "input") return missingInput(g, id);
  if (op === "call") throw new Error("an ordinary function has no enclosure");
  const value = g.values[id] as number;
  if (op === "const") {
    const k = w.constant(id, value);
    return { lo: k, hi: k, err: undefined, within: [value, value] };
  }
  const args = g.args[id] as readonly number[];
  // a missing argument is not read
  const arg = (i: number) => known.get(args[i] as number) as Enclosure;
  return ENCLOSE[op](w, arg(0), arg(1), arg(2), arg(3));
}
