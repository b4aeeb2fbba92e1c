// The folds in two givens where the budget is a straight line in neither, or where both have a range.
import { describe, expect, test } from "vitest";
import type { FoldChain } from "../../src/branches/foldChain.ts";
import { foldChains, meetingsOf } from "../../src/branches/foldChains.ts";
import type { FoldDiagram } from "../../src/branches/foldDiagram.ts";
import { foldSystem } from "../../src/branches/foldSystem.ts";
import { mergeChains, rangeOf } from "../../src/branches/mergeChains.ts";
import { traceBranches } from "../../src/branches/traceBranches.ts";
import { traceFolds } from "../../src/branches/traceFolds.ts";
import * as core from "../../src/index.ts";
import { add, mul, STEFAN_BOLTZMANN, square, sub } from "../../src/index.ts";
import { distantLoop, twoGivens, vapourLoop } from "./loops.ts";

const WITHIN = [150, 400] as const;
const AROUND = [250, 350] as const;
const x = (t: core.Quantity) => sub(t, 300);
const ends = ({ curves }: FoldDiagram) => curves.map((c) => c.ends);

describe("along the width of an ice line, with the luminosity", () => {
  const loop = distantLoop();
  const range = { alongBetween: [2, 60], between: [3e26, 5e26], within: WITHIN } as const;
  const diagram = traceFolds(loop, { along: "width", and: "luminosity", ...range });

  test("all folds are proved", () => {
    expect(diagram).toMatchObject({ method: "space", proof: "proved", complete: true, undecided: [] });
    expect(diagram.curves).toHaveLength(3);
  });

  test("two of them meet where the width does not matter, at 265 K", () => {
    // there tanh = 0, and N = N_T = 0 is 0.5·s = 0.6σT⁴ and 0.2·s/w = 2.4σT³ for the flux s of the whole sphere: w = T/10
    expect(diagram.touches).toMatchObject([{ kind: "transcritical", exists: "below" }]);
    const [{ at, and, andBracket, temperature }] = diagram.touches as [FoldDiagram["touches"][number]];
    const luminosity = 1.2 * STEFAN_BOLTZMANN * 265 ** 4 * 16 * Math.PI * 149597870700 ** 2;
    expect(at).toBeCloseTo(26.5, 9);
    expect(temperature).toBeCloseTo(265, 9);
    expect(Math.abs(and / luminosity - 1)).toBeLessThan(1e-13);
    // the formula is rounded a dozen times
    expect(andBracket[0] / luminosity).toBeLessThan(1 + 1e-14);
    expect(andBracket[1] / luminosity).toBeGreaterThan(1 - 1e-14);
  });

  test("two meet in the cusp that is found along the luminosity", () => {
    const along = traceFolds(loop, { along: "luminosity", and: "width", between: [2, 60], within: WITHIN });
    expect(along).toMatchObject({ method: "line", complete: true });
    const [there] = along.cusps;
    const [here] = diagram.cusps;
    expect(diagram.cusps).toHaveLength(1);
    expect(Math.abs((here?.at as number) - (there?.and as number))).toBeLessThan(1e-9);
    expect(Math.abs((here?.and as number) / (there?.at as number) - 1)).toBeLessThan(1e-12);
    // the temperature of a cusp is less well known than its givens
    expect(here?.temperature).toBeCloseTo(there?.temperature as number, 4);
  });

  test("each is a fold of the diagram along the width", () => {
    for (const { points, exists } of diagram.curves) {
      for (const { at, and, temperature } of points.filter((_, i) => i % 40 === 20)) {
        const options = {
          along: "width",
          between: [1, 61],
          within: WITHIN,
          at: { luminosity: and },
        } as const;
        const misses = traceBranches(loop, options)
          .folds.filter((f) => f.exists === exists)
          .map((f) => Math.abs(f.at - at) + Math.abs(f.temperature - temperature));
        expect(Math.min(...misses)).toBeLessThan(1e-5);
      }
    }
  });

  test("the same with ranges along the luminosity", () => {
    const options = { along: "luminosity", and: "width", between: [10, 60], within: WITHIN } as const;
    const space = traceFolds(loop, { ...options, alongBetween: [1e26, 8e26] });
    expect(space).toMatchObject({ method: "space", complete: true, touches: [] });
    expect(ends(space)).toEqual(ends(traceFolds(loop, options)));
    expect(space.curves.map((c) => c.exists)).toEqual(["below", "above"]);
  });
});

test.each([
  [0.6, 260],
  [0.65, 285],
  [0.7, 265],
  [0.75, 255],
])(
  "ice of albedo %d around %d K has the cusp that it has where the budget is a straight line",
  (cold, midpoint) => {
    const loop = core.closeLoop(({ temperature, given }) => {
      const flux = given("flux", 1361, "W m-2", { within: [0, 1e5] });
      const width = given("width", 10, "K", { within: [0.5, 100] });
      const albedo = core.tanhAlbedo({ temperature, cold, warm: 0.3, midpoint, width });
      return {
        heating: { sunlight: core.absorbedFlux({ flux, albedo }) },
        cooling: { longwave: core.greyEmission({ temperature, emissivity: 0.6 }) },
        heatCapacity: 4.2e8,
      };
    });
    const ranges = { along: "flux", and: "width", between: [2, 60], within: [200, 340] } as const;
    const line = traceFolds(loop, ranges);
    const space = traceFolds(loop, { ...ranges, alongBetween: [600, 4000] });
    expect([line.method, space.method]).toEqual(["line", "space"]);
    expect(space).toMatchObject({ complete: true, undecided: [] });
    expect(space.curves).toHaveLength(2);
    expect(space.cusps.map(({ and, at }) => [and, at])).toEqual(
      line.cusps.map(({ and, at }) => [expect.closeTo(and, 9), expect.closeTo(at, 6)]),
    );
  },
);

test("folds in carbon and flux pass through those of the acceptance case", () => {
  // an independent computation in high precision: at C = 280 folds lie at these fluxes
  for (const [flux, temperature] of [
    [1276.3234109303, 272.87849932],
    [1471.9530876739, 255.37444344],
  ] as const) {
    const options = { along: "carbon", alongBetween: [100, 2000], and: "flux", within: [200, 290] } as const;
    const { curves, complete } = traceFolds(vapourLoop(), { ...options, between: [flux, flux + 20] });
    expect(complete).toBe(true);
    const first = curves
      .map((c) => c.points[0])
      .find((p) => Math.abs((p?.temperature as number) - temperature) < 1);
    // the flux is given to 5e-11; dC/dS = N_S/N_C is about −30
    expect(first?.at).toBeCloseTo(280, 7);
    expect(first?.temperature).toBeCloseTo(temperature, 7);
  }
});

describe("known places", () => {
  test("a cusp, and folds that leave the range of the first given", () => {
    // p + 0.1p² = x³ − qx has folds at x² = q/3, where it is −2x³
    const loop = twoGivens((t, p, q) => {
      const cubic = sub(mul(square(x(t)), x(t)), mul(q, x(t)));
      return sub(add(p, mul(0.1, square(p))), cubic);
    });
    const options = {
      along: "p",
      alongBetween: [-3, 3],
      and: "q",
      between: [-4, 5],
      within: AROUND,
    } as const;
    const { curves, cusps, touches, complete } = traceFolds(loop, options);
    expect({ complete, touches }).toEqual({ complete: true, touches: [] });
    expect(cusps).toMatchObject([{ exists: "above", curves: [0, 1] }]);
    expect(Math.abs(cusps[0]?.and as number)).toBeLessThan(1e-9);
    expect(curves.map((c) => c.ends)).toEqual([
      ["cusp", "along"],
      ["cusp", "along"],
    ]);
    // −2x³ = 3.9 and −2.1 at p = 3 and −3, q = 3x²
    expect(curves[0]?.range[1]).toBeCloseTo(3 * 1.95 ** (2 / 3), 9);
    expect(curves[1]?.range[1]).toBeCloseTo(3 * 1.05 ** (2 / 3), 9);
    for (const { points } of curves) {
      for (const { at, and, temperature } of points.slice(1, -1)) {
        const place = temperature - 300;
        expect(place * place).toBeCloseTo(and / 3, 9);
        expect(at + 0.1 * at * at).toBeCloseTo(-2 * place * place * place, 9);
      }
    }
  });

  test.each([
    [1, 4, "below", "above"],
    [-1, 2, "above", "below"],
  ] as const)("two cusps close together, with folds outside or between (%d)", (sign, count, ...sides) => {
    // p = x³/3 ∓ q(q − 0.1)x has folds at x² = ±q(q − 0.1)
    const loop = twoGivens((t, p, q) => {
      const cubic = mul(1 / 3, mul(square(x(t)), x(t)));
      return sub(p, sub(cubic, mul(mul(mul(sign, q), sub(q, 0.1)), x(t))));
    });
    const options = {
      along: "p",
      alongBetween: [-9, 9],
      and: "q",
      between: [-2, 2.3],
      within: AROUND,
    } as const;
    const { curves, cusps, complete } = traceFolds(loop, options);
    expect(complete).toBe(true);
    expect(curves).toHaveLength(count);
    const found = cusps.map(({ and, exists }) => [Math.round(and * 1e9) / 1e9 + 0, exists]);
    expect(found.sort((a, b) => (a[0] as number) - (b[0] as number))).toEqual([
      [0, sides[0]],
      [0.1, sides[1]],
    ]);
  });

  // ẋ = q + px − x² (Strogatz, section 3.6, imperfect bifurcations, from memory): folds at p² = −4q
  test("a transcritical point and its imperfections", () => {
    const loop = twoGivens((t, p, q) => add(q, sub(mul(p, x(t)), square(x(t)))));
    const options = {
      along: "p",
      alongBetween: [-3, 3],
      and: "q",
      between: [-1, 1.1],
      within: AROUND,
    } as const;
    const { curves, cusps, touches, complete } = traceFolds(loop, options);
    expect({ complete, cusps }).toEqual({ complete: true, cusps: [] });
    expect(touches).toMatchObject([{ kind: "transcritical", exists: "below" }]);
    expect(touches[0]?.andBracket[0]).toBeLessThanOrEqual(0);
    expect(touches[0]?.andBracket[1]).toBeGreaterThanOrEqual(0);
    expect(curves.map((c) => c.exists)).toEqual(["below", "above"]);
    for (const { points } of curves)
      for (const { at, and } of points) expect(at * at).toBeCloseTo(-4 * and, 9);
  });

  test("an island of states that vanishes", () => {
    const loop = twoGivens((t, p, q) => sub(sub(q, square(x(t))), square(p)));
    const options = {
      along: "p",
      alongBetween: [-3, 3],
      and: "q",
      between: [-1, 1.1],
      within: AROUND,
    } as const;
    const { curves, touches, complete } = traceFolds(loop, options);
    expect(complete).toBe(true);
    expect(touches).toMatchObject([{ kind: "isola", exists: "above", at: 0 }]);
    for (const { points } of curves) for (const { at, and } of points) expect(at * at).toBeCloseTo(and, 9);
  });

  test("a fold that leaves the range of temperature", () => {
    // p² + p = (x − q)²: a fold at x = q, p = 0
    const loop = twoGivens((t, p, q) => sub(add(square(p), p), square(sub(x(t), q))));
    const options = {
      along: "p",
      alongBetween: [-0.4, 3],
      and: "q",
      between: [-9, 80],
      within: [290, 340],
    } as const;
    const { curves, complete } = traceFolds(loop, options);
    expect(complete).toBe(true);
    expect(curves.map((c) => c.ends)).toEqual([["between", "within"]]);
    expect(curves[0]?.range[1]).toBeCloseTo(40, 9);
  });

  test("givens that act through their ratio alone", () => {
    // the folds keep their temperatures, and the flux is a multiple of the emissivity
    const loop = core.closeLoop(({ temperature, given }) => {
      const flux = given("flux", 1361, "W m-2", { within: [0, 1e5] });
      const emissivity = given("emissivity", 0.6, "1", { within: [0.01, 1] });
      const albedo = core.tanhAlbedo({ temperature, cold: 0.7, warm: 0.3, midpoint: 265, width: 10 });
      return {
        heating: { sunlight: core.absorbedFlux({ flux, albedo }) },
        cooling: { longwave: core.greyEmission({ temperature, emissivity }) },
        heatCapacity: 4.2e8,
      };
    });
    const options = { along: "flux", and: "emissivity", between: [0.5, 0.7], within: WITHIN } as const;
    const { curves, complete } = traceFolds(loop, { ...options, alongBetween: [500, 4000] });
    expect(complete).toBe(true);
    // the fluxes at an emissivity of 0.6 are those of the documentation's first diagram
    const folds = traceBranches(loop, { along: "flux", between: [900, 1900], within: WITHIN }).folds;
    expect(folds.map((f) => f.exists)).toEqual(curves.map((c) => c.exists));
    for (const [i, { points, ends: kinds }] of curves.entries()) {
      expect(kinds).toEqual(["between", "between"]);
      for (const { at, and, temperature } of points) {
        expect(at / and).toBeCloseTo((folds[i]?.at as number) / 0.6, 8);
        expect(temperature).toBeCloseTo(folds[i]?.temperature as number, 7);
      }
    }
  });

  test("a fold at which the first given is zero, to rounding", () => {
    // (2 + q)(p + p²) = (1 + q²)x²: a fold at x = 0, p = 0
    const loop = twoGivens((t, p, q) => {
      const bowl = mul(add(1, square(q)), square(x(t)));
      return sub(mul(add(2, q), add(p, square(p))), bowl);
    });
    const options = {
      along: "p",
      alongBetween: [-0.4, 3],
      and: "q",
      between: [-1, 1.1],
      within: AROUND,
    } as const;
    const { curves, complete } = traceFolds(loop, options);
    expect(complete).toBe(true);
    expect(curves.map((c) => c.ends)).toEqual([["between", "between"]]);
    for (const { at, temperature } of curves[0]?.points ?? []) {
      expect(Math.abs(at)).toBeLessThan(1e-12);
      expect(temperature).toBeCloseTo(300, 9);
    }
  });

  test("none", () => {
    const loop = twoGivens((t, p, q) => sub(add(square(p), q), x(t)));
    const options = { along: "p", alongBetween: [0, 3], and: "q", between: [-1, 1], within: AROUND } as const;
    expect(traceFolds(loop, options)).toMatchObject({ complete: true, curves: [], cusps: [], touches: [] });
  });
});

describe("what is not decided is said", () => {
  test("folds that meet where they hardly part: no cusp in the strict sense", () => {
    // p = x³ − q³x has folds at x² = q³/3
    const loop = twoGivens((t, p, q) => {
      const x = sub(t, 300);
      return sub(p, sub(mul(square(x), x), mul(mul(square(q), q), x)));
    });
    const options = {
      along: "p",
      alongBetween: [-5, 5],
      and: "q",
      between: [-1, 1.1],
      within: AROUND,
    } as const;
    const { complete, cusps, undecided } = traceFolds(loop, { ...options, effort: 4000 });
    expect({ complete, cusps }).toEqual({ complete: false, cusps: [] });
    expect(undecided.some(({ and: [low, high] }) => low <= 0.01 && high >= -0.01)).toBe(true);
  });

  test("an effort that is spent", () => {
    const options = {
      along: "width",
      alongBetween: [2, 60],
      and: "luminosity",
      between: [3e26, 5e26],
    } as const;
    const { proof, undecided } = traceFolds(distantLoop(), { ...options, within: WITHIN, effort: 300 });
    expect(proof).toBe("partial");
    expect(undecided.length).toBeGreaterThan(0);
  });
});

describe("chains of tubes", () => {
  // p² + p = (x − q)²: a fold at x = q, p = 0
  const loop = twoGivens((t, p, q) => sub(add(square(p), p), square(sub(sub(t, 300), q))));
  const system = foldSystem(loop, "0 1");
  system.set([0, 0]);
  const space = (q: readonly [number, number]) => ({ t: AROUND, p: [-0.4, 3], q }) as const;
  const chainOver = (q: readonly [number, number]): FoldChain => {
    const chains = foldChains(
      system,
      space(q),
      meetingsOf(() => []),
    );
    const start = system.solve({ t: 300 + q[0] + 0.1, p: 0.01, q: q[0] + 0.1 });
    chains.follow(start as NonNullable<typeof start>);
    expect(chains.chains).toHaveLength(1);
    return chains.chains[0] as FoldChain;
  };

  test("that follow one fold are one", () => {
    const [first, second] = [chainOver([-4, 1]), chainOver([0, 5])];
    const merged = mergeChains(system, second, first) as FoldChain;
    expect([merged.low.at.q, merged.high.at.q]).toEqual([-4, 5]);
    expect(rangeOf(merged)).toEqual([-4, 5]);
    const covered = merged.tubes.every(
      ({ q }, i) => i === 0 || q[0] <= (merged.tubes[i - 1]?.q[1] as number),
    );
    expect(covered).toBe(true);
    expect(mergeChains(system, first, chainOver([2, 5]))).toBe(undefined);
  });

  test("that follow two folds stay two", () => {
    // p = x³ − qx has folds at ±√(q/3)
    const cubic = twoGivens((t, p, q) => sub(p, sub(mul(square(x(t)), x(t)), mul(q, x(t)))));
    const both = foldSystem(cubic, "0 1");
    both.set([0, 0]);
    const chains = foldChains(
      both,
      { t: AROUND, p: [-9, 9], q: [1, 3] },
      meetingsOf(() => []),
    );
    for (const side of [-1, 1]) chains.follow({ t: 300 + side * Math.sqrt(2 / 3), p: 0, q: 2 });
    const [cool, warm] = chains.chains as readonly [FoldChain, FoldChain];
    expect(mergeChains(both, cool, warm)).toBe(undefined);
  });

  test("a place where Newton's method does not settle is none", () => {
    const flat = twoGivens((t, p, q) => add(mul(0, t), add(p, mul(0, q))));
    const lost = foldSystem(flat, "0 1");
    lost.set([0, 0]);
    expect(lost.solve({ t: 300, p: 1, q: 0 })).toBe(undefined);
  });
});
