// Corner folds in two givens, both of which have a range.
import { describe, expect, test } from "vitest";
import { traceBranches } from "../../src/branches/traceBranches.ts";
import { traceFolds } from "../../src/branches/traceFolds.ts";
import * as core from "../../src/index.ts";
import { add, max, mul, square, sub } from "../../src/index.ts";
import { icyLoop, twoGivens } from "./loops.ts";

const x = (t: core.Quantity) => sub(t, 300);

test("the bottom of a valley at a kink that moves", () => {
  // p + p² = max(x − q, 2(q − x)): a corner at x = q, p = 0
  const loop = twoGivens((t, p, q) => {
    const away = sub(x(t), q);
    return sub(add(p, square(p)), max(away, mul(-2, away)));
  });
  const options = { along: "p", alongBetween: [-0.4, 1], and: "q", between: [-1, 1] } as const;
  const { curves, complete, method } = traceFolds(loop, { ...options, within: [290, 310] });
  expect({ method, complete }).toEqual({ method: "space", complete: true });
  expect(curves).toMatchObject([{ kind: "corner", exists: "above", ends: ["between", "between"] }]);
  for (const { at, and, temperature } of curves[0]?.points ?? []) {
    expect(Math.abs(at)).toBeLessThan(1e-12);
    expect(temperature).toBeCloseTo(300 + and, 11);
  }
});

describe("an icy planet has the curves that it has where the flux takes any value", () => {
  const loops = [icyLoop(core.rampAlbedo), icyLoop(core.quadraticAlbedo)] as const;

  test.each([
    ["rampAlbedo", 0, "emissivity", [0.4, 0.9], 0],
    ["rampAlbedo", 0, "openAbove", [252, 360], 1],
    ["rampAlbedo", 0, "cold", [0.3, 0.8], 1],
    ["quadraticAlbedo", 1, "cold", [0.3, 0.8], 0],
  ] as const)("%s %d along the flux and %s", (_name, i, and, between, changes) => {
    const options = { along: "flux", and, between, within: [150, 400] } as const;
    const line = traceFolds(loops[i], options);
    const space = traceFolds(loops[i], { ...options, alongBetween: [500, 4000] });
    expect([line.complete, space.complete]).toEqual([true, true]);
    expect([line.method, space.method]).toEqual(["line", "space"]);
    const summary = ({ curves }: typeof line) =>
      curves
        .map(({ kind, exists, range, ends }) => ({ kind, exists, low: range[0], high: range[1], ends }))
        .sort((a, b) => (a.kind + a.exists < b.kind + b.exists ? -1 : 1));
    expect(summary(space)).toEqual(
      summary(line).map((c) => ({ ...c, low: expect.closeTo(c.low, 9), high: expect.closeTo(c.high, 9) })),
    );
    expect(space.changes).toHaveLength(changes);
    for (const list of ["changes", "cusps"] as const) {
      expect(space[list].map(({ at, and: value, temperature }) => [at, value, temperature])).toEqual(
        line[list].map(({ at, and: value, temperature }) => [
          expect.closeTo(at, 7),
          expect.closeTo(value, 9),
          expect.closeTo(temperature, 8),
        ]),
      );
    }
    const [change] = space.changes;
    if (change) {
      const [below, above] = change.curves.map((k) => space.curves[k]);
      expect([below?.range[1], above?.range[0]]).toEqual([change.and, change.and]);
    }
  });
});

test("each diagram along the first given has the same folds and corners, with kinks that move with both", () => {
  // a cubic with a kink at x = q + p/4, where the budget is no straight line in p
  const loop = twoGivens((t, p, q) => {
    const kink = max(0, sub(x(t), add(q, mul(0.25, p))));
    const cubic = sub(mul(0.05, mul(square(x(t)), x(t))), mul(add(0.5, mul(0.4, q)), x(t)));
    return sub(sub(add(p, mul(0.08, square(p))), cubic), mul(0.6, kink));
  });
  const options = { along: "p", alongBetween: [-4, 4], and: "q", between: [-1, 1] } as const;
  const diagram = traceFolds(loop, { ...options, within: [295, 305] });
  expect(diagram).toMatchObject({ method: "space", complete: true });
  expect(new Set(diagram.curves.map((c) => c.kind))).toEqual(new Set(["fold", "corner"]));
  let compared = 0;
  for (const { points } of diagram.curves) {
    for (const { and } of points.slice(1, -1).filter((_, i) => i % 9 === 4)) {
      const { folds, complete } = traceBranches(loop, {
        ...({ along: "p", between: [-4, 4], within: [295, 305], at: { q: and } } as const),
      });
      expect(complete).toBe(true);
      const here = diagram.curves.filter(({ range }) => range[0] <= and && and <= range[1]);
      expect(here.map(({ kind, exists }) => kind + exists).sort()).toEqual(
        folds.map(({ kind, exists }) => kind + exists).sort(),
      );
      for (const curve of here) {
        const point = curve.points.find((p) => p.and === and);
        if (!point) continue;
        const misses = folds
          .filter((f) => f.kind === curve.kind)
          .map((f) => Math.abs(f.at - point.at) + Math.abs(f.temperature - point.temperature));
        expect(Math.min(...misses)).toBeLessThan(1e-6);
        compared++;
      }
    }
  }
  expect(compared).toBeGreaterThan(12);
});
