// Every rounding is taken outwards: compared with exact whole-number arithmetic, because doubles cannot show it.
import { describe, expect, test } from "vitest";
import { add, div, log, max, min, mul, neg, sqrt, square, sub } from "../../src/graph/operations.ts";
import type { Quantity, Value } from "../../src/graph/quantity.ts";
import { enclosureKernel } from "../../src/reading/enclosureKernel.ts";
import { randomNumbers } from "../graph/randomGraph.ts";
import * as big from "./bigNumber.ts";
import { type Bounds, holds, isKnown } from "./enclosing.ts";
import { enclosed, recorded } from "./recorded.ts";

type Exact = (x: big.Real, y: big.Real, z: big.Real) => big.Big;
type Write = (x: Quantity, y: Quantity, z: Quantity) => Value;

/** An operation as a law writes it, and the same on whole numbers. */
const OPERATIONS: Readonly<Record<string, readonly [Write, Exact]>> = {
  add: [(x, y) => add(x, y), big.add],
  sub: [(x, y) => sub(x, y), big.sub],
  mul: [(x, y) => mul(x, y), big.mul],
  div: [(x, y) => div(x, y), big.div],
  sqrt: [(x) => sqrt(x), big.sqrt],
  square: [(x) => square(x), (x) => big.mul(x, x)],
  // an argument that is itself rounded
  "sum of a sum": [(x, y, z) => add(add(x, y), z), (x, y, z) => big.add(big.add(x, y), z)],
  "difference of a product": [(x, y, z) => sub(mul(x, y), z), (x, y, z) => big.sub(big.mul(x, y), z)],
  "product of sums": [
    (x, y, z) => mul(sub(x, y), add(y, z)),
    (x, y, z) => big.mul(big.sub(x, y), big.add(y, z)),
  ],
  "product of products": [(x, y, z) => mul(mul(x, y), z), (x, y, z) => big.mul(big.mul(x, y), z)],
  "quotient by a sum": [(x, y, z) => div(x, add(y, z)), (x, y, z) => big.div(x, big.add(y, z))],
  "quotient of a product": [(x, y, z) => div(mul(x, y), z), (x, y, z) => big.div(big.mul(x, y), z)],
  "root of a sum": [(x, y) => sqrt(add(x, y)), (x, y) => big.sqrt(big.add(x, y))],
  "square of a sum": [(x, y) => square(add(x, y)), (x, y) => big.mul(big.add(x, y), big.add(x, y))],
};

/** Operations that do not round. */
const EXACT: Readonly<Record<string, readonly [Write, Exact]>> = {
  neg: [(x) => neg(x), big.neg],
  min: [(x, y) => min(x, y), big.min],
  max: [(x, y) => max(x, y), big.max],
};

/** Powers of two around which arguments are drawn: subnormal, tiny, ordinary, huge, next to overflow. */
const SCALES = [-1074, -1060, -1022, -1000, -540, -511, -60, -1, 0, 1, 30, 511, 540, 1000, 1023];
const LAST_BIT = 2 ** -52;

/** A double of a random scale: a short one, one just above a power of two, or any. */
function draw(random: () => number): number {
  const scale = SCALES[Math.floor(random() * SCALES.length)] as number;
  const kind = random();
  const tail = Math.floor(random() * 2 ** 52) * LAST_BIT;
  const mantissa = kind < 0.2 ? 1 + Math.floor(random() * 8) / 8 : kind < 0.5 ? 1 + tail / 64 : 1 + tail;
  const size = scale < -1000 ? mantissa * 2 ** -1000 * 2 ** (scale + 1000) : mantissa * 2 ** scale;
  return random() < 0.5 ? -size : size;
}

interface Case {
  readonly bounds: Bounds;
  readonly truth: big.Real;
  readonly at: string;
}

/** What the kernel says of an operation, with the exact result at every corner of each box (or at each point). */
function cases([write, exact]: readonly [Write, Exact], kind: "points" | "boxes", count: number): Case[] {
  const random = randomNumbers(5);
  const { graph, inputs, outputs } = recorded(write);
  const wide = new Set(kind === "boxes" ? inputs : []);
  const kernel = enclosureKernel(graph, { inputs, outputs: outputs.slice(0, 1), wide });
  const out = new Float64Array(3);
  return Array.from({ length: count }).flatMap(() => {
    const box = inputs.map(() => {
      const a = draw(random);
      const b = kind === "boxes" ? (random() < 0.5 ? draw(random) : a * (1 + random())) : a;
      return a < b ? [a, b] : [b, a];
    }) as [number, number][];
    kernel(
      Float64Array.from(box, (side) => side[0]),
      Float64Array.from(box, (side) => side[1]),
      out,
    );
    const bounds = [...out] as unknown as Bounds;
    if (!isKnown(bounds)) return [];
    const corners = kind === "boxes" ? [0, 1, 2, 3, 4, 5, 6, 7] : [0];
    return corners.map((corner) => {
      const point = box.map((side, i) => side[(corner >> i) & 1] as number);
      const [x, y, z] = point.map(big.fromDouble) as [big.Real, big.Real, big.Real];
      return { bounds, truth: exact(x, y, z) as big.Real, at: `[${point}]: ${bounds}` };
    });
  });
}

const outside = (list: readonly Case[], part: number): string[] =>
  list.filter(({ bounds, truth }) => !holds(bounds, truth, part)).map(({ at }) => at);

describe.each(Object.keys(OPERATIONS))("%s", (name) => {
  const rule = OPERATIONS[name] as readonly [Write, Exact];
  const points = cases(rule, "points", 8000);
  const boxes = cases(rule, "boxes", 600);

  test("holds the exact result, from subnormal numbers to the edge of overflow", () => {
    expect(points.length).toBeGreaterThan(2000);
    expect(boxes.length).toBeGreaterThan(200);
    expect(outside(points, 1).slice(0, 3)).toEqual([]);
    expect(outside(boxes, 1).slice(0, 3)).toEqual([]);
  });

  test("would not without the error, so the check can fail", () => {
    expect(outside(points, 0).length).toBeGreaterThan(points.length / 10);
    expect(outside(boxes, 0).length).toBeGreaterThan(0);
  });
});

test.each(["add", "sub", "mul", "div", "sqrt", "square"])(
  "%s: the error is hardly larger than it must be",
  (name) => {
    // half an ulp is 0.925 of the assumed 1.2e-16 just above a power of two
    const points = cases(OPERATIONS[name] as readonly [Write, Exact], "points", 8000);
    expect(outside(points, 0.85).length).toBeGreaterThan(0);
  },
);

test.each(Object.keys(EXACT))("%s does not round and has no error", (name) => {
  for (const kind of ["points", "boxes"] as const) {
    const list = cases(EXACT[name] as readonly [Write, Exact], kind, 1000);
    expect(list.filter(({ bounds }) => bounds[2] !== 0)).toEqual([]);
    expect(outside(list, 1)).toEqual([]);
  }
});

describe("an argument that is known only vaguely", () => {
  // (z + y) − y with y = 1 rounds to 0 or to 2^-52, where it is 1e-17 or 1.2e-16, and says so
  const vague = (y: Value, z: Value) => sub(add(z, y), y);
  const exact = big.fromDouble;
  test.each<[string, Write, number, big.Big]>([
    ["a product", (x, y, z) => mul(vague(y, z), vague(y, x)), 1e-17, big.mul(exact(1e-17), exact(1e-17))],
    ["a square", (_, y, z) => square(vague(y, z)), 1e-17, big.mul(exact(1e-17), exact(1e-17))],
    ["a quotient", (_, y, z) => div(y, vague(y, z)), 1.2e-16, big.div(exact(1), exact(1.2e-16))],
    [
      "a negative quotient",
      (_, y, z) => div(y, neg(vague(y, z))),
      1.2e-16,
      big.div(exact(-1), exact(1.2e-16)),
    ],
    ["a root", (_, y, z) => sqrt(vague(y, z)), 1.2e-16, big.sqrt(exact(1.2e-16))],
    ["a logarithm", (_, y, z) => log(vague(y, z)), 1.2e-16, big.log(exact(1.2e-16))],
  ])("%s", (_name, write, z, truth) => {
    for (const ranges of [{}, { x: [0, 1], y: [0, 1], z: [0, 1] }] as const) {
      const [bounds] = enclosed(write, ranges)({ x: z, y: 1, z });
      expect(isKnown(bounds)).toBe(true);
      expect(holds(bounds, truth as big.Real)).toBe(true);
      expect(holds(bounds, truth as big.Real, 0)).toBe(false);
    }
  });
});

test("a part of the error that would underflow is not lost when the divisor is tiny too", () => {
  const [x, y, z] = [-1.0633e-319, -1.1927877225728404e-301, -1.118081822086758e-301] as const;
  const [bounds] = enclosed((a, b, c) => div(a, add(b, c)))({ x, y, z });
  const divisor = big.add(big.fromDouble(y), big.fromDouble(z));
  expect(holds(bounds, big.div(big.fromDouble(x), divisor) as big.Real)).toBe(true);
});

describe("an error is no smaller than the roundings it sums, although it is itself rounded", () => {
  // what a sum or a product adds: its own rounding is at most 2^-53 of it, for which 1.2e-16 is taken
  const own = (size: number) => big.mul(big.fromDouble(1.2e-16), big.fromDouble(Math.abs(size)));
  const random = randomNumbers(3);

  test("of a difference that is exactly zero, so that no rounding of its own hides a lack", () => {
    const { graph, inputs } = recorded((x) => x);
    const [x, y, z] = inputs as [number, number, number];
    const left = graph.node("add", [graph.node("add", [x, y]), y]);
    const right = graph.node("mul", [z, graph.constant(1)]);
    const kernel = enclosureKernel(graph, {
      inputs,
      outputs: [graph.node("sub", [left, right])],
      wide: new Set(),
    });
    const out = new Float64Array(3);
    for (let k = 0; k < 200; k++) {
      const [a, b] = [random(), random()];
      kernel(Float64Array.of(a, b, a + b + b), Float64Array.of(a, b, a + b + b), out);
      expect(out[0]).toBe(0);
      const least = [a + b, a + b + b, a + b + b].map(own).reduce(big.add);
      expect(big.less(big.fromDouble(out[2] as number) as big.Real, least as big.Real)).toBe(false);
    }
  });

  test.each([10, 700, 3000])("of %i sums", (count) => {
    const { graph, inputs } = recorded((x) => x);
    const [x, y] = inputs as [number, number, number];
    let sum = x;
    for (let i = 0; i < count; i++) sum = graph.node("add", [sum, graph.node("neg", [y])]);
    const kernel = enclosureKernel(graph, { inputs, outputs: [sum], wide: new Set() });
    const out = new Float64Array(3);
    for (let k = 0; k < 5; k++) {
      const [a, b] = [random(), random()];
      kernel(Float64Array.of(a, b, 0), Float64Array.of(a, b, 0), out);
      let [s, least] = [a, big.fromDouble(0)];
      for (let i = 0; i < count; i++) {
        s -= b;
        least = big.add(least, own(s));
      }
      expect(out[0]).toBe(s);
      expect(big.less(big.fromDouble(out[2] as number) as big.Real, least as big.Real)).toBe(false);
    }
  });
});
