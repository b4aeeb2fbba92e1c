// Which value of a parameter gives a temperature.
import { describe, expect, test } from "vitest";
import { solveFor } from "../../src/branches/solveFor.ts";
import * as core from "../../src/index.ts";
import { iceLoop } from "../states/iceLoop.ts";
import { formulaLoop, sampledLoop, vapourLoop } from "./loops.ts";

const greyLoop = () =>
  core.closeLoop(({ temperature, given }) => ({
    heating: {
      sunlight: core.absorbedFlux({ flux: 1361, albedo: given("albedo", 0.3, "1", { within: [0, 1] }) }),
    },
    cooling: {
      longwave: core.greyColumnEmission({
        temperature,
        opticalDepth: given("opticalDepth", 0.6, "1", { within: [0, 100] }),
      }),
      transport: core.inUnit(given("transport", 0, "W m-2"), "W m-2"),
    },
    heatCapacity: 1,
  }));

describe("288 K at 1361 W m⁻² and an albedo of 0.3", () => {
  test("needs an emissivity of 0.610540512", () => {
    const loop = core.closeLoop(({ temperature, given }) => ({
      heating: { sunlight: core.absorbedFlux({ flux: 1361, albedo: 0.3 }) },
      cooling: { longwave: core.greyEmission({ temperature, emissivity: given("emissivity", 0.5, "1") }) },
      heatCapacity: 1,
    }));
    const found = solveFor(loop, { unknown: "emissivity", temperature: 288, within: [0, 1] });
    expect(found).toMatchObject({ complete: true, proof: "proved", solutions: [{ stability: "stable" }] });
    // 1361·0.7/4/(σ·288⁴), nine digits
    expect(found.solutions[0]?.value).toBeCloseTo(0.610540512, 9);
    expect(JSON.parse(JSON.stringify(found))).toEqual(found);
  });

  test("or a grey optical depth of 0.850523934", () => {
    const found = solveFor(greyLoop(), { unknown: "opticalDepth", temperature: 288, within: [0, 100] });
    expect(found.solutions).toHaveLength(1);
    expect(found.solutions[0]?.value).toBeCloseTo(0.850523934, 9);
    for (const { bracket } of found.solutions) expect(bracket[1] - bracket[0]).toBeLessThan(1e-13);
  });
});

test("each solution has the temperature as a state, and both solutions of a parabola are found", () => {
  const loop = formulaLoop((t, p) => core.sub(core.sub(300, t), core.sub(1, core.square(p))));
  const found = solveFor(loop, { unknown: "p", temperature: 303, within: [-10, 11] });
  expect(found).toMatchObject({ complete: true, fixed: {} });
  expect(found.solutions.map((s) => s.value)).toEqual([-2, 2]);
  for (const { value } of found.solutions) {
    const { states } = core.findStates(loop, { within: [150, 400], at: { p: value } });
    expect(states[0]?.temperature).toBeCloseTo(303, 10);
  }
});

test("a solution has the stability and λ of its state", () => {
  const loop = vapourLoop();
  for (const state of core.findStates(loop, { within: [150, 400], at: { flux: 1400 } }).states) {
    const { temperature } = state;
    const found = solveFor(loop, { unknown: "flux", temperature, within: [1000, 2000] });
    expect(found.solutions).toMatchObject([{ stability: state.stability }]);
    expect(found.solutions[0]?.value).toBeCloseTo(1400, 8);
    expect(found.solutions[0]?.feedbackParameter).toBeCloseTo(state.feedbackParameter, 8);
  }
});

test("none, and a kink, and a stretch that is balanced throughout", () => {
  const none = solveFor(iceLoop(), { unknown: "flux", temperature: 300, within: [10, 1000] });
  expect(none).toMatchObject({ complete: true, solutions: [] });
  const kinked = formulaLoop((t, p) => core.add(core.sub(300, t), core.max(p, core.mul(2, p))));
  expect(
    solveFor(kinked, { unknown: "p", temperature: 300, within: [-3, 4] }).solutions[0]?.value,
  ).toBeCloseTo(0, 12);
  const flat = formulaLoop((t, p) => core.add(core.sub(300, t), core.max(0, p)));
  const found = solveFor(flat, { unknown: "p", temperature: 300, within: [-3, 4] });
  expect(found.complete).toBe(false);
  expect(found.undecided.map((u) => u.kind)).toContain("flat");
});

test("at the threshold of a step what is balanced on one side is not on the other, and no flux is named", () => {
  const loop = core.closeLoop(({ temperature, given }) => ({
    heating: {
      sunlight: core.absorbedFlux({
        flux: given("flux", 1361, "W m-2", { within: [0, 1e5] }),
        albedo: core.stepAlbedo({ temperature, cold: 0.62, warm: 0.32, threshold: 263.15 }),
      }),
    },
    cooling: { longwave: core.greyEmission({ temperature, emissivity: 0.6 }) },
    heatCapacity: 1,
  }));
  const options = { unknown: "flux", within: [100, 5000] } as const;
  const found = solveFor(loop, { ...options, temperature: 263.15 });
  expect(found).toMatchObject({ solutions: [], complete: false, undecided: [{ kind: "jump" }] });
  // 4·0.6·σT⁴ over the share that is absorbed at the threshold and above
  const [{ interval }] = found.undecided as [(typeof found.undecided)[number]];
  const [low, high] = interval;
  const emitted = 4 * 0.6 * core.STEFAN_BOLTZMANN * 263.15 ** 4;
  expect(low).toBeLessThanOrEqual(emitted / 0.68);
  expect(high).toBeGreaterThanOrEqual(emitted / 0.68);
  const above = solveFor(loop, { ...options, temperature: 263.16 });
  expect(above).toMatchObject({ complete: true, solutions: [{ stability: "stable" }] });
});

test("a λ of zero is written as JSON keeps it, and all that is said is frozen", () => {
  const loop = core.closeLoop(({ temperature, given }) => ({
    heating: { lamp: given("lamp", 300, "W m-2", { within: [0, 1e4] }) },
    cooling: {
      longwave: core.ceilingEmission({
        ...{ temperature, ceiling: 300 },
        emission: core.linearEmission({ temperature, intercept: 200, slope: 2, reference: 273 }),
      }),
    },
    heatCapacity: 1,
  }));
  const found = solveFor(loop, { unknown: "lamp", temperature: 350, within: [100, 500] });
  expect(found.solutions).toHaveLength(1);
  expect(Object.is(found.solutions[0]?.feedbackParameter, 0)).toBe(true);
  expect(Object.isFrozen(found.within)).toBe(true);
});

test("a sampled law is sampled", () => {
  const found = solveFor(sampledLoop(), { unknown: "flux", temperature: 290, within: [500, 2000] });
  const proved = solveFor(iceLoop(), { unknown: "flux", temperature: 290, within: [500, 2000] });
  expect(found).toMatchObject({ proof: "sampled", complete: false });
  expect(found.solutions[0]?.value).toBeCloseTo(proved.solutions[0]?.value as number, 9);
});
