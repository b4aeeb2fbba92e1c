// Heating and cooling against temperature: the same flows as the ledgers of the states, and nothing that is not finite.
import { expect, test } from "vitest";
import { div, inUnit, sub } from "../../src/graph/operations.ts";
import { closeLoop } from "../../src/loop/closeLoop.ts";
import { budgetCurve } from "../../src/states/budgetCurve.ts";
import { refusal } from "../refusal.ts";
import { budget, found, loop } from "./cases.ts";

test("ends and spacing are as asked for", () => {
  const { points, within, dropped } = budgetCurve(loop, { within: [200, 300], points: 5 });
  expect(points.map((p) => p.temperature)).toEqual([200, 225, 250, 275, 300]);
  expect([within, dropped]).toEqual([[200, 300], 0]);
});

test("balances where a state is, with the flows of its ledger", () => {
  for (const { temperature, ledger } of found.states) {
    const at = budgetCurve(loop, { within: [temperature, temperature + 1], points: 2 }).points[0];
    const [heating, cooling] = ["space", "surface"].map((from) =>
      ledger.flows.filter((flow) => flow.from === from).reduce((sum, flow) => sum + flow.value, 0),
    );
    expect([at?.heating, at?.cooling]).toEqual([heating, cooling]);
  }
});

test("other givens change the curve and are told", () => {
  const brighter = budgetCurve(loop, { within: [150, 400], at: { flux: 1500 } });
  expect(brighter.givens).toEqual({ flux: 1500, emissivity: 0.6 });
  const ratio = (brighter.points[0]?.heating as number) / (budget.points[0]?.heating as number);
  // all heating but the glow of the haze, which is 0.7 W m⁻² of 103, grows with the flux
  expect(ratio).toBeGreaterThan(1.09);
  expect(ratio).toBeLessThan(1500 / 1361);
});

test("a temperature without a finite value is left out and counted", () => {
  const pole = closeLoop(({ temperature }) => ({
    heating: { pole: inUnit(div(1, inUnit(sub(temperature, 200), "1")), "W m-2") },
    cooling: { fixed: inUnit(1, "W m-2") },
    heatCapacity: 1,
  }));
  const { points, dropped } = budgetCurve(pole, { within: [190, 210], points: 3 });
  expect([points.map((p) => p.temperature), dropped]).toEqual([[190, 210], 1]);
});

test("survives JSON", () => {
  expect(JSON.parse(JSON.stringify(budget))).toEqual(budget);
});

test.each([
  [{ within: [300, 200] }, "out-of-range", "within[1]"],
  [{ within: [200, Number.NaN] }, "not-a-number", "within[1]"],
  [{ within: [200, 300], points: 1 }, "out-of-range", "points"],
  [{ within: [200, 300], at: { flx: 1 } }, "unknown-name", "at.flx"],
  [{ within: [200, 300], from: 1 }, "unknown-name", "budgetCurve.from"],
])("refuses %j", (options, code, path) => {
  const error = refusal(() => budgetCurve(loop, options as never));
  expect([error.code, error.path]).toEqual([code, path]);
});
