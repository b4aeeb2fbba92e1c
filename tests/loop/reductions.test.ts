// A forcing stands on the cooling side, subtracted; anything else is refused.
import { describe, expect, test } from "vitest";
import * as core from "../../src/index.ts";
import type { Budget, Tools } from "../../src/loop/types.ts";
import { refusal } from "../refusal.ts";

const { add, closeLoop, co2AdjustedForcingMyhre, div, findStates, forcedEmission, inUnit } = core;
const { linearEmission, max, min, mul, neg, sub } = core;

const parts = ({ temperature, given, couple }: Tools) => {
  mul(-2, temperature);
  const clear = linearEmission({ temperature, intercept: 240, slope: 2, reference: 288 });
  const concentration = given("co2", 556e-6, "1");
  const forcing = couple("forcing", co2AdjustedForcingMyhre({ concentration, reference: 278e-6 }));
  return { clear, forcing, factor: given("factor", -1, "1") };
};
type Parts = ReturnType<typeof parts>;

describe("a forcing is refused", () => {
  test.each<[string, (p: Parts) => Pick<Budget, "heating" | "cooling">, string]>([
    ["as a heating", (p) => ({ heating: { co2: p.forcing }, cooling: { olr: p.clear } }), "heating.co2"],
    [
      "in a record among the heatings",
      (p) => ({ heating: { co2: { value: p.forcing, to: "air" } }, cooling: { olr: p.clear } }),
      "heating.co2",
    ],
    [
      "as a part of a heating",
      (p) => ({ heating: { sun: add(240, mul(0.5, p.forcing)) }, cooling: { olr: p.clear } }),
      "heating.sun",
    ],
    [
      "as a negative heating",
      (p) => ({ heating: { sun: sub(240, p.forcing) }, cooling: { olr: p.clear } }),
      "heating.sun",
    ],
    [
      "as a cooling",
      (p) => ({ heating: { sun: 240 }, cooling: { olr: p.clear, co2: p.forcing } }),
      "cooling.co2",
    ],
    [
      "added to a cooling",
      (p) => ({ heating: { sun: 240 }, cooling: { olr: add(p.clear, inUnit(div(p.forcing, 2), "W m-2")) } }),
      "cooling.olr",
    ],
    [
      "subtracted twice",
      (p) => ({ heating: { sun: 240 }, cooling: { olr: sub(p.clear, neg(p.forcing)) } }),
      "cooling.olr",
    ],
    [
      "times a negative number, subtracted",
      // the number is recorded before the forcing, so that it is the first factor
      (p) => ({ heating: { sun: 240 }, cooling: { olr: sub(p.clear, mul(-2, p.forcing)) } }),
      "cooling.olr",
    ],
    [
      "as a heating within limits",
      (p) => ({ heating: { co2: min(5, max(0, p.forcing)) }, cooling: { olr: p.clear } }),
      "heating.co2",
    ],
  ])("%s", (_, flows, path) => {
    const error = refusal(() => closeLoop((tools) => ({ ...flows(parts(tools)), heatCapacity: 0 })));
    expect(error).toMatchObject({ code: "bad-budget", path, value: "co2AdjustedForcingMyhre" });
    expect(error.allowed).toBe("a forcing on the cooling side, subtracted");
  });
});

describe("a forcing is taken", () => {
  test.each<[string, (p: Parts) => Budget["cooling"]]>([
    ["by forcedEmission", ({ clear, forcing }) => ({ olr: forcedEmission({ clear, forcing }) })],
    ["subtracted", (p) => ({ olr: sub(p.clear, p.forcing) })],
    ["as a negative cooling", (p) => ({ olr: p.clear, co2: neg(p.forcing) })],
    ["times what may be negative", (p) => ({ olr: add(p.clear, mul(p.factor, p.forcing)) })],
    ["times −1", (p) => ({ olr: add(p.clear, mul(-1, p.forcing)) })],
  ])("%s, and warms by forcing over slope", (_, cooling) => {
    const loop = closeLoop((tools) => ({
      heating: { sun: 240 },
      cooling: cooling(parts(tools)),
      heatCapacity: 0,
    }));
    const [state] = findStates(loop, { within: [200, 400] }).states;
    // 5.35·ln 2 over 2 W m⁻² K⁻¹, in more digits than the search promises
    expect(Math.abs((state?.temperature ?? 0) - 288 - (5.35 * Math.LN2) / 2)).toBeLessThan(1e-9);
  });
});

test("what another law makes of a forcing is its own affair", () => {
  const share = core.defineLaw({
    name: "share",
    output: { symbol: "H", unit: "W m-2" },
    inputs: { forcing: { symbol: "F", unit: "W m-2" } },
    write: ({ forcing }) => mul(0.01, forcing),
  });
  const loop = closeLoop((tools) => {
    const { clear, forcing } = parts(tools);
    return { heating: { sun: add(240, share({ forcing })) }, cooling: { olr: clear }, heatCapacity: 0 };
  });
  expect(loop.flows.map((f) => f.name)).toEqual(["sun", "olr"]);
});

test("above 2000 and below 180 ppm a state carries a note that the law is extrapolated", () => {
  const loop = closeLoop(({ temperature, given }) => {
    const clear = linearEmission({ temperature, intercept: 240, slope: 2, reference: 288 });
    const concentration = given("co2", 400e-6, "1");
    const forcing = core.co2EffectiveForcingAr6({ concentration, reference: 278.3e-6, nitrousOxide: 330e-9 });
    return { heating: { sun: 240 }, cooling: { olr: forcedEmission({ clear, forcing }) }, heatCapacity: 0 };
  });
  const notes = (co2: number) =>
    findStates(loop, { within: [200, 400], at: { co2 } }).states.flatMap((s) =>
      s.notes.filter((n) => n.about === "co2EffectiveForcingAr6.concentration").map((n) => n.code),
    );
  expect(notes(179e-6)).toEqual(["outside-published"]);
  expect(notes(181e-6)).toEqual([]);
  expect(notes(1999e-6)).toEqual([]);
  expect(notes(2001e-6)).toEqual(["outside-published"]);
});
