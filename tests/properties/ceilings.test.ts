// What holds for any emission under a ceiling, and where a runaway lands.
import fc from "fast-check";
import { describe, expect, test } from "vitest";
import {
  absorbedFlux,
  blackbodyFlux,
  ceilingEmission,
  closeLoop,
  emissionHeight,
  findStates,
  greyColumnEmission,
  greyEmission,
  groundBelowEmission,
  heightEmission,
  komabayashiIngersollLimit,
  northEmission,
  pressureOpticalDepth,
  proveCount,
  RUNAWAY_LIMITS,
  simpsonNakajimaLimit,
  vapourOpticalDepth,
} from "../../src/index.ts";
import { settings } from "./settings.ts";

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });

describe("emission under a ceiling", () => {
  const cases = fc.record({
    temperature: between(150, 3000),
    emissivity: between(0.1, 1),
    ceiling: between(100, 600),
    window: between(0, 1),
  });
  const emitted = (temperature: number, { emissivity, ceiling, window }: Record<string, number>) =>
    ceilingEmission({
      temperature,
      emission: greyEmission({ temperature, emissivity: emissivity as number }),
      ceiling: ceiling as number,
      window: window as number,
    });

  test("is what it would be below the ceiling, the ceiling up to 1400 K, and never more than a black body", () => {
    fc.assert(
      fc.property(cases, ({ temperature, ...planet }) => {
        const flux = emitted(temperature, planet);
        const free = greyEmission({ temperature, emissivity: planet.emissivity });
        if (temperature <= 1400) expect(flux).toBe(Math.min(free, planet.ceiling));
        else expect(flux).toBeGreaterThanOrEqual(Math.min(free, planet.ceiling));
        expect(flux).toBeLessThanOrEqual(blackbodyFlux({ temperature }) * (1 + 4 * 2 ** -53));
      }),
      settings(500),
    );
  });

  test("never falls and never jumps as the ground warms", () => {
    fc.assert(
      fc.property(cases, between(0, 1), ({ temperature, ...planet }, step) => {
        const rise = emitted(temperature + step, planet) - emitted(temperature, planet);
        const steepest = (4 * blackbodyFlux({ temperature: temperature + step })) / (temperature + step);
        expect(rise).toBeGreaterThanOrEqual(0);
        // rounding of a flux up to 5·10⁶
        expect(rise).toBeLessThanOrEqual(2 * steepest * step + 1e-8);
      }),
      settings(500),
    );
  });

  test("a planet that absorbs more than the ceiling lands on the hot branch, and nowhere else", () => {
    const loop = closeLoop(({ temperature, given }) => ({
      heating: {
        sunlight: absorbedFlux({ flux: given("flux", 1361, "W m-2", { within: [0, 1e5] }), albedo: 0.3 }),
      },
      cooling: {
        longwave: ceilingEmission({
          temperature,
          emission: northEmission({ temperature }),
          ceiling: RUNAWAY_LIMITS.outgoing.flux,
        }),
      },
      heatCapacity: 0,
    }));
    const within = [100, 3000] as const;
    const at = (flux: number) => findStates(loop, { within, at: { flux } }).states.map((s) => s.temperature);
    const below = at(1361);
    expect(below).toHaveLength(1);
    expect(below[0]).toBeCloseTo(273.15 + (238.175 - 203.3) / 2.09, 9);
    const above = at(1700);
    expect(above).toHaveLength(1);
    // σT⁴ = σ·1400⁴ + 297.5 − 282, with σ to five digits
    expect(above[0]).toBeCloseTo((1400 ** 4 + 15.5 / 5.6704e-8) ** 0.25, 6);
    const tiles = proveCount(loop, { within, over: { flux: [1650, 1750] } }).tiles;
    expect(tiles).toEqual([{ over: { flux: [1650, 1750] }, count: 1 }]);
  });
});

describe("limits of a grey steam atmosphere", () => {
  const column = fc.record({ absorption: between(1e-4, 10), gravity: between(0.1, 100) });

  test("fall with more absorption and rise with gravity; dry air above lets out more", () => {
    fc.assert(
      fc.property(column, between(0.01, 1), between(1, 2), ({ absorption, gravity }, humidity, more) => {
        fc.pre(absorption * more <= 10 && gravity * more <= 100);
        const moist = komabayashiIngersollLimit({ absorption, gravity, humidity });
        const steam = simpsonNakajimaLimit({ absorption, gravity });
        const thicker = { absorption: absorption * more, gravity };
        const heavier = { absorption, gravity: gravity * more };
        // a few dozen roundings
        const slack = 64 * 2 ** -53 * Math.max(moist, steam);
        expect(komabayashiIngersollLimit({ absorption, gravity })).toBeLessThanOrEqual(moist + slack);
        expect(komabayashiIngersollLimit({ ...thicker, humidity })).toBeLessThanOrEqual(moist + slack);
        expect(komabayashiIngersollLimit({ ...heavier, humidity })).toBeGreaterThanOrEqual(moist - slack);
        expect(simpsonNakajimaLimit(thicker)).toBeLessThanOrEqual(steam + slack);
        expect(simpsonNakajimaLimit(heavier)).toBeGreaterThanOrEqual(steam - slack);
      }),
      settings(300),
    );
  });

  test("more vapour in the same column is the same as more absorption", () => {
    fc.assert(
      fc.property(between(0.02, 10), between(0.1, 100), between(0.01, 1), (absorption, gravity, humidity) => {
        const drier = komabayashiIngersollLimit({ absorption, gravity, humidity });
        const thinner = komabayashiIngersollLimit({ absorption: absorption * humidity, gravity });
        expect(Math.abs(drier / thinner - 1)).toBeLessThanOrEqual(64 * 2 ** -53);
      }),
      settings(300),
    );
  });
});

describe("optical depths that scale", () => {
  test("keep the known column, multiply along pressure, and grow with warmth", () => {
    fc.assert(
      fc.property(
        between(1e4, 1e6),
        between(0.1, 10),
        between(0.5, 3),
        between(200, 400),
        (pressure, depth, exponent, T) => {
          const at = (p: number, from: number, referenceDepth: number) =>
            pressureOpticalDepth({ pressure: p, referencePressure: from, referenceDepth, exponent });
          expect(at(pressure, pressure, depth)).toBe(depth);
          const there = at(1e5, pressure, depth);
          expect(Math.abs(at(pressure, 1e5, there) / depth - 1)).toBeLessThanOrEqual(1e-13);
          const vapour = (temperature: number) =>
            vapourOpticalDepth({ temperature, referenceTemperature: T, referenceDepth: depth });
          expect(vapour(T)).toBe(depth);
          expect(vapour(T + 1)).toBeGreaterThan(depth);
        },
      ),
      settings(300),
    );
  });

  test("a grey column of vapour alone emits most at one temperature, and less beyond it", () => {
    const emission = (temperature: number) =>
      greyColumnEmission({
        temperature,
        opticalDepth: vapourOpticalDepth({ temperature, referenceTemperature: 288, referenceDepth: 2 }),
      });
    // the column's flux is largest where (3/4)τ·(L/(R_v·T) − 4) = 4
    const depth = (T: number) => 2 * Math.exp((2.5e6 / 461.5) * (1 / 288 - 1 / T));
    const condition = (T: number) => 0.75 * depth(T) * (2.5e6 / 461.5 / T - 4) - 4;
    let [low, high] = [200, 400];
    while (high - low > 1e-9) {
      const middle = (low + high) / 2;
      if (condition(middle) < 0) low = middle;
      else high = middle;
    }
    expect(emission(low - 5)).toBeLessThan(emission(low));
    expect(emission(low + 5)).toBeLessThan(emission(low));
    expect(Math.abs(emission(low + 1e-3) - emission(low - 1e-3))).toBeLessThan(1e-8);
  });
});

describe("emission from a height", () => {
  test("height, ground and emission agree with one another", () => {
    fc.assert(
      fc.property(between(200, 800), between(150, 300), between(1e-3, 1e-2), (ground, top, lapseRate) => {
        const height = emissionHeight({
          surfaceTemperature: ground,
          emissionTemperature: top,
          lapseRate,
        });
        const back = groundBelowEmission({ emissionTemperature: top, lapseRate, height });
        expect(Math.abs(back / ground - 1)).toBeLessThanOrEqual(1e-14);
        const flux = heightEmission({ temperature: ground, lapseRate, height });
        expect(Math.abs(flux / blackbodyFlux({ temperature: top }) - 1)).toBeLessThanOrEqual(1e-13);
      }),
      settings(300),
    );
  });

  test("ends where the air at that height would be at zero kelvin", () => {
    expect(heightEmission({ temperature: 30, lapseRate: 0.0065, height: 5000 })).toBe(0);
  });
});
