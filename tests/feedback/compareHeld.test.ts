// Finite changes with and without couplings: lost branches, kinks, sampled laws, shares, and what is refused.
import { describe, expect, test } from "vitest";
import { analyseFeedbacks } from "../../src/feedback/analyseFeedbacks.ts";
import { compareHeld } from "../../src/feedback/compareHeld.ts";
import {
  absorbedFlux,
  add,
  closeLoop,
  defineLaw,
  div,
  findStates,
  greyEmission,
  inUnit,
  linearEmission,
  mul,
  rampAlbedo,
  type State,
  sampledLaw,
  square,
  stepAlbedo,
  sub,
  tanhAlbedo,
  type Value,
} from "../../src/index.ts";
import { holdFixed } from "../../src/loop/holdFixed.ts";
import { iceLoop } from "../states/iceLoop.ts";

const within = [100, 450] as const;
const statesOf = <N extends string>(loop: Parameters<typeof findStates<N>>[0], at = {}) =>
  findStates<N>(loop, { within, at } as never).states;
const third = <N extends string>(states: readonly State<N>[]) => states[2] as State<N>;

/** A ramp with all its corners: N is piecewise straight, so branches end on corners. */
const rampLoop = () =>
  closeLoop(({ temperature, given, couple }) => {
    const ramp = { cold: 0.7, warm: 0.3, frozenBelow: 250, openAbove: 280 };
    const albedo = couple("albedo", rampAlbedo({ temperature, ...ramp }));
    const flux = given("flux", 1361, "W m-2", { within: [0, 1e5] });
    const straight = { intercept: 203.3, slope: 2.09, reference: 273.15 };
    return {
      heating: { sunlight: absorbedFlux({ flux, albedo }) },
      cooling: { longwave: linearEmission({ temperature, ...straight }) },
      heatCapacity: 4e8,
    };
  });

test("a branch that ends at a leap is not said to arrive in it", () => {
  // warmer than 288 K the planet reflects more, so that between two fluxes nothing balances
  const loop = closeLoop(({ temperature, given, couple }) => {
    const albedo = couple("albedo", stepAlbedo({ temperature, cold: 0.3, warm: 0.4, threshold: 288 }));
    const heat = given("heat", 0, "W m-2", { within: [0, 100] });
    const sunlight = absorbedFlux({ flux: 1360, albedo });
    const straight = { intercept: 240, slope: 2, reference: 288 };
    return {
      heating: { sunlight, heat },
      cooling: { longwave: linearEmission({ temperature, ...straight }) },
      heatCapacity: 4e8,
    };
  });
  const [state] = statesOf(loop);
  expect(state?.temperature).toBeCloseTo(287, 9);
  const warmedBy = (heat: number) =>
    compareHeld(loop, { from: state as never, change: { heat }, hold: ["albedo"] });
  expect(warmedBy(1).temperatureChange).toBeCloseTo(0.5, 9);
  // 238 + heat = 240 + 2 (T − 288) reaches the leap at 2 W m⁻², and 204 + heat leaves it at 36
  const { temperatureChange, temperatureChangeHeld, lost } = warmedBy(20);
  expect(temperatureChange).toBeNull();
  expect(temperatureChangeHeld).toBeCloseTo(10, 9);
  expect(lost).toMatchObject([{ held: [], lost: { reason: "undecided" } }]);
  expect(lost[0]?.lost.temperature).toBeCloseTo(288, 3);
  expect(lost[0]?.lost.givens.heat).toBeCloseTo(2, 3);
});

describe("a branch that ends", () => {
  test("at a corner of a ramp, which is told from a smooth fold", () => {
    const loop = rampLoop();
    const states = statesOf(loop);
    expect(states.map((s) => s.stability)).toEqual(["stable", "unstable", "stable"]);
    const cold = states[0];
    const [loss] = compareHeld(loop, { from: cold as never, change: { flux: 2600 }, hold: ["albedo"] }).lost;
    // at the corner: S (1 − 0.7)/4 = 203.3 + 2.09 (250 − 273.15)
    expect(loss?.lost).toMatchObject({ reason: "corner-fold", drift: "warms", nextIs: "found" });
    expect(loss?.lost.temperature).toBeCloseTo(250, 9);
    expect(loss?.lost.givens.flux).toBeCloseTo((203.3 + 2.09 * (250 - 273.15)) / 0.075, 8);
    // and above it: S (1 − 0.3)/4 = 203.3 + 2.09 (T − 273.15)
    const S = loss?.lost.next?.givens.flux ?? Number.NaN;
    expect(loss?.lost.next?.temperature).toBeCloseTo((0.175 * S - 203.3) / 2.09 + 273.15, 8);
  });

  test("only with something held: shares are null, the whole answer is not", () => {
    // a cloud that brightens as it warms keeps this planet from leaving its branch
    const loop = closeLoop(({ temperature, given, couple }) => {
      const flux = given("flux", 1361, "W m-2", { within: [0, 1e5] });
      const ice = tanhAlbedo({ temperature, cold: 0.7, warm: 0.3, midpoint: 265, width: 20 });
      const haze = couple("haze", inUnit(mul(3, sub(temperature, 250)), "W m-2"));
      return {
        heating: { sunlight: absorbedFlux({ flux, albedo: couple("albedo", ice) }) },
        cooling: { longwave: greyEmission({ temperature, emissivity: 0.5 }), haze },
        heatCapacity: 4e8,
      };
    });
    const from = statesOf(loop, { flux: 900 })[0];
    const compared = compareHeld(loop as never, {
      from: from as never,
      change: { flux: 1850 } as never,
      hold: ["haze", "albedo"] as never,
    });
    expect(compared.lost.map((l) => l.held)).not.toContainEqual([]);
    expect(compared.lost.length).toBeGreaterThan(0);
    expect(compared.temperatureChange).toBeGreaterThan(0);
    expect(compared.to?.stability).toBe("stable");
    expect(compared.shares).toBeNull();
    expect(compared.notes.map((n) => n.code)).toEqual(["branch-lost"]);
    // the answer is exactly that of a search at the new flux
    const reached = statesOf(loop, { flux: 1850 }).map((s) => s.temperature);
    expect(Math.min(...reached.map((T) => Math.abs(T - (compared.to?.temperature ?? 0))))).toBeLessThan(
      1e-10,
    );
  });

  test("where nothing else answers, there is no response", () => {
    const loop = closeLoop(({ temperature, given, couple }) => {
      const longwave = couple("longwave", greyEmission({ temperature, emissivity: 0.6 }));
      const flux = given("flux", 1361, "W m-2", { within: [0, 1e5] });
      return {
        heating: { sunlight: absorbedFlux({ flux, albedo: 0.3 }) },
        cooling: { longwave },
        heatCapacity: 0,
      };
    });
    const from = statesOf(loop)[0];
    const compared = compareHeld(loop as never, {
      from: from as never,
      change: { flux: 1400 } as never,
      hold: ["longwave"] as never,
    });
    expect(compared).toMatchObject({
      lost: [{ held: ["longwave"], lost: { reason: "no-response" } }],
      regulation: null,
    });
    expect(compared.notes.map((n) => n.text)).toEqual([
      "1 of 2 choices of held couplings leave nothing that answers to temperature, so there are no shares and no regulation",
    ]);
    const feedbacks = analyseFeedbacks(loop as never, from as never);
    expect(feedbacks.reference).toMatchObject({
      kind: "reference response",
      feedbackParameter: 0,
      text: "no flow answers to temperature except through the chosen couplings",
    });
    expect(feedbacks).toMatchObject({ gain: null, feedbackFactor: null });
    expect(feedbacks.notes.map(({ code, about }) => [code, about])).toEqual([
      ["no-feedback-factors", "reference"],
      ["stability-unknown", "without longwave"],
    ]);
    // with C = 0 temperature follows at once
    expect(feedbacks.eFoldingTime).toBe(0);
  });

  test("out of the range is said", () => {
    const loop = iceLoop();
    const from = third(statesOf(loop));
    const compared = compareHeld(loop, {
      from,
      change: { flux: 1600 },
      hold: ["albedo"],
      within: [250, 295],
    });
    expect(compared.lost[0]).toMatchObject({ held: [], lost: { reason: "range", next: null } });
    expect(compared.lost[0]?.lost.temperature).toBeCloseTo(295, 3);
    expect(compared.notes[0]?.text).toMatch(
      /^\d of 2 choices of held couplings leave the range of 250 to 295 K, so/,
    );
  });

  test("an unstable one is called so, whether it arrives or not", () => {
    const loop = iceLoop();
    const from = statesOf(loop)[1] as State<never>;
    const codes = (flux: number) =>
      compareHeld(loop, { from: from as never, change: { flux }, hold: ["albedo"] }).notes.map((n) => n.code);
    expect(codes(1400)).toEqual(["unstable-branch"]);
    expect(codes(1000)).toEqual(["branch-lost", "unstable-branch"]);
  });

  test("a change too small for its answer to be told from 0 has no regulation", () => {
    const loop = iceLoop();
    const from = third(statesOf(loop));
    const compared = compareHeld(loop, { from, change: { flux: 1361 + 1e-12 }, hold: ["albedo"] });
    expect(compared).toMatchObject({ regulation: null, notes: [{ code: "no-regulation" }] });
    const larger = compareHeld(loop, { from, change: { flux: 1361 + 1e-6 }, hold: ["albedo"] });
    expect(larger.regulation).toBeLessThan(0);
  });
});

test("two givens that change together, there and back", () => {
  const loop = iceLoop();
  const from = third(statesOf(loop));
  const there = compareHeld(loop, { from, change: { flux: 1300, emissivity: 0.55 }, hold: ["albedo"] });
  const back = compareHeld(loop, {
    from: there.to as typeof from,
    change: { flux: 1361, emissivity: 0.6 },
    hold: ["albedo"],
  });
  expect(back.to?.temperature).toBeCloseTo(from.temperature, 10);
  expect(there.temperatureChange).toBeCloseTo(-(back.temperatureChange ?? 0), 10);
  // the shares of one coupling are all of the difference
  const { temperatureChange, temperatureChangeHeld, shares } = there;
  expect(shares?.albedo).toBeCloseTo((temperatureChange ?? 0) - (temperatureChangeHeld ?? 0), 12);
});

test("a small change is the slope", () => {
  const loop = iceLoop();
  const from = third(statesOf(loop));
  const step = 1e-3;
  const { temperatureChange, temperatureChangeHeld } = compareHeld(loop, {
    from,
    change: { flux: 1361 + step },
    hold: ["albedo"],
  });
  const slope = analyseFeedbacks(loop, from).responses.flux.temperature ?? Number.NaN;
  const heldSlope =
    analyseFeedbacks(holdFixed(loop, ["albedo"], from), from).responses.flux.temperature ?? Number.NaN;
  // the second order is some 1e-5 of the first at this step
  expect((temperatureChange ?? 0) / step / slope).toBeCloseTo(1, 5);
  expect((temperatureChangeHeld ?? 0) / step / heldSlope).toBeCloseTo(1, 5);
});

describe("couplings inside couplings", () => {
  const nested = () =>
    closeLoop(({ temperature, given, couple }) => {
      const forcing = given("forcing", 0, "W m-2", { within: [-50, 50] });
      const warmth = div(inUnit(sub(temperature, 288), "1"), 10);
      const vapour = couple("vapour", add(mul(0.8, warmth), mul(0.2, square(warmth))));
      const cloud = couple("cloud", add(mul(0.3, vapour), mul(0.4, warmth)));
      const kept = inUnit(add(mul(4, vapour), mul(3, cloud)), "W m-2");
      const longwave = inUnit(mul(2.5, sub(temperature, 288)), "W m-2");
      return { heating: { forcing, kept }, cooling: { longwave }, heatCapacity: 0 };
    });
  const loop = nested();
  const from = findStates(loop, { within: [287, 289] }).states[0] as State<never>;
  const hold = ["vapour", "cloud"] as const;
  const compared = compareHeld(loop, { from: from as never, change: { forcing: 3 }, hold });

  test("each choice is what the held loop gives", () => {
    for (const { held, temperatureChange } of compared.subsets) {
      const alone = held.length > 0 ? holdFixed(loop, held, from as never) : loop;
      const T = findStates(alone, { within: [280, 300], at: { forcing: 3 } }).states[0]?.temperature ?? 0;
      expect(Math.abs(T - 288 - (temperatureChange ?? 0)), held.join()).toBeLessThan(1e-10);
    }
  });

  test("a held coupling still feels what enters it from another that is held only elsewhere", () => {
    const [state] = findStates(holdFixed(loop, ["vapour"], from as never), {
      within: [280, 300],
      at: { forcing: 3 },
    }).states;
    // cloud still answers to temperature itself, no longer through vapour
    const T = state?.temperature ?? Number.NaN;
    expect(state?.couplings.vapour).toBe(0);
    expect(state?.couplings.cloud).toBeCloseTo(0.04 * (T - 288), 12);
  });

  test("the paths: temperature → vapour → cloud → net flux is one of three", () => {
    const { loops } = analyseFeedbacks(loop, from as never);
    const found = Object.fromEntries(loops.map((l) => [l.through.join(" → "), l.feedbackParameter]));
    expect(Object.keys(found).sort()).toEqual(["cloud", "vapour", "vapour → cloud"]);
    expect(found.vapour).toBeCloseTo(0.32, 12);
    expect(found.cloud).toBeCloseTo(0.12, 12);
    expect(found["vapour → cloud"]).toBeCloseTo(0.072, 12);
  });
});

test("twelve couplings: 4096 branches, and shares that add up", () => {
  const strengths = Array.from({ length: 12 }, (_, i) => 0.02 * (i + 1));
  const loop = closeLoop(({ temperature, given, couple }) => {
    const forcing = given("forcing", 0, "W m-2", { within: [-50, 50] });
    const warmer = inUnit(sub(temperature, 288), "1");
    const kept = strengths.map((s, i) =>
      couple(`q${i}`, inUnit(mul(s, add(warmer, mul(0.01 * i, square(warmer)))), "W m-2")),
    );
    const sum = kept.reduce<Value>((total, q) => add(total, q) as Value, 0);
    const longwave = inUnit(mul(4, warmer), "W m-2");
    return { heating: { forcing, sum }, cooling: { longwave }, heatCapacity: 0 } as never;
  });
  const from = findStates(loop as never, { within: [287, 289] }).states[0] as State<never>;
  const hold = strengths.map((_, i) => `q${i}`) as never;
  const compared = compareHeld(loop as never, { from: from as never, change: { forcing: 2 } as never, hold });
  expect(compared.evaluations).toBe(4096);
  const shares = Object.values<number>(compared.shares as never);
  const sum = shares.reduce((total, x) => total + x, 0);
  const { temperatureChange, temperatureChangeHeld } = compared;
  expect(sum).toBeCloseTo((temperatureChange ?? 0) - (temperatureChangeHeld ?? 0), 10);
  expect([...shares].sort((a, b) => a - b)).toEqual(shares);
});

describe("a loop with a sampled law", () => {
  const ice = { cold: 0.7, warm: 0.3, midpoint: 265, width: 10 };
  const plain = sampledLaw({
    name: "plainAlbedo",
    output: { symbol: "α", unit: "1", within: [0, 1] },
    inputs: { temperature: { symbol: "T", unit: "K", within: [0, 1e5] } },
    compute: ({ temperature }) => tanhAlbedo({ temperature, ...ice }),
  });
  const sampled = closeLoop(({ temperature, given, couple }) => ({
    heating: {
      sunlight: absorbedFlux({
        flux: given("flux", 1361, "W m-2", { within: [0, 1e5] }),
        albedo: couple("albedo", plain({ temperature })),
      }),
    },
    cooling: { longwave: greyEmission({ temperature, emissivity: 0.6 }) },
    heatCapacity: 4.2e8,
  }));
  const from = third(statesOf(sampled));
  const exact = iceLoop();
  const same = third(statesOf(exact));

  test("works, close to the same loop with the law, and says that it is sampled", () => {
    const feedbacks = analyseFeedbacks(sampled, from);
    const reference = analyseFeedbacks(exact, same);
    // slopes of the sampled law are difference quotients
    expect(feedbacks.feedbackParameter).toBeCloseTo(reference.feedbackParameter, 6);
    expect(feedbacks.loops[0]?.feedbackParameter).toBeCloseTo(reference.loops[0]?.feedbackParameter ?? 0, 6);
    expect(feedbacks).toMatchObject({ proved: false, feedbackParameterRange: null });
    expect(feedbacks.loops[0]?.feedbackParameterRange).toBeNull();
    expect(feedbacks.reference).toMatchObject({ kind: "Planck response", feedbackParameterRange: null });
    expect(feedbacks.notes.map((n) => n.code)).toEqual(["sampled-law"]);
  });

  test("can be compared, and loses its branch at the same fold", () => {
    const near = compareHeld(sampled, { from, change: { flux: 1450 }, hold: ["albedo"] });
    const proved = compareHeld(exact, { from: same, change: { flux: 1450 }, hold: ["albedo"] });
    expect(near.temperatureChange).toBeCloseTo(proved.temperatureChange ?? 0, 9);
    expect(near).toMatchObject({ proof: "sampled", notes: [{ code: "sampled-law" }] });
    const [loss] = compareHeld(sampled, { from, change: { flux: 1000 }, hold: ["albedo"] }).lost;
    // the fold of this loop is a row of the reference table: 1192.37172762746 at 274.233658 K
    expect(loss?.lost.givens.flux).toBeCloseTo(1192.37172762746, 5);
    expect(loss?.lost).toMatchObject({ reason: "fold", drift: "cools", between: null, nextIs: "found" });
  });
});

test("a state that a law refuses is said to be one, before and after a change", () => {
  const cloud = defineLaw({
    name: "coolCloud",
    output: { symbol: "q", unit: "W m-2" },
    inputs: { temperature: { symbol: "T", unit: "K", within: [200, 290] } },
    write: ({ temperature }) => inUnit(mul(0.1, sub(temperature, 250)), "W m-2"),
  });
  const loop = closeLoop(({ temperature, given, couple }) => ({
    heating: { sunlight: absorbedFlux({ flux: given("flux", 1361, "W m-2"), albedo: 0.3 }) },
    cooling: {
      longwave: greyEmission({ temperature, emissivity: 0.6 }),
      cloud: couple("cloud", cloud({ temperature })),
    },
    heatCapacity: 4e8,
  }));
  const [from] = findStates(loop, { within }).states;
  const warmer = compareHeld(loop, { from: from as never, change: { flux: 1500 }, hold: ["cloud"] });
  const refused = { code: "outside-range", severity: "invalid", range: [200, 290] };
  expect(analyseFeedbacks(loop, from as never).notes).toEqual([]);
  expect(warmer.notes).toMatchObject([{ ...refused, about: "to: coolCloud.temperature" }]);
  expect(analyseFeedbacks(loop, warmer.to as never).notes).toMatchObject([
    { ...refused, about: "coolCloud.temperature", value: warmer.to?.temperature },
  ]);
});

test("results survive JSON, are frozen, and a state that went through it is taken up again", () => {
  const loop = iceLoop();
  const state = third(statesOf(loop));
  const again = JSON.parse(JSON.stringify(state)) as typeof state;
  const results = [
    analyseFeedbacks(loop, state),
    compareHeld(loop, { from: state, change: { flux: 1000 }, hold: ["albedo"] }),
  ];
  for (const result of results) {
    expect(JSON.parse(JSON.stringify(result))).toEqual(result);
    expect(Object.isFrozen(result)).toBe(true);
  }
  expect(analyseFeedbacks(loop, again)).toEqual(results[0]);
  expect(compareHeld(loop, { from: again, change: { flux: 1000 }, hold: ["albedo"] })).toEqual(results[1]);
  const held = holdFixed(loop, ["albedo"], again);
  expect(held.toJSON()).toMatchObject({ held: { albedo: state.temperature } });
  expect(Object.isFrozen(held)).toBe(true);
});
