// How far a state is from the ends of its branch, and how long a brightening star needs to get there.
import { describe, expect, test } from "vitest";
import type { TippingMargins } from "../../src/branches/margins.ts";
import { tippingMargins } from "../../src/branches/tippingMargins.ts";
import { traceBranches } from "../../src/branches/traceBranches.ts";
import { SOLAR_AGE, stellarBrightening } from "../../src/star/stellarBrightening.ts";
import { refusal } from "../refusal.ts";
import { iceLoop } from "../states/iceLoop.ts";
import { distantLoop, sampledLoop, stateOf, vapourLoop } from "./loops.ts";

const WITHIN = [150, 400] as const;
const GIGAYEAR = 1e9 * 31557600;
const SUN = 1.9884e30;

describe("the margins of a state", () => {
  const loop = iceLoop();
  const states = [stateOf(loop, 0), stateOf(loop, 1), stateOf(loop, 2)] as const;
  const options = { along: "flux", between: [900, 1900], within: WITHIN } as const;
  const [cold, middle, warm] = states.map((s) => tippingMargins(loop, s, options)) as [
    TippingMargins,
    TippingMargins,
    TippingMargins,
  ];
  const { folds, jumps } = traceBranches(loop, options);

  test("are the same on a diagram that was traced before, and another diagram is refused", () => {
    const diagram = traceBranches(loop, options);
    for (const [i, margins] of [cold, middle, warm].entries())
      expect(tippingMargins(loop, states[i] as never, { along: "flux", diagram })).toEqual(margins);
    const ask = (other: typeof diagram, along = "flux") =>
      refusal(() => tippingMargins(loop, states[0], { along, diagram: other } as never)).code;
    const [given] = Object.keys(diagram.fixed) as [never];
    expect(ask(traceBranches(loop, { ...options, at: { [given]: 0.61 } }))).toBe("contradiction");
    expect(ask(diagram, given)).toBe("contradiction");
    expect(ask(traceBranches(loop, { ...options, between: [1400, 1900] }))).toBe("out-of-range");
  });

  test("are the distances to the folds of its branch", () => {
    const [high, low] = folds.map((f) => f.at) as [number, number];
    expect(cold.rise).toMatchObject({
      distance: high - 1361,
      relative: (high - 1361) / 1361,
      end: { kind: "fold" },
    });
    expect(cold.fall).toMatchObject({ end: { kind: "between", at: 900 }, jump: null, after: null });
    expect(warm.fall).toMatchObject({
      distance: 1361 - low,
      end: { kind: "fold", temperature: folds[1]?.temperature },
    });
    expect([middle.rise.end.at, middle.fall.end.at]).toEqual([high, low]);
    expect(middle.rise.jump).toBeNull();
  });

  test("tell the state after the jump and the edges of the basin", () => {
    expect(warm.fall.jump).toEqual(jumps[1]);
    expect(warm.fall.after).toMatchObject({ stability: "stable", givens: { flux: folds[1]?.at } });
    expect(warm.fall.after?.temperature).toBeCloseTo(jumps[1]?.to?.temperature as number, 9);
    expect(cold.basin?.coldest).toBeNull();
    expect(cold.basin?.hottest).toBeCloseTo(states[1].temperature, 9);
    expect(warm.basin?.coldest).toBeCloseTo(states[1].temperature, 9);
    expect(middle.basin).toBeNull();
  });

  test("show λ on the way: zero at a fold, and restoring until then", () => {
    const { way } = warm.fall;
    expect(way[0]).toMatchObject({ at: 1361, temperature: states[2].temperature });
    expect(Math.abs(way.at(-1)?.feedbackParameter as number)).toBeLessThan(1e-9);
    for (const p of way.slice(0, -1)) expect(p.feedbackParameter).toBeLessThan(0);
    expect(way.at(-1)?.at).toBe(folds[1]?.at);
  });

  test("say what is held", () => {
    expect(warm).toMatchObject({ fixed: { emissivity: 0.6 }, held: "at fixed emissivity 0.6" });
    const far = distantLoop();
    const state = stateOf(far, 2);
    expect(tippingMargins(far, state, { along: "luminosity", within: WITHIN }).held).toBe(
      "at fixed distance 149597870700 m, width 10 K",
    );
  });

  test("take a state from JSON, use the declared range of the given, and survive JSON", () => {
    const again = JSON.parse(JSON.stringify(states[2])) as (typeof states)[2];
    const found = tippingMargins(loop, again, { along: "flux" });
    expect(found.between).toEqual([0, 1e5]);
    expect(found.fall.end.at).toBeCloseTo(folds[1]?.at as number, 9);
    expect(JSON.parse(JSON.stringify(found))).toEqual(found);
  });

  test("are sampled for a sampled loop", () => {
    const plain = sampledLoop();
    const state = stateOf(plain, 2);
    const found = tippingMargins(plain, state, options);
    expect(found.proof).toBe("sampled");
    expect(found.fall.end.at).toBeCloseTo(folds[1]?.at as number, 7);
  });
});

describe("a brightening star", () => {
  const loop = vapourLoop();
  const state = stateOf(loop, 2);
  const margins = (brightening: Parameters<typeof tippingMargins>[2]["brightening"]) =>
    tippingMargins(loop, state, {
      along: "flux",
      between: [900, 1900],
      within: WITHIN,
      brightening: brightening as never,
    });
  const factor = margins({ mass: SUN }).rise.end.at / 1361;

  test("like the Sun: Δt = 2.5·t₀·(1 − S₀/S_fold), at fixed carbon", () => {
    const { rise, fall, held } = margins({ mass: SUN });
    expect(rise.time).toBeCloseTo(2.5 * SOLAR_AGE * (1 - 1 / factor), -6);
    expect(fall.time).toBeNull();
    expect(held).toBe("at fixed carbon 280");
  });

  test.each([
    // factors and times in 10⁹ years: from the formula of Gough 1981 with t₀ = 4.57
    [1.1, 1.0386],
    [1.05, 0.544],
  ])("a factor of %f takes %f billion years", (brighter, gigayears) => {
    const time = 2.5 * SOLAR_AGE * (1 - 1 / brighter);
    expect(time / GIGAYEAR).toBeCloseTo(gigayears, 4);
    expect(stellarBrightening({ age: SOLAR_AGE + time })).toBeCloseTo(brighter, 12);
  });

  test("the law: 1 today, 1/1.4 at the beginning", () => {
    expect(stellarBrightening({ age: SOLAR_AGE })).toBe(1);
    expect(stellarBrightening({ age: 0 })).toBeCloseTo(0.7142857142857143, 15);
  });

  test("of another age takes another time", () => {
    const young = margins({ mass: SUN, age: SOLAR_AGE / 2 }).rise.time as number;
    const reached = stellarBrightening({ age: SOLAR_AGE / 2 + young });
    expect(reached / stellarBrightening({ age: SOLAR_AGE / 2 })).toBeCloseTo(factor, 12);
  });

  test("of another mass is refused with the reason", () => {
    for (const mass of [0.89 * SUN, 1.11 * SUN]) {
      const { code, message } = refusal(() => margins({ mass }));
      expect(code).toBe("out-of-range");
      expect(message).toContain("0.9 to 1.1 solar masses: the history is the Sun's, another star needs");
    }
  });

  test("with a rate or a table", () => {
    expect(margins({ rate: 1e-18 }).rise.time).toBeCloseTo((factor - 1) / 1e-18, -6);
    expect(margins({ rate: -1e-18 }).rise.time).toBeNull();
    const table = [0, 1, 2, 3].map((i) => ({ time: i * 1e17, luminosity: 1 + 0.1 * i }));
    // 1.05 at 0.5, so 1.05·factor = 1.2695 at 2.695
    expect(margins({ table, now: 0.5e17 }).rise.time).toBeCloseTo(
      ((1.05 * factor - 1) / 0.1 - 0.5) * 1e17,
      -6,
    );
    expect(margins({ table, now: 2e17 }).rise.time).toBeNull();
  });

  test("that fades instead, with a rate or a table", () => {
    const { end } = margins({ mass: SUN }).fall;
    expect(end.kind).toBe("fold");
    const less = 1 - end.at / 1361;
    expect(margins({ rate: -1e-18 }).fall.time).toBeCloseTo(less / 1e-18, -6);
    expect(margins({ rate: 1e-18 }).fall.time).toBeNull();
    // a star that fades by a tenth in 1e17 s and brightens afterwards, twice as fast
    const table = [2, 1, 0.8, 1.6].map((luminosity, i) => ({ time: i * 2e17, luminosity }));
    const { fall, rise } = margins({ table, now: 2e17 });
    expect(fall.time).toBeCloseTo((less / 0.2) * 2e17, -6);
    expect(rise.time).toBeCloseTo(2e17 + ((factor - 0.8) / 0.8) * 2e17, -6);
    const dark = table.map(({ time }, i) => ({ time, luminosity: i }));
    expect(refusal(() => margins({ table: dark, now: 0 }))).toMatchObject({
      ...{ code: "out-of-range", path: "brightening.now", value: 0 },
    });
    // from the bottom on there is no way down
    expect(margins({ table, now: 4e17 }).fall.time).toBeNull();
  });
});
