// Functions with known zeros, shared by the tests of the proved search.
import type { Enclosed } from "../../src/search/enclosed.ts";
import {
  add,
  constant,
  enclosedBy,
  type Jet,
  larger,
  magnitude,
  multiply,
  negate,
  reciprocal,
  root,
  scale,
  shift,
  smaller,
  squared,
  step,
  subtract,
  tanh,
} from "./jet.ts";

export interface Problem {
  readonly title: string;
  readonly f: (x: Jet) => Jet;
  readonly range: readonly [number, number];
  /** All zeros. */
  readonly zeros: readonly number[];
  /** Which of them cannot be decided, and why. */
  readonly doubts?: readonly string[];
  readonly cuts?: readonly number[];
}

const product =
  (...zeros: number[]) =>
  (x: Jet): Jet =>
    zeros.map((z) => shift(x, -z)).reduce(multiply);
const fourth = (x: Jet): Jet => squared(squared(x));

/** An ice–albedo balance: absorbed share of a flux, by tanh, minus 0.6 σT⁴; its folds are in table i of `tests/reference`. */
export const ice =
  (flux: number) =>
  (t: Jet): Jet => {
    const share = shift(scale(0.2, tanh(scale(0.1, shift(t, -265)))), 0.5);
    return subtract(scale(flux / 4, share), scale(0.6 * 5.67e-8, fourth(t)));
  };
/** Rises by 64 over the ramp [250, 282] at flux 128, as the straight line of slope 2 does. */
export const ramp =
  (flux: number, at250: number) =>
  (t: Jet): Jet => {
    const u = smaller(larger(scale(1 / 32, shift(t, -250)), constant(0)), constant(1));
    return subtract(scale(flux, shift(scale(0.5, u), 0.25)), shift(scale(2, shift(t, -250)), at250));
  };

export const smooth: readonly Problem[] = [
  { title: "a straight line", f: (x) => shift(x, -1), range: [-5, 9], zeros: [1] },
  { title: "a zero at 0", f: (x) => x, range: [-5, 9], zeros: [0] },
  { title: "no zero", f: (x) => shift(squared(x), 1), range: [-5, 9], zeros: [] },
  {
    title: "eight zeros",
    f: product(1, 2, 3, 4, 5, 6, 7, 8),
    range: [-9, 9.5],
    zeros: [1, 2, 3, 4, 5, 6, 7, 8],
  },
  { title: "a cluster 1e-3 apart", f: product(1, 1.001, 1.002), range: [-9, 9], zeros: [1, 1.001, 1.002] },
  {
    title: "a cluster 1e-6 apart",
    f: product(1, 1.000001, 1.000002),
    range: [-9, 9],
    zeros: [1, 1.000001, 1.000002],
  },
  // tanh(2x) = x: mpmath's findroot with 30 digits gives 0.957504024077268640676501530502
  {
    title: "tanh minus a line",
    f: (x) => subtract(tanh(scale(2, x)), x),
    range: [-40, 50],
    zeros: [-0.9575040240772686, 0, 0.9575040240772686],
  },
];

export const doubtful: readonly Problem[] = [
  {
    title: "a double zero",
    f: (x) => squared(shift(x, -280)),
    range: [2.7, 2000],
    zeros: [280],
    doubts: ["fold"],
  },
  { title: "x² at 0", f: squared, range: [-10, 12], zeros: [0], doubts: ["fold"] },
  { title: "a triple zero", f: product(3, 3, 3), range: [-10, 12], zeros: [3], doubts: ["fold"] },
  { title: "|x − 1|", f: (x) => magnitude(shift(x, -1)), range: [-5, 9], zeros: [1], doubts: ["corner"] },
  {
    title: "|x − 1|, with the kink known",
    f: (x) => magnitude(shift(x, -1)),
    range: [-5, 9],
    zeros: [1],
    doubts: ["corner"],
    cuts: [1],
  },
  {
    title: "a ramp's corner on zero",
    f: ramp(256, 64),
    range: [2.7, 2000],
    zeros: [250, 314],
    doubts: ["corner"],
  },
  {
    title: "a ramp as steep as the line",
    f: ramp(128, 32),
    range: [2.7, 2000],
    zeros: [250, 266, 282],
    doubts: ["flat"],
  },
  {
    title: "a ramp as steep as the line, with the kinks known",
    f: ramp(128, 32),
    range: [2.7, 2000],
    zeros: [250, 266, 282],
    doubts: ["flat"],
    cuts: [250, 282],
  },
  {
    title: "zero everywhere",
    f: (x) => subtract(x, x),
    range: [-100, 900],
    zeros: [0, 500],
    doubts: ["flat"],
  },
  {
    title: "a step through zero",
    f: (x) => step(shift(x, -1), constant(-1), constant(1)),
    range: [-5, 9],
    zeros: [1],
    doubts: ["jump"],
  },
  { title: "a pole", f: (x) => reciprocal(shift(x, -1)), range: [-5, 9], zeros: [1], doubts: ["undefined"] },
  {
    title: "no value on one side",
    f: (x) => shift(root(shift(x, -1)), -1),
    range: [-50, 90],
    zeros: [1, 2],
    doubts: ["undefined"],
  },
  { title: "a zero at the lower end", f: (x) => shift(x, -1), range: [1, 9], zeros: [1], doubts: ["edge"] },
  { title: "a zero at the upper end", f: (x) => shift(x, -9), range: [1, 9], zeros: [9], doubts: ["edge"] },
  { title: "a double zero at the end", f: squared, range: [0, 9], zeros: [0], doubts: ["edge"] },
];

export const cornered: readonly Problem[] = [
  {
    title: "a crossing at a kink",
    f: (x) => larger(shift(x, -1), scale(3, shift(x, -1))),
    range: [-5, 9],
    zeros: [1],
  },
  {
    title: "a crossing at a known kink",
    f: (x) => larger(shift(x, -1), scale(3, shift(x, -1))),
    range: [-5, 9],
    zeros: [1],
    cuts: [1],
  },
  { title: "a ramp with three zeros", f: ramp(256, 70), range: [2.7, 2000], zeros: [247, 253, 311] },
  {
    title: "a ramp with three zeros and known kinks",
    f: ramp(256, 70),
    range: [2.7, 2000],
    zeros: [247, 253, 311],
    cuts: [282, 250],
  },
  {
    title: "a known kink where there is none",
    f: (x) => add(x, negate(constant(1))),
    range: [-5, 9],
    zeros: [1],
    cuts: [1, 3, 3, 9, 100, Number.NaN],
  },
];

export const enclosed = (problem: Problem): Enclosed => enclosedBy(problem.f);
