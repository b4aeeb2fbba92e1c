// Numbers folded, generated code and the interpreter must give the same bits: there is one physics, not three.
import { describe, expect, test } from "vitest";
import { Graph } from "../../src/graph/node.ts";
import type { Op } from "../../src/graph/op.ts";
import { Quantity } from "../../src/graph/quantity.ts";
import { NO_DIMENSION } from "../../src/ground/dimension.ts";
import { generateScalar } from "../../src/reading/generateScalar.ts";
import { interpretScalar } from "../../src/reading/interpretScalar.ts";
import type { ReadingOf } from "../../src/reading/readingOf.ts";
import { slopeNodes } from "../../src/reading/slopeKernel.ts";
import { valueProgram } from "../../src/reading/valueKernel.ts";
import { randomNumbers, randomPlan, recordPlan, runPlan } from "./randomGraph.ts";

const kernelBy = (make: typeof generateScalar) => (graph: Graph, reading: ReadingOf) => {
  const run = make(valueProgram(graph, reading));
  return (x: Float64Array, out: Float64Array) => run(x, x, out);
};
const generateValue = kernelBy(generateScalar);
const interpretValue = kernelBy(interpretScalar);

const INPUTS = 3;
const POINTS = [0, -0, 1, -1, 300, 1e-320, -1e200];

describe("folded = generated = interpreted", () => {
  test("in value and slope on 6,000 random graphs, with ±0, min, max and partial folding", () => {
    const random = randomNumbers(7);
    const differences: string[] = [];
    const seen = { graphs: 0, points: 0, numbers: 0, zeros: 0, nans: 0, infinities: 0 };
    for (let k = 0; k < 6000; k++) {
      const plan = randomPlan(random, 5, INPUTS);
      const recorded = recordPlan(plan, INPUTS);
      if (!recorded) continue;
      seen.graphs++;
      const { graph, inputs, output } = recorded;
      const slopes = slopeNodes(graph, { inputs, outputs: [output], wrt: inputs });
      const reading = { inputs, outputs: [output, ...slopes] };
      const generated = generateValue(graph, reading);
      const interpreted = interpretValue(graph, reading);
      const a = new Float64Array(1 + INPUTS);
      const b = new Float64Array(1 + INPUTS);
      for (let t = 0; t < 8; t++) {
        const draw = () =>
          random() < 0.15 ? (POINTS[Math.floor(random() * POINTS.length)] as number) : (random() - 0.3) * 5;
        const x = Float64Array.from({ length: INPUTS }, draw);
        const folded = runPlan(plan, [...x]) as number;
        generated(x, a);
        interpreted(x, b);
        seen.points++;
        if (Number.isNaN(folded)) seen.nans++;
        else if (!Number.isFinite(folded)) seen.infinities++;
        else if (folded === 0) seen.zeros++;
        else seen.numbers++;
        if (!Object.is(folded, a[0]) || a.some((v, i) => !Object.is(v, b[i]))) {
          differences.push(`${JSON.stringify(plan)} at ${x}: ${folded} ${a} ${b}`);
        }
      }
    }
    expect(differences.slice(0, 3)).toEqual([]);
    expect(seen.graphs).toBeGreaterThan(3000);
    expect(Math.min(seen.numbers, seen.zeros * 20, seen.nans, seen.infinities * 20)).toBeGreaterThan(1000);
  });

  test("a part that is partly constant is folded to the bits that the whole would have", () => {
    const plan = { op: "mul", args: [{ op: "div", args: [{ constant: 1 }, { constant: 3 }] }, { input: 0 }] };
    const { graph, inputs, output } = recordPlan(plan, 1) as NonNullable<ReturnType<typeof recordPlan>>;
    expect(graph.ops.filter((op) => op === "div")).toEqual([]);
    const out = new Float64Array(1);
    generateValue(graph, { inputs, outputs: [output] })(Float64Array.of(0.7), out);
    expect(out[0]).toBe((1 / 3) * 0.7);
  });
});

test("a + b and b + a are one node, and so are a·b and b·a; a − b and b − a are not", () => {
  const graph = new Graph();
  const [a, b] = ["a", "b"].map((name) => graph.input({ kind: "given", name }, NO_DIMENSION)) as [
    number,
    number,
  ];
  const id = (op: Op, ...args: number[]) =>
    graph.record(
      op,
      args.map((node) => new Quantity(graph, node)),
    ).id;
  expect(id("add", a, b)).toBe(id("add", b, a));
  expect(id("mul", a, b)).toBe(id("mul", b, a));
  expect(id("sub", a, b)).not.toBe(id("sub", b, a));
});
