// Compares the library with numbers that others printed or computed, and makes sure that nothing is left out.
import { describe, expect, test } from "vitest";
import * as door from "../../src/index.ts";
import { equilibriumTemperature, REDISTRIBUTION_GLOBAL } from "../../src/index.ts";
import { rows, subjects } from "./rows.ts";

describe.each(Object.entries(subjects))("%s", (_, checks) => {
  test.each(checks.map((check) => [`${check.what} (${check.source.authors} ${check.source.year})`, check]))(
    "%s",
    (_name, { ours, published, tolerance }) => {
      const difference = Math.abs(ours() - published);
      expect(difference).toBeLessThanOrEqual(tolerance);
    },
  );
});

const covered = new Set(rows.flatMap((row) => row.covers));
const isLaw = (value: unknown) => typeof value === "function" && "card" in value;

test("every exported law and every constant is compared with something", () => {
  const laws = Object.entries(door).flatMap(([name, value]) => (isLaw(value) ? [name] : []));
  expect(laws.length).toBeGreaterThan(15);
  expect([...laws, ...door.CONSTANTS.map((c) => c.name)].filter((name) => !covered.has(name))).toEqual([]);
});

test("rows cover only what is exported", () => {
  expect([...covered].filter((name) => !(name in door))).toEqual([]);
});

test("there are at least 40 checks from at least 12 sources, no two the same", () => {
  expect(rows.length).toBeGreaterThanOrEqual(40);
  expect(new Set(rows.map((row) => row.source)).size).toBeGreaterThanOrEqual(12);
  expect(new Set(rows.map((row) => `${row.what} ${row.source.title}`)).size).toBe(rows.length);
});

test("tolerances are finite, and tighter than a twentieth of the number", () => {
  for (const { tolerance, published, unit, what } of rows) {
    const size = unit === "degC" ? 273.15 + published : Math.abs(published);
    expect(tolerance, what).toBeLessThanOrEqual(size / 20);
  }
});

test("a sphere in place of the flattened Jupiter is half a kelvin too warm, and no tolerance hides it", () => {
  const sphere = equilibriumTemperature({
    flux: 50.616,
    albedo: 0.343,
    redistribution: REDISTRIBUTION_GLOBAL,
  });
  const printed = rows.find((row) => row.what.startsWith("Jupiter: equilibrium temperature"));
  const excess = sphere - (printed?.ours() ?? Number.NaN);
  expect(excess).toBeGreaterThan(0.5);
  expect(excess).toBeGreaterThan(10 * (printed?.tolerance ?? Number.NaN));
});
