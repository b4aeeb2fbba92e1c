// Branches that cross and exchange their stability, and those that nearly do.
import { describe, expect, test } from "vitest";
import type { Diagram, Fold } from "../../src/branches/diagram.ts";
import { statesOnDiagram } from "../../src/branches/statesOnDiagram.ts";
import { tippingMargins } from "../../src/branches/tippingMargins.ts";
import { traceBranches } from "../../src/branches/traceBranches.ts";
import * as core from "../../src/index.ts";
import { formulaLoop } from "./loops.ts";

const { add, exp, findStates, log, mul, neg, square, sub } = core;
const options = { along: "p", between: [-2, 2.1], within: [250, 350] } as const;
const kinds = (diagram: Diagram) => diagram.branches.map((b) => [b.stability, b.low.kind, b.high.kind]);

/** ẋ = h + px − x² with x = T − 300; for h = 0 the normal form of the transcritical point. */
const normalForm = (h: number) =>
  formulaLoop((t, p) => {
    const x = sub(t, 300);
    const turn = sub(mul(p, x), square(x));
    return h === 0 ? turn : add(h, turn);
  });

// Strogatz, Nonlinear Dynamics and Chaos, section 3.2, and Kuznetsov, Elements of Applied Bifurcation Theory (from memory):
// x = 0 is stable below p = 0, x = p above
describe("the normal form px − x²", () => {
  const loop = normalForm(0);
  const diagram = traceBranches(loop, options);

  test("has one transcritical point, proved", () => {
    expect(diagram).toMatchObject({ complete: true, proof: "proved", undecided: [], folds: [], jumps: [] });
    expect(diagram.crossings).toHaveLength(1);
    const [{ at, atBracket, temperature, temperatureBracket }] = diagram.crossings as [
      Diagram["crossings"][number],
    ];
    expect(Math.abs(at)).toBeLessThan(1e-12);
    expect(atBracket[0]).toBeLessThanOrEqual(0);
    expect(atBracket[1]).toBeGreaterThanOrEqual(0);
    expect(atBracket[1] - atBracket[0]).toBeLessThan(1e-11);
    expect(temperature).toBeCloseTo(300, 12);
    expect(temperatureBracket[0]).toBeLessThanOrEqual(300);
    expect(temperatureBracket[1]).toBeGreaterThanOrEqual(300);
  });

  test("in which the two branches exchange their stability", () => {
    expect(kinds(diagram)).toEqual([
      ["unstable", "between", "transcritical"],
      ["stable", "between", "transcritical"],
      ["unstable", "transcritical", "between"],
      ["stable", "transcritical", "between"],
    ]);
    expect(diagram.crossings[0]).toMatchObject({ kind: "transcritical", below: [0, 1], above: [2, 3] });
    for (const p of [-1.5, -1e-3, 1e-3, 2]) {
      const { states, complete } = statesOnDiagram(loop, diagram, p);
      expect(complete).toBe(true);
      expect(states.map((s) => s.stability)).toEqual(["unstable", "stable"]);
      expect(states[1]?.temperature).toBeCloseTo(300 + Math.max(0, p), 11);
    }
    expect(statesOnDiagram(loop, diagram, 0).complete).toBe(false);
  });

  test("and a margin ends there without a jump", () => {
    const state = findStates(loop, { within: [250, 350], at: { p: -1 } }).states[1] as core.State<"given p">;
    const { rise } = tippingMargins(loop, state, { ...options });
    expect(rise).toMatchObject({ end: { kind: "transcritical" }, jump: null });
    expect(rise.distance).toBeCloseTo(1, 12);
  });
});

describe("its imperfect versions", () => {
  test.each([-0.1, -1e-9, -1e-13, -1e-17])("with h = %d end in two folds at p = ±2√−h", (h) => {
    const diagram = traceBranches(normalForm(h), options);
    expect(diagram).toMatchObject({ complete: true, crossings: [], undecided: [] });
    const exact = 2 * Math.sqrt(-h);
    expect(diagram.folds.map((f) => f.exists)).toEqual(["below", "above"]);
    diagram.folds.forEach(({ at, atBracket }: Fold, i) => {
      // a fold in a narrow stretch is no closer than rounding in h, 1e-21, moves it
      expect(Math.abs(Math.abs(at) - exact)).toBeLessThan(1e-4 * exact);
      expect(atBracket[0]).toBeLessThanOrEqual((2 * i - 1) * exact);
      expect(atBracket[1]).toBeGreaterThanOrEqual((2 * i - 1) * exact);
    });
  });

  test.each([0.1, 1e-9, 1e-13, 1e-17])("with h = %d pass each other by", (h) => {
    const diagram = traceBranches(normalForm(h), options);
    expect(diagram).toMatchObject({ complete: true, crossings: [], undecided: [], folds: [] });
    expect(kinds(diagram)).toEqual([
      ["unstable", "between", "between"],
      ["stable", "between", "between"],
    ]);
  });
});

// Strogatz, section 3.2 (from memory): x(1 − x²) − a(1 − e^(−bx)) has a transcritical point at x = 0, ab = 1, beside which
// x = 2(ab − 1)/(ab²); r ln x + x − 1 has one at x = 1, r = −1
describe("a crossing that no factor shows is named, not claimed", () => {
  test.each([
    [
      1,
      "stable",
      (t: core.Quantity, p: core.Quantity) => {
        const x = sub(t, 300);
        return sub(mul(x, sub(1, square(x))), mul(p, sub(1, exp(neg(x)))));
      },
    ],
    [-1, "unstable", (t: core.Quantity, p: core.Quantity) => add(mul(p, log(sub(t, 299))), sub(t, 300))],
  ] as const)("at p = %d", (place, after, write) => {
    const between = [place - 0.3, place + 0.31] as const;
    const diagram = traceBranches(formulaLoop(write), { along: "p", between, within: [299.9, 300.1] });
    expect(diagram).toMatchObject({ complete: false, proof: "partial", crossings: [] });
    expect(diagram.undecided).toHaveLength(1);
    const [{ kind, parameters, temperatures }] = diagram.undecided as [Diagram["undecided"][number]];
    expect(kind).toBe("transcritical");
    for (const [[low, high], exact] of [
      [parameters, place],
      [temperatures, 300],
    ] as const) {
      expect(low).toBeLessThanOrEqual(exact);
      expect(high).toBeGreaterThanOrEqual(exact);
      expect(high - low).toBeLessThan(1e-5);
    }
    const level = diagram.branches.filter((b) => b.temperatures[1] - b.temperatures[0] < 1e-9);
    expect(level.map((b) => [b.high.kind, b.low.kind].includes("undecided"))).toEqual([true, true]);
    expect(level.find((b) => b.low.kind === "undecided")?.stability).toBe(after);
  });
});

// two branches that touch and part again, and two that cross so flatly that they hardly part
test.each<[string, (x: core.Value, p: core.Quantity) => core.Value]>([
  ["x(x − p²)", (x, p) => mul(x, sub(x, square(p)))],
  ["x(x − p³)", (x, p) => mul(x, sub(x, mul(square(p), p)))],
  ["x² − p⁴", (x, p) => sub(square(x), square(square(p)))],
])("%s has no transcritical point", (_, write) => {
  const loop = formulaLoop((t, p) => write(sub(t, 300), p));
  const diagram = traceBranches(loop, { along: "p", between: [-1, 1.1], within: [290, 310] });
  expect(diagram).toMatchObject({ complete: false, crossings: [], folds: [] });
  expect(diagram.undecided.map((u) => u.kind)).toEqual(["count"]);
});

test("a pitchfork is not taken for a crossing of two branches", () => {
  const fork = formulaLoop((t, p) => {
    const x = sub(t, 300);
    return sub(mul(p, x), mul(x, square(x)));
  });
  const diagram = traceBranches(fork, options);
  expect(diagram).toMatchObject({ complete: false, crossings: [], undecided: [{ kind: "count" }] });
});

test("a slow way back may pass through a crossing", () => {
  // x·(p − f(x)) with f = x³ − 4.5x² + 4.5x: below the fold at p = −1.5·√0.75 nothing holds the warm branch, and it cools to
  // x = 0; from there a rise goes on along f behind the crossing at p = 0, and is lost at p = 1.5·√0.75 to the warm branch
  const loop = formulaLoop((t, p) => {
    const x = sub(t, 300);
    const f = add(sub(mul(square(x), x), mul(4.5, square(x))), mul(4.5, x));
    return mul(x, sub(p, f));
  });
  const diagram = traceBranches(loop, { along: "p", between: [-2.2, 2.1], within: [295, 310] });
  expect(diagram).toMatchObject({ complete: true, crossings: [{ kind: "transcritical" }] });
  expect(diagram.folds).toHaveLength(2);
  const exact = 1.5 * Math.sqrt(0.75);
  const [rise, fall] = ["rise", "fall"].map((d) => diagram.jumps.find((j) => j.direction === d));
  expect(fall?.at).toBeCloseTo(-exact, 9);
  expect(fall?.to?.temperature).toBeCloseTo(300, 9);
  expect(fall?.returnsAt).toBeCloseTo(exact, 9);
  expect(rise?.at).toBeCloseTo(exact, 9);
  expect(rise?.to?.branch).toBe(fall?.from);
  // the fall does not end on the branch that the rise left, but on the level beside it; a fall of p meets the crossing first
  expect(rise?.returnsAt).toBeNull();
});
