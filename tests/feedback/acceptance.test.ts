// Ice, water vapour and carbon dioxide in one column, against an independent computation at 50 digits (issue text): to 1e-8.
import { describe, expect, test } from "vitest";
import { analyseFeedbacks } from "../../src/feedback/analyseFeedbacks.ts";
import { compareHeld } from "../../src/feedback/compareHeld.ts";
import { holdFixed } from "../../src/loop/holdFixed.ts";
import { findStates } from "../../src/states/findStates.ts";
import type { State } from "../../src/states/state.ts";
import { warmLoop } from "./warmLoop.ts";

/** All digits that were printed: half a unit of the last, and as much again for the rounding of ours. */
const close = (value: number | null | undefined, expected: number) =>
  expect(Math.abs((value ?? Number.NaN) - expected)).toBeLessThanOrEqual(1e-8);

const loop = warmLoop();
const within = [100, 450] as const;
const found = findStates(loop, { within });
const state = found.states[2] as State<"coupling albedo">;

test("the four states", () => {
  const expected = [245.48668797, 264.45537675, 283.52122668, 342.35526826];
  expect(found.states).toHaveLength(expected.length);
  expected.forEach((T, i) => {
    close(found.states[i]?.temperature, T);
  });
});

describe("at the third state", () => {
  const feedbacks = analyseFeedbacks(loop, found.states[2] as never);

  test("λ, its parts, their factors and the gain", () => {
    close(feedbacks.feedbackParameter, -2.16356784);
    close(feedbacks.reference.feedbackParameter, -3.32564047);
    expect(feedbacks.reference.kind).toBe("Planck response");
    expect(feedbacks.loops.map((l) => l.through)).toEqual([["opticalDepth"], ["albedo"]]);
    close(feedbacks.loops[0]?.feedbackParameter, 0.68334176);
    close(feedbacks.loops[1]?.feedbackParameter, 0.47873088);
    close(feedbacks.loops[0]?.feedbackFactor, 0.20547674);
    close(feedbacks.loops[1]?.feedbackFactor, 0.14395148);
    close(feedbacks.gain, 1.53710941);
    expect(feedbacks.loops.map((l) => l.effect)).toEqual(["amplifies", "amplifies"]);
    expect(feedbacks.notes).toEqual([]);
  });

  test("every number lies in its proved bounds, and those are as narrow as rounding allows", () => {
    const parts = [feedbacks, feedbacks.reference, ...feedbacks.loops];
    for (const { feedbackParameter, feedbackParameterRange } of parts) {
      const [low, high] = feedbackParameterRange ?? [Number.NaN, Number.NaN];
      expect(low).toBeLessThanOrEqual(feedbackParameter);
      expect(high).toBeGreaterThanOrEqual(feedbackParameter);
      expect(high - low).toBeLessThan(1e-12);
    }
    expect(feedbacks.proved).toBe(true);
  });

  test("times: C over λ, and over λ without a loop", () => {
    const C = 4.2e8;
    expect(feedbacks.eFoldingTime).toBeCloseTo(C / 2.16356784, 0);
    expect(feedbacks.growthTime).toBeNull();
    const [vapour] = feedbacks.loops;
    close(vapour?.without.feedbackParameter, -2.16356784 - 0.68334176);
    expect(vapour?.without.eFoldingTime).toBeCloseTo(C / (2.16356784 + 0.68334176), 0);
  });

  test("the answer to each given is that of states found anew", () => {
    const step = 1e-3;
    for (const name of ["flux", "carbonDioxide"] as const) {
      const p = feedbacks.givens[name];
      const at = (value: number) =>
        findStates(loop, { within, at: { [name]: value } }).states[2]?.temperature ?? Number.NaN;
      // central difference: its error is of the order of step², far below 1e-9 here
      const difference = (at(p + step) - at(p - step)) / (2 * step);
      expect(Math.abs((feedbacks.responses[name].temperature ?? Number.NaN) - difference)).toBeLessThan(1e-9);
    }
    close(feedbacks.sensitivity, 1 / 2.16356784);
  });
});

test("at the second state growth, no gain, and a note that says so", () => {
  const feedbacks = analyseFeedbacks(loop, found.states[1] as never);
  expect(feedbacks.feedbackParameter).toBeGreaterThan(0);
  expect(feedbacks.gain).toBeNull();
  expect(feedbacks.eFoldingTime).toBeNull();
  expect(feedbacks.growthTime).toBe(4.2e8 / feedbacks.feedbackParameter);
  expect(feedbacks.feedbackFactor).toBeGreaterThan(1);
  expect(feedbacks.notes.map((n) => n.code)).toEqual(["no-gain"]);
  expect(feedbacks.responses.flux.temperature).toBeLessThan(0);
});

describe("doubled carbon dioxide", () => {
  const change = { carbonDioxide: 560 };
  const hold = ["albedo", "opticalDepth"] as const;
  const compared = compareHeld(loop, { from: found.states[2] as never, change, hold });

  test("ΔT with and without both couplings, and the shares", () => {
    close(compared.temperatureChange, 4.15561428);
    close(compared.temperatureChangeHeld, 2.80288709);
    close(compared.shares?.albedo, 0.44852776);
    close(compared.shares?.opticalDepth, 0.90419943);
    close(compared.regulation, 1 - 4.15561428 / 2.80288709);
    expect(compared).toMatchObject({ evaluations: 4, proof: "proved", lost: [], notes: [] });
  });

  test("ΔT with one of them held", () => {
    const changes = compared.subsets.map((s) => [s.held, s.temperatureChange] as const);
    expect(changes.map(([held]) => held)).toEqual([[], ["albedo"], ["opticalDepth"], hold]);
    close(changes[1]?.[1], 3.60119369);
    close(changes[2]?.[1], 3.14552203);
  });

  test("the new state is the one that a search finds", () => {
    const states = findStates(loop, { within, at: change }).states;
    const same = states.find((s) => Math.abs(s.temperature - (compared.to?.temperature ?? 0)) < 1e-9);
    expect(same?.stability).toBe("stable");
    expect(compared.to?.couplings.albedo).toBeCloseTo(same?.couplings.albedo ?? Number.NaN, 11);
    expect(compared.to?.proved).toBe(true);
  });

  test("a loop shows what is held in it, one after the other, and where", () => {
    const state = found.states[2] as (typeof found.states)[number];
    const once = holdFixed(loop, ["albedo"], state);
    const twice = holdFixed(once, ["opticalDepth"], state as never);
    const { temperature } = state;
    expect(JSON.parse(JSON.stringify(once)).held).toEqual({ albedo: temperature });
    expect(JSON.parse(JSON.stringify(twice)).held).toEqual({
      albedo: temperature,
      opticalDepth: temperature,
    });
  });

  test("holding keeps what the given does through a held coupling", () => {
    const held = holdFixed(loop, hold, found.states[2] as never);
    const states = findStates(held, { within, at: change }).states;
    expect(states).toHaveLength(1);
    close((states[0]?.temperature ?? 0) - state.temperature, 2.80288709);
  });
});

test.each([
  { from: 0, flux: 2000, S: 1471.9530876739, T: 255.37444343, drift: "warms" },
  { from: 2, flux: 900, S: 1276.3234109303, T: 272.87849932, drift: "cools" },
  { from: 2, flux: 2000, S: 1645.5215068997, T: 314.97536417, drift: "warms" },
  { from: 3, flux: 2000, S: 1645.5215068997, T: 314.97536417, drift: "warms" },
])("state $from is lost at S = $S", ({ from, flux, S, T, drift }) => {
  const compared = compareHeld(loop, {
    from: found.states[from] as never,
    change: { flux },
    hold: ["albedo"],
  });
  const [loss] = compared.lost;
  expect(loss?.held).toEqual([]);
  close(loss?.lost.givens.flux, S);
  close(loss?.lost.temperature, T);
  expect(loss?.lost).toMatchObject({ reason: "fold", drift });
  const [before, behind] = (loss?.lost.between ?? []).map((s) => 1361 + s * (flux - 1361));
  expect(Math.min(before as number, behind as number)).toBeLessThan(S);
  expect(Math.max(before as number, behind as number)).toBeGreaterThan(S);
  expect(compared).toMatchObject({ shares: null, regulation: null, to: null, temperatureChange: null });
  expect(compared.notes.map((n) => n.code)).toContain("branch-lost");
});
