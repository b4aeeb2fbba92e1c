// Which budgets are refused, and what a loop shows of itself.
import { describe, expect, test } from "vitest";
import * as core from "../../src/index.ts";
import type { Budget, Tools } from "../../src/loop/types.ts";
import { refusal } from "../refusal.ts";

const { absorbedFlux, add, closeLoop, findStates, greyEmission, inUnit, mul, sub, tanhAlbedo } = core;
const ice = { cold: 0.7, warm: 0.3, midpoint: 265, width: 10 };

describe("a budget is refused", () => {
  const longwave = ({ temperature }: Tools) => ({ longwave: greyEmission({ temperature, emissivity: 0.6 }) });
  const close = (write: (tools: Tools) => unknown) =>
    refusal(() => closeLoop(write as (tools: Tools) => Budget));
  let foreign: Tools["temperature"] | undefined;
  closeLoop((tools) => {
    foreign = tools.temperature;
    return { heating: {}, cooling: longwave(tools), heatCapacity: 0 };
  });
  test.each<[string, (tools: Tools) => unknown, Partial<core.ThermosteadError>]>([
    ["without flows", () => ({ heating: {}, cooling: {}, heatCapacity: 1 }), { code: "bad-budget" }],
    ["that is nothing", () => undefined, { code: "bad-budget" }],
    [
      "without heating",
      (t) => ({ cooling: longwave(t), heatCapacity: 1 }),
      { code: "bad-budget", path: "budget.heating" },
    ],
    [
      "with an unknown field",
      (t) => ({ heating: {}, cooling: longwave(t), heatCapcity: 1 }),
      { code: "unknown-name", path: "budget.heatCapcity" },
    ],
    [
      "without a heat capacity",
      (t) => ({ heating: {}, cooling: longwave(t) }),
      { code: "missing", path: "heatCapacity" },
    ],
    [
      "with a negative heat capacity",
      (t) => ({ heating: {}, cooling: longwave(t), heatCapacity: -1 }),
      { code: "out-of-range", path: "heatCapacity" },
    ],
    [
      "that never uses its temperature",
      () => ({ heating: { sunlight: 240 }, cooling: { longwave: 240 }, heatCapacity: 1 }),
      { code: "temperature-unused" },
    ],
    [
      "that uses its temperature only in what does not enter the balance",
      ({ temperature }) => ({
        heating: { sunlight: 240 },
        cooling: { longwave: 240 },
        exchange: {
          drift: { value: greyEmission({ temperature, emissivity: 0.6 }), from: "air", to: "sea" },
        },
        heatCapacity: 1,
      }),
      { code: "temperature-unused" },
    ],
    [
      "with a NaN flow",
      (t) => ({ heating: { sunlight: Number.NaN }, cooling: longwave(t), heatCapacity: 1 }),
      { code: "not-a-number", path: "heating.sunlight" },
    ],
    [
      "with a text as a flow",
      (t) => ({ heating: { sunlight: "240" }, cooling: longwave(t), heatCapacity: 1 }),
      { code: "not-a-number", path: "heating.sunlight" },
    ],
    [
      "with a flow in another unit",
      (t) => ({ heating: { sunlight: t.temperature }, cooling: longwave(t), heatCapacity: 1 }),
      { code: "unit-mismatch", path: "heating.sunlight", value: "K", allowed: "W m-2" },
    ],
    [
      "that adds different units",
      (t) => ({
        heating: { sunlight: add(t.temperature, t.given("flux", 1, "W m-2")) },
        cooling: longwave(t),
        heatCapacity: 1,
      }),
      { code: "unit-mismatch", path: "add" },
    ],
    [
      "with an exponential of kelvins",
      (t) => ({ heating: { sunlight: core.exp(t.temperature) }, cooling: longwave(t), heatCapacity: 1 }),
      { code: "unit-mismatch", path: "exp" },
    ],
    [
      "with a flow from a reservoir to itself",
      (t) => ({
        heating: { sunlight: { value: 1, from: "surface" } },
        cooling: longwave(t),
        heatCapacity: 1,
      }),
      { code: "bad-budget", path: "heating.sunlight" },
    ],
    [
      "with one flow on both sides",
      (t) => ({ heating: { longwave: 1 }, cooling: longwave(t), heatCapacity: 1 }),
      { code: "repeated-name", path: "cooling.longwave" },
    ],
    [
      "with a given twice",
      (t) => ({
        heating: { a: t.given("flux", 1, "W m-2"), b: t.given("flux", 2, "W m-2") },
        cooling: longwave(t),
        heatCapacity: 1,
      }),
      { code: "repeated-name", value: "flux" },
    ],
    [
      "with a given and a coupling of one name",
      (t) => ({
        heating: { a: t.couple("flux", t.given("flux", 1, "W m-2")) },
        cooling: longwave(t),
        heatCapacity: 1,
      }),
      { code: "repeated-name", value: "flux" },
    ],
    [
      "with a given called temperature",
      (t) => ({ heating: { a: t.given("temperature", 1, "W m-2") }, cooling: longwave(t), heatCapacity: 1 }),
      { code: "repeated-name" },
    ],
    [
      "with a name that every object has",
      (t) => ({ heating: { a: t.given("__proto__", 1, "W m-2") }, cooling: longwave(t), heatCapacity: 1 }),
      { code: "reserved-name", value: "__proto__" },
    ],
    [
      "with an empty name",
      (t) => ({ heating: { a: t.given("", 1, "W m-2") }, cooling: longwave(t), heatCapacity: 1 }),
      { code: "reserved-name" },
    ],
    [
      "with a given outside its range",
      (t) => ({
        heating: { a: t.given("flux", -1, "W m-2", { within: [0, 9] }) },
        cooling: longwave(t),
        heatCapacity: 1,
      }),
      { code: "out-of-range", path: "flux", allowed: "0 to 9", unit: "W m-2" },
    ],
    [
      "with a reversed range",
      (t) => ({
        heating: { a: t.given("flux", 1, "W m-2", { within: [9, 0] }) },
        cooling: longwave(t),
        heatCapacity: 1,
      }),
      { code: "out-of-range", path: "flux.within[1]" },
    ],
    [
      "with an unknown unit",
      (t) => ({ heating: { a: t.given("flux", 1, "W/m2") }, cooling: longwave(t), heatCapacity: 1 }),
      { code: "unknown-unit", value: "W/m2" },
    ],
    [
      "with arithmetic on a quantity",
      (t) => ({
        heating: { a: (t.temperature as unknown as number) * 2 },
        cooling: longwave(t),
        heatCapacity: 1,
      }),
      { code: "quantity-as-number" },
    ],
    [
      "with a comparison of a quantity",
      (t) => ({
        heating: { a: (t.temperature as unknown as number) > 273 ? 1 : 2 },
        cooling: longwave(t),
        heatCapacity: 1,
      }),
      { code: "quantity-as-number" },
    ],
    [
      "with a quantity of another loop in an operation",
      (t) => ({
        heating: { a: add(t.temperature, foreign as never) },
        cooling: longwave(t),
        heatCapacity: 1,
      }),
      { code: "other-loop" },
    ],
    [
      "with a quantity of another loop in a law",
      (t) => ({
        heating: {
          a: absorbedFlux({
            flux: t.given("flux", 1, "W m-2"),
            albedo: tanhAlbedo({ temperature: foreign as never, ...ice }),
          }),
        },
        cooling: longwave(t),
        heatCapacity: 1,
      }),
      { code: "other-loop", path: "absorbedFlux.albedo" },
    ],
    [
      "with a quantity of another loop as a flow",
      (t) => ({
        heating: { a: greyEmission({ temperature: foreign as never, emissivity: 1 }) },
        cooling: longwave(t),
        heatCapacity: 1,
      }),
      { code: "other-loop", path: "heating.a" },
    ],
    [
      "whose coupling is ignored",
      (t) => {
        t.couple("albedo", tanhAlbedo({ temperature: t.temperature, ...ice }));
        return { heating: { a: 1 }, cooling: longwave(t), heatCapacity: 1 };
      },
      { code: "coupling-unused", value: "albedo" },
    ],
    [
      "whose coupling is bypassed",
      (t) => {
        const law = tanhAlbedo({ temperature: t.temperature, ...ice });
        const albedo = t.couple("albedo", law);
        return {
          heating: { a: absorbedFlux({ flux: 1361, albedo }), b: absorbedFlux({ flux: 1, albedo: law }) },
          cooling: longwave(t),
          heatCapacity: 1,
        };
      },
      { code: "coupling-bypassed", value: "albedo" },
    ],
    [
      "with a rate of an unknown variable",
      (t) => ({ heating: {}, cooling: longwave(t), heatCapacity: 1, rates: { cover: 1 } }),
      { code: "unknown-name", path: "rates.cover" },
    ],
    [
      "with a variable without rate",
      (t) => ({
        heating: { a: absorbedFlux({ flux: 1, albedo: t.variable("cover", { within: [0, 1] }) }) },
        cooling: longwave(t),
        heatCapacity: 1,
      }),
      { code: "missing", path: "rates.cover" },
    ],
    [
      "with a constant that is not finite",
      (t) => ({
        heating: { a: inUnit(mul(t.temperature, Number.POSITIVE_INFINITY), "W m-2") },
        cooling: longwave(t),
        heatCapacity: 1,
      }),
      { code: "not-a-number" },
    ],
  ])("%s", (_, write, expected) => {
    const error = close(write);
    expect(error).toMatchObject(expected);
    expect(error.stack).toContain("closeLoop.test.ts");
  });
});

describe("a loop", () => {
  const loop = closeLoop(({ temperature, given, couple }) => {
    const flux = given("flux", 1361, "W m-2", { within: [0, 1e5] });
    const albedo = couple("albedo", tanhAlbedo({ temperature, ...ice }));
    const longwave = greyEmission({ temperature, emissivity: 0.6 });
    return {
      heating: { sunlight: absorbedFlux({ flux, albedo }) },
      cooling: { longwave },
      heatCapacity: 4.2e8,
      report: { excess: sub(temperature, 273.15), flux },
    };
  });

  test("shows its names and values as JSON", () => {
    expect(JSON.parse(JSON.stringify(loop))).toEqual({
      variables: [{ name: "temperature", unit: "K", within: [0, 1e5] }],
      givens: [{ name: "flux", value: 1361, unit: "W m-2", within: [0, 1e5] }],
      couplings: ["albedo"],
      flows: [
        { name: "sunlight", from: "space", to: "surface" },
        { name: "longwave", from: "surface", to: "space" },
      ],
      report: ["excess", "flux"],
    });
    expect(Object.isFrozen(loop)).toBe(true);
  });

  test("prints its budget with couplings by name", () => {
    expect(core.formulaOf(loop).heating.sunlight).toBe("flux * (1 - albedo) / 4");
    expect(core.formulaOf(loop, { notation: "tex" }).heating.sunlight).toContain("\\mathrm{albedo}");
    expect(core.sourcesOf(loop).map((s) => s.law)).toEqual(["tanhAlbedo", "greyEmission", "absorbedFlux"]);
  });

  test("prints names with signs that mean something in TeX as what they are", () => {
    const odd = closeLoop(({ temperature, given, couple }) => ({
      heating: {
        a: mul(given("S_0 & more", 1361, "W m-2"), couple("50%", tanhAlbedo({ temperature, ...ice }))),
      },
      cooling: { b: greyEmission({ temperature, emissivity: 0.6 }) },
      heatCapacity: 1,
    }));
    const tex = core.formulaOf(odd, { notation: "tex" }).heating.a;
    expect(tex).toContain("\\mathrm{S\\_0 \\& more}");
    expect(tex).toContain("\\mathrm{50\\%}");
  });

  test("knows the units of quotients, products and roots", () => {
    const close = (write: (energy: core.Quantity, time: core.Quantity) => core.Value) =>
      closeLoop(({ temperature, given }) => ({
        heating: { stored: write(given("energy", 2.4e10, "J m-2"), given("time", 1e8, "s")) },
        cooling: { b: greyEmission({ temperature, emissivity: 1 }) },
        heatCapacity: 1,
      }));
    const { div, sqrt } = core;
    expect(() => close((energy, time) => div(energy, time))).not.toThrow();
    expect(() => close((energy, time) => div(mul(energy, time), mul(time, time)))).not.toThrow();
    expect(() => close((energy, time) => sqrt(div(mul(energy, energy), mul(time, time))))).not.toThrow();
    expect(refusal(() => close((energy, time) => mul(energy, time))).code).toBe("unit-mismatch");
    expect(refusal(() => close((energy, time) => div(time, energy))).code).toBe("unit-mismatch");
  });

  test("names the port of a list that is out of its range in a state", () => {
    const mixed = closeLoop(({ temperature, couple }) => {
      const bright = couple("bright", inUnit(core.div(sub(temperature, 200), 40), "1"));
      const covers = [
        { fraction: 0.25, albedo: 0.1 },
        { fraction: 0.25, albedo: bright },
      ];
      return {
        heating: { sunlight: absorbedFlux({ flux: 1361, albedo: core.mixAlbedo({ covers, bare: 0.1 }) }) },
        cooling: { longwave: greyEmission({ temperature, emissivity: 1 }) },
        heatCapacity: 1,
      };
    });
    const [only] = findStates(mixed, { within: [150, 400] }).states;
    const value = ((only?.temperature ?? 0) - 200) / 40;
    expect(only?.notes).toMatchObject([
      { code: "outside-range", about: "mixAlbedo.covers[1].albedo", value, range: [0, 1], unit: "1" },
    ]);
  });

  test("without heating loses what it cools by", () => {
    const falling = closeLoop(({ temperature }) => ({
      heating: {},
      cooling: { leak: core.linearEmission({ temperature, intercept: 0, slope: 2, reference: 288 }) },
      heatCapacity: 4,
    }));
    const [only] = findStates(falling, { within: [150, 400] }).states;
    expect(only).toMatchObject({ stability: "stable", feedbackParameter: -2, eFoldingTime: 2 });
  });

  test("reads report quantities in every state", () => {
    const [cold] = findStates(loop, { within: [150, 400] }).states;
    expect(cold?.report.excess).toBe((cold?.temperature as number) - 273.15);
    expect(cold?.report.flux).toBe(1361);
  });

  test("may couple a plain number, so that a law can be replaced by it", () => {
    const fixed = closeLoop(({ temperature, couple }) => ({
      heating: { sunlight: absorbedFlux({ flux: 1361, albedo: couple("albedo", 0.3) }) },
      cooling: { longwave: greyEmission({ temperature, emissivity: 0.6 }) },
      heatCapacity: 0,
    }));
    const [only] = findStates(fixed, { within: [150, 400] }).states;
    expect(only?.couplings.albedo).toBe(0.3);
    expect(only?.eigenvalues).toBeNull();
    expect(only?.eFoldingTime).toBe(0);
  });

  test("may use the arithmetic behind a coupling elsewhere: it is shared by accident, and is no way round", () => {
    const shared = closeLoop(({ temperature, couple }) => {
      const excess = couple("excess", sub(temperature, 288));
      const response = inUnit(mul(2, excess), "W m-2");
      const loss = inUnit(sub(temperature, 288), "W m-2");
      return { heating: { a: 240, response }, cooling: { b: add(240, mul(3, loss)) }, heatCapacity: 1 };
    });
    expect(findStates(shared, { within: [150, 400] }).states[0]?.temperature).toBeCloseTo(288, 9);
  });

  test("with several variables is recorded, and says that its states are not found yet", () => {
    const vegetated = closeLoop(({ temperature, variable }) => {
      const cover = variable("cover", { within: [0, 1] });
      return {
        heating: { sunlight: absorbedFlux({ flux: 1361, albedo: cover }) },
        cooling: { longwave: greyEmission({ temperature, emissivity: 0.6 }) },
        heatCapacity: 1e8,
        rates: { cover: inUnit(mul(cover, sub(1, cover)), "s-1") },
      };
    });
    expect(refusal(() => findStates(vegetated, { within: [150, 400] })).code).toBe("several-variables");
  });
});

describe("a second reservoir", () => {
  // one layer that is transparent to sunlight and opaque to longwave: it emits σTa⁴ up and down, σT⁴ = 2σTa⁴
  const layered = (balanced: boolean) =>
    closeLoop(({ temperature }) => {
      const surface = core.blackbodyFlux({ temperature });
      const half = core.div(surface, balanced ? 2 : 3);
      return {
        heating: {
          sunlight: absorbedFlux({ flux: 1361, albedo: 0.3 }),
          back: { value: half, from: "atmosphere", to: "surface" },
        },
        cooling: { emission: { value: surface, from: "surface", to: "atmosphere" } },
        exchange: { outgoing: { value: half, from: "atmosphere", to: "space" } },
        heatCapacity: 1e8,
      };
    });

  test("has its own balance in the ledger", () => {
    const [state] = findStates(layered(true), { within: [100, 500] }).states;
    // Marshall & Plumb 2008, §2.3: one opaque layer makes T_s = 2^(1/4) T_e; 302.746 K from the exact ledger table
    expect(state?.temperature).toBeCloseTo(302.7461355507867, 9);
    expect(state?.ledger.reservoirs.map((r) => r.name)).toEqual(["space", "surface", "atmosphere"]);
    expect(state?.notes).toEqual([]);
  });

  test("called interior gives heat without being asked for its storage", () => {
    const heated = closeLoop(({ temperature }) => ({
      heating: { internal: { value: 0.09, from: "interior" } },
      cooling: { longwave: greyEmission({ temperature, emissivity: 1 }) },
      heatCapacity: 0,
    }));
    const [state] = findStates(heated, { within: [10, 100] }).states;
    expect(state?.ledger.reservoirs.find((r) => r.name === "interior")?.storage).toBeNull();
    expect(state?.notes).toEqual([]);
  });

  test("that does not balance is said to be open", () => {
    const [state] = findStates(layered(false), { within: [100, 500] }).states;
    expect(state?.notes).toMatchObject([
      { code: "open-reservoir", severity: "invalid", about: "atmosphere" },
    ]);
  });

  test("that misses its balance by a part in 10⁹ is said to be open, and how far", () => {
    const loop = closeLoop(({ temperature }) => ({
      heating: { sunlight: 240 },
      cooling: { up: { value: greyEmission({ temperature, emissivity: 1 }), to: "air" } },
      exchange: { out: { value: 240 * (1 - 1e-9), from: "air", to: "space" } },
      heatCapacity: 1,
    }));
    const [only] = findStates(loop, { within: [100, 500] }).states;
    expect(only?.notes).toMatchObject([{ code: "open-reservoir", about: "air" }]);
    expect(only?.notes[0]?.value).toBeCloseTo(2.4e-7, 12);
  });
});
