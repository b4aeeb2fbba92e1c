// A heat capacity below zero has no meaning: the state says so, and tells no time.
import { expect, test } from "vitest";
import * as core from "../../src/index.ts";

const within = [150, 400] as const;
const loop = core.closeLoop(({ temperature, given }) => ({
  heating: { sunlight: 240 },
  cooling: { longwave: core.greyEmission({ temperature, emissivity: 0.6 }) },
  heatCapacity: given("capacity", 100, "J m-2 K-1"),
}));
const stateAt = (capacity: number) => {
  const [state] = core.findStates(loop, { within, at: { capacity } }).states;
  return state as core.State<"variable temperature" | "given capacity">;
};

test("a time needs a heat capacity of 0 or more", () => {
  const { feedbackParameter: lambda, ...plain } = stateAt(100);
  expect(plain).toMatchObject({ stability: "stable", eFoldingTime: -100 / lambda, proved: true, notes: [] });
  expect(stateAt(0).eFoldingTime).toBe(0);
  const below = stateAt(-100);
  expect(below).toMatchObject({ eFoldingTime: null, eigenvalues: null, proved: false });
  expect(below.notes.map((n) => [n.code, n.severity, n.about])).toEqual([
    ["outside-range", "invalid", "heatCapacity"],
  ]);
  expect(core.analyseFeedbacks(loop, below)).toMatchObject({ eFoldingTime: null, growthTime: null });
});
