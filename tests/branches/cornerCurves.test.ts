// Corner folds in two givens, where the budget is a straight line in the first.
import { describe, expect, test } from "vitest";
import type { FoldCurve, FoldDiagram } from "../../src/branches/foldDiagram.ts";
import { traceBranches } from "../../src/branches/traceBranches.ts";
import { traceFolds } from "../../src/branches/traceFolds.ts";
import * as core from "../../src/index.ts";
import { add, div, max, min, mul, STEFAN_BOLTZMANN, square, sub } from "../../src/index.ts";
import { icyLoop, twoGivens } from "./loops.ts";

const WITHIN = [150, 400] as const;
const AROUND = [290, 310] as const;

/** What the curves say at a value of the second given that is one of their points, by rising temperature. */
const foldsAt = ({ curves }: FoldDiagram, and: number) =>
  curves
    .flatMap(({ kind, exists, points }) =>
      points.filter((p) => p.and === and).map((p) => ({ kind, exists, ...p })),
    )
    .sort((a, b) => a.temperature - b.temperature);

/** Values at which curves have points that are not their ends. */
const innerValues = (curves: readonly FoldCurve[]): number[] => [
  ...new Set(curves.flatMap(({ points }) => points.slice(1, -1).map((p) => p.and))),
];

const summary = ({ curves }: FoldDiagram) => curves.map(({ kind, exists, ends }) => [kind, exists, ...ends]);

describe("the corners of a ramp of albedo", () => {
  const loop = icyLoop(core.rampAlbedo);

  test("lie at its ends, where S = 4εσT⁴/(1 − α)", () => {
    const options = { along: "flux", and: "emissivity", between: [0.4, 0.9], within: WITHIN } as const;
    const diagram = traceFolds(loop, options);
    expect(diagram).toMatchObject({ method: "line", proof: "proved", complete: true, undecided: [] });
    expect(summary(diagram)).toEqual([
      ["corner", "below", "between", "between"],
      ["corner", "above", "between", "between"],
    ]);
    for (const [i, temperature, albedo] of [
      [0, 250, 0.7],
      [1, 285, 0.3],
    ] as const) {
      const { points, range } = diagram.curves[i] as FoldCurve;
      expect(range).toEqual([0.4, 0.9]);
      for (const p of points) {
        const flux = (4 * p.and * STEFAN_BOLTZMANN * temperature ** 4) / (1 - albedo);
        expect(Math.abs(p.temperature / temperature - 1)).toBeLessThan(1e-15);
        // the formula is rounded a dozen times
        expect(Math.abs(p.at / flux - 1)).toBeLessThan(3e-15);
      }
    }
  });

  // On the ramp, of slope s = (α_c − α_w)/(T_o − T_f), dS/dT = 0 at T = (4/3)(T_f − (1 − α_c)/s). That is T_o at
  // T_o = 875/3 and T_f at T_o = 1000/3 for the albedos here.
  test("the upper one goes on as a fold that meets the lower one as the ramp grows flat", () => {
    const options = { along: "flux", and: "openAbove", between: [252, 360], within: WITHIN } as const;
    const diagram = traceFolds(loop, options);
    expect(diagram).toMatchObject({ proof: "proved", complete: true, touches: [] });
    expect(summary(diagram)).toEqual([
      ["corner", "below", "between", "cusp"],
      ["fold", "above", "corner", "cusp"],
      ["corner", "above", "between", "fold"],
    ]);
    expect(diagram.changes).toMatchObject([{ curves: [2, 1] }]);
    expect(diagram.cusps).toMatchObject([{ curves: [0, 1], exists: "below" }]);
    for (const [{ and, andBracket, temperature, temperatureBracket, at }, openAbove, place, albedo] of [
      [diagram.changes[0] as FoldDiagram["changes"][number], 875 / 3, 875 / 3, 0.3],
      [diagram.cusps[0] as FoldDiagram["cusps"][number], 1000 / 3, 250, 0.7],
    ] as const) {
      expect(andBracket[0]).toBeLessThan(openAbove);
      expect(andBracket[1]).toBeGreaterThan(openAbove);
      expect(andBracket[1] - andBracket[0]).toBeLessThan(1e-10);
      expect(temperatureBracket[0]).toBeLessThanOrEqual(place);
      expect(temperatureBracket[1]).toBeGreaterThanOrEqual(place);
      expect(and).toBeCloseTo(openAbove, 10);
      expect(temperature).toBeCloseTo(place, 10);
      expect(at).toBeCloseTo((4 * 0.6 * STEFAN_BOLTZMANN * place ** 4) / (1 - albedo), 8);
    }
    for (const { and, temperature } of (diagram.curves[1] as FoldCurve).points)
      expect(temperature).toBeCloseTo((4 / 3) * (250 - (0.3 * (and - 250)) / 0.4), 8);
  });
});

// dα/dT at 250 K is −2(α_c − α_w)/35 there, so S turns where 2(α_c − 0.3)/35 = 4(1 − α_c)/250: α_c = 0.453125
test("the corner of a parabola of albedo meets the fold on it where the ice grows dark", () => {
  const options = { along: "flux", and: "cold", between: [0.3, 0.8], within: WITHIN } as const;
  const diagram = traceFolds(icyLoop(core.quadraticAlbedo), options);
  expect(diagram).toMatchObject({ complete: true, changes: [] });
  expect(summary(diagram)).toEqual([
    ["corner", "below", "cusp", "between"],
    ["fold", "above", "cusp", "between"],
  ]);
  expect(diagram.cusps).toMatchObject([{ exists: "above", curves: [0, 1] }]);
  expect(diagram.cusps[0]?.and).toBeCloseTo(0.453125, 12);
});

describe("each diagram along the first given has the same folds and corners", () => {
  const x = (t: Parameters<Parameters<typeof twoGivens>[0]>[0]) => sub(t, 300);
  type Write = Parameters<typeof twoGivens>[0];
  const formulas: readonly (readonly [string, Write])[] = [
    // a cubic with a kink that moves
    [
      "cubic",
      (t, p, q) =>
        sub(
          sub(p, mul(0.05, mul(square(x(t)), x(t)))),
          sub(mul(0.6, max(0, sub(x(t), q))), mul(add(0.5, mul(0.4, q)), x(t))),
        ),
    ],
    // a ramp that moves and grows steep, with p as a factor, on a parabola
    [
      "ramp",
      (t, p, q) => {
        const ramp = min(1, max(0, div(sub(x(t), mul(-2, q)), 2.5)));
        return sub(mul(add(2, mul(add(1, q), ramp)), p), add(mul(0.8, x(t)), mul(0.05, square(x(t)))));
      },
    ],
    // two kinks that pass each other
    [
      "kinks",
      (t, p, q) =>
        sub(
          p,
          sub(sub(mul(2, max(0, sub(x(t), q))), mul(add(2.6, q), max(0, add(x(t), 0.3)))), mul(0.5, x(t))),
        ),
    ],
  ];
  const loops = [...formulas.map(([name, write]) => [name, twoGivens(write), [-1.7, 1.9]] as const)] as const;

  test.each(loops)("%s", (_name, loop, between) => {
    const diagram = traceFolds(loop, { along: "p", and: "q", between, within: AROUND });
    const values = innerValues(diagram.curves);
    const step = Math.floor(values.length / 14);
    const chosen = values.filter((_, i) => i % step === 0);
    expect(chosen.length).toBeGreaterThan(12);
    for (const q of chosen) {
      const { folds, complete } = traceBranches(loop, {
        ...({ along: "p", between: [-1e3, 1e3], within: AROUND, at: { q } } as const),
      });
      expect(complete).toBe(true);
      const found = foldsAt(diagram, q);
      expect(found.map(({ kind, exists }) => [kind, exists])).toEqual(folds.map((f) => [f.kind, f.exists]));
      for (const [i, { at, temperature }] of found.entries()) {
        // a bracket at a kink is a few units in the last place wide
        expect(temperature).toBeCloseTo(folds[i]?.temperature as number, 8);
        expect(at).toBeCloseTo(folds[i]?.at as number, 8);
      }
    }
  });

  test.each([
    ["rampAlbedo", icyLoop(core.rampAlbedo)],
    ["quadraticAlbedo", icyLoop(core.quadraticAlbedo)],
  ] as const)("%s along the flux", (_name, loop) => {
    for (const [and, between] of [
      ["openAbove", [255, 345]],
      ["cold", [0.32, 0.8]],
    ] as const) {
      const diagram = traceFolds(loop, { along: "flux", and, between, within: WITHIN });
      expect(diagram.complete).toBe(true);
      const values = innerValues(diagram.curves).filter((_, i) => i % 9 === 0);
      for (const value of values) {
        const { folds } = traceBranches(loop, {
          ...({ along: "flux", between: [10, 1e5], within: WITHIN, at: { [and]: value } } as const),
        });
        expect(foldsAt(diagram, value)).toMatchObject(
          folds.map(({ kind, exists, at, temperature }) => ({
            ...{ kind, exists },
            // far from a cusp a fold's place is known as well as its bracket
            at: expect.closeTo(at, 6),
            temperature: expect.closeTo(temperature, 6),
          })),
        );
      }
    }
  });
});

describe("ends", () => {
  test("a corner leaves the range of temperature with its kink", () => {
    const options = { along: "flux", and: "openAbove", between: [252, 290], within: [150, 280] } as const;
    const diagram = traceFolds(icyLoop(core.rampAlbedo), options);
    expect(diagram.complete).toBe(true);
    expect(summary(diagram)).toEqual([
      ["corner", "below", "between", "between"],
      ["corner", "above", "between", "within"],
    ]);
    expect(diagram.curves[1]?.range[1]).toBeCloseTo(280, 10);
    expect(diagram.curves[1]?.points.at(-1)?.temperature).toBe(280);
  });

  test("a kink at which λ keeps its sign is no corner", () => {
    const loop = twoGivens((t, p, q) => sub(p, add(sub(t, 300), max(0, sub(sub(t, 300), q)))));
    const options = { along: "p", and: "q", between: [-1, 1], within: AROUND } as const;
    expect(traceFolds(loop, options)).toMatchObject({ complete: true, curves: [], undecided: [] });
  });

  test("two folds meet in a cusp beside a kink", () => {
    // p = x³ − qx has its cusp at q = 0; the kink at x = 4 has a corner, as x³ − 100(x − 4) falls there
    const loop = twoGivens((t, p, q) => {
      const x = sub(t, 300);
      return sub(p, sub(sub(mul(square(x), x), mul(q, x)), mul(100, max(0, sub(x, 4)))));
    });
    const diagram = traceFolds(loop, { along: "p", and: "q", between: [-2, 2.1], within: [295, 305] });
    expect(diagram).toMatchObject({ complete: true, cusps: [{ exists: "above", curves: [0, 1] }] });
    expect(summary(diagram)).toEqual([
      ["fold", "below", "cusp", "between"],
      ["fold", "above", "cusp", "between"],
      ["corner", "below", "between", "between"],
    ]);
    expect(Math.abs(diagram.cusps[0]?.and as number)).toBeLessThan(1e-12);
  });
});

describe("not decided", () => {
  const x = (t: Parameters<Parameters<typeof twoGivens>[0]>[0]) => sub(t, 300);
  const options = { along: "p", and: "q", between: [-1, 1.1], within: AROUND } as const;

  test("a fold on its way through a kink at which only the curvature leaps", () => {
    // λ = q − x − 2max(0, x): the fold lies at x = q below zero and at q/3 above
    const loop = twoGivens((t, p, q) =>
      add(add(p, mul(q, x(t))), sub(mul(-0.5, square(x(t))), square(max(0, x(t))))),
    );
    const { complete, curves, undecided } = traceFolds(loop, options);
    expect(complete).toBe(false);
    expect(undecided).toHaveLength(1);
    expect(undecided[0]?.and[0]).toBeLessThan(0);
    expect(undecided[0]?.and[1]).toBeGreaterThan(0);
    expect((undecided[0]?.and[1] as number) - (undecided[0]?.and[0] as number)).toBeLessThan(1e-5);
    expect(curves.map((c) => c.kind)).toEqual(["fold"]);
    for (const { and, temperature } of curves[0]?.points ?? [])
      expect(temperature).toBeCloseTo(300 + (and < 0 ? and : and / 3), 8);
  });

  test("a balance that answers to no first given", () => {
    // p = x²/q has a fold at x = 0 on either side of q = 0, and none there
    const bowls = [
      (t: core.Quantity) => square(x(t)),
      (t: core.Quantity) => add(square(x(t)), max(0, sub(x(t), 5))),
    ];
    for (const bowl of bowls) {
      const loop = twoGivens((t, p, q) => sub(mul(q, p), bowl(t)));
      const { complete, undecided } = traceFolds(loop, options);
      expect(complete).toBe(false);
      expect(
        undecided.some(({ and: [low, high], kind }) => low <= 0 && high >= 0 && kind === "undefined"),
      ).toBe(true);
    }
  });

  test("a stretch of temperatures without a slope", () => {
    // at q = 1 the ramp is as steep as the straight line
    const loop = twoGivens((t, p, q) => sub(p, sub(x(t), mul(q, min(1, max(0, x(t)))))));
    const { complete, curves, undecided } = traceFolds(loop, { ...options, between: [0.4, 1.9] });
    expect(complete).toBe(false);
    expect(undecided).toHaveLength(1);
    expect(curves.map(({ kind, ends }) => [kind, ...ends])).toEqual([
      ["corner", "undecided", "between"],
      ["corner", "undecided", "between"],
    ]);
  });

  test.each([
    // right of the kinks p rises with x; left of both it falls, rises, or rises but falls between them if there is a between
    [1.5, true, ["corner"]],
    [-7, true, []],
    [-2, false, []],
  ])("two kinks in one place, of which rounding may put either first (%d)", (second, decided, kinds) => {
    const loop = twoGivens((t, p, q) =>
      sub(
        sub(p, mul(add(2, q), x(t))),
        add(mul(second > -7 ? 6 : 0.5, max(0, mul(-1, x(t)))), mul(second, max(0, mul(-3, x(t))))),
      ),
    );
    const { curves, complete } = traceFolds(loop, { ...options, effort: 2000 });
    expect([complete, curves.map((c) => c.kind)]).toEqual([decided, kinds]);
  });

  test("three kinks in one place, between which λ could leap back", () => {
    const kink = (t: core.Quantity, factor: number) => div(max(0, mul(-factor, x(t))), factor);
    const loop = twoGivens((t, p, q) => {
      const kinks = mul(6, add(sub(kink(t, 1), kink(t, 3)), kink(t, 7)));
      return sub(sub(p, mul(add(3, mul(0.1, q)), x(t))), kinks);
    });
    const { curves, complete } = traceFolds(loop, { ...options, effort: 2000 });
    expect([complete, curves]).toEqual([false, []]);
  });

  test("an effort that is spent, by its name", () => {
    const loop = icyLoop(core.rampAlbedo);
    const spent = {
      along: "flux",
      and: "openAbove",
      between: [252, 360],
      within: WITHIN,
      effort: 100,
    } as const;
    const { proof, undecided } = traceFolds(loop, spent);
    expect(proof).toBe("partial");
    expect(undecided.map((u) => u.kind)).toContain("effort");
  });
});
