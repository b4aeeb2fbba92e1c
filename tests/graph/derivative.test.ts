// Symbolic derivatives against difference quotients, and their decisions at kinks.
import { describe, expect, test } from "vitest";
import { derivative } from "../../src/graph/derivative.ts";
import { Graph } from "../../src/graph/node.ts";
import { max, min, mul, square, sub } from "../../src/graph/operations.ts";
import { Quantity } from "../../src/graph/quantity.ts";
import { NO_DIMENSION } from "../../src/ground/dimension.ts";
import { valueKernel } from "../../src/reading/valueKernel.ts";
import { randomNumbers, randomPlan, recordPlan } from "./randomGraph.ts";

describe("derivatives", () => {
  test("first and second derivatives of random graphs agree with central differences", () => {
    const random = randomNumbers(11);
    let compared = 0;
    for (let k = 0; k < 3000; k++) {
      const recorded = recordPlan(randomPlan(random, 4, 2), 2);
      if (!recorded) continue;
      const { graph, inputs, output } = recorded;
      const [x] = inputs as [number, number];
      const first = derivative(graph, output, x, inputs);
      const second = derivative(graph, first, x, inputs);
      const kernel = valueKernel(graph, { inputs, outputs: [output, first, second] });
      const at = (v: number) => {
        const out = new Float64Array(3);
        kernel(Float64Array.of(v, 0.8), out);
        return out;
      };
      const h = 1e-4;
      const here = at(0.6);
      const [left, right] = [at(0.6 - h), at(0.6 + h)];
      // a kink or a steep place near the point makes the quotients disagree among themselves: no verdict there
      const quotients = [1, 2, 4].map(
        (s) => ((at(0.6 + s * h)[0] as number) - (at(0.6 - s * h)[0] as number)) / (2 * s * h),
      );
      const smooth = quotients.every(
        (q) => Math.abs(q - (quotients[0] as number)) < 1e-6 * (1 + Math.abs(q)),
      );
      if (!smooth || ![...here, ...left, ...right].every((v) => Math.abs(v) < 1e3)) continue;
      const slope = (8 * (quotients[0] as number) - 2 * (quotients[1] as number)) / 6;
      expect(Math.abs((here[1] as number) - slope)).toBeLessThan(1e-5 * (1 + Math.abs(slope)));
      const curvature = ((right[1] as number) - (left[1] as number)) / (2 * h);
      if (
        Math.abs((at(0.6 + 2 * h)[1] as number) - (at(0.6 - 2 * h)[1] as number) - 4 * h * curvature) < 1e-7
      ) {
        expect(Math.abs((here[2] as number) - curvature)).toBeLessThan(1e-3 * (1 + Math.abs(curvature)));
      }
      compared++;
    }
    expect(compared).toBeGreaterThan(500);
  });

  test("what is held counts as constant", () => {
    const g = new Graph();
    const x = g.input({ kind: "given", name: "x" }, NO_DIMENSION);
    const held = square(new Quantity(g, x)).id;
    const product = mul(new Quantity(g, held), new Quantity(g, x)).id;
    const value = (node: number, inputs: number[], at: number[]) => {
      const out = new Float64Array(1);
      valueKernel(g, { inputs, outputs: [node] })(Float64Array.from(at), out);
      return out[0];
    };
    expect(value(derivative(g, product, x), [x], [3])).toBe(27);
    expect(value(derivative(g, product, x, [held]), [x, held], [3, 5])).toBe(5);
    expect(value(derivative(g, product, held, [x]), [x, held], [3, 5])).toBe(3);
    expect(g.ops[derivative(g, held, product)]).toBe("const");
  });

  test("at a kink the slope is the one on the side of the second argument", () => {
    const g = new Graph();
    const x = g.input({ kind: "given", name: "x" }, NO_DIMENSION);
    const q = new Quantity(g, x);
    const slopes = (node: Quantity, at: number) => {
      const out = new Float64Array(1);
      valueKernel(g, { inputs: [x], outputs: [derivative(g, node.id, x)] })(Float64Array.of(at), out);
      return out[0];
    };
    const roof = min(q, sub(2, q));
    const ditch = max(sub(2, q), q);
    expect([0, 1, 2].map((at) => slopes(roof, at))).toEqual([1, -1, -1]);
    expect([0, 1, 2].map((at) => slopes(ditch, at))).toEqual([-1, 1, 1]);
  });
});
