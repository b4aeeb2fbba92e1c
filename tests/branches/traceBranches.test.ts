// The diagram of temperature against a parameter: what it holds, how it was found, what it leaves open.
import { describe, expect, test } from "vitest";
import type { Diagram } from "../../src/branches/diagram.ts";
import { statesOnDiagram } from "../../src/branches/statesOnDiagram.ts";
import { traceBranches } from "../../src/branches/traceBranches.ts";
import * as core from "../../src/index.ts";
import { iceLoop } from "../states/iceLoop.ts";
import { distantLoop, formulaLoop, sampledLoop, vapourLoop } from "./loops.ts";

const WITHIN = [150, 400] as const;
const { add, div, exp, max, min, mul, square, sub } = core;

const folds = (diagram: Diagram) => diagram.folds.map((f) => [f.at, f.temperature]);
const kinds = (diagram: Diagram) => diagram.branches.map((b) => [b.stability, b.low.kind, b.high.kind]);

describe("the acceptance case", () => {
  // folds from an independent computation in high precision, given to 14 and 11 digits
  const expected = [
    [1471.9530876739, 255.37444344],
    [1276.3234109303, 272.87849932],
    [1645.5215068997, 314.97536417],
  ] as const;
  const loop = vapourLoop();
  const diagram = traceBranches(loop, { along: "flux", between: [900, 1900], within: WITHIN });

  test("has its three folds, and no other", () => {
    expect(diagram).toMatchObject({ complete: true, proof: "proved", method: "line", undecided: [] });
    expect(diagram.folds).toHaveLength(3);
    expected.forEach(([flux, temperature], i) => {
      expect(Math.abs((diagram.folds[i]?.at as number) - flux)).toBeLessThan(6e-11);
      expect(Math.abs((diagram.folds[i]?.temperature as number) - temperature)).toBeLessThan(6e-9);
    });
  });

  test("has four branches, of alternating stability", () => {
    expect(kinds(diagram)).toEqual([
      ["stable", "between", "fold"],
      ["unstable", "fold", "fold"],
      ["stable", "fold", "fold"],
      ["unstable", "between", "fold"],
    ]);
  });

  test("jumps up and back where both jumps land inside, and runs away where nothing is left", () => {
    const [up, down, away] = diagram.jumps;
    expect(up).toMatchObject({ direction: "rise", from: 0, to: { branch: 2 }, leaves: null });
    expect(down).toMatchObject({ direction: "fall", from: 2, to: { branch: 0 }, leaves: null });
    expect([up?.returnsAt, down?.returnsAt]).toEqual([down?.at, up?.at]);
    expect(away).toMatchObject({ direction: "rise", from: 2, to: null, leaves: "hotter", returnsAt: null });
    // what comes beyond the range, and back from there, is not known
    expect(diagram.jumps.map((jump) => jump.noReturn)).toEqual([false, false, false]);
    expect(diagram.gaps).toMatchObject([{ too: "hot" }]);
    expect(diagram.gaps[0]?.parameters).toEqual([diagram.folds[2]?.atBracket[1], 1900]);
  });

  test("survives JSON", () => {
    expect(JSON.parse(JSON.stringify(diagram))).toEqual(diagram);
    const again = JSON.parse(JSON.stringify(diagram)) as typeof diagram;
    const here = statesOnDiagram(loop, again, 1361);
    const { states } = core.findStates(loop, { within: WITHIN });
    expect(here).toMatchObject({ complete: true, branches: [0, 1, 2, 3] });
    // brackets of one state may differ by roundings
    here.states.forEach((state, i) => {
      expect(state.temperature).toBeCloseTo(states[i]?.temperature as number, 10);
    });
  });

  test("along carbon, which is no straight line, the same states are found", () => {
    const along = traceBranches(loop, { along: "carbon", between: [10, 20000], within: WITHIN });
    expect(along).toMatchObject({ complete: true, method: "monotone" });
    expect(along.folds).toHaveLength(2);
    for (const fold of along.folds) {
      // at the carbon of a fold the flux has a fold at 1361
      const at = { carbon: fold.at };
      const back = traceBranches(loop, { along: "flux", between: [900, 1900], within: WITHIN, at });
      const misses = back.folds.map(
        (f) => Math.abs(f.at - 1361) + Math.abs(f.temperature - fold.temperature),
      );
      expect(Math.min(...misses)).toBeLessThan(1e-9);
    }
  });
});

describe("the way a parameter takes", () => {
  test("a distance goes through the flux, and its folds are those of the flux", () => {
    const loop = distantLoop();
    const options = { between: [1e11, 2e11], within: WITHIN } as const;
    const byDistance = traceBranches(loop, { along: "distance", ...options });
    const byFlux = traceBranches(iceLoop(), { along: "flux", between: [900, 3000], within: WITHIN });
    expect(byDistance).toMatchObject({ complete: true, method: "line" });
    byDistance.folds.forEach((fold, i) => {
      const flux = 3.828e26 / (4 * Math.PI * fold.at * fold.at);
      expect(Math.abs(flux - (byFlux.folds[i]?.at as number))).toBeLessThan(1e-9);
      expect(fold.exists).not.toBe(byFlux.folds[i]?.exists);
    });
    expect(byDistance.folds).toHaveLength(2);
  });

  test("a width, with which the budget rises and falls, goes by tiles; its fold is proved", () => {
    const loop = distantLoop();
    const diagram = traceBranches(loop, { along: "width", between: [2, 60], within: WITHIN });
    expect(diagram).toMatchObject({ complete: true, method: "tiles" });
    expect(diagram.folds).toHaveLength(1);
    const { at, atBracket, temperature } = diagram.folds[0] as Diagram["folds"][number];
    expect(atBracket[1] - atBracket[0]).toBeLessThan(1e-9);
    // the same fold along the luminosity, in which the budget is a straight line
    const options = { between: [1e26, 1e27], within: WITHIN, at: { width: at } } as const;
    const back = traceBranches(loop, { along: "luminosity", ...options });
    const misses = back.folds.map((f) => [
      Math.abs(f.at / 3.828e26 - 1),
      Math.abs(f.temperature - temperature),
    ]);
    expect(misses.some(([l, t]) => (l as number) < 1e-12 && (t as number) < 1e-6)).toBe(true);
  });

  test("an isolated ring of states is found", () => {
    // ((T − 300)/10)² + p² = 1
    const ring = formulaLoop((t, p) => sub(sub(1, square(div(sub(t, 300), 10))), square(p)));
    const diagram = traceBranches(ring, { along: "p", between: [-2, 2.1], within: [250, 350] });
    expect(diagram).toMatchObject({ complete: true, method: "tiles" });
    expect(kinds(diagram)).toEqual([
      ["unstable", "fold", "fold"],
      ["stable", "fold", "fold"],
    ]);
    for (const [at, temperature] of folds(diagram)) {
      expect(Math.abs(Math.abs(at as number) - 1)).toBeLessThan(1e-12);
      expect(temperature).toBeCloseTo(300, 9);
    }
    expect(diagram.gaps.map((g) => g.too)).toEqual(["cold", "cold"]);
  });

  test("a pole parts two branches that never meet", () => {
    // 1 + p(T − 300) = 0
    const pole = formulaLoop((t, p) => add(1, mul(p, sub(t, 300))));
    const diagram = traceBranches(pole, { along: "p", between: [-2, 2], within: [250, 350] });
    expect(diagram).toMatchObject({ complete: true, folds: [], method: "line" });
    expect(diagram.branches.map((b) => b.parameters)).toEqual([
      [0.02, 2],
      [-2, -0.02],
    ]);
    expect(diagram.gaps).toMatchObject([{ too: "hot" }]);
  });

  test("a parameter that only part of the states answer to", () => {
    // a ramp albedo: below the ramp nothing answers to the albedo of the warm surface
    const loop = core.closeLoop(({ temperature, given }) => {
      const warm = given("warm", 0.3, "1", { within: [0, 1] });
      const albedo = core.rampAlbedo({ temperature, cold: 0.7, warm, frozenBelow: 255, openAbove: 275 });
      return {
        heating: { sunlight: core.absorbedFlux({ flux: 1361, albedo }) },
        cooling: { longwave: core.greyEmission({ temperature, emissivity: 0.6 }) },
        heatCapacity: 4e8,
      };
    });
    const diagram = traceBranches(loop, { along: "warm", between: [0.2, 0.6], within: WITHIN });
    expect(diagram).toMatchObject({
      complete: true,
      method: "tiles",
      folds: [{ kind: "corner", exists: "below" }],
    });
    expect(kinds(diagram)[0]).toEqual(["stable", "between", "between"]);
    // N = 0 at the upper end of the ramp: (1 − warm)·1361/4 = 0.6·σ·275⁴
    const exact = 1 - (4 * 0.6 * core.STEFAN_BOLTZMANN * 275 ** 4) / 1361;
    expect(diagram.folds[0]?.at).toBeCloseTo(exact, 12);
    expect(diagram.folds[0]?.temperature).toBeCloseTo(275, 9);
  });

  test("corner folds where the budget is no straight line but monotone", () => {
    const kinked = formulaLoop((t, p) =>
      sub(
        add(p, mul(div(t, 3000), exp(p))),
        sub(div(sub(t, 300), 10), mul(3, max(-1, min(1, div(sub(t, 300), 5))))),
      ),
    );
    const diagram = traceBranches(kinked, { along: "p", between: [-5, 5], within: [200, 400] });
    expect(diagram).toMatchObject({ complete: true, method: "monotone" });
    expect(diagram.folds.map((f) => [f.kind, Math.round(f.temperature * 1e9) / 1e9])).toEqual([
      ["corner", 295],
      ["corner", 305],
    ]);
    // p + T·exp(p)/3000 = −0.5 + 3 and 0.5 − 3
    diagram.folds.forEach(({ at, temperature }, i) => {
      expect(at + (temperature / 3000) * Math.exp(at)).toBeCloseTo(i === 0 ? 2.5 : -2.5, 9);
    });
  });
});

describe("a corner that moves with the parameter", () => {
  const loop = core.closeLoop(({ temperature, given }) => {
    const frozenBelow = given("frozenBelow", 255, "K", { within: [100, 255.5] });
    const openAbove = given("openAbove", 275, "K", { within: [256, 400] });
    const albedo = core.rampAlbedo({ temperature, cold: 0.7, warm: 0.3, frozenBelow, openAbove });
    return {
      heating: { sunlight: core.absorbedFlux({ flux: 1361, albedo }) },
      cooling: { longwave: core.greyEmission({ temperature, emissivity: 0.6 }) },
      heatCapacity: 4e8,
    };
  });

  // beyond the ramp nothing answers to its ends; a state is lost when the end of the ramp has come up to it
  test.each([
    ["openAbove", [260, 350], 0.3, "below"],
    ["frozenBelow", [150, 255], 0.7, "above"],
  ] as const)("is decided up to the fold, along %s", (along, between, albedo, exists) => {
    const diagram = traceBranches(loop, { along, between, within: WITHIN });
    expect(diagram).toMatchObject({ complete: true, method: "tiles", folds: [{ kind: "corner", exists }] });
    const exact = (((1 - albedo) * 1361) / 4 / (0.6 * core.STEFAN_BOLTZMANN)) ** 0.25;
    const [{ at, atBracket, temperature }] = diagram.folds as [Diagram["folds"][number]];
    expect(at).toBeCloseTo(exact, 11);
    expect(temperature).toBeCloseTo(exact, 11);
    expect(atBracket[1] - atBracket[0]).toBeLessThan(1e-11);
    expect(diagram.branches).toHaveLength(3);
  });

  test("is decided where both sides answer", () => {
    // with y = T − 300 − p/2: p = max(y, −2y), so y = p and y = −p/2 above p = 0
    const moving = formulaLoop((t, p) => {
      const y = sub(sub(t, 300), div(p, 2));
      return sub(p, max(y, mul(-2, y)));
    });
    const diagram = traceBranches(moving, { along: "p", between: [-2, 2.1], within: [290, 310] });
    expect(diagram).toMatchObject({ complete: true, folds: [{ kind: "corner", exists: "above" }] });
    expect(Math.abs(diagram.folds[0]?.at as number)).toBeLessThan(1e-12);
    const { states } = statesOnDiagram(moving, diagram, 1);
    expect(states.map((s) => s.temperature)).toEqual([300, 301.5]);
  });
});

describe("what is not decided is said", () => {
  test("two folds that are about to merge", () => {
    const cusp = formulaLoop((t, p) => sub(p, mul(square(sub(t, 300)), sub(t, 300))));
    const diagram = traceBranches(cusp, { along: "p", between: [-2, 2], within: [250, 350] });
    expect(diagram).toMatchObject({ complete: false, proof: "partial", undecided: [{ kind: "cusp" }] });
    expect(diagram.branches.map((b) => b.stability)).toEqual(["stable", "stable"]);
  });

  test("a fold on the end of the parameter's range", () => {
    const parabola = formulaLoop((t, p) => sub(p, square(sub(t, 300))));
    const diagram = traceBranches(parabola, { along: "p", between: [0, 4], within: [250, 350] });
    expect(diagram).toMatchObject({ complete: false, undecided: [{ kind: "edge", parameters: [0, 0] }] });
    expect(diagram.branches).toHaveLength(2);
  });

  test("a state that does not answer to the parameter", () => {
    const crossing = formulaLoop((t, p) => mul(sub(t, 300), sub(p, sub(t, 300))));
    const diagram = traceBranches(crossing, { along: "p", between: [-2, 2.1], within: [250, 350] });
    // T = 300 and T = 300 + p cross at p = 0 and exchange their stability
    expect(diagram).toMatchObject({
      complete: true,
      method: "tiles",
      crossings: [{ kind: "transcritical" }],
    });
    for (const p of [-1, 1]) {
      const { states, complete } = statesOnDiagram(crossing, diagram, p);
      expect([complete, states.map((s) => Math.round(s.temperature * 1e9) / 1e9)]).toEqual([
        true,
        [300, 300 + p].sort((a, b) => a - b),
      ]);
    }
  });

  test("whether a slow way back returns: no, where it is followed to the end of the parameter's range", () => {
    const rise = { along: "flux", within: WITHIN } as const;
    const [whole] = traceBranches(iceLoop(), { ...rise, between: [900, 1900] }).jumps;
    const [part] = traceBranches(iceLoop(), { ...rise, between: [1361, 1900] }).jumps;
    expect(whole).toMatchObject({ direction: "rise", to: { branch: 2 }, noReturn: false });
    expect(whole?.returnsAt).toBeLessThan(1361);
    expect(part).toMatchObject({ direction: "rise", to: { branch: 2 }, returnsAt: null, noReturn: true });
  });

  test("an effort that is spent", () => {
    const options = { along: "flux", between: [900, 1900], within: WITHIN, effort: 10 } as const;
    const diagram = traceBranches(iceLoop(), options);
    expect(diagram).toMatchObject({ complete: false, notes: [{ code: "search-stopped" }] });
  });

  test("a loop with an ordinary function is sampled", () => {
    const loop = sampledLoop();
    const diagram = traceBranches(loop, { along: "flux", between: [900, 1900], within: WITHIN });
    const proved = traceBranches(iceLoop(), { along: "flux", between: [900, 1900], within: WITHIN });
    expect(diagram).toMatchObject({ complete: false, proof: "sampled", notes: [{ code: "sampled-search" }] });
    expect(kinds(diagram)).toEqual(kinds(proved));
    diagram.folds.forEach((fold, i) => {
      // slopes are difference quotients
      expect(fold.temperature).toBeCloseTo(proved.folds[i]?.temperature as number, 5);
      expect(fold.at).toBeCloseTo(proved.folds[i]?.at as number, 7);
    });
    expect(statesOnDiagram(loop, diagram, 1361)).toMatchObject({ complete: false, branches: [0, 1, 2] });
    const width = traceBranches(loop, { along: "width", between: [2, 60], within: WITHIN });
    expect(kinds(width).map(([stability]) => stability)).toEqual(["stable", "unstable", "stable"]);
  });
});

test("a range from -0 begins at 0, which JSON keeps", () => {
  const { between } = traceBranches(iceLoop(), { along: "flux", between: [-0, 900], within: WITHIN });
  expect(between).toEqual([0, 900]);
  const found = core.findStates(iceLoop(), { within: [-0, 400], at: { flux: -0 } });
  expect(found.within).toEqual([0, 400]);
  for (const { givens } of found.states) expect(givens.flux).toBe(0);
});

test("no fold costs a bisection: a step that rounding swallows still passes it", () => {
  const readings = Array.from({ length: 60 }, (_, i) => {
    const emissivity = 0.55 + i / 600;
    const options = { along: "flux", between: [900, 1800], within: WITHIN, at: { emissivity } } as const;
    return traceBranches(iceLoop(), options).cost.points;
  });
  // most take 44; a bisection down to the last place adds 45
  expect(Math.max(...readings)).toBeLessThan(60);
});

test("the points keep the tolerance", () => {
  const loop = iceLoop();
  for (const tolerance of [0.05, 0.002, 1e-4]) {
    const options = { along: "flux", between: [900, 1900], within: WITHIN, tolerance } as const;
    const { branches } = traceBranches(loop, options);
    for (const { points } of branches) {
      for (let i = 1; i < points.length; i++) {
        const [a, b] = [points[i - 1], points[i]] as [(typeof points)[number], (typeof points)[number]];
        expect(b.at).toBeGreaterThan(a.at);
        // between two points the curve is at its farthest from the line near the middle
        const t = (a.temperature + b.temperature) / 2;
        const at = core.STEFAN_BOLTZMANN * 0.6 * t ** 4 * (4 / (1 - (0.5 - 0.2 * Math.tanh((t - 265) / 10))));
        expect(Math.abs(at - (a.at + b.at) / 2)).toBeLessThan(1.01 * tolerance * 1000);
      }
    }
  }
});
