// Records an expression of inputs x, y, z and reads its enclosure.

import { derivative } from "../../src/graph/derivative.ts";
import { Graph } from "../../src/graph/node.ts";
import { Quantity, type Value } from "../../src/graph/quantity.ts";
import { NO_DIMENSION } from "../../src/ground/dimension.ts";
import { enclosureKernel } from "../../src/reading/enclosureKernel.ts";
import { type Bounds, boundsOf } from "./enclosing.ts";

type Interval = readonly [number, number];
type Ranges = { readonly [N in "x" | "y" | "z"]?: Interval };

/** A graph with the expression, its slope and its curvature in x. */
export function recorded(write: (x: Quantity, y: Quantity, z: Quantity) => Value) {
  const graph = new Graph();
  const names = ["x", "y", "z"] as const;
  const inputs = names.map((name) => graph.input({ kind: "given", name }, NO_DIMENSION));
  const [x, y, z] = inputs.map((id) => new Quantity(graph, id)) as [Quantity, Quantity, Quantity];
  const value = graph.lift(write(x, y, z));
  const slope = derivative(graph, value, x.id, inputs);
  const outputs = [value, slope, derivative(graph, slope, x.id, inputs)];
  return { graph, inputs, outputs, names };
}

/** Encloses value, slope and curvature in x; what is not given is 1. Points are points for the kernel too. */
export function enclosed(
  write: (x: Quantity, y: Quantity, z: Quantity) => Value,
  ranges: Ranges = {},
): (box: { readonly [N in "x" | "y" | "z"]?: number | Interval }) => readonly [Bounds, Bounds, Bounds] {
  const { graph, inputs, outputs, names } = recorded(write);
  const declared = new Map(
    names.flatMap((name, i) => (ranges[name] ? [[inputs[i] as number, ranges[name]] as const] : [])),
  );
  return (box) => {
    const sides = names.map((name) => box[name] ?? 1);
    const wide = new Set(inputs.filter((_, i) => typeof sides[i] !== "number"));
    const kernel = enclosureKernel(graph, { inputs, outputs, wide, ranges: declared });
    const end = (side: number | Interval, i: 0 | 1) => (typeof side === "number" ? side : side[i]);
    const out = new Float64Array(9);
    kernel(
      Float64Array.from(sides, (side) => end(side, 0)),
      Float64Array.from(sides, (side) => end(side, 1)),
      out,
    );
    return [boundsOf(out, 0), boundsOf(out, 1), boundsOf(out, 2)];
  };
}
