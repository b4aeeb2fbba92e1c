// Diagrams whose parts lie closer together than rounding, over each other, or behind something undecided. All answers by hand.
import { describe, expect, test } from "vitest";
import { gateNodes } from "../../src/branches/gateCurve.ts";
import { gateLine } from "../../src/branches/gateLine.ts";
import { statesOnDiagram } from "../../src/branches/statesOnDiagram.ts";
import { traceBranches } from "../../src/branches/traceBranches.ts";
import * as core from "../../src/index.ts";
import { iceLoop } from "../states/iceLoop.ts";
import { formulaLoop } from "./loops.ts";

const { add, div, log, max, min, mul, square, step, sub, tanh } = core;

describe("states on a diagram of tiles", () => {
  test("are told apart where branches reach over each other's temperatures", () => {
    // (T − 300 − 50p²)² = 0.004: two states, always 0.126 K apart, on branches that both span 18 K
    const loop = formulaLoop((t, p) => sub(0.004, square(sub(sub(t, 300), mul(50, square(p))))));
    const diagram = traceBranches(loop, { along: "p", between: [-0.6, 1], within: [280, 420] });
    expect(diagram).toMatchObject({ method: "tiles", complete: true });
    for (let i = 0; i < 200; i++) {
      const p = -0.6 + (1.6 * (i + 0.5)) / 200;
      const { states, complete } = statesOnDiagram(loop, diagram, p);
      const middle = 300 + 50 * p * p;
      expect(complete).toBe(true);
      expect(states.map((s) => s.stability)).toEqual(["unstable", "stable"]);
      expect(states[0]?.temperature).toBeCloseTo(middle - Math.sqrt(0.004), 7);
      expect(states[1]?.temperature).toBeCloseTo(middle + Math.sqrt(0.004), 7);
    }
  });

  test("are found between columns where the branch turns in temperature, by their margins too", () => {
    // T = 290 + 100(p − 0.05)²
    const loop = formulaLoop((t, p) => sub(add(290, mul(100, square(sub(p, 0.05)))), t));
    const options = { along: "p", between: [-1, 1], within: [200, 400] } as const;
    const diagram = traceBranches(loop, options);
    const { states, complete } = statesOnDiagram(loop, diagram, 0.05);
    expect([complete, states.map((s) => s.temperature)]).toEqual([true, [expect.closeTo(290, 9)]]);
    const [state] = core.findStates(loop, { within: [200, 400], at: { p: 0.05 } }).states;
    expect(core.tippingMargins(loop, state as core.State<"p">, options).stability).toBe("stable");
  });
});

test("a branch that is steeper than rounding still runs the way that is proved", () => {
  // N = p + 1e-25·T − min(T, 260) − max(T − 320, 0): level to within rounding from 260 to 320 K
  const loop = formulaLoop((t, p) => sub(add(p, mul(1e-25, t)), add(min(t, 260), max(sub(t, 320), 0))));
  const diagram = traceBranches(loop, { along: "p", between: [200, 300], within: [150, 400] });
  expect(diagram.complete).toBe(true);
  expect(diagram.branches.map((b) => b.stability)).toEqual(["stable", "unstable", "stable"]);
  // p falls on the unstable branch, by 6e-24
  expect(diagram.folds.map((fold) => fold.exists)).toEqual(["below", "above"]);
  // at the fold itself the state that is reached cannot be told from the fold behind it: no jump is claimed
  expect(diagram.jumps.map(({ to, leaves }) => [to?.branch ?? null, leaves])).not.toContainEqual([
    null,
    "hotter",
  ]);
});

describe("behind something undecided", () => {
  test("no gap is claimed", () => {
    const spent = traceBranches(iceLoop(), {
      ...{ along: "flux", between: [900, 1900], within: [150, 400] },
      effort: 10,
    });
    expect(spent).toMatchObject({ complete: false, gaps: [] });
    // ln p falls below every bound at p = 0, so a stretch next to it stays open
    const loop = formulaLoop((t, p) => sub(add(300, log(p)), sub(t, mul(30, tanh(div(sub(t, 300), 4))))));
    const open = traceBranches(loop, { along: "p", between: [0, 1e9], within: [200, 400] });
    expect([open.complete, open.gaps]).toEqual([false, []]);
    const first = Math.min(...open.branches.map((b) => b.parameters[0]));
    expect(first).toBeGreaterThan(0);
    expect(open.branches.map((b) => (b.parameters[0] === first ? b.low.kind : "undecided"))).toEqual(
      open.branches.map(() => "undecided"),
    );
  });

  test("no jump passes a leap that holds the climate", () => {
    // N = p − (x³/3 − x) − 50·step(x − 1.5) with x = (T − 250)/10: above its fold at p = 2/3, x rises to 1.5 and stays
    const loop = formulaLoop((t, p) => {
      const x = div(sub(t, 250), 10);
      return sub(p, add(sub(div(mul(x, mul(x, x)), 3), x), mul(50, step(sub(x, 1.5)))));
    });
    const diagram = traceBranches(loop, { along: "p", between: [-2, 2], within: [200, 300] });
    const rise = diagram.jumps.find((jump) => jump.direction === "rise");
    expect(rise).toMatchObject({ from: 0, to: null, leaves: null, noReturn: false });
    expect(rise?.at).toBeCloseTo(2 / 3, 9);
  });
});

test("a curve is bounded over a few units in the last place", () => {
  // p = 65536·(T − 300), as a difference of which only the slope is enclosed closely
  const loop = formulaLoop((t, p) => {
    const rise = sub(t, 300);
    return sub(p, sub(mul(2 ** 40, rise), mul(2 ** 40 - 65536, rise)));
  });
  const nodes = gateNodes(loop, "p");
  if (!nodes) throw new Error("no gate");
  const line = gateLine(loop, nodes);
  line.set([0], [0, 0]);
  for (const units of [1, 2, 3, 5, 7, 15]) {
    const to = 300 + units * 2 ** -44;
    const [low, high] = line.curveOver(300, to);
    expect(low).toBeLessThanOrEqual(0);
    expect(high).toBeGreaterThanOrEqual(65536 * (to - 300));
  }
});
