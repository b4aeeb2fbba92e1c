// A node written as a product of two others.
import { describe, expect, test } from "vitest";
import { factorsOf } from "../../src/graph/factors.ts";
import { Graph } from "../../src/graph/node.ts";
import { Quantity, type Value } from "../../src/graph/quantity.ts";
import { NO_DIMENSION } from "../../src/ground/dimension.ts";
import { add, div, exp, inUnit, mul, neg, square, sub } from "../../src/index.ts";
import { valueKernel } from "../../src/reading/valueKernel.ts";

type Write = (x: Quantity, p: Quantity) => Value;

/** The ways found for a formula, and their factors at x = 1.7, p = −0.6 with what is left. */
function waysOf(write: Write) {
  const graph = new Graph();
  const [x, p] = ["x", "p"].map((name) => graph.input({ kind: "given", name }, NO_DIMENSION)) as [
    number,
    number,
  ];
  const target = (write(new Quantity(graph, x), new Quantity(graph, p)) as Quantity).id;
  const out = new Float64Array(1);
  const value = (node: number) => {
    valueKernel(graph, { inputs: [x, p], outputs: [node] })(Float64Array.of(1.7, -0.6), out);
    return out[0] as number;
  };
  const ways = factorsOf(graph, target, x).map(({ factor, rest }) => [value(factor), value(rest)] as const);
  return { ways, whole: value(target) };
}

describe("a node is a product", () => {
  test.each<[string, number, Write]>([
    ["as a multiplication", 1.7, (x, p) => mul(x, sub(p, x))],
    ["by what the terms of a sum share", 1.7, (x, p) => sub(mul(p, x), square(x))],
    [
      "through names, signs and quotients",
      1.7,
      (x, p) => inUnit(neg(div(mul(inUnit(x, "1"), add(x, p)), p)), "1"),
    ],
    ["inside a sum of sums", 1.7, (x, p) => add(sub(mul(p, x), mul(x, exp(x))), mul(3, x))],
    ["by a part that is no input", 2.7, (x, p) => sub(mul(add(x, 1), p), mul(add(x, 1), square(x)))],
  ])("%s", (_, factor, write) => {
    const { ways, whole } = waysOf(write);
    expect(ways.some(([first]) => Math.abs(first - factor) < 1e-15)).toBe(true);
    // a product of doubles, rounded a few times
    for (const [first, rest] of ways)
      expect(Math.abs(first * rest - whole)).toBeLessThan(1e-14 * Math.abs(whole));
  });

  test.each<[string, Write]>([
    ["where one term has no such factor", (x, p) => add(1, sub(mul(p, x), square(x)))],
    ["where only the parameter is shared", (x, p) => mul(p, sub(x, 3))],
    ["where it is in a divisor", (x, p) => div(p, x)],
    ["where it is inside a function", (x, p) => mul(p, exp(x))],
  ])("but not %s", (_, write) => {
    expect(waysOf(write).ways).toEqual([]);
  });
});
