// What every law does with wrong input, and what laws written by users can do.
import { describe, expect, test } from "vitest";
import * as core from "../../src/index.ts";
import { refusal } from "../refusal.ts";

const wrong = (value: unknown) => value as never;

describe("a law refuses", () => {
  const {
    absorbedFlux,
    equilibriumTemperature,
    mixAlbedo,
    orbitMeanFlux,
    rampAlbedo,
    stellarFlux,
    tanhAlbedo,
  } = core;
  test.each<[string, () => unknown, Partial<core.ThermosteadError>]>([
    [
      "an albedo above 1",
      () => absorbedFlux({ flux: 1361, albedo: 1.2 }),
      { code: "out-of-range", path: "absorbedFlux.albedo", value: 1.2, allowed: "0 to 1", unit: "1" },
    ],
    [
      "an albedo below 0",
      () => absorbedFlux({ flux: 1361, albedo: -0.1 }),
      { code: "out-of-range", value: -0.1 },
    ],
    [
      "a negative flux",
      () => absorbedFlux({ flux: -1, albedo: 0.3 }),
      { code: "out-of-range", path: "absorbedFlux.flux", unit: "W m-2" },
    ],
    [
      "NaN",
      () => absorbedFlux({ flux: Number.NaN, albedo: 0.3 }),
      { code: "not-a-number", path: "absorbedFlux.flux" },
    ],
    [
      "infinity",
      () => absorbedFlux({ flux: Number.POSITIVE_INFINITY, albedo: 0.3 }),
      { code: "not-a-number" },
    ],
    [
      "a string",
      () => absorbedFlux({ flux: wrong("1361"), albedo: 0.3 }),
      { code: "not-a-number", value: "1361" },
    ],
    ["null", () => absorbedFlux({ flux: wrong(null), albedo: 0.3 }), { code: "not-a-number" }],
    [
      "a distance of 0",
      () => stellarFlux({ luminosity: 1e26, distance: 0 }),
      { code: "out-of-range", path: "stellarFlux.distance", unit: "m" },
    ],
    [
      "an eccentricity of 1",
      () => orbitMeanFlux({ fluxAtSemiMajorAxis: 1, eccentricity: 1 }),
      { code: "out-of-range", path: "orbitMeanFlux.eccentricity" },
    ],
    [
      "a missing port",
      () => absorbedFlux(wrong({ flux: 1361 })),
      { code: "missing", path: "absorbedFlux.albedo" },
    ],
    [
      "an unknown port",
      () => absorbedFlux(wrong({ flux: 1361, albedo: 0.3, albdo: 0.3 })),
      { code: "unknown-name", path: "absorbedFlux.albdo" },
    ],
    [
      "a misspelt port with a default",
      () => equilibriumTemperature(wrong({ flux: 1361, albedo: 0.3, redistribution: 0.25, emissivty: 0.9 })),
      { code: "unknown-name", path: "equilibriumTemperature.emissivty" },
    ],
    [
      "no redistribution",
      () => equilibriumTemperature(wrong({ flux: 1361, albedo: 0.3 })),
      { code: "missing", path: "equilibriumTemperature.redistribution" },
    ],
    ["no object", () => absorbedFlux(wrong(undefined)), { code: "unreadable", path: "absorbedFlux" }],
    [
      "fractions that sum to 0.97",
      () =>
        mixAlbedo({
          covers: [
            { fraction: 0.5, albedo: 0.1 },
            { fraction: 0.47, albedo: 0.2 },
          ],
        }),
      { code: "shares-not-one", path: "mixAlbedo.covers", value: 0.97 },
    ],
    [
      "fractions above 1 beside a bare rest",
      () =>
        mixAlbedo({
          covers: [
            { fraction: 0.7, albedo: 0.1 },
            { fraction: 0.5, albedo: 0.2 },
          ],
          bare: 0.3,
        }),
      { code: "out-of-range" },
    ],
    ["an empty list", () => mixAlbedo({ covers: [] }), { code: "unreadable", path: "mixAlbedo.covers" }],
    [
      "an unknown field in a list",
      () => mixAlbedo({ covers: [wrong({ fraction: 1, albedo: 0.1, name: "sea" })] }),
      { code: "unknown-name", path: "mixAlbedo.covers[0].name" },
    ],
    [
      "a wrong albedo in a list",
      () => mixAlbedo({ covers: [{ fraction: 1, albedo: 1.1 }] }),
      { code: "out-of-range", path: "mixAlbedo.covers[0].albedo" },
    ],
    [
      "a ramp that stands on its head",
      () => rampAlbedo({ temperature: 260, cold: 0.6, warm: 0.2, frozenBelow: 280, openAbove: 250 }),
      { code: "out-of-range", unit: "K" },
    ],
    [
      "a width of 0",
      () => tanhAlbedo({ temperature: 260, cold: 0.6, warm: 0.2, midpoint: 265, width: 0 }),
      { code: "out-of-range", path: "tanhAlbedo.width" },
    ],
  ])("%s", (_, call, expected) => {
    const error = refusal(call);
    expect(error).toMatchObject(expected);
    expect(error.message).toContain(error.path);
    expect(error.message).toContain(`docs/errors.md#${error.code}`);
    expect(error.stack).toContain("laws.test.ts");
  });

  test("a misspelt port with the nearest known name", () => {
    const error = refusal(() => absorbedFlux(wrong({ flux: 1361, albdo: 0.3 })));
    expect(error.allowed).toBe("flux, albedo (nearest: albedo)");
  });

  test("names that every object has", () => {
    const wires = JSON.parse('{ "flux": 1361, "albedo": 0.3, "__proto__": 1 }');
    expect(refusal(() => absorbedFlux(wires)).code).toBe("unknown-name");
  });
});

describe("a law written by a user", () => {
  const heatLeak = core.defineLaw({
    name: "heatLeak",
    output: { symbol: "F", unit: "W m-2" },
    inputs: {
      temperature: { symbol: "T", unit: "K", within: [0, 5000] },
      slope: { symbol: "B", unit: "W m-2 K-1", default: 2 },
    },
    write: ({ temperature, slope }) => core.mul(slope, core.sub(temperature, 250)),
  });

  test("takes numbers, defaults and quantities", () => {
    expect(heatLeak({ temperature: 260 })).toBe(20);
    expect(heatLeak({ temperature: 260, slope: 3 })).toBe(30);
    expect(heatLeak({ temperature: 260, slope: undefined })).toBe(20);
    const loop = core.closeLoop(({ temperature }) => ({
      heating: { sunlight: 20 },
      cooling: { leak: heatLeak({ temperature }) },
      heatCapacity: 0,
    }));
    expect(core.findStates(loop, { within: [100, 400] }).states.map((s) => s.temperature)).toEqual([260]);
  });

  test("does not change what it was given", () => {
    const wires = Object.freeze({ temperature: 260 });
    heatLeak(wires);
    expect(Object.keys(wires)).toEqual(["temperature"]);
  });

  test("that gives no finite number is refused", () => {
    const broken = core.defineLaw({
      name: "broken",
      output: { symbol: "x", unit: "1" },
      inputs: { y: { symbol: "y", unit: "1" } },
      write: ({ y }) => core.div(1, y),
    });
    expect(refusal(() => broken({ y: 0 }))).toMatchObject({ code: "not-finite", path: "broken" });
  });

  test.each([
    ["the unit of its output", { output: { symbol: "F", unit: "banana" } }, "unknown-unit", "hill.output"],
    [
      "the unit of a port",
      { inputs: { temperature: { symbol: "T", unit: "kelvin" } } },
      "unknown-unit",
      "hill.temperature",
    ],
    [
      "a range that is reversed",
      { inputs: { temperature: { symbol: "T", unit: "K", within: [400, 100] } } },
      "out-of-range",
      "hill.temperature[1]",
    ],
    [
      "a range in a list",
      {
        inputs: {
          temperature: { symbol: "T", unit: "K" },
          parts: { each: { x: { symbol: "x", unit: "1", within: [2, 1] } } },
        },
      },
      "out-of-range",
      "hill.parts.x[1]",
    ],
  ])(
    "is refused for %s when a loop first records it",
    (_, facts: { readonly inputs?: object; readonly output?: object }, code, path) => {
      const spec = {
        name: "hill",
        output: { symbol: "F", unit: "W m-2" },
        inputs: { temperature: { symbol: "T", unit: "K" } },
      };
      const hill = core.defineLaw({
        ...spec,
        ...facts,
        write: ({ temperature }: never) => temperature,
      } as never);
      const close = () =>
        core.closeLoop(({ temperature, given }) => {
          const parts = "parts" in (facts.inputs ?? {}) ? { parts: [{ x: given("x", 1.5, "1") }] } : {};
          return {
            heating: { sunlight: 200 },
            cooling: { hill: hill({ temperature, ...parts } as never) },
            heatCapacity: 1,
          };
        });
      expect(refusal(close)).toMatchObject({ code, path });
    },
  );

  test("may feed another law with a value whose unit cannot be told inside it", () => {
    const { add, blackbodyFlux, defineLaw, mul } = core;
    const empirical = defineLaw({
      name: "empirical",
      output: { symbol: "F", unit: "W m-2" },
      inputs: {
        temperature: { symbol: "T", unit: "K" },
        pressure: { symbol: "p", unit: "Pa" },
      },
      write: ({ temperature, pressure }) =>
        blackbodyFlux({ temperature: add(temperature, mul(1e-4, pressure)) }),
    });
    const loop = core.closeLoop(({ temperature, given }) => ({
      heating: { sunlight: 240 },
      cooling: { longwave: empirical({ temperature, pressure: given("pressure", 1e5, "Pa") }) },
      heatCapacity: 1,
    }));
    const [only] = core.findStates(loop, { within: [150, 400] }).states;
    expect(only?.temperature).toBeCloseTo(core.blackbodyTemperature({ flux: 240 }) - 10, 9);
  });

  test("is refused a quantity with another unit", () => {
    const error = refusal(() =>
      core.closeLoop(({ temperature, given }) => ({
        heating: { sunlight: core.absorbedFlux({ flux: given("flux", 1361, "K"), albedo: 0.3 }) },
        cooling: { longwave: core.greyEmission({ temperature, emissivity: 1 }) },
        heatCapacity: 1,
      })),
    );
    expect(error).toMatchObject({
      code: "unit-mismatch",
      path: "absorbedFlux.flux",
      value: "K",
      allowed: "W m-2",
    });
    expect(error.stack).toContain("laws.test.ts");
  });
});

describe("a sampled law", () => {
  const measured = core.sampledLaw({
    name: "measured",
    output: { symbol: "F", unit: "W m-2" },
    inputs: { temperature: { symbol: "T", unit: "K", within: [100, 400] } },
    compute: ({ temperature }) => (temperature > 390 ? Number.NaN : temperature * 2 - 300),
  });

  test("is a function of numbers whose slope is a difference quotient", () => {
    expect(measured({ temperature: 250 })).toBe(200);
    expect(measured.card.sampled).toBe(true);
    expect(core.slopesOf(measured, { temperature: 250 }).slopes.temperature).toBeCloseTo(2, 8);
    expect(core.slopesOf(measured, { temperature: 100 }).slopes.temperature).toBeCloseTo(2, 8);
  });

  test("has slopes of ten digits where it bends, and is not asked outside of its port's range", () => {
    const asked: number[] = [];
    const radiated = core.sampledLaw({
      name: "radiated",
      output: { symbol: "F", unit: "W m-2" },
      inputs: { temperature: { symbol: "T", unit: "K", within: [100, 400] } },
      compute: ({ temperature }) => {
        asked.push(temperature);
        return core.STEFAN_BOLTZMANN * temperature ** 4;
      },
    });
    const slope = (temperature: number) => core.slopesOf(radiated, { temperature }).slopes.temperature ?? NaN;
    // (h/T)² with h/T = 6.06e-6, and rounding over the step
    expect(Math.abs(slope(288) / (4 * core.STEFAN_BOLTZMANN * 288 ** 3) - 1)).toBeLessThan(2e-10);
    // one-sided at the ends: 1.5 h/T
    for (const end of [100, 400])
      expect(Math.abs(slope(end) / (4 * core.STEFAN_BOLTZMANN * end ** 3) - 1)).toBeLessThan(1e-5);
    expect(Math.min(...asked)).toBe(100);
    expect(Math.max(...asked)).toBe(400);
  });

  test("is refused when it gives NaN, also inside a search", () => {
    expect(refusal(() => measured({ temperature: 395 }))).toMatchObject({
      code: "not-finite",
      path: "measured",
    });
    const loop = core.closeLoop(({ temperature }) => ({
      heating: { sunlight: 200 },
      cooling: { longwave: measured({ temperature }) },
      heatCapacity: 1,
    }));
    const error = refusal(() => core.findStates(loop, { within: [100, 400] }));
    expect(error).toMatchObject({ code: "not-finite", path: "measured", value: Number.NaN });
    const [, at] = /in W m-2, here for temperature = (.*)$/.exec(error.allowed) as unknown as [
      string,
      string,
    ];
    expect(measured({ temperature: 390 })).toBe(480);
    expect(Number(at)).toBeGreaterThan(390);
    expect(Number(at)).toBeLessThanOrEqual(400);
    const found = core.findStates(loop, { within: [100, 380] });
    expect(found.states.map((s) => s.temperature)).toEqual([250]);
    expect(found.notes.map((n) => n.code)).toContain("sampled-law");
    expect(found.proof).toBe("sampled");
  });
});
