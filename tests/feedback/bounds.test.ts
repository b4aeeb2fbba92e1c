// Every bound of an analysis holds the true value, which another program computed at 60 digits, and is narrow.
import { describe, expect, test } from "vitest";
import { analyseFeedbacks } from "../../src/feedback/analyseFeedbacks.ts";
import type { Feedbacks } from "../../src/feedback/feedbacks.ts";
import { findStates, type Loop } from "../../src/index.ts";
import { fromDecimal, fromDouble, less } from "../reading/bigNumber.ts";
import table from "../reference/computed/feedback_parts.json" with { type: "json" };
import { referenceLoops } from "./referenceLoops.ts";

type Bounds = readonly [number, number] | null | undefined;

/** Compares exactly: the digits of the table with the doubles of the bounds. */
function expectHeld(bounds: Bounds, middle: number | null | undefined, digits: string, what: string): void {
  const [low, high] = bounds ?? [Number.NaN, Number.NaN];
  const truth = fromDecimal(digits);
  expect(low <= high, `${what} has bounds`).toBe(true);
  expect(less(truth, fromDouble(low)), `${what}: ${digits} below ${low}`).toBe(false);
  expect(less(fromDouble(high), truth), `${what}: ${digits} above ${high}`).toBe(false);
  const value = middle ?? Number.NaN;
  expect(low <= value && value <= high, `${what}: ${value} in ${low} to ${high}`).toBe(true);
  // a bracket of some 1e-15 of T makes 1e-14 or so of a slope; the smallest parts of λ are rests of 1 − tanh², known to
  // some 1e-14 W m⁻² K⁻¹ however small they are
  expect(high - low, `width of ${what}`).toBeLessThanOrEqual(1e-11 * Math.abs(value) + 1e-13);
}

type Row = (typeof table.budgets)[number]["states"][number];
type Response = { readonly flux: string; readonly temperature: string };
type Part = {
  readonly lambda: string;
  readonly factor: string;
  readonly without: { readonly lambda: string; readonly time: string };
};

describe.each(table.budgets)("$id", ({ id, within, states, givens }) => {
  const loop = referenceLoops[id as keyof typeof referenceLoops]() as Loop;
  const found = findStates(loop, { within: within as [number, number] });

  test("is the same budget", () => {
    expect(Object.fromEntries(loop.givens.map((g) => [g.name, g.value]))).toEqual(givens);
    expect(found).toMatchObject({ complete: true, states: { length: states.length } });
  });

  test.each(states.map((row, i) => ({ ...row, i })))("at $T K", ({ i, ...row }) => {
    const state = found.states[i];
    if (!state) throw new Error("no state");
    expect(Math.abs(state.temperature - Number(row.T))).toBeLessThan(1e-9);
    expectAllHeld(analyseFeedbacks(loop, state as never), row as Row);
  });
});

function expectAllHeld(found: Feedbacks, row: Row): void {
  expectHeld(found.feedbackParameterRange, found.feedbackParameter, row.lambda, "λ");
  const { reference } = found;
  expectHeld(reference.feedbackParameterRange, reference.feedbackParameter, row.reference, "λ₀");
  expectHeld(found.feedbackFactorRange, found.feedbackFactor, row.factor, "Σ f");
  if (row.gain) expectHeld(found.gainRange, found.gain, row.gain, "gain");
  else expect(found).toMatchObject({ gain: null, gainRange: null, notes: [{ code: "no-gain" }] });
  expectHeld(found.sensitivityRange, found.sensitivity, row.sensitivity, "sensitivity");
  expectTimeHeld(found, row.lambda, row.time, "time");

  const responses = Object.entries<Response>(row.responses as never);
  expect(Object.keys(found.responses)).toEqual(responses.map(([name]) => name));
  for (const [name, { flux, temperature }] of responses) {
    const ours = found.responses[name];
    expectHeld(ours?.fluxRange, ours?.flux, flux, `∂N/∂${name}`);
    expectHeld(ours?.temperatureRange, ours?.temperature, temperature, `dT/d${name}`);
  }

  const parts = row.loops as never as Readonly<Record<string, Part>>;
  expect(found.loops.map((l) => l.through.join(" → ")).sort()).toEqual(Object.keys(parts).sort());
  for (const ours of found.loops) {
    const name = ours.through.join(" → ");
    const { lambda, factor, without } = parts[name] as Part;
    expectHeld(ours.feedbackParameterRange, ours.feedbackParameter, lambda, `λ of ${name}`);
    expectHeld(ours.feedbackFactorRange, ours.feedbackFactor, factor, `f of ${name}`);
    const { feedbackParameter, feedbackParameterRange } = ours.without;
    expectHeld(feedbackParameterRange, feedbackParameter, without.lambda, `λ without ${name}`);
    expectTimeHeld(ours.without, without.lambda, without.time, `time without ${name}`);
  }
}

function expectTimeHeld(
  times: Pick<Feedbacks, "eFoldingTime" | "eFoldingTimeRange" | "growthTime" | "growthTimeRange">,
  lambda: string,
  time: string,
  what: string,
): void {
  const falls = Number(lambda) < 0;
  const { eFoldingTime, eFoldingTimeRange, growthTime, growthTimeRange } = times;
  if (falls) expectHeld(eFoldingTimeRange, eFoldingTime, time, what);
  else expectHeld(growthTimeRange, growthTime, time, what);
  expect(falls ? [growthTime, growthTimeRange] : [eFoldingTime, eFoldingTimeRange]).toEqual([null, null]);
}
