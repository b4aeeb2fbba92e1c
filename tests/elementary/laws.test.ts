// Laws that the elementary functions obey among themselves, at random arguments from a fixed seed.
import { describe, expect, it } from "vitest";
import { cos, sin } from "../../src/ground/elementary/cosSin.ts";
import { exp } from "../../src/ground/elementary/exp.ts";
import { expm1 } from "../../src/ground/elementary/expm1.ts";
import { log } from "../../src/ground/elementary/log.ts";
import { log1p } from "../../src/ground/elementary/log1p.ts";
import { power } from "../../src/ground/elementary/power.ts";
import { tanh } from "../../src/ground/elementary/tanh.ts";
import { between } from "./draws.ts";
import { next, previous } from "./ulps.ts";

/** Half an ulp of 1. */
const UNIT = 2 ** -53;

/** The arguments where the law is off by more than its slack. */
function offenders(xs: number[], off: (x: number) => number, slack: (x: number) => number): number[] {
  // slack is itself computed with rounding: a thousandth more covers that
  return xs.filter((x) => !(Math.abs(off(x)) <= slack(x) * 1.001));
}

describe("never falls between neighbours", () => {
  /** Where the entry of the table changes, for exp of the argument. */
  const seams = Array.from({ length: 2000 }, (_, i) => ((i - 1000 + 0.5) * Math.LN2) / 128);
  /** Where the cell changes, for log of the argument. */
  const edges = Array.from(
    { length: 1280 },
    (_, i) => (1 + (i % 128) / 128) * 2 ** (Math.floor(i / 128) - 5),
  );
  const halves = seams.map((x) => x / 2);
  const lessOne = edges.map((x) => x - 1);

  it.each([
    ["exp", exp, [...between(-745, 709), ...between(-1, 1), ...seams]],
    ["log", log, [...between(0, 4), ...between(0.98, 1.02), ...edges]],
    ["tanh", tanh, [...between(-19.1, 19.1), ...between(-0.1, 0.1), ...halves, 1 / 16, -1 / 16, 2 ** -27]],
    ["expm1", expm1, [...between(-38.5, 38), ...between(-0.03, 0.03), ...seams, 1 / 64, -1 / 64, 2 ** -54]],
    ["log1p", log1p, [...between(-0.99, 3), ...between(-0.02, 0.02), ...lessOne, 2 ** -54]],
    ["power in its base", (x: number) => power(x, 1.7), between(0.01, 9)],
    ["power in its exponent", (x: number) => power(3.3, x), between(-300, 300)],
  ])("%s", (_, of, xs) => {
    expect(xs.filter((x) => !(of(previous(x)) <= of(x) && of(x) <= of(next(x))))).toEqual([]);
  });
});

describe("round trips", () => {
  const wide = between(-700, 700);
  const spread = wide.map(exp);

  it("exp(log x) is x", () => {
    // log is off by an ulp at most, that is by 2^-52 |log x|, which moves exp by as much; exp adds an ulp
    // of its own
    const off = (x: number): number => exp(log(x)) / x - 1;
    expect(offenders(spread, off, (x) => 2 * UNIT * (Math.abs(log(x)) + 1))).toEqual([]);
  });

  it("log(exp x) is x", () => {
    const off = (x: number): number => log(exp(x)) - x;
    expect(offenders(wide, off, (x) => 2 * UNIT * (Math.abs(x) + 1))).toEqual([]);
  });

  it("log1p(expm1 x) is x", () => {
    // an ulp of y = expm1 x is 2^-52 |y| at most, and moves log1p y by that times e^-x
    const off = (x: number): number => log1p(expm1(x)) - x;
    const slack = (x: number): number => 2 * UNIT * (Math.abs(expm1(x)) * exp(-x) + Math.abs(x));
    expect(offenders(between(-5, 20), off, slack)).toEqual([]);
  });

  it("(x^1.5)^(2/3) is x", () => {
    // an ulp of each power; and the double next to 2/3 is 2^-53/3 away from it, which counts ln x^1.5 times
    const off = (x: number): number => power(power(x, 1.5), 2 / 3) / x - 1;
    const slack = (x: number): number => 2 * UNIT * (1 + 2 / 3) + (UNIT / 3) * 1.5 * Math.abs(log(x));
    expect(offenders(between(-300, 300).map(exp), off, slack)).toEqual([]);
  });
});

describe("agreement", () => {
  // 0.52 ulp for each function, half an ulp for each sum or quotient
  const positive = between(1, 30);

  it("expm1 is exp − 1", () => {
    // e^x is at most 1.6 times e^x − 1
    const off = (x: number): number => expm1(x) / (exp(x) - 1) - 1;
    expect(offenders(positive, off, () => 2 * UNIT * (0.52 + 0.52 * 1.6 + 1))).toEqual([]);
  });

  it("log1p is log(1 + x)", () => {
    // half an ulp of 1 + x moves its logarithm, which is at least ln 2, by 2^-53
    const off = (x: number): number => log1p(x) / log(1 + x) - 1;
    expect(offenders(positive, off, () => 2 * UNIT * (0.52 + 0.52 + 0.5 / Math.LN2 + 0.5))).toEqual([]);
  });

  it("tanh x is y/(y + 2), y = expm1(2x)", () => {
    // a change of y counts 2/(y + 2) times
    const off = (x: number): number => tanh(x) / (expm1(2 * x) / (expm1(2 * x) + 2)) - 1;
    const slack = (x: number): number => 2 * UNIT * (0.52 + (0.52 * 2) / (expm1(2 * x) + 2) + 1.5);
    expect(offenders(between(-15, 15), off, slack)).toEqual([]);
  });

  it("cos² + sin² is 1", () => {
    // each is off by 0.8·2^-53 at most: together 1.6 (|cos| + |sin|) ≤ 2.3; the squares and their sum add 1.5
    const off = (x: number): number => cos(x) * cos(x) + sin(x) * sin(x) - 1;
    expect(offenders(between(-1e6, 1e6), off, () => 4 * UNIT)).toEqual([]);
  });

  it("sin 2x is 2 sin x cos x", () => {
    // 0.8·2^-53 for sin 2x; 0.8·2^-53 for each factor, times twice the other, at most 2.3 in all; half an
    // ulp for the product
    const off = (x: number): number => sin(2 * x) - 2 * sin(x) * cos(x);
    expect(offenders(between(-3, 3), off, () => UNIT * (0.8 + 2.3 + 0.5))).toEqual([]);
  });
});

it("tanh and sin are odd and cos is even, to the bit", () => {
  const xs = [...between(0, 20), ...between(0, 0.1)];
  expect(xs.filter((x) => tanh(-x) !== -tanh(x) || sin(-x) !== -sin(x) || cos(-x) !== cos(x))).toEqual([]);
});
