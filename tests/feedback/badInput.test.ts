// What the feedback calls refuse, and hard cases that they answer.
import { describe, expect, test } from "vitest";
import { analyseFeedbacks } from "../../src/feedback/analyseFeedbacks.ts";
import { compareHeld } from "../../src/feedback/compareHeld.ts";
import {
  absorbedFlux,
  closeLoop,
  findStates,
  greyEmission,
  linearEmission,
  rampAlbedo,
  type State,
  sampledLaw,
} from "../../src/index.ts";
import { holdFixed } from "../../src/loop/holdFixed.ts";
import { refusal } from "../refusal.ts";
import { iceLoop } from "../states/iceLoop.ts";
import { warmLoop } from "./warmLoop.ts";

const loop = iceLoop();
const within = [150, 400] as const;
const found = findStates(loop, { within });
const state = found.states[2] as (typeof found.states)[number];
type Refused = (state: unknown) => unknown;
const calls: readonly (readonly [string, Refused])[] = [
  ["analyseFeedbacks", (s) => analyseFeedbacks(loop, s as never)],
  ["holdFixed", (s) => holdFixed(loop, ["albedo"], s as never)],
  ["compareHeld", (s) => compareHeld(loop, { from: s as never, change: { flux: 1400 }, hold: ["albedo"] })],
];

describe.each(calls)("%s", (_, call) => {
  const foreign = (s: unknown) => refusal(() => call(s));
  test("refuses a state of other givens, and a temperature that is no equilibrium", () => {
    const error = foreign({ ...state, givens: { ...state.givens, flux: 1362 } });
    expect(error).toMatchObject({ code: "foreign-state" });
    expect(error.value).toMatch(/^a balance of -?\d.* to -?\d.* W m-2$/);
    const moved = { temperature: { value: 290, bracket: [290 - 1e-9, 290 + 1e-9] } };
    expect(foreign({ ...state, variables: moved }).code).toBe("foreign-state");
    // also after a round trip
    const other = findStates(loop, { within, at: { flux: 1400 } }).states[2];
    const sent = JSON.parse(JSON.stringify({ ...other, givens: state.givens }));
    expect(foreign(sent).code).toBe("foreign-state");
  });

  test("refuses a temperature that is none of an equilibrium, however wide its bracket", () => {
    const forged = (value: number, bracket: readonly [number, number]) =>
      foreign({ ...state, variables: { temperature: { value, bracket } } }).code;
    expect(forged(280, [200, 350])).toBe("foreign-state");
    expect(forged(state.temperature + 0.01, [200, 350])).toBe("foreign-state");
    expect(forged(state.temperature - 0.01, [200, 350])).toBe("foreign-state");
    // a wide bracket is no lie
    const wide = { temperature: { value: state.temperature, bracket: [state.temperature - 1, 350] } };
    expect(() => call({ ...state, variables: wide })).not.toThrow();
  });

  test("refuses a state of another loop, by its names", () => {
    const [other] = findStates(warmLoop(), { within }).states;
    const error = foreign(other);
    expect(error.code).toBe("foreign-state");
    expect(error.path).toMatch(/\.givens$/);
    expect(error.value).toBe("flux,carbonDioxide");
  });

  test.each([
    ["nothing", undefined, "unreadable", "variables"],
    ["a temperature", 288, "unreadable", "variables"],
    ["no couplings", { ...state, couplings: undefined }, "unreadable", "couplings"],
    ["a missing given", { ...state, givens: { flux: 1361 } }, "foreign-state", "givens"],
    [
      "a coupling too many",
      { ...state, couplings: { ...state.couplings, cover: 0.5 } },
      "foreign-state",
      "couplings",
    ],
    [
      "a given as text",
      { ...state, givens: { ...state.givens, flux: "1361" } },
      "not-a-number",
      "givens.flux",
    ],
    [
      "a given out of its range",
      { ...state, givens: { ...state.givens, emissivity: 2 } },
      "out-of-range",
      "givens.emissivity",
    ],
    [
      "a coupling that is NaN",
      { ...state, couplings: { albedo: Number.NaN } },
      "not-a-number",
      "couplings.albedo",
    ],
    [
      "no bracket",
      { ...state, variables: { temperature: { value: 288 } } },
      "missing",
      "variables.temperature.bracket[0]",
    ],
    [
      "a bracket elsewhere",
      { ...state, variables: { temperature: { value: 288, bracket: [200, 201] } } },
      "out-of-range",
      "variables.temperature.value",
    ],
    [
      "a temperature below 0",
      { ...state, variables: { temperature: { value: -1, bracket: [-2, 0] } } },
      "out-of-range",
      "variables.temperature.value",
    ],
  ])("refuses %s", (_what, bad, code, path) => {
    const error = foreign(bad);
    expect({ code: error.code, path: error.path.replace(/^(state|from)\./, "") }).toEqual({ code, path });
  });

  test("takes a temperature without a width whose balance is no more than rounding", () => {
    const at = (value: number) => ({
      ...state,
      variables: { temperature: { value, bracket: [value, value] } },
    });
    // λ of about 2 W m⁻² K⁻¹ makes 2e-12 W m⁻² of 1e-12 K, and rounding of flows near 240 W m⁻² may be 5e-10
    expect(() => call(at(state.temperature + 1e-12))).not.toThrow();
    expect(foreign(at(state.temperature + 1e-8)).code).toBe("foreign-state");
  });

  test("takes every state of its loop", () => {
    for (const s of found.states) expect(() => call(s)).not.toThrow();
  });
});

test("a sampled state is taken with a bracket that is wider than it was found", () => {
  const leak = sampledLaw({
    name: "leak",
    output: { symbol: "F", unit: "W m-2" },
    inputs: { temperature: { symbol: "T", unit: "K" } },
    compute: ({ temperature }) => 240 + 2 * (temperature - 288),
  });
  const sampled = closeLoop(({ temperature, couple }) => ({
    heating: { sunlight: absorbedFlux({ flux: 1371.42, albedo: couple("albedo", 0.3) }) },
    cooling: { leak: leak({ temperature }) },
    heatCapacity: 1,
  }));
  const [only] = findStates(sampled, { within }).states;
  const value = only?.temperature ?? Number.NaN;
  const from = (middle: number) => ({
    ...(only as NonNullable<typeof only>),
    variables: { temperature: { value: middle, bracket: [middle - 1e-4, middle + 1e-4] as const } },
  });
  expect(() => analyseFeedbacks(sampled, from(value))).not.toThrow();
  expect(refusal(() => analyseFeedbacks(sampled, from(value + 2e-4))).code).toBe("foreign-state");
});

describe("names", () => {
  test.each([
    ["analyseFeedbacks", () => analyseFeedbacks(loop, state, { through: ["albdo"] as never }), "through[0]"],
    ["holdFixed", () => holdFixed(loop, ["albedo", "albdo"] as never, state), "names[1]"],
    [
      "compareHeld",
      () => compareHeld(loop, { from: state, change: { flux: 1400 }, hold: ["albdo"] as never }),
      "hold[0]",
    ],
  ])("%s suggests the nearest coupling", (_, call, path) => {
    const error = refusal(call);
    expect(error).toMatchObject({ code: "unknown-name", path });
    expect(error.allowed).toBe("albedo (nearest: albedo)");
  });

  test("a given is no coupling, and a name is no list", () => {
    expect(refusal(() => holdFixed(loop, ["flux"] as never, state)).code).toBe("unknown-name");
    expect(refusal(() => holdFixed(loop, "albedo" as never, state)).code).toBe("unreadable");
    expect(refusal(() => analyseFeedbacks(loop, state, { thru: [] } as never)).allowed).toContain("through");
  });
});

describe("compareHeld", () => {
  const compare = (options: object) =>
    refusal(() =>
      compareHeld(loop, { from: state, change: { flux: 1400 }, hold: ["albedo"], ...options } as never),
    );
  test.each([
    [{ change: {} }, "missing", "change"],
    [{ change: undefined }, "missing", "change"],
    [{ change: { flx: 1400 } }, "unknown-name", "change.flx"],
    [{ change: 5 }, "unreadable", "change"],
    [{ change: { flux: Number.NaN } }, "not-a-number", "change.flux"],
    [{ change: { flux: undefined } }, "missing", "change.flux"],
    [{ change: { emissivity: 2 } }, "out-of-range", "change.emissivity"],
    [{ hold: [] }, "missing", "hold"],
    [{ within: [400, 200] }, "out-of-range", "within[1]"],
    [{ within: [100, 200] }, "out-of-range", "within"],
    [{ steps: 3 }, "unknown-name", "compareHeld.steps"],
  ])("%o", (options, code, path) => {
    expect(compare(options)).toMatchObject({ code, path });
  });

  test("errors say what was received, what is allowed and in which unit", () => {
    const messageOf = (options: object) => compare(options).message.replace(/ \(docs.*/, "");
    expect(messageOf({ change: { emissivity: 2 } })).toBe(
      "change.emissivity: out of range, received 2; allowed: 0.01 to 1",
    );
    expect(messageOf({ within: [100, 200] })).toBe(
      `within: out of range, received "100 to 200"; allowed: a range around the state, which is at ${state.temperature} K`,
    );
    expect(messageOf({ change: {} })).toBe(
      'change: missing, received "no new value"; allowed: new values of flux, emissivity',
    );
    expect(messageOf({ hold: [] })).toBe(
      'hold: missing, received "no name"; allowed: at least one coupling of albedo',
    );
  });

  test("givens that do not change keep the values of the state, not those of the loop", () => {
    const [from] = findStates(loop, { within: [280, 400], at: { flux: 1400 } }).states;
    const { to } = compareHeld(loop, { from: from as never, change: { emissivity: 0.59 }, hold: ["albedo"] });
    expect(to?.givens).toEqual({ flux: 1400, emissivity: 0.59 });
  });

  test("more couplings than 12", () => {
    const many = closeLoop(({ temperature, couple }) => {
      const parts = Array.from({ length: 13 }, (_, i) => [
        `h${i}`,
        couple(`q${i}`, greyEmission({ temperature, emissivity: 0.01 })),
      ]);
      return { heating: { sun: 40 }, cooling: Object.fromEntries(parts), heatCapacity: 0 } as never;
    });
    const [from] = findStates(many, { within: [100, 600] }).states;
    const hold = Array.from({ length: 13 }, (_, i) => `q${i}`);
    const error = refusal(() => compareHeld(many, { from: from as never, change: {}, hold: hold as never }));
    expect(error).toMatchObject({ code: "too-large", path: "hold", value: 13 });
  });

  test("a given that the budget does not depend on changes nothing", () => {
    const idle = closeLoop(({ temperature, given, couple }) => {
      given("idle", 1, "m");
      const albedo = couple(
        "albedo",
        rampAlbedo({ temperature, cold: 0.6, warm: 0.3, frozenBelow: 250, openAbove: 280 }),
      );
      return {
        heating: { sunlight: absorbedFlux({ flux: 1361, albedo }) },
        cooling: { longwave: greyEmission({ temperature, emissivity: 0.6 }) },
        heatCapacity: 0,
      };
    });
    const from = findStates(idle, { within }).states.at(-1) as State<never>;
    const options = { from, change: { idle: 5 }, hold: ["albedo"] } as never;
    expect(compareHeld(idle, options)).toMatchObject({ regulation: null, proof: "proved", lost: [] });
    expect(compareHeld(idle, options).notes.map((n) => n.code)).toEqual(["no-regulation"]);
    expect(Math.abs(compareHeld(idle, options).temperatureChange ?? 1)).toBeLessThan(1e-11);
    const { responses } = analyseFeedbacks(idle, from as never);
    const nothing = { flux: 0, fluxRange: [0, 0], temperature: 0, temperatureRange: [0, 0] };
    expect(responses).toEqual({ idle: { ...nothing, unit: "m" } });
  });
});

test("holding all that answers to temperature is refused", () => {
  const bare = closeLoop(({ temperature, couple }) => ({
    heating: { sun: 240 },
    cooling: { longwave: couple("longwave", greyEmission({ temperature, emissivity: 0.6 })) },
    heatCapacity: 0,
  }));
  const [only] = findStates(bare, { within }).states;
  expect(refusal(() => holdFixed(bare, ["longwave"], only as never)).code).toBe("temperature-unused");
});

test("what is no loop is refused as such", () => {
  const none = undefined as never;
  const calls: readonly (readonly [string, () => unknown])[] = [
    ["holdFixed", () => holdFixed(none, [], state)],
    ["analyseFeedbacks", () => analyseFeedbacks(none, state)],
    ["compareHeld", () => compareHeld(none, { from: state, change: {}, hold: [] } as never)],
  ];
  for (const [path, call] of calls) expect(refusal(call)).toMatchObject({ code: "unreadable", path });
});

test("several variables are refused by name", () => {
  const two = closeLoop(({ temperature, variable }) => {
    const cover = variable("cover", { within: [0, 1] });
    return {
      heating: { sunlight: absorbedFlux({ flux: 1361, albedo: cover }) },
      cooling: { longwave: greyEmission({ temperature, emissivity: 0.6 }) },
      heatCapacity: 1e8,
      rates: { cover: 0 },
    };
  });
  expect(refusal(() => analyseFeedbacks(two, state as never)).code).toBe("several-variables");
});

describe("on a continuum of equilibria", () => {
  // N = 0 for all T between the corners: S (0.6 − 0.3)/4/40 = 2.5 with S = 4000/3
  const flat = closeLoop(({ temperature, given, couple }) => {
    const ramp = { cold: 0.6, warm: 0.3, frozenBelow: 253, openAbove: 293 };
    const flux = given("flux", 4000 / 3, "W m-2", { within: [0, 1e5] });
    return {
      heating: {
        sunlight: absorbedFlux({ flux, albedo: couple("albedo", rampAlbedo({ temperature, ...ramp })) }),
      },
      cooling: { longwave: linearEmission({ temperature, intercept: 550 / 3, slope: 2.5, reference: 273 }) },
      heatCapacity: 4e8,
    };
  });
  const middle = {
    variables: { temperature: { value: 273, bracket: [272.9, 273.1] as const } },
    givens: { flux: 4000 / 3 },
    couplings: { albedo: 0.45 },
  };

  test("λ is not told from 0, and nothing is divided by it", () => {
    const feedbacks = analyseFeedbacks(flat, middle);
    expect(Math.abs(feedbacks.feedbackParameter)).toBeLessThan(1e-14);
    expect(feedbacks).toMatchObject({
      proved: false,
      gain: null,
      sensitivity: null,
      eFoldingTime: null,
      growthTime: null,
      responses: { flux: { temperature: null } },
    });
    expect(feedbacks.notes.map((n) => n.code)).toEqual(["stability-unknown"]);
    // the parts are known all the same
    expect(feedbacks.loops[0]?.feedbackParameter).toBeCloseTo(2.5, 12);
    expect(feedbacks.loops[0]?.without.eFoldingTime).toBeCloseTo(4e8 / 2.5, 0);
  });

  test("there is no branch to follow", () => {
    const compared = compareHeld(flat, { from: middle, change: { flux: 1300 }, hold: ["albedo"] });
    expect(compared).toMatchObject({
      proof: "partial",
      lost: [{ held: [], lost: { reason: "undecided", stage: 0 } }],
    });
    expect(compared.notes.map(({ code, value }) => [code, value])).toEqual([["branch-undecided", 1]]);
    expect(compared.notes[0]?.text).not.toContain("lose");
  });
});
