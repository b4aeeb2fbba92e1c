// What must hold for every loop: exact sums, refinement, holding, and indifference to how the budget is written.
import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { analyseFeedbacks } from "../../src/feedback/analyseFeedbacks.ts";
import {
  add,
  closeLoop,
  div,
  findStates,
  inUnit,
  mul,
  type State,
  sub,
  type Value,
} from "../../src/index.ts";
import { holdFixed } from "../../src/loop/holdFixed.ts";
import { settings } from "../properties/settings.ts";
import { NAMES, type Name, type Plain, planLoop, plans, stateOf } from "./planLoop.ts";

const through = (names: readonly string[], cut: readonly string[]) =>
  names.filter((n) => cut.includes(n)).join();

/** λ of the loops of one analysis, summed by what is left of their paths when only `cut` counts. */
function reduced(loop: Plain, of: readonly string[], cut: readonly string[]): Map<string, number> {
  const { loops, reference } = analyseFeedbacks(loop, stateOf(loop), { through: of as never });
  const sums = new Map<string, number>([["", reference.feedbackParameter]]);
  for (const l of loops) {
    const key = through(l.through, cut);
    sums.set(key, (sums.get(key) ?? 0) + l.feedbackParameter);
  }
  return sums;
}

/** Roundings of some dozen products and sums of size 1. */
const ROUNDING = 1e-13;
const subsets = fc.subarray([...NAMES]);

describe("for random couplings that act on each other", () => {
  test("all loops and the reference add up to λ", () => {
    fc.assert(
      fc.property(plans, subsets, (plan, cut) => {
        const loop = planLoop(plan);
        const state = stateOf(loop);
        const found = analyseFeedbacks(loop, state, { through: cut });
        const sum = found.loops.reduce((s, l) => s + l.feedbackParameter, found.reference.feedbackParameter);
        expect(Math.abs(sum - state.feedbackParameter)).toBeLessThan(ROUNDING);
        expect(Math.abs(found.residual)).toBeLessThan(ROUNDING);
        expect(found.loops).toHaveLength(2 ** cut.length - 1);
      }),
      settings(20),
    );
  });

  test("a coarser choice sums a finer one", () => {
    fc.assert(
      fc.property(plans, subsets, (plan, coarse) => {
        const loop = planLoop(plan);
        const fine = reduced(loop, NAMES, coarse);
        for (const [key, sum] of reduced(loop, coarse, coarse))
          expect(Math.abs((fine.get(key) ?? Number.NaN) - sum)).toBeLessThan(ROUNDING);
      }),
      settings(20),
    );
  });

  test("holding couplings leaves λ minus the loops through them, and the state where it was", () => {
    fc.assert(
      fc.property(plans, subsets, (plan, names) => {
        const loop = planLoop(plan);
        const state = stateOf(loop);
        const held = holdFixed(loop, names, state) as Plain;
        const left = analyseFeedbacks(loop, state)
          .loops.filter((l) => l.through.some((n) => names.includes(n)))
          .reduce((lambda, l) => lambda - l.feedbackParameter, state.feedbackParameter);
        expect(Math.abs(stateOf(held).temperature - state.temperature)).toBeLessThan(1e-11);
        const after = analyseFeedbacks(held, state);
        expect(Math.abs(after.feedbackParameter - left)).toBeLessThan(ROUNDING);
        for (const name of names) expect(after.loops.map((l) => l.through.join())).not.toContain(name);
      }),
      settings(20),
    );
  });

  test("laws, helper quantities, read-outs, names and what else is coupled change nothing", () => {
    const upper = (name: Name) => `the ${name.toUpperCase()}`;
    fc.assert(
      fc.property(plans, fc.subarray([...NAMES], { minLength: 1 }), (plan, cut) => {
        const expected = reduced(planLoop(plan), cut, cut);
        for (const writing of [{ laws: true }, { helpers: true }, { couple: cut }]) {
          const found = reduced(planLoop(plan, writing), cut, cut);
          expect([...found.keys()].sort()).toEqual([...expected.keys()].sort());
          for (const [key, sum] of found)
            expect(Math.abs((expected.get(key) ?? Number.NaN) - sum)).toBeLessThan(ROUNDING);
        }
        const renamed = planLoop(plan, { rename: upper });
        const names = cut.map(upper);
        const found = [...reduced(renamed, names, names).values()].sort((x, y) => x - y);
        expect(found).toEqual([...expected.values()].sort((x, y) => x - y));
      }),
      settings(8),
    );
  });
});

/** Layers of couplings, each acting on all of the next: width^layers paths, and more where layers are skipped. */
function wideLoop(layers: number, width: number) {
  return closeLoop(({ temperature, couple }) => {
    let last: Value[] = [div(inUnit(sub(temperature, 288), "1"), 10)];
    for (let layer = 0; layer < layers; layer++) {
      last = Array.from({ length: width }, (_, i) => {
        const value = last.reduce(
          (sum, x, j) => add(sum, mul(0.05 + 0.01 * (i + 2 * j), x)) as Value,
          0 as Value,
        );
        return couple(`q${layer}.${i}`, value);
      });
    }
    const flow = inUnit(
      last.reduce((sum, x) => add(sum, x) as Value, 0 as Value),
      "W m-2",
    );
    const emission = inUnit(mul(2, sub(temperature, 288)), "W m-2");
    return { heating: { flow }, cooling: { longwave: emission }, heatCapacity: 0 } as never;
  });
}

describe("very many feedback loops", () => {
  test("the 64 strongest are listed, the rest is summed, and the sum stays exact", () => {
    const loop = wideLoop(4, 4);
    const state = findStates(loop, { within: [287, 289] }).states[0] as State;
    const found = analyseFeedbacks(loop, state as never);
    expect(found.loops).toHaveLength(64);
    expect(found.others?.count).toBe(4 ** 4 - 64);
    const listed = found.loops.map((l) => l.feedbackParameter);
    expect([...listed].sort((a, b) => b - a)).toEqual(listed);
    // every path on its own: q0.i from temperature, q(l).j from q(l−1).i, then the flow
    const weights: number[] = [];
    const w = (i: number, j: number) => 0.05 + 0.01 * (i + 2 * j);
    for (let path = 0; path < 256; path++) {
      const [p, q, r, s] = [path & 3, (path >> 2) & 3, (path >> 4) & 3, path >> 6] as const;
      weights.push(0.1 * w(p, 0) * w(q, p) * w(r, q) * w(s, r));
    }
    weights.sort((a, b) => b - a);
    listed.forEach((value, i) => {
      expect(Math.abs(value - (weights[i] as number))).toBeLessThan(1e-17);
    });
    const rest = weights.slice(64).reduce((sum, x) => sum + x, 0);
    expect(Math.abs((found.others?.feedbackParameter ?? 0) - rest)).toBeLessThan(1e-15);
    const [low, high] = found.others?.feedbackParameterRange ?? [1, 0];
    expect(low <= rest && rest <= high).toBe(true);
    expect(found.notes.map((n) => n.code)).toEqual(["loops-summed"]);
  });

  test("10¹⁰ of them take no longer", () => {
    const loop = wideLoop(10, 10);
    const state = findStates(loop, { within: [287, 289] }).states[0] as State;
    const found = analyseFeedbacks(loop, state as never);
    expect(found.others?.count).toBe(1e10 - 64);
    expect(Math.abs(found.residual)).toBeLessThan(1e-15);
  });
});
