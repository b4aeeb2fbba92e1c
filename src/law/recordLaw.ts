// Records a law alone, with every port a free input: for its slopes and its printed formula.
import type { ListPort, Port, Ports } from "../graph/card.ts";
import { Graph } from "../graph/node.ts";
import { Quantity } from "../graph/quantity.ts";
import { dimensionOf } from "../ground/dimension.ts";
import type { Law } from "./types.ts";
import { isList } from "./wiring.ts";

/** A law's graph with a free input for each wire. */
export interface RecordedLaw {
  readonly graph: Graph;
  readonly output: number;
  /** Path of each wire (`covers[0].albedo` in lists), its port and its node. */
  readonly inputs: readonly { readonly path: string; readonly port: Port; readonly node: number }[];
}

/** Which ports are wired, and how many records each list has. */
export interface Shape {
  readonly rows: (list: string) => number;
  /** Whether an optional port is wired. */
  readonly has: (port: string) => boolean;
  /** Wires that stay numbers: what must be a number in this law (as fractions of a complete cover). */
  readonly fixed?: (path: string) => number | undefined;
}

/** Records a law for a shape. Throws what the law throws. */
export function recordLaw<I extends Ports>(law: Law<I>, { rows, has, fixed }: Shape): RecordedLaw {
  const graph = new Graph();
  const inputs: { path: string; port: Port; node: number }[] = [];
  const free = (path: string, port: Port): Quantity | number => {
    const number = fixed?.(path);
    if (number !== undefined) return number;
    const node = graph.input({ kind: "given", name: path }, dimensionOf(port.unit));
    inputs.push({ path, port, node });
    return new Quantity(graph, node);
  };
  const wires: Record<string, unknown> = {};
  for (const [name, port] of Object.entries(law.card.inputs) as [string, Port | ListPort][]) {
    if (isList(port)) {
      wires[name] = Array.from({ length: rows(name) }, (_, i) =>
        Object.fromEntries(Object.entries(port.each).map(([k, p]) => [k, free(`${name}[${i}].${k}`, p)])),
      );
    } else if (!port.optional || has(name)) wires[name] = free(name, port);
  }
  const result = (law as unknown as (wires: unknown) => Quantity)(wires);
  return { graph, output: result.id, inputs };
}
