// The sampled search: what it finds near folds, corners and flat stretches, and what it admits.
import { describe, expect, test } from "vitest";
import * as core from "../../src/index.ts";
import { refusal } from "../refusal.ts";

const ICE = { cold: 0.7, warm: 0.3, midpoint: 265, width: 10 };

const albedo = core.sampledLaw({
  name: "iceTable",
  output: { symbol: "α", unit: "1" },
  inputs: { temperature: { symbol: "T", unit: "K", within: [0, 1e4] } },
  compute: ({ temperature }) => core.tanhAlbedo({ temperature, ...ICE }),
});

/** The ice loop, with its albedo as an ordinary function. */
const iceLoop = () =>
  core.closeLoop(({ temperature, given }) => ({
    heating: {
      sunlight: core.absorbedFlux({
        flux: given("flux", 1361, "W m-2", { within: [0, 1e5] }),
        albedo: albedo({ temperature }),
      }),
    },
    cooling: { longwave: core.greyEmission({ temperature, emissivity: 0.6 }) },
    heatCapacity: 4.2e8,
  }));

/** An ordinary function that adds nothing: with it a loop is searched by sampling. */
const nothing = core.sampledLaw({
  name: "nothing",
  output: { symbol: "F", unit: "W m-2" },
  inputs: { temperature: { symbol: "T", unit: "K" } },
  compute: () => 0,
});

/** A loop whose net flux is a given formula of temperature. */
const loopOf = (write: (temperature: core.Quantity) => core.Value) =>
  core.closeLoop(({ temperature }) => ({
    heating: {
      imagined: core.inUnit(write(core.inUnit(temperature, "1")), "W m-2"),
      nothing: nothing({ temperature }),
    },
    cooling: {},
    heatCapacity: 1,
  }));

describe("the sampled search", () => {
  const { add, div, findStates, log, max, mul, square, sub } = core;

  test("says that it is one", () => {
    const found = findStates(iceLoop(), { within: [150, 400] });
    expect(found).toMatchObject({ proof: "sampled", complete: false, within: [150, 400] });
    expect(found.notes.map((n) => n.code)).toEqual(["sampled-search", "sampled-law"]);
    expect(found.cost.points).toBeGreaterThan(500);
    expect(found.constants).toContain("CODATA 2018");
  });

  test("finds two states that are about to merge, and none beyond the fold", () => {
    // double root at 300.3, distances from 1 to 1e-6 K; then none
    for (const gap of [1, 1e-2, 1e-4, 1e-6]) {
      const pair = loopOf((t) => sub(square(sub(t, 300.3)), (gap * gap) / 4));
      const { states } = findStates(pair, { within: [150, 400] });
      expect(states.map((s) => s.stability)).toEqual(["stable", "unstable"]);
      expect((states[1]?.temperature as number) - (states[0]?.temperature as number)).toBeCloseTo(gap, 9);
    }
    const none = loopOf((t) => add(square(sub(t, 300.3)), 1e-9));
    expect(findStates(none, { within: [150, 400] })).toMatchObject({ states: [], undecided: [] });
  });

  test("admits a fold that it cannot tell from a touching", () => {
    const touching = loopOf((t) => square(sub(t, 300.3)));
    const found = findStates(touching, { within: [150, 400] });
    expect(found.states).toEqual([]);
    expect(found.undecided).toMatchObject([{ kind: "fold" }]);
  });

  test("admits a stretch on which everything is balanced", () => {
    const flat = loopOf((t) => max(0, sub(t, 300)));
    const found = findStates(flat, { within: [150, 400] });
    expect(found.states).toEqual([]);
    expect(found.undecided).toMatchObject([{ kind: "flat" }]);
    expect(found.undecided[0]?.interval[0]).toBe(150);
    expect(found.undecided[0]?.interval[1]).toBeCloseTo(300, -1);
  });

  test("admits where the budget has no value", () => {
    const partial = loopOf((t) => log(sub(t, 200)));
    const found = findStates(partial, { within: [150, 400] });
    expect(found.states.map((s) => s.temperature)).toEqual([201]);
    expect(found.undecided.map((u) => u.kind)).toContain("undefined");
  });

  test("takes a pole for what it is not: no state is claimed with a large imbalance", () => {
    const pole = loopOf((t) => div(1, sub(t, 300.123)));
    const found = findStates(pole, { within: [150, 400] });
    expect(found.states).toEqual([]);
    expect(found.undecided).toMatchObject([{ kind: "jump" }]);
  });

  test("says when its effort is spent, and where", () => {
    const found = findStates(iceLoop(), { within: [150, 400], effort: 40 });
    expect(found.cost.points).toBeLessThan(400);
    // more is wanted around the first two zeros than may be spent, and the third lies behind them
    const valley = (t: core.Quantity | number) => sub(max(sub(200, t), sub(t, 200)), 10.1);
    const kinked = loopOf((t) => core.min(valley(t as never), sub(330.1, t)));
    const stopped = findStates(kinked, { within: [150, 400], effort: 10 });
    expect(stopped.states.filter((s) => s.temperature > 275)).toEqual([]);
    const last = stopped.undecided.at(-1);
    expect(last?.kind).toBe("effort");
    expect(last?.interval).toEqual([275, 400]);
    expect(stopped.notes.map((n) => n.code)).toContain("search-stopped");
    const all = findStates(kinked, { within: [150, 400] }).states.map((s) =>
      Number(s.temperature.toFixed(9)),
    );
    expect(all).toEqual([189.9, 210.1, 330.1]);
  });

  test("takes a leap that ends near zero on one side for a leap", () => {
    const leap = loopOf((t) => sub(20, mul(21, core.step(sub(t, 300.123)))));
    const found = findStates(leap, { within: [150, 400] });
    expect(found.states).toEqual([]);
    expect(found.undecided).toMatchObject([{ kind: "jump" }]);
  });

  test("does not take the rounding of flows for states", () => {
    const loop = core.closeLoop(({ temperature }) => ({
      heating: {
        a: core.inUnit(mul(mul(temperature, 0.7), 1.3), "W m-2"),
        nothing: nothing({ temperature }),
      },
      cooling: { b: core.inUnit(mul(temperature, 0.7 * 1.3), "W m-2") },
      heatCapacity: 1,
    }));
    const found = findStates(loop, { within: [150, 400] });
    expect(found.states).toEqual([]);
    expect(found.undecided).toMatchObject([{ kind: "flat", interval: [150, 400] }]);
  });

  test("adds up what temperature does through every port of a law", () => {
    const both = core.sampledLaw({
      name: "both",
      output: { symbol: "F", unit: "W m-2" },
      inputs: { first: { symbol: "T", unit: "K" }, second: { symbol: "U", unit: "K" } },
      compute: ({ first, second }) => 3 * first + 5 * second - 8 * 288,
    });
    const loop = core.closeLoop(({ temperature }) => ({
      heating: {},
      cooling: { both: both({ first: temperature, second: temperature }) },
      heatCapacity: 1,
    }));
    const [only] = findStates(loop, { within: [150, 400] }).states;
    // difference quotients of numbers near 2000 over steps of 0.003 K
    expect(only?.feedbackParameter).toBeCloseTo(-8, 7);
  });

  test("changes nothing but the givens it is told", () => {
    const loop = iceLoop();
    const warm = findStates(loop, { within: [150, 400], at: { flux: 1800 } });
    expect(warm.states).toHaveLength(1);
    expect(warm.states[0]?.givens).toEqual({ flux: 1800 });
    expect(findStates(loop, { within: [150, 400] }).states).toHaveLength(3);
    expect(findStates(loop, { within: [150, 400], at: { flux: undefined } }).states).toHaveLength(3);
  });

  test.each<[string, unknown, Partial<core.ThermosteadError>]>([
    ["a reversed range", { within: [400, 150] }, { code: "out-of-range", path: "within[1]", unit: "K" }],
    ["an empty range", { within: [300, 300] }, { code: "out-of-range" }],
    ["no range", {}, { code: "unreadable", path: "within" }],
    ["a range with NaN", { within: [Number.NaN, 400] }, { code: "not-a-number", path: "within[0]" }],
    ["a range below absolute zero", { within: [-1, 400] }, { code: "out-of-range", path: "within[0]" }],
    ["an unknown given", { within: [150, 400], at: { flx: 1 } }, { code: "unknown-name", path: "at.flx" }],
    [
      "a given outside its range",
      { within: [150, 400], at: { flux: -1 } },
      { code: "out-of-range", path: "at.flux", unit: "W m-2" },
    ],
    [
      "a NaN given",
      { within: [150, 400], at: { flux: Number.NaN } },
      { code: "not-a-number", path: "at.flux" },
    ],
    [
      "a given called __proto__",
      { within: [150, 400], at: JSON.parse('{ "__proto__": 1 }') },
      { code: "unknown-name" },
    ],
    [
      "an unknown option",
      { within: [150, 400], stepps: 3 },
      { code: "unknown-name", path: "findStates.stepps" },
    ],
    ["an effort of 0", { within: [150, 400], effort: 0 }, { code: "out-of-range", path: "effort" }],
  ])("refuses %s", (_, options, expected) => {
    expect(refusal(() => findStates(iceLoop(), options as never))).toMatchObject(expected);
  });
});
