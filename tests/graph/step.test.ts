// The step: 0 below zero, 1 from there on.
import { describe, expect, test } from "vitest";
import { adjoint } from "../../src/graph/adjoint.ts";
import { derivative } from "../../src/graph/derivative.ts";
import { Graph } from "../../src/graph/node.ts";
import { mul, step, sub } from "../../src/graph/operations.ts";
import { printNode } from "../../src/graph/print.ts";
import { Quantity } from "../../src/graph/quantity.ts";
import { dimensionOf, NO_DIMENSION } from "../../src/ground/dimension.ts";
import { allowGeneration } from "../../src/reading/generation.ts";
import { valueKernel } from "../../src/reading/valueKernel.ts";

const graph = new Graph();
const [x, y] = ["x", "y"].map((name) => graph.input({ kind: "given", name }, dimensionOf("K"))) as [
  number,
  number,
];
const quantity = (id: number) => new Quantity(graph, id);
const leap = step(sub(quantity(x), quantity(y)));

describe("the step of a quantity", () => {
  test.each([true, false])("has the values of the step of a number (generated: %s)", (generate) => {
    allowGeneration(generate);
    const kernel = valueKernel(graph, { inputs: [x, y], outputs: [leap.id] });
    allowGeneration(true);
    const out = new Float64Array(1);
    const values = [-Infinity, -1, -5e-324, -0, 0, 5e-324, 1, Infinity, NaN];
    expect(values.map((v) => step(v))).toEqual([0, 0, 0, 1, 1, 1, 1, 1, NaN]);
    for (const v of values) {
      kernel(Float64Array.of(v, 0), out);
      expect(out[0]).toBe(step(v - 0));
    }
  });

  test("is a pure number, whatever it is taken of", () => {
    expect(graph.dimensions[leap.id]).toBe(NO_DIMENSION);
    expect(() => mul(leap, leap)).not.toThrow();
  });

  test("has the slope 0 by both kinds of derivative, and so has its slope", () => {
    const product = mul(mul(quantity(x), quantity(x)), leap).id;
    const first = derivative(graph, product, x, [x, y]);
    const outputs = [first, derivative(graph, first, x, [x, y]), ...adjoint(graph, product, [x, y])];
    const kernel = valueKernel(graph, { inputs: [x, y], outputs });
    const out = new Float64Array(4);
    kernel(Float64Array.of(3, 1), out);
    expect([...out].map(Math.abs)).toEqual([6, 2, 6, 0]);
    kernel(Float64Array.of(3, 5), out);
    expect([...out].map(Math.abs)).toEqual([0, 0, 0, 0]);
  });

  test("is printed as a bracket that is 1 where it is true", () => {
    const names = new Map([
      [x, "T"],
      [y, "T_0"],
    ]);
    const node = mul(2, leap).id;
    expect(printNode(graph, node, { notation: "text", names })).toBe("(T - T_0 >= 0) * 2");
    expect(printNode(graph, node, { notation: "tex", names })).toBe("\\left[T - T_0 \\ge 0\\right] \\, 2");
  });
});
