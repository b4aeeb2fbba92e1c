// The folds of a loop in two of its givens.
import { describe, expect, test } from "vitest";
import { traceBranches } from "../../src/branches/traceBranches.ts";
import { traceFolds } from "../../src/branches/traceFolds.ts";
import { add, exp, mul, square, sub } from "../../src/index.ts";
import { refusal } from "../refusal.ts";
import { distantLoop, formulaLoop, sampledLoop, twoGivens, vapourLoop } from "./loops.ts";

const WITHIN = [150, 400] as const;

describe("the folds of an icy planet in luminosity and in the width of its ice line", () => {
  const loop = distantLoop();
  const diagram = traceFolds(loop, { along: "luminosity", and: "width", between: [2, 60], within: WITHIN });
  const tracedAt = (width: number) =>
    traceBranches(loop, { along: "luminosity", between: [1e25, 1e28], within: WITHIN, at: { width } });

  test("are two curves that meet in a cusp", () => {
    expect(diagram).toMatchObject({ proof: "proved", complete: true, undecided: [] });
    expect(diagram.curves).toMatchObject([
      { exists: "below", ends: ["between", "cusp"] },
      { exists: "above", ends: ["between", "cusp"] },
    ]);
    expect(diagram.cusps).toMatchObject([{ exists: "below", curves: [0, 1] }]);
  });

  test("have two folds on one side of the cusp and none on the other", () => {
    const width = diagram.cusps[0]?.and as number;
    expect(tracedAt(width - 1e-3).folds).toHaveLength(2);
    expect(tracedAt(width + 1e-3)).toMatchObject({ folds: [], complete: true });
  });

  test("are the folds of the diagram at each width", () => {
    diagram.curves.forEach(({ points, exists }, i) => {
      for (const { at, and, temperature } of points.slice(1, -1)) {
        const fold = tracedAt(and).folds[i];
        expect(fold?.exists).toBe(exists);
        expect(fold?.temperature).toBeCloseTo(temperature, 6);
        expect(Math.abs((fold?.at as number) / at - 1)).toBeLessThan(1e-12);
      }
    });
  });
});

test("the cusp of p = x³ − qx lies at q = 0, its folds at x² = q/3", () => {
  const loop = twoGivens((t, p, q) => {
    const x = sub(t, 300);
    return add(sub(p, mul(square(x), x)), mul(q, x));
  });
  const options = { along: "p", and: "q", between: [-4, 5], within: [250, 350] } as const;
  const { curves, cusps, complete } = traceFolds(loop, options);
  expect(complete).toBe(true);
  expect(cusps).toHaveLength(1);
  for (const { at, and, temperature, exists } of cusps) {
    expect(Math.abs(and)).toBeLessThan(1e-12);
    expect(Math.abs(at)).toBeLessThan(1e-9);
    expect(temperature).toBeCloseTo(300, 6);
    expect(exists).toBe("above");
  }
  for (const { points } of curves) {
    for (const { at, and: q, temperature } of points) {
      const x = temperature - 300;
      expect(x * x).toBeCloseTo(q / 3, 8);
      expect(at).toBeCloseTo(x * x * x - q * x, 8);
    }
  }
});

test("a loop with an ordinary function is sampled", () => {
  const options = { along: "flux", and: "width", between: [8, 40], within: WITHIN } as const;
  const { proof, complete, curves } = traceFolds(sampledLoop(), options);
  expect({ proof, complete }).toEqual({ proof: "sampled", complete: false });
  expect(curves.map((c) => c.exists)).toEqual(["below", "above"]);
});

describe("refused", () => {
  const base = { and: "carbon", between: [10, 1000], within: WITHIN } as const;
  test.each([
    [() => traceFolds(vapourLoop(), { ...base, along: "carbon" }), "contradiction", /another given/],
    [
      () => traceFolds(sampledLoop(), { along: "width", and: "flux", between: [900, 1900], within: WITHIN }),
      "contradiction",
      /straight line/,
    ],
    [
      () =>
        traceFolds(
          twoGivens((t, p, q) => add(exp(p), mul(q, t))),
          { along: "p", and: "q", between: [0, 1], within: WITHIN },
        ),
      "missing",
      /alongBetween/,
    ],
    [
      () => traceFolds(vapourLoop(), { ...base, along: "flux", alongBetween: [1900, 900] }),
      "out-of-range",
      /alongBetween/,
    ],
    [() => traceFolds(vapourLoop(), { ...base, along: "fluxx" as never }), "unknown-name", /nearest: flux/],
    [
      () => traceFolds(vapourLoop(), { ...base, along: "flux", between: [1000, 10] }),
      "out-of-range",
      /between/,
    ],
    [
      () =>
        traceFolds(
          formulaLoop((t, p) => sub(p, t)),
          { along: "p", and: "q" as never, between: [0, 1], within: WITHIN },
        ),
      "unknown-name",
      /nearest: p/,
    ],
  ] as const)("%#", (call, code, words) => {
    const error = refusal(call);
    expect(error.code).toBe(code);
    expect(error.message).toMatch(words);
  });
});
