// Units at the edge: every name against its published definition, and the closed grammar that joins them.
import fs from "node:fs";
import { describe, expect, it, test } from "vitest";
import { inSI } from "../../src/planet/inSI.ts";
import { UNITS } from "../../src/planet/units.ts";
import { unitFactors } from "../../src/planet/unitText.ts";
import { refusal } from "../refusal.ts";

/** Published definitions, typed here and not taken from the library. */
const DEFINITIONS: readonly (readonly [name: string, size: number, si: string, source: string])[] = [
  ["m", 1, "m", "SI"],
  ["km", 1000, "m", "SI prefix"],
  ["au", 149597870700, "m", "IAU 2012 Resolution B2"],
  ["solRad", 6.957e8, "m", "IAU 2015 Resolution B3"],
  ["earthRad", 6.3781e6, "m", "IAU 2015 Resolution B3"],
  ["jupiterRad", 7.1492e7, "m", "IAU 2015 Resolution B3"],
  ["kg", 1, "kg", "SI"],
  ["g", 0.001, "kg", "SI prefix"],
  ["solMass", 1.988409870698051e30, "kg", "astropy 5.2.1, constants.iau2015.M_sun"],
  ["earthMass", 5.972167867791379e24, "kg", "astropy 5.2.1, constants.iau2015.M_earth"],
  ["jupiterMass", 1.8981245973360505e27, "kg", "astropy 5.2.1, constants.iau2015.M_jup"],
  ["s", 1, "s", "SI"],
  ["min", 60, "s", "SI brochure, table 8"],
  ["h", 3600, "s", "SI brochure, table 8"],
  ["d", 86400, "s", "SI brochure, table 8"],
  ["yr", 31557600, "s", "Julian year of 365.25 d, IAU style manual"],
  ["Myr", 3.15576e13, "s", "a million Julian years"],
  ["Gyr", 3.15576e16, "s", "a thousand million Julian years"],
  ["K", 1, "K", "SI"],
  ["J", 1, "J", "SI"],
  ["W", 1, "W", "SI"],
  ["kW", 1000, "W", "SI prefix"],
  ["solLum", 3.828e26, "W", "IAU 2015 Resolution B3"],
  ["Pa", 1, "Pa", "SI"],
  ["hPa", 100, "Pa", "SI prefix"],
  ["kPa", 1000, "Pa", "SI prefix"],
  ["bar", 100000, "Pa", "IUPAC Gold Book"],
  ["atm", 101325, "Pa", "10th CGPM 1954, Resolution 4"],
];

const reading = (unit: string, difference = false) => ({ unit, difference });

/** A conversion is a product or a quotient or two, each rounded once. */
const ROUNDING = 4 * Number.EPSILON;

test("every unit has a published definition here; degC has its own test", () => {
  expect([...DEFINITIONS.map(([name]) => name), "degC"].sort()).toEqual(Object.keys(UNITS).sort());
});

describe.each(DEFINITIONS)("%s = %d %s (%s)", (name, size, si) => {
  it("is read so", () => {
    const found = inSI(1, name, reading(si), "x");
    expect(Math.abs(found / size - 1)).toBeLessThanOrEqual(ROUNDING);
    expect(UNITS[name]?.si).toBe(si);
  });

  it.each([0.61, 3, 1e-9, 123456.789])("comes back: %d", (value) => {
    const there = inSI(value, name, reading(si), "x");
    expect(Math.abs(there / (UNITS[name]?.size ?? Number.NaN) / value - 1)).toBeLessThanOrEqual(ROUNDING);
  });
});

describe("degC", () => {
  it("is a temperature: 15 degC = 288.15 K (SI brochure, 2.3.1)", () => {
    // 273.15 is no double, so the sum is rounded in its last digit
    expect(Math.abs(inSI(15, "degC", reading("K"), "x") - 288.15)).toBeLessThanOrEqual(6e-14);
    expect(inSI(-273.15, "degC", reading("K"), "x")).toBe(0);
  });
  it.each([
    ["a difference", "degC", reading("K", true)],
    ["a part of a unit", "W m-2 degC-1", reading("W m-2 K-1")],
    ["a power", "degC2", reading("K")],
  ])("is refused as %s", (_, unit, wanted) => {
    expect(refusal(() => inSI(1, unit, wanted, "a.b"))).toMatchObject({ code: "unit-mismatch", path: "a.b" });
  });
  it("leaves K for differences", () => {
    expect(inSI(9, "K", reading("K", true), "x")).toBe(9);
  });
});

describe("the text of a unit", () => {
  it.each(["W m-2 K-1", "W.m**-2.K**-1", "W/m^2/K", "W / m**2 / K", "W*m^-2*K^-1", "J s-1 m-2 K-1"])(
    "reads %s",
    (text) => {
      expect(inSI(2.1, text, reading("W m-2 K-1"), "x")).toBe(2.1);
    },
  );
  it("divides by the one factor after a slash", () => {
    expect(unitFactors("W/m^2 K", "x").map((f) => f.exponent)).toEqual([1, -2, 1]);
  });
  it("converts compound units: 1 kW m-2 = 1000 W m-2, 1 g m-3 = 0.001 kg m-3", () => {
    expect(inSI(1, "kW m-2", reading("W m-2"), "x")).toBe(1000);
    expect(inSI(1, "g m-3", reading("kg m-3"), "x")).toBe(0.001);
  });
  it.each([
    ["", "unreadable"],
    [" au", "unreadable"],
    ["au ", "unreadable"],
    ["W m-22", "unreadable"],
    ["W//m", "unreadable"],
    ["W m- 2", "unreadable"],
    ["(W)", "unreadable"],
    ["W m-2; au", "unreadable"],
    ["m m m m m m m m m", "unreadable"],
    ["m".repeat(61), "unreadable"],
    ["parsec", "unknown-unit"],
    ["cm", "unknown-unit"],
    ["constructor", "unknown-unit"],
    ["kg", "unit-mismatch"],
    ["m2", "unit-mismatch"],
  ])("refuses %j for a length: %s", (text, code) => {
    expect(refusal(() => inSI(1, text, reading("m"), "orbit.a"))).toMatchObject({ code, path: "orbit.a" });
  });
  it("suggests the nearest unit, whatever its case", () => {
    expect(refusal(() => inSI(1, "AU", reading("m"), "x")).allowed).toMatch(/nearest: au\)$/);
    expect(refusal(() => inSI(1, "Lsun", reading("W"), "x")).allowed).toMatch(/nearest: solLum\)$/);
    expect(refusal(() => inSI(1, "L_sun", reading("W"), "x")).allowed).toMatch(/nearest: solLum\)$/);
    expect(refusal(() => inSI(1, "solRadd", reading("m"), "x")).allowed).toMatch(/nearest: solRad\)$/);
  });
  it("refuses what is not finite in SI", () => {
    expect(refusal(() => inSI(1e300, "solLum", reading("W"), "x")).code).toBe("not-a-number");
  });
});

test("docs/planet.md shows the table of units", () => {
  const page = fs.readFileSync(new URL("../../docs/planet.md", import.meta.url), "utf8");
  // the columns of a table may be padded
  const rows = page.replace(/ +\|/g, " |");
  for (const [name, { meaning, size, si }] of Object.entries(UNITS)) {
    expect(rows).toContain(`| \`${name}\` | ${size} ${si} | ${meaning} |`);
  }
});
