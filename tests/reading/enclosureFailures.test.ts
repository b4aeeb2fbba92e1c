// What cannot be enclosed says so; kinks count with both sides; signs come from declared ranges only.
import { describe, expect, test } from "vitest";
import {
  add,
  div,
  exp,
  log,
  max,
  min,
  mul,
  sqrt,
  square,
  step,
  sub,
  tanh,
} from "../../src/graph/operations.ts";
import type { Quantity, Value } from "../../src/graph/quantity.ts";
import { enclosureKernel } from "../../src/reading/enclosureKernel.ts";
import { allowGeneration } from "../../src/reading/generation.ts";
import { refusal } from "../refusal.ts";
import { type Bounds, boundsOf, isKnown } from "./enclosing.ts";
import { enclosed, recorded } from "./recorded.ts";

/** The tests by which a search excludes a zero. */
const decides = ([lo, hi, err]: Bounds): boolean => lo - err > 0 || hi + err < 0;

describe.each([
  ["generated", true],
  ["interpreted", false],
] as const)("%s", (_, generate) => {
  const read: typeof enclosed = (write, ranges) => {
    const of = enclosed(write, ranges);
    return (box) => {
      allowGeneration(generate);
      const result = of(box);
      allowGeneration(true);
      return result;
    };
  };

  describe("a failure decides nothing", () => {
    const rows: [
      string,
      (x: Quantity, y: Quantity) => Value,
      { x: number | [number, number]; y?: number | [number, number] },
    ][] = [
      ["a divisor that may be zero", (x) => div(1, x), { x: [-1, 2] }],
      ["a divisor that ends in zero", (x) => div(1, x), { x: [0, 2] }],
      ["a divisor that is zero", (x) => div(1, x), { x: 0 }],
      ["a divisor that is −0", (x) => div(1, x), { x: -0 }],
      ["zero by zero", (x) => div(x, x), { x: 0 }],
      ["a zero dividend over a box with zero", (x, y) => div(y, x), { x: [0, 2], y: 0 }],
      ["a divisor that vanishes in rounding", (x, y) => div(1, sub(add(x, y), y)), { x: 1e-17, y: 1 }],
      ["a root below zero", (x) => sqrt(x), { x: -1 }],
      ["a root of a box that begins below zero", (x) => sqrt(x), { x: [-1, 4] }],
      ["a root that rounding may push below zero", (x, y) => sqrt(sub(x, y)), { x: 0.3, y: 0.3 }],
      ["a logarithm of zero", (x) => log(x), { x: 0 }],
      ["a logarithm of a box that begins at zero", (x) => log(x), { x: [0, 4] }],
      ["a logarithm of a box that begins below zero", (x) => log(x), { x: [-1, 4] }],
      ["a logarithm of what may be zero", (x, y) => log(sub(add(x, y), y)), { x: 1e-17, y: 1 }],
      ["an exponential that overflows", (x) => exp(x), { x: 800 }],
      ["the end of a box that overflows", (x) => exp(x), { x: [1, 800] }],
      ["a product that overflows", (x) => mul(x, 1e300), { x: [1e10, 1e20] }],
      ["a sum that overflows", (x) => add(x, x), { x: 1.7e308 }],
      ["a negative sum that overflows", (x) => add(x, x), { x: [-1.7e308, -1] }],
      ["a square that overflows", (x) => square(x), { x: [-1e200, 1] }],
      ["overflow in the divisor", (x) => div(1, square(x)), { x: 1e200 }],
      ["an exponential of something far too vague", (x, y) => exp(sub(add(x, y), y)), { x: 1, y: 1e17 }],
    ];
    test.each(rows)("%s", (_name, write, box) => {
      expect(isKnown(read(write)(box)[0])).toBe(false);
      expect(decides(read(write)(box)[0])).toBe(false);
    });
    test.each(rows)("%s, with a constant beside it in a min and a max", (_name, write, box) => {
      for (const side of [min, max]) {
        const bounds = read((x, y) => side(write(x, y), 5))(box)[0];
        expect(isKnown(bounds)).toBe(false);
        expect(decides(bounds)).toBe(false);
      }
    });
    test.each([
      ["[−5, 0] declared and +0 met", [-5, 0], 0],
      ["[0, 5] declared and −0 met", [0, 5], -0],
    ] as const)("a divisor, %s", (_name, range, x) => {
      for (const y of [3, -3] as const) {
        const bounds = read((a, b) => div(b, a), { x: range, y: y > 0 ? [0, 5] : [-5, 0] })({ x, y })[0];
        expect(isKnown(bounds)).toBe(false);
        expect(decides(bounds)).toBe(false);
      }
    });
    test("the slope of a root at zero", () => {
      const [value, slope] = read((x) => sqrt(x))({ x: [0, 4] });
      expect(isKnown(value)).toBe(true);
      expect(value[0]).toBe(0);
      expect(isKnown(slope)).toBe(false);
    });
    test("a slope on a side that is not known because a side has failed", () => {
      const [value, slope] = read((x) => max(log(x), 0))({ x: [-2, -1] });
      expect(isKnown(value)).toBe(false);
      expect(isKnown(slope)).toBe(false);
    });
  });

  describe("a box that is none promises nothing", () => {
    const cube = (x: Quantity) => add(mul(square(x), x), 10);
    test.each([
      ["NaN", NaN, NaN],
      ["NaN at its end", 1, NaN],
      ["infinite", 1, Infinity],
      ["minus infinite", -Infinity, 1],
      ["its ends reversed", 2, 1],
      ["below its declared range", -0.5, 1],
      ["above its declared range", 1, 5.5],
    ])("%s", (_name, low, high) => {
      const all = read(cube, { x: [0, 5] })({ x: [low, high] });
      expect(all.map(isKnown)).toEqual([false, false, false]);
      expect(read(cube, { x: [0, 5] })({ x: [0, 5] }).map(isKnown)).toEqual([true, true, true]);
    });
    test.each([NaN, Infinity, -Infinity, -1, 6])("the point %s", (x) => {
      expect(read(cube, { x: [0, 5] })({ x }).map(isKnown)).toEqual([false, false, false]);
    });
    test("NaN does not hide behind a min or a max", () => {
      for (const side of [min, max]) {
        for (const x of [NaN, [NaN, 9], [-9, NaN]] as const) {
          for (const write of [(a: Quantity) => side(a, 5), (a: Quantity) => side(5, a)]) {
            expect(isKnown(read(write)({ x })[0])).toBe(false);
          }
        }
      }
    });
    test("an infinite input in an infinite range", () => {
      expect(isKnown(read((x) => tanh(x), { x: [0, Infinity] })({ x: Infinity })[0])).toBe(false);
    });
  });

  describe("a leap", () => {
    test.each([
      ["across", [-1, 2], [0, 1]],
      ["up to it", [-1, 0], [0, 1]],
      ["from it on", [0, 2], [1, 1]],
      ["at it", 0, [1, 1]],
      ["at −0", -0, [1, 1]],
      ["below", [-2, -1e-300], [0, 0]],
    ] as const)("%s", (_name, x, [least, greatest]) => {
      expect(read((a) => step(a))({ x })[0]).toEqual([least, greatest, 0]);
    });
    test.each([
      ["across", [-1, 2], false],
      ["ending at it", [-1, 0], false],
      ["at it", 0, false],
      ["beginning at it, where it has its value already", [0, 2], true],
      ["below", [-2, -1e-300], true],
      ["above", [1e-300, 2], true],
    ] as const)("has a slope and a curvature only away from it: %s", (_name, x, known) => {
      const write = (a: Quantity) => add(mul(3, a), mul(5, step(a)));
      const [value, slope, curvature] = read(write)({ x });
      expect([isKnown(value), isKnown(slope), isKnown(curvature)]).toEqual([true, known, known]);
      if (known) expect(slope.slice(0, 2)).toEqual([3, 3]);
    });
    test("of what rounding may take across it", () => {
      const [value, slope] = read((a, b) => step(sub(add(a, b), b)))({ x: 1e-17, y: 1 });
      expect(value.slice(0, 2)).toEqual([0, 1]);
      expect(isKnown(slope)).toBe(false);
    });
    // the difference of two doubles has the sign of the exact one, so it is decided at 0 too, in spite of its error
    test.each([
      ["at it", 0.3, 0.3, 1],
      ["at it, below zero", -2.7, -2.7, 1],
      ["just below it", 0.3 - 2 ** -54, 0.3, 0],
      ["just above it", 0.3 + 2 ** -54, 0.3, 1],
      ["the least number below it", 0, 5e-324, 0],
    ] as const)("of a difference of two exact points, %s", (_name, x, y, expected) => {
      expect(read((a, b) => step(sub(a, b)))({ x, y })[0]).toEqual([expected, expected, 0]);
    });
    test("of a difference that is 0 only because a product was rounded", () => {
      // the doubles 0.1 and 3 have a product below the double next to it
      const z = 0.1 * 3;
      const [value, slope] = read((a, b, c) => step(sub(mul(a, b), c)))({ x: 0.1, y: 3, z });
      expect(value).toEqual([0, 1, 0]);
      expect(isKnown(slope)).toBe(false);
    });
    test("of what has failed fails", () => {
      expect(isKnown(read((a, b) => step(sub(log(a), b)))({ x: -1, y: 0 })[0])).toBe(false);
      for (const x of [-1, [-1, 2]] as const)
        expect(isKnown(read((a) => step(log(a)))({ x })[0])).toBe(false);
      expect(isKnown(read((a) => step(exp(a)))({ x: 800 })[0])).toBe(false);
    });
  });

  describe("a kink", () => {
    const ramp = (x: Quantity, y: Quantity) => max(0, min(1, sub(x, y)));
    const bounds = (list: readonly Bounds[]) => list.map(([lo, hi, err]) => [lo, hi, err]);
    test("undecided: the slope is that of both sides, there is no curvature", () => {
      const [value, slope, curvature] = read(ramp)({ x: [1.5, 2.5], y: 2 });
      expect(value.slice(0, 2)).toEqual([0, 0.5]);
      expect(bounds([slope])).toEqual([[0, 1, 0]]);
      expect(isKnown(curvature)).toBe(false);
    });
    test.each([
      ["below", [1, 1.5], 0],
      ["on the ramp", [2.1, 2.9], 1],
      ["above", [3.5, 4], 0],
    ] as const)("%s: decided", (_name, x, expected) => {
      const [, slope, curvature] = read(ramp)({ x, y: 2 });
      expect(bounds([slope, curvature])).toEqual([
        [expected, expected, 0],
        [0, 0, 0],
      ]);
    });
    test("exactly at the corner of two exact points: both sides", () => {
      const [, slope, curvature] = read((x, y) => max(x, y))({ x: 2, y: 2 });
      expect(bounds([slope])).toEqual([[0, 1, 0]]);
      expect(isKnown(curvature)).toBe(false);
    });
    test("closer to the corner than rounding can tell: both sides", () => {
      const [, slope, curvature] = read((x, y, z) => max(0, sub(add(x, y), z)))({ x: 1e-17, y: 1, z: 1 });
      expect(slope.slice(0, 2)).toEqual([0, 1]);
      expect(isKnown(curvature)).toBe(false);
    });
    test.each([
      ["above the corner, computed below it", 1e-16, 5e-17],
      ["below the corner, computed above it", 1.2e-16, 1.8e-16],
    ])("%s: both sides, whichever side is the vague one", (_name, x, corner) => {
      // (x + 1) − 1 is computed as 0 or 2^-52
      const vague = (a: Quantity, b: Quantity) => sub(add(a, b), b);
      for (const side of [min, max]) {
        for (const write of [
          (a: Quantity, b: Quantity, c: Quantity) => side(vague(a, b), c),
          (a: Quantity, b: Quantity, c: Quantity) => side(c, vague(a, b)),
        ]) {
          const [, slope, curvature] = read(write)({ x, y: 1, z: corner });
          expect(slope.slice(0, 2)).toEqual([0, 1]);
          expect(isKnown(curvature)).toBe(false);
        }
      }
    });
    test("at the end of a box: the side of a = b belongs to the second, as when numbers are read", () => {
      const of = read((x, y) => max(y, x));
      expect(bounds(of({ x: [2, 3], y: 2 }).slice(1))).toEqual([
        [1, 1, 0],
        [0, 0, 0],
      ]);
      const [, slope, curvature] = of({ x: [1, 2], y: 2 });
      expect(bounds([slope])).toEqual([[0, 1, 0]]);
      expect(isKnown(curvature)).toBe(false);
    });
  });

  describe("signs", () => {
    test("none is assumed of an input without a range", () => {
      expect(read((x) => square(x))({ x: [-2, 1] })[0].slice(0, 2)).toEqual([0, 4]);
      expect(read((x, y) => mul(x, y))({ x: [-2, 1], y: [-3, 5] })[0].slice(0, 2)).toEqual([-10, 6]);
    });
    test.each([
      [
        [2, 3],
        [4, 5],
        [8, 15],
      ],
      [
        [2, 3],
        [-5, -4],
        [-15, -8],
      ],
      [
        [-3, -2],
        [4, 5],
        [-15, -8],
      ],
      [
        [-3, -2],
        [-5, -4],
        [8, 15],
      ],
      [
        [-3, 2],
        [4, 5],
        [-15, 10],
      ],
      [
        [-3, 2],
        [-5, -4],
        [-10, 15],
      ],
      [
        [2, 3],
        [-5, 4],
        [-15, 12],
      ],
      [
        [-3, -2],
        [-5, 4],
        [-12, 15],
      ],
      [
        [-3, 2],
        [-5, 4],
        [-12, 15],
      ],
    ] as [[number, number], [number, number], [number, number]][])(
      "%s times %s, with and without declared signs",
      (x, y, product) => {
        const sign = ([low, high]: [number, number]) =>
          (low > 0 ? [0, 9] : high < 0 ? [-9, 0] : [-9, 9]) as [number, number];
        const write = (a: Quantity, b: Quantity) => mul(a, b);
        expect(read(write)({ x, y })[0].slice(0, 2)).toEqual(product);
        expect(read(write, { x: sign(x), y: sign(y) })({ x, y })[0].slice(0, 2)).toEqual(product);
        // 1 over the reciprocals' ends are the same numbers
        if (y[0] * y[1] > 0) {
          const quotient = [x[0] / y[0], x[0] / y[1], x[1] / y[0], x[1] / y[1]];
          const expected = [Math.min(...quotient), Math.max(...quotient)];
          const over = (a: Quantity, b: Quantity) => div(a, b);
          expect(read(over)({ x, y })[0].slice(0, 2)).toEqual(expected);
          expect(read(over, { x: sign(x), y: sign(y) })({ x, y })[0].slice(0, 2)).toEqual(expected);
        }
      },
    );
    test("1 − tanh² has its range exactly, through the middle", () => {
      const [, slope] = read((x) => tanh(x))({ x: [-0.1, 5] });
      expect(slope[1]).toBe(1);
      expect(slope[0]).toBeCloseTo(1.8e-4, 5);
    });
  });

  test("a long sum is no danger to the parser", () => {
    const [bounds] = read(
      (x) => Array.from({ length: 3000 }).reduce<Value>((s, _v, i) => add(mul(s, 0.5), i % 7), x) as Value,
    )({ x: [0, 1] });
    expect(isKnown(bounds)).toBe(true);
  });
});

describe("refused", () => {
  test("a NaN constant under a min, when it is recorded", () => {
    expect(refusal(() => recorded((x) => min(x, log(-1)))).code).toBe("not-a-number");
    expect(refusal(() => recorded((x) => max(x, div(1, 0)))).code).toBe("not-a-number");
  });
  test("an ordinary function", () => {
    const { graph, inputs } = recorded((x) => x);
    const node = graph.call({ value: (x) => x, partial: () => ({}) as never }, inputs.slice(0, 1));
    expect(() => enclosureKernel(graph, { inputs, outputs: [node], wide: new Set() })).toThrow(
      /no enclosure/,
    );
  });
  test("an input that is not among the inputs", () => {
    const { graph, inputs, outputs } = recorded((x, y) => mul(x, y));
    const reading = { inputs: inputs.slice(0, 1), outputs, wide: new Set<number>() };
    expect(refusal(() => enclosureKernel(graph, reading)).code).toBe("missing");
  });
});

test("a point for the kernel and a box of no width agree", () => {
  const { graph, inputs, outputs } = recorded((x, y, z) =>
    div(mul(tanh(x), sub(y, 3)), add(exp(z), square(y))),
  );
  const at = Float64Array.of(0.3, 1.7, -0.4);
  const out = [new Set<number>(), new Set(inputs)].map((wide) => {
    const result = new Float64Array(9);
    enclosureKernel(graph, { inputs, outputs, wide })(at, at, result);
    return result;
  });
  for (const i of [0, 1, 2])
    expect(boundsOf(out[1] as Float64Array, i).slice(0, 2)).toEqual(
      boundsOf(out[0] as Float64Array, i).slice(0, 2),
    );
});
