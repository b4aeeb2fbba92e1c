// A balance that leaps through zero: an entry of its own in every list, and no state.
import { describe, expect, test } from "vitest";
import { solveFor } from "../../src/branches/solveFor.ts";
import { statesOnDiagram } from "../../src/branches/statesOnDiagram.ts";
import { traceBranches } from "../../src/branches/traceBranches.ts";
import * as core from "../../src/index.ts";

const { closeLoop, findStates, greyEmission, step, stepAlbedo, STEFAN_BOLTZMANN, sub } = core;
const WITHIN = [150, 400] as const;

/** Budyko's albedos, 0.62 below −10 °C and 0.32 above. */
const iceLoop = () =>
  closeLoop(({ temperature, given, couple }) => {
    const flux = given("flux", 1361, "W m-2", { within: [0, 1e5] });
    const threshold = given("threshold", 263.15, "K", { within: [100, 400] });
    const albedo = couple("albedo", stepAlbedo({ temperature, cold: 0.62, warm: 0.32, threshold }));
    return {
      heating: { sunlight: core.absorbedFlux({ flux, albedo }) },
      cooling: { longwave: greyEmission({ temperature, emissivity: 0.6 }) },
      heatCapacity: 4e8,
    };
  });
/** (1 − α)·S/4 = 0.6·σT⁴ solved by hand. */
const temperatureOf = (flux: number, albedo: number) =>
  (((1 - albedo) * flux) / 4 / (0.6 * STEFAN_BOLTZMANN)) ** 0.25;
const fluxOf = (temperature: number, albedo: number) =>
  (4 * 0.6 * STEFAN_BOLTZMANN * temperature ** 4) / (1 - albedo);

describe("states", () => {
  const loop = iceLoop();

  test("the two on either side are found, and the leap between is named", () => {
    const found = findStates(loop, { within: WITHIN });
    expect(found.states.map((s) => s.stability)).toEqual(["stable", "stable"]);
    expect(found.states[0]?.temperature).toBeCloseTo(temperatureOf(1361, 0.62), 10);
    expect(found.states[1]?.temperature).toBeCloseTo(temperatureOf(1361, 0.32), 10);
    expect(found).toMatchObject({ complete: false, proof: "partial", undecided: [{ kind: "jump" }] });
    expect(found.undecided).toHaveLength(1);
    const [{ interval, enclosure }] = found.undecided as [core.Undecided];
    const [low, high] = interval;
    expect(low).toBeLessThan(263.15);
    expect(high).toBeGreaterThanOrEqual(263.15);
    // a few roundings on either side of the threshold
    expect(high - low).toBeLessThan(2e-12);
    // N below and above the leap
    const [least, greatest] = enclosure as readonly [number, number];
    const net = (albedo: number) => ((1 - albedo) * 1361) / 4 - 0.6 * STEFAN_BOLTZMANN * 263.15 ** 4;
    expect(least).toBeCloseTo(net(0.62), 9);
    expect(greatest).toBeCloseTo(net(0.32), 9);
  });

  test("where the balance keeps its sign across the leap everything is proved", () => {
    for (const [flux, albedo] of [
      [900, 0.62],
      [1900, 0.32],
    ] as const) {
      const found = findStates(loop, { within: WITHIN, at: { flux } });
      expect(found).toMatchObject({ complete: true, undecided: [] });
      expect(found.states.map((s) => s.temperature)).toHaveLength(1);
      expect(found.states[0]?.temperature).toBeCloseTo(temperatureOf(flux, albedo), 10);
    }
  });

  test("a leap downwards through zero, to which the climate is drawn from both sides, is no state either", () => {
    const drawn = closeLoop(({ temperature }) => ({
      heating: { lamp: core.inUnit(sub(1, core.mul(2, step(sub(temperature, 300)))), "W m-2") },
      cooling: {},
      heatCapacity: 1,
    }));
    const found = findStates(drawn, { within: WITHIN });
    expect(found).toMatchObject({ states: [], complete: false, undecided: [{ kind: "jump" }] });
  });

  test("proveCount proves no number where the balance leaps through zero", () => {
    const at = (over: readonly [number, number]) =>
      core.proveCount(loop, { within: WITHIN, over: { flux: over }, effort: 500 });
    expect(at([800, 900]).tiles.map((t) => t.count)).toEqual([1]);
    expect(at([1300, 1310]).tiles.map((t) => t.count)).toEqual([null]);
  });

  test("every threshold for which a temperature is balanced, or none", () => {
    const options = {
      unknown: "threshold",
      temperature: temperatureOf(1361, 0.5),
      within: [200, 300],
    } as const;
    expect(solveFor(loop, options)).toMatchObject({
      solutions: [],
      complete: false,
      undecided: [{ kind: "jump" }],
    });
  });
});

describe("branches", () => {
  test("along the flux: both, and the leap over the fluxes at which it changes the sign", () => {
    const loop = iceLoop();
    const diagram = traceBranches(loop, { along: "flux", between: [900, 2200], within: WITHIN });
    expect(diagram).toMatchObject({
      complete: false,
      proof: "partial",
      folds: [],
      undecided: [{ kind: "jump" }],
    });
    expect(diagram.undecided).toHaveLength(1);
    const [{ parameters, temperatures }] = diagram.undecided as [core.UndecidedStretch];
    const [low, high] = [fluxOf(263.15, 0.32), fluxOf(263.15, 0.62)];
    expect(parameters[0]).toBeCloseTo(low, 8);
    expect(parameters[1]).toBeCloseTo(high, 8);
    expect(temperatures[1] - temperatures[0]).toBeLessThan(2e-12);
    const [cold, warm] = diagram.branches as [core.Branch, core.Branch];
    expect(diagram.branches.map((b) => [b.stability, b.low.kind, b.high.kind])).toEqual([
      ["stable", "between", "leap"],
      ["stable", "leap", "between"],
    ]);
    expect(cold.parameters[1]).toBeCloseTo(high, 8);
    expect(warm.parameters[0]).toBeCloseTo(low, 8);
    const here = statesOnDiagram(loop, diagram, 1361);
    expect(here.complete).toBe(false);
    expect(here.states.map((s) => s.temperature)).toEqual(
      findStates(loop, { within: WITHIN }).states.map((s) => expect.closeTo(s.temperature, 10)),
    );
  });

  test("a slow rise passes the leap and jumps to the warm branch, a slow fall back", () => {
    const loop = iceLoop();
    const diagram = traceBranches(loop, { along: "flux", between: [900, 2200], within: WITHIN });
    const [low, high] = [fluxOf(263.15, 0.32), fluxOf(263.15, 0.62)];
    const near = (x: number) => expect.closeTo(x, 8);
    const jump = { temperature: near(263.15), leaves: null, noReturn: false };
    expect(diagram.jumps).toMatchObject([
      {
        ...{ ...jump, direction: "rise", from: 0, at: near(high), returnsAt: near(low) },
        to: { branch: 1, temperature: near(temperatureOf(high, 0.32)) },
      },
      {
        ...{ ...jump, direction: "fall", from: 1, at: near(low), returnsAt: near(high) },
        to: { branch: 0, temperature: near(temperatureOf(low, 0.62)) },
      },
    ]);
    // the leap is also what bounds the basins
    const [cold, warm] = findStates(loop, { within: WITHIN }).states.map((state) =>
      core.tippingMargins(loop, state, { along: "flux", between: [900, 2200], within: WITHIN, diagram }),
    );
    expect(cold?.basin).toEqual({ coldest: null, hottest: near(263.15) });
    expect(warm?.basin).toEqual({ coldest: near(263.15), hottest: null });
    expect(cold?.rise).toMatchObject({ end: { kind: "leap" }, after: { stability: "stable" } });
  });

  test("a leap that drives the climate back from both sides holds it: no jump", () => {
    const loop = closeLoop(({ temperature, given }) => {
      const flux = given("flux", 1361, "W m-2", { within: [0, 1e5] });
      const albedo = stepAlbedo({ temperature, cold: 0.32, warm: 0.62, threshold: 263.15 });
      return {
        heating: { sunlight: core.absorbedFlux({ flux, albedo }) },
        cooling: { longwave: greyEmission({ temperature, emissivity: 0.6 }) },
        heatCapacity: 4e8,
      };
    });
    const diagram = traceBranches(loop, { along: "flux", between: [500, 2500], within: WITHIN });
    expect(diagram.branches.map((b) => [b.low.kind, b.high.kind])).toEqual([
      ["between", "leap"],
      ["leap", "between"],
    ]);
    expect(diagram.branches[0]?.parameters[1]).toBeLessThan(diagram.branches[1]?.parameters[0] as number);
    expect(diagram.jumps).toEqual([]);
  });

  test("a parameter's range that ends amid a leap: no third branch, and the jump is known as before", () => {
    const loop = iceLoop();
    const [low, high] = [fluxOf(263.15, 0.32), fluxOf(263.15, 0.62)];
    const near = (x: number) => expect.closeTo(x, 8);
    const short = traceBranches(loop, { along: "flux", between: [900, 1500], within: WITHIN });
    expect(short.branches.map((b) => [b.stability, b.low.kind, b.high.kind])).toEqual([
      ["stable", "between", "between"],
      ["stable", "leap", "between"],
    ]);
    expect(short.branches[1]).toMatchObject({ parameters: [near(low), 1500], low: { at: near(low) } });
    expect(short.undecided).toMatchObject([{ kind: "jump", parameters: [near(low), 1500] }]);
    const cold = { branch: 0, temperature: near(temperatureOf(low, 0.62)) };
    expect(short.jumps).toMatchObject([{ direction: "fall", at: near(low), to: cold, noReturn: true }]);
    const upper = traceBranches(loop, { along: "flux", between: [1200, 2200], within: WITHIN });
    expect(upper.branches.map((b) => [b.stability, b.low.kind, b.high.kind])).toEqual([
      ["stable", "between", "leap"],
      ["stable", "between", "between"],
    ]);
    const warm = { branch: 1, temperature: near(temperatureOf(high, 0.32)) };
    expect(upper.jumps).toMatchObject([{ direction: "rise", at: near(high), to: warm, noReturn: true }]);
  });

  test("a leap on the end of the range of temperature: the branch below ends at its own parameter", () => {
    const loop = iceLoop();
    const { branches } = traceBranches(loop, { along: "flux", between: [900, 2200], within: [200, 263.15] });
    const high = fluxOf(263.15, 0.62);
    expect(branches.map((b) => [b.stability, b.low.kind, b.high.kind])).toEqual([
      ["stable", "between", "leap"],
    ]);
    expect(branches[0]?.parameters).toEqual([900, expect.closeTo(high, 8)]);
  });

  test("below the fluxes at which the balance leaps through zero, the leap bounds no basin", () => {
    const loop = iceLoop();
    // below 960 W m⁻² the balance keeps its sign across the leap
    for (const [flux, hottest] of [
      [930, null],
      [1000, expect.closeTo(263.15, 8)],
    ]) {
      const [cold] = findStates(loop, { within: WITHIN, at: { flux } }).states;
      const options = { along: "flux", between: [900, 1500], within: WITHIN } as const;
      expect(core.tippingMargins(loop, cold as NonNullable<typeof cold>, options).basin).toEqual({
        coldest: null,
        hottest,
      });
    }
  });

  test("along the threshold: no branch goes on over thresholds at which both states are", () => {
    const { branches } = traceBranches(iceLoop(), {
      ...{ along: "threshold", between: [240, 300], within: WITHIN },
    });
    const [cold, warm] = [temperatureOf(1361, 0.62), temperatureOf(1361, 0.32)];
    expect(branches.map((b) => [b.low.kind, b.high.kind])).toEqual([
      ["undecided", "between"],
      ["between", "undecided"],
    ]);
    for (const [branch, temperature] of [
      [branches[0], cold],
      [branches[1], warm],
    ] as const)
      for (const end of branch?.temperatures ?? []) expect(end).toBeCloseTo(temperature, 8);
    expect(branches[1]?.parameters[1]).toBeLessThanOrEqual(cold + 1e-6);
    expect(branches[0]?.parameters[0]).toBeGreaterThanOrEqual(warm - 1e-6);
  });

  test("along the threshold: the leap where it lies between both states", () => {
    const diagram = traceBranches(iceLoop(), {
      along: "threshold",
      between: [220, 320],
      within: WITHIN,
    });
    expect(diagram.method).toBe("tiles");
    const leaps = diagram.undecided.filter((u) => u.kind === "jump");
    const widest = leaps.reduce((a, b) =>
      b.parameters[1] - b.parameters[0] > a.parameters[1] - a.parameters[0] ? b : a,
    );
    // a state next to the leap is told from it only in tiles that are narrow, as far as the effort reaches
    expect(Math.abs(widest.parameters[0] - temperatureOf(1361, 0.62))).toBeLessThan(0.05);
    expect(Math.abs(widest.parameters[1] - temperatureOf(1361, 0.32))).toBeLessThan(0.05);
  });
});
