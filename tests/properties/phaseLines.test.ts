// What holds along the saturation lines.
import fc from "fast-check";
import { expect, test } from "vitest";
import {
  co2FrostPoint,
  saturationPressureIce,
  saturationPressureLiquid,
  saturationTemperature,
} from "../../src/index.ts";
import { refusal } from "../refusal.ts";
import { settings } from "./settings.ts";

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });

test("the boiling point at the saturation pressure is the temperature again, and the other way round", () => {
  fc.assert(
    fc.property(between(273.16, 647.096), (temperature) => {
      const pressure = saturationPressureLiquid({ temperature });
      // cancellation in the quadratic at cold temperatures; a hundred times what rounding does there
      expect(Math.abs(saturationTemperature({ pressure }) - temperature)).toBeLessThan(1e-10);
    }),
    settings(1000),
  );
  fc.assert(
    fc.property(between(Math.log(611.66), Math.log(22.064e6)), (x) => {
      const pressure = Math.exp(x);
      const temperature = Math.min(647.096, saturationTemperature({ pressure }));
      expect(Math.abs(saturationPressureLiquid({ temperature }) / pressure - 1)).toBeLessThan(1e-10);
    }),
    settings(1000),
  );
});

test("every line rises, and ice meets the liquid at the triple point", () => {
  const rises = (f: (x: number) => number, [low, high]: readonly [number, number]) =>
    fc.assert(
      fc.property(between(low, high), between(low, high), (a, b) => {
        if (Math.abs(a - b) > 1e-6 * Math.abs(a)) expect(Math.sign(f(a) - f(b))).toBe(Math.sign(a - b));
      }),
      settings(300),
    );
  rises((temperature) => saturationPressureLiquid({ temperature }), [273.16, 647.096]);
  rises((temperature) => saturationPressureIce({ temperature }), [30, 273.16]);
  rises((pressure) => saturationTemperature({ pressure }), [612, 22.064e6]);
  rises((pressure) => co2FrostPoint({ pressure }), [1e-6, 517950]);
  const temperature = 273.16;
  // seven digits, which is what the fit to ice was given
  expect(saturationPressureIce({ temperature }) / saturationPressureLiquid({ temperature })).toBeCloseTo(
    1,
    6,
  );
});

test("nothing is said where there is no such phase", () => {
  const paths = [
    () => saturationPressureLiquid({ temperature: 273.15 }),
    () => saturationPressureLiquid({ temperature: 647.1 }),
    () => saturationTemperature({ pressure: 611.6 }),
    () => saturationTemperature({ pressure: 22.064e6 + 0.01 }),
    () => saturationPressureIce({ temperature: 273.2 }),
    () => co2FrostPoint({ pressure: 6e5 }),
  ].map(refusal);
  expect(paths.map((e) => e.code)).toEqual(Array(6).fill("out-of-range"));
  expect(paths.map((e) => e.path)).toEqual([
    "saturationPressureLiquid.temperature",
    "saturationPressureLiquid.temperature",
    "saturationTemperature.pressure",
    "saturationTemperature.pressure",
    "saturationPressureIce.temperature",
    "co2FrostPoint.pressure",
  ]);
});
