// Special values, limits, and the least and greatest of two numbers.
import { describe, expect, it, test } from "vitest";
import { max, min } from "../../src/ground/elementary/minMax.ts";
import { power } from "../../src/ground/elementary/power.ts";
import { every } from "./every.ts";
import { next, previous } from "./ulps.ts";

const LEAST = 5e-324;
const GREATEST = Number.MAX_VALUE;

const at: [string, number[], number][] = [
  ["exp", [0], 1],
  ["exp", [-0], 1],
  ["exp", [Infinity], Infinity],
  ["exp", [-Infinity], 0],
  ["exp", [NaN], NaN],
  ["exp", [LEAST], 1],
  ["exp", [-LEAST], 1],
  ["exp", [GREATEST], Infinity],
  ["exp", [-GREATEST], 0],
  // e^709.782712893384 = 1.79769313486227321783965e308, and at the next double it is above 2^1024 (mpmath)
  ["exp", [709.782712893384], 1.7976931348622732e308],
  ["exp", [next(709.782712893384)], Infinity],
  // e^x = 2^-1075 at x = −745.13321910194120762… (mpmath): half the least double
  ["exp", [-745.1332191019411], LEAST],
  ["exp", [-745.1332191019412], 0],
  ["log", [0], -Infinity],
  ["log", [-0], -Infinity],
  ["log", [1], 0],
  ["log", [Infinity], Infinity],
  ["log", [-Infinity], NaN],
  ["log", [-LEAST], NaN],
  ["log", [-1], NaN],
  ["log", [NaN], NaN],
  // −1074 ln 2 and 1024 ln 2 less 2^-53, rounded (mpmath)
  ["log", [LEAST], -744.4400719213812],
  ["log", [GREATEST], 709.782712893384],
  // −2^-53 − 2^-107, rounded, and 2^-52 − 2^-105, by Taylor's series
  ["log", [previous(1)], -(2 ** -53)],
  ["log", [next(1)], 2 ** -52 - 2 ** -105],
  ["tanh", [0], 0],
  ["tanh", [-0], -0],
  ["tanh", [Infinity], 1],
  ["tanh", [-Infinity], -1],
  ["tanh", [NaN], NaN],
  ["tanh", [LEAST], LEAST],
  ["tanh", [-LEAST], -LEAST],
  ["tanh", [GREATEST], 1],
  ["tanh", [20], 1],
  ["expm1", [0], 0],
  ["expm1", [-0], -0],
  ["expm1", [Infinity], Infinity],
  ["expm1", [-Infinity], -1],
  ["expm1", [NaN], NaN],
  ["expm1", [-LEAST], -LEAST],
  ["expm1", [-800], -1],
  ["expm1", [709.782712893384], 1.7976931348622732e308],
  ["expm1", [710], Infinity],
  ["log1p", [0], 0],
  ["log1p", [-0], -0],
  ["log1p", [-1], -Infinity],
  ["log1p", [Infinity], Infinity],
  ["log1p", [next(-1)], -36.7368005696771],
  ["log1p", [previous(-1)], NaN],
  ["log1p", [-Infinity], NaN],
  ["log1p", [NaN], NaN],
  ["log1p", [LEAST], LEAST],
  ["log1p", [GREATEST], 709.782712893384],
  ["cos", [0], 1],
  ["cos", [-0], 1],
  ["cos", [LEAST], 1],
  ["cos", [Infinity], NaN],
  ["cos", [-Infinity], NaN],
  ["cos", [NaN], NaN],
  ["cos", [next(1e6)], NaN],
  ["sin", [0], 0],
  ["sin", [-0], -0],
  ["sin", [-LEAST], -LEAST],
  ["sin", [Infinity], NaN],
  ["sin", [-Infinity], NaN],
  ["sin", [NaN], NaN],
  ["sin", [previous(-1e6)], NaN],
  ["power", [0, 2.5], 0],
  ["power", [-0, 2.5], 0],
  ["power", [0, -2.5], Infinity],
  ["power", [-0, -3], Infinity],
  ["power", [0, 0], 1],
  ["power", [0, Infinity], 0],
  ["power", [0, -Infinity], Infinity],
  ["power", [Infinity, 0.1], Infinity],
  ["power", [Infinity, -0.1], 0],
  ["power", [Infinity, 0], 1],
  ["power", [Infinity, Infinity], Infinity],
  ["power", [2, Infinity], Infinity],
  ["power", [2, -Infinity], 0],
  ["power", [0.5, Infinity], 0],
  ["power", [0.5, -Infinity], Infinity],
  ["power", [1, Infinity], NaN],
  ["power", [1, -Infinity], NaN],
  ["power", [1, 1e308], 1],
  ["power", [3, -0], 1],
  ["power", [NaN, 0], NaN],
  ["power", [NaN, 1], NaN],
  ["power", [0, NaN], NaN],
  ["power", [2, NaN], NaN],
  ["power", [-1, 2], NaN],
  ["power", [-LEAST, 2], NaN],
  ["power", [-Infinity, 2], NaN],
  ["power", [10, 309], Infinity],
  ["power", [10, -324], 0],
  ["power", [next(1), 1e300], Infinity],
  ["power", [previous(1), 1e300], 0],
  ["power", [7, 1e-320], 1],
  ["power", [LEAST, -1], Infinity],
];

test.each(at)("%s(%o) is %d", (name, x, expected) => {
  expect(every[name]?.(x)).toBe(expected);
});

test("there is a value wherever there should be one", () => {
  const faults: string[] = [];
  const check = (name: string, x: number[], holds: (y: number) => boolean): void => {
    const y = every[name]?.(x) ?? NaN;
    if (!holds(y)) faults.push(`${name}(${x}) = ${y}`);
  };
  for (let size = LEAST; size < Infinity; size *= 1.7) {
    for (const x of [size, -size]) {
      check("exp", [x], (y) => y >= 0);
      check("expm1", [x], (y) => y >= -1 && y > 0 === x > 0);
      check("tanh", [x], (y) => Math.abs(y) <= 1 && y > 0 === x > 0);
      check("cos", [x], (y) => (size <= 1e6 ? Math.abs(y) <= 1 : Number.isNaN(y)));
      check("sin", [x], (y) => (size <= 1e6 ? Math.abs(y) <= 1 : Number.isNaN(y)));
    }
    check("log", [size], (y) => Math.abs(y) < 745);
    check("log1p", [size], (y) => y > 0);
    for (const exponent of [-1e300, -3.3, -LEAST, LEAST, 0.2, 700, 1e300]) {
      check("power", [size, exponent], (y) => y >= 0);
    }
  }
  expect(faults).toEqual([]);
});

describe("power is exact where the exact result is a double", () => {
  it.each([
    [4, 0.5, 2],
    [9, 1.5, 27],
    [10, 22, 1e22],
    [3, 33, 5559060566555523],
    [0.25, -2.5, 32],
    [2, -1074, LEAST],
    [2, 1023, 8.98846567431158e307],
    [1.5, 5, 7.59375],
    [16, 0.25, 2],
  ])("%d^%d is %d", (base, exponent, expected) => {
    expect(power(base, exponent)).toBe(expected);
  });

  it("to the first power", () => {
    for (let x = LEAST; x < Infinity; x *= 3.1) expect(power(x, 1)).toBe(x);
  });
});

describe("min and max", () => {
  it("choose", () => {
    expect([min(1, 2), min(2, 1), max(1, 2), max(2, 1)]).toEqual([1, 1, 2, 2]);
    expect([min(-Infinity, 0), max(Infinity, 0)]).toEqual([-Infinity, Infinity]);
  });

  it("of equal zeros take the second", () => {
    expect([min(0, -0), min(-0, 0), max(0, -0), max(-0, 0)]).toEqual([-0, 0, -0, 0]);
  });

  it.each([
    [NaN, 1],
    [1, NaN],
    [NaN, NaN],
    [NaN, Infinity],
    [-Infinity, NaN],
  ])("of %d and %d are NaN", (a, b) => {
    expect(min(a, b)).toBeNaN();
    expect(max(a, b)).toBeNaN();
  });
});
