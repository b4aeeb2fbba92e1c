// Bounds of random loops: numbers lie in their bounds wherever the state is in its bracket; and where there are no bounds.
import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { analyseFeedbacks } from "../../src/feedback/analyseFeedbacks.ts";
import {
  absorbedFlux,
  add,
  closeLoop,
  findStates,
  greyEmission,
  inUnit,
  linearEmission,
  mul,
  rampAlbedo,
  type State,
  sampledLaw,
  sqrt,
  square,
  step,
  sub,
  tanhAlbedo,
  type Value,
} from "../../src/index.ts";
import { settings } from "../properties/settings.ts";
import { refusal } from "../refusal.ts";
import { NAMES, planLoop, plans, stateOf } from "./planLoop.ts";
import { rangesIn } from "./ranges.ts";
import { warmLoop } from "./warmLoop.ts";

const subsets = fc.subarray([...NAMES]);
/** A state with another bracket, and another place in it. */
const moved = <S extends State<never>>(state: S, value: number, bracket: readonly [number, number]) =>
  ({ ...state, variables: { temperature: { value, bracket } } }) as never;

describe("for random couplings that act on each other", () => {
  test("every number has bounds, lies in them, and they are narrow", () => {
    let compared = 0;
    fc.assert(
      fc.property(plans, subsets, (plan, cut) => {
        const loop = planLoop(plan);
        const ranges = rangesIn(analyseFeedbacks(loop, stateOf(loop), { through: cut }));
        for (const { path, value, range } of ranges) {
          if (value === null) {
            expect(range, path).toBeNull();
            continue;
          }
          compared++;
          const [low, high] = range ?? [Number.NaN, Number.NaN];
          expect(low <= value && value <= high, `${path}: ${value} in ${low} to ${high}`).toBe(true);
          // some dozen roundings; what is left of numbers near 1, as Σ f is, is known to 1e-15 of these
          expect(high - low, path).toBeLessThanOrEqual(1e-12 * Math.abs(value) + 1e-14);
        }
      }),
      settings(25),
    );
    expect(compared).toBeGreaterThan(400);
  });

  test("bounds are those of the whole bracket, wherever in it the state is said to lie", () => {
    let wide = 0;
    fc.assert(
      fc.property(plans, fc.double({ min: -1, max: 1, noNaN: true }), (plan, place) => {
        const loop = planLoop(plan);
        const state = stateOf(loop);
        const T = state.temperature;
        const bracket = [T - 2e-4, T + 2e-4] as const;
        const ranges = rangesIn(analyseFeedbacks(loop, moved(state, T + 2e-4 * place, bracket)));
        for (const { path, value, range } of ranges) {
          if (value === null) continue;
          const [low, high] = range ?? [Number.NaN, Number.NaN];
          expect(low <= value && value <= high, `${path}: ${value} in ${low} to ${high}`).toBe(true);
          if (high - low > 1e-9 * Math.abs(value)) wide++;
        }
        const middle = rangesIn(analyseFeedbacks(loop, moved(state, T, bracket)));
        expect(middle.map((r) => r.range).filter(Boolean)).toHaveLength(
          middle.filter((r) => r.value !== null).length,
        );
        const byPath = new Map(middle.map((r) => [r.path, r.range]));
        // loops of nearly one strength may change their order
        for (const { path, range } of ranges)
          if (!path.includes("loops[")) expect(range, path).toEqual(byPath.get(path));
      }),
      settings(25),
    );
    expect(wide).toBeGreaterThan(500);
  });
});

/** The fields that have a number, a range, or neither. */
const fieldsOf = (result: object) =>
  Object.fromEntries(
    rangesIn(result).map(({ path, value, range }) => {
      for (const x of [value, ...(range ?? [])]) expect(Number.isFinite(x ?? 0), path).toBe(true);
      return [path.replace("feedbacks.", ""), [value !== null, range !== null]];
    }),
  );
const [both, neither, middleOnly] = [
  [true, true],
  [false, false],
  [true, false],
] as const;

describe("no bounds where there is no number:", () => {
  const within = [100, 450] as const;
  const emission = (temperature: Value) => greyEmission({ temperature, emissivity: 0.6 } as never) as never;

  test("λ is 0 for all that the bounds tell", () => {
    // N = 0 for all T between the corners
    const flat = closeLoop(({ temperature, given, couple }) => {
      const ramp = { cold: 0.6, warm: 0.3, frozenBelow: 253, openAbove: 293 };
      const flux = given("flux", 4000 / 3, "W m-2", { within: [0, 1e5] });
      const albedo = couple("albedo", rampAlbedo({ temperature, ...ramp }));
      const straight = { intercept: 550 / 3, slope: 2.5, reference: 273 };
      return {
        heating: { sunlight: absorbedFlux({ flux, albedo }) },
        cooling: { longwave: linearEmission({ temperature, ...straight }) },
        heatCapacity: 4e8,
      };
    });
    const middle = {
      variables: { temperature: { value: 273, bracket: [272.9, 273.1] as const } },
      givens: { flux: 4000 / 3 },
      couplings: { albedo: 0.45 },
    };
    const found = analyseFeedbacks(flat, middle);
    expect(fieldsOf(found)).toMatchObject({
      feedbackParameter: both,
      feedbackFactor: both,
      gain: neither,
      sensitivity: neither,
      "responses.flux.flux": both,
      "responses.flux.temperature": neither,
      eFoldingTime: neither,
      growthTime: neither,
      "loops[0].feedbackFactor": both,
      "loops[0].without.eFoldingTime": both,
    });
    const [low, high] = found.feedbackFactorRange ?? [Number.NaN, Number.NaN];
    expect(low < 1 && high > 1).toBe(true);
    expect(found.notes.map((n) => n.text)).toEqual([
      "λ has no sign that its bounds prove, so nothing is divided by it: times, sensitivities and gain are null",
    ]);
  });

  test("Σ f ≥ 1", () => {
    const loop = warmLoop();
    const unstable = findStates(loop, { within }).states[1] as State<never>;
    const found = analyseFeedbacks(loop, unstable as never);
    expect(fieldsOf(found)).toMatchObject({
      feedbackFactor: both,
      gain: neither,
      sensitivity: both,
      growthTime: both,
      eFoldingTime: neither,
      "responses.flux.temperature": both,
    });
    expect(found.feedbackFactorRange?.[0]).toBeGreaterThan(1);
    expect(found.notes.map((n) => n.code)).toEqual(["no-gain"]);
  });

  test("a sampled law", () => {
    const plain = sampledLaw({
      name: "plainAlbedo",
      output: { symbol: "α", unit: "1", within: [0, 1] },
      inputs: { temperature: { symbol: "T", unit: "K", within: [0, 1e5] } },
      compute: ({ temperature }) =>
        tanhAlbedo({ temperature, cold: 0.7, warm: 0.3, midpoint: 265, width: 10 }),
    });
    const loop = closeLoop(({ temperature, couple }) => ({
      heating: { sunlight: absorbedFlux({ flux: 1361, albedo: couple("albedo", plain({ temperature })) }) },
      cooling: { longwave: greyEmission({ temperature, emissivity: 0.6 }) },
      heatCapacity: 4.2e8,
    }));
    const state = findStates(loop, { within }).states[2] as State<never>;
    const found = analyseFeedbacks(loop, state as never);
    for (const [path, has] of Object.entries(fieldsOf(found)))
      expect(has, path).toEqual(path.includes("rowthTime") ? neither : middleOnly);
    expect(found.notes[0]?.text).toContain("there are no bounds");
  });

  test("a reference response that is not told from 0, and a loop without which nothing is left", () => {
    const loop = closeLoop(({ temperature, couple }) => {
      const warmer = inUnit(sub(temperature, 300), "1");
      return {
        heating: { sun: 4 },
        cooling: {
          bent: inUnit(mul(0.01, square(warmer)), "W m-2"),
          clouds: couple("clouds", inUnit(add(4, mul(2, warmer)), "W m-2")),
        },
        heatCapacity: 0,
      };
    });
    const [state] = findStates(loop, { within: [250, 350] }).states;
    const found = analyseFeedbacks(loop, state as never);
    expect(found.feedbackParameter).toBeCloseTo(-2, 12);
    expect(fieldsOf(found)).toEqual({
      feedbackParameter: both,
      "reference.feedbackParameter": both,
      "loops[0].feedbackParameter": both,
      "loops[0].feedbackFactor": neither,
      "loops[0].without.feedbackParameter": both,
      "loops[0].without.eFoldingTime": neither,
      "loops[0].without.growthTime": neither,
      feedbackFactor: neither,
      gain: neither,
      sensitivity: both,
      eFoldingTime: both,
      growthTime: neither,
    });
    // at C = 0 temperature follows at once
    expect(found.eFoldingTimeRange).toEqual([0, 0]);
    expect(found.notes.map(({ code, about }) => [code, about])).toEqual([
      ["no-feedback-factors", "reference"],
      ["stability-unknown", "without clouds"],
    ]);
    // none of these numbers is below 0 or above it for sure
    expect(found.reference.kind).toBe("reference response");
  });

  test("an unstable branch without a restoring reference says so", () => {
    const loop = closeLoop(({ temperature, couple }) => {
      const warmer = inUnit(sub(temperature, 300), "1");
      return {
        heating: { sun: 4, steam: inUnit(mul(3, warmer), "W m-2") },
        cooling: { clouds: couple("clouds", inUnit(add(4, mul(2, warmer)), "W m-2")) },
        heatCapacity: 1e8,
      };
    });
    const [state] = findStates(loop, { within: [250, 350] }).states;
    const found = analyseFeedbacks(loop, state as never);
    expect(found).toMatchObject({ gain: null, feedbackFactor: null });
    expect(found.sensitivityRange?.[1]).toBeLessThan(0);
    expect(found.notes.map((n) => n.code)).toEqual(["no-feedback-factors", "unstable-branch"]);
  });

  test("a leap inside of a wide bracket: no slope is proved", () => {
    const loop = closeLoop(({ temperature, couple }) => {
      const open = step(inUnit(sub(temperature, 250), "1"));
      const albedo = couple("albedo", sub(0.6, mul(0.3, open)));
      return {
        heating: { sunlight: absorbedFlux({ flux: 1361, albedo }) },
        cooling: { longwave: emission(temperature) },
        heatCapacity: 1e8,
      };
    });
    const state = findStates(loop, { within }).states.at(-1) as State<never>;
    expect(analyseFeedbacks(loop, state as never).proved).toBe(true);
    const wide = analyseFeedbacks(loop, moved(state, state.temperature, [200, 350]));
    expect(wide).toMatchObject({ proved: false, sensitivity: null, eFoldingTime: null, gain: null });
    expect(wide.feedbackParameterRange).toBeNull();
    expect(wide.notes.map((n) => n.code)).toContain("stability-unknown");
  });

  test("a state on a corner: the bounds hold both slopes, and the effect is not decided", () => {
    // at the upper corner S (1 − 0.3)/4 = 203 + 2 (280 − 270)
    const loop = closeLoop(({ temperature, couple }) => {
      const ramp = { cold: 0.35, warm: 0.3, frozenBelow: 260, openAbove: 280 };
      const albedo = couple("albedo", rampAlbedo({ temperature, ...ramp }));
      return {
        heating: { sunlight: absorbedFlux({ flux: (4 * 223) / 0.7, albedo }) },
        cooling: { longwave: linearEmission({ temperature, intercept: 203, slope: 2, reference: 270 }) },
        heatCapacity: 1e8,
      };
    });
    const corner = {
      variables: { temperature: { value: 280, bracket: [280 - 1e-9, 280 + 1e-9] as const } },
      givens: {},
      couplings: { albedo: 0.3 },
    };
    const found = analyseFeedbacks(loop, corner as never);
    const ice = ((223 / 0.7) * 0.05) / 20;
    expect(found.loops[0]?.effect).toBe("undecided");
    for (const [range, a, b] of [
      [found.loops[0]?.feedbackParameterRange, 0, ice],
      [found.feedbackParameterRange, -2, -2 + ice],
      [found.gainRange, 1, 1 / (1 - ice / 2)],
      [found.eFoldingTimeRange, 1e8 / 2, 1e8 / (2 - ice)],
    ] as const) {
      expect(range?.[0]).toBeLessThanOrEqual(a);
      expect(range?.[1]).toBeGreaterThanOrEqual(b);
      expect((range?.[1] ?? 0) - (range?.[0] ?? 0)).toBeLessThan((b - a) * (1 + 1e-9));
    }
  });

  test("a heat capacity below 0 has no times, and a note", () => {
    const loop = closeLoop(({ temperature, given }) => ({
      heating: { sunlight: 240 },
      cooling: { longwave: emission(temperature) },
      heatCapacity: given("capacity", -100, "J m-2 K-1"),
    }));
    const [state] = findStates(loop, { within }).states;
    const found = analyseFeedbacks(loop, state as never);
    expect(found).toMatchObject({
      eFoldingTime: null,
      eFoldingTimeRange: null,
      sensitivity: expect.any(Number),
    });
    expect(found.notes).toMatchObject([
      { code: "outside-range", severity: "invalid", about: "heatCapacity", value: -100, unit: "J m-2 K-1" },
    ]);
  });
});

test("what goes as T⁴ but does not restore is no Planck response, and says why", () => {
  const loop = closeLoop(({ temperature, couple }) => ({
    heating: { sun: 99, back: greyEmission({ temperature, emissivity: 0.1 }) },
    cooling: { clouds: couple("clouds", greyEmission({ temperature, emissivity: 0.2 })) },
    heatCapacity: 0,
  }));
  const [state] = findStates(loop, { within: [100, 500] }).states;
  if (!state) throw new Error("no state");
  const { reference, notes } = analyseFeedbacks(loop, state as never);
  expect(reference.kind).toBe("reference response");
  expect(reference.text).toBe(
    "the fourth power of temperature in back, with all chosen couplings held; not known to restore",
  );
  expect(notes.map((n) => n.code)).toEqual(["no-feedback-factors"]);
});

test("a slope that is not finite is refused by its name", () => {
  const loop = closeLoop(({ temperature, couple }) => ({
    heating: { sun: 4 },
    cooling: {
      clouds: couple("clouds", inUnit(add(4, sqrt(inUnit(sub(temperature, 300), "1"))), "W m-2")),
      longwave: inUnit(mul(2, sub(temperature, 300)), "W m-2"),
    },
    heatCapacity: 0,
  }));
  const state = {
    variables: { temperature: { value: 300, bracket: [300, 300] as const } },
    givens: {},
    couplings: { clouds: 4 },
  };
  const error = refusal(() => analyseFeedbacks(loop, state as never));
  expect(error).toMatchObject({ code: "not-finite", path: "state: ∂net/∂temperature" });
});
