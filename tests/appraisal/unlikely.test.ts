// Inputs that are allowed but most likely slips are read as they stand, with a caution.
import { describe, expect, it, test } from "vitest";
import { appraisePlanet } from "../../src/appraisal/appraisePlanet.ts";
import { plain, snowy } from "./planets.ts";

const SUN = 3.828e26;
const CODES = ["luminosity-of-no-star", "warm-albedo-above-cold"];
const doubts = (description: unknown) =>
  appraisePlanet(description).notes.filter(({ code }) => CODES.includes(code));
const shining = (luminosity: string) =>
  plain({ star: { luminosity }, orbit: { semiMajorAxis: "1 au" }, longwave: undefined });

describe("a luminosity", () => {
  it.each(["1e-7 solLum", "9.9e-7 solLum", "1.01e7 solLum", "0.2 W"])("of %s is of no star", (luminosity) => {
    const [note, ...more] = doubts(shining(luminosity));
    expect(more).toEqual([]);
    expect(note).toMatchObject({
      ...{ code: "luminosity-of-no-star", severity: "caution", about: "star.luminosity", unit: "W" },
      range: [1e-6 * SUN, 1e7 * SUN],
    });
    const [number, unit] = luminosity.split(" ");
    expect(note?.value).toBeCloseTo(Number(number) * (unit === "W" ? 1 : SUN));
    expect(note?.text).toContain(unit === "W" || Number(number) < 1 ? "faint" : "bright");
  });

  it.each(["1.01e-6 solLum", "1e-3 solLum", "9.9e6 solLum"])("of %s is that of a star", (luminosity) => {
    expect(doubts(shining(luminosity))).toEqual([]);
  });

  test("that follows from radius and temperature counts as well, and each star by itself", () => {
    const dwarf = { radius: "100 km", effectiveTemperature: "3000 K" };
    const [note, ...more] = doubts(plain({ star: [dwarf, { luminosity: "0.2 solLum" }] }));
    expect(more).toEqual([]);
    // 4π·(1e5)²·5.670374419e-8·3000⁴ W, worked out by hand from the formula
    expect(note?.about).toBe("star[0].luminosity");
    expect((note?.value ?? 0) / 5.7717e17).toBeCloseTo(1, 4);
  });
});

describe("a warm albedo above the cold one", () => {
  const tanh = { law: "tanhAlbedo", cold: 0.28, warm: 0.62, midpoint: "266 K", width: "9 K" };
  const ends = { frozenBelow: "250 K", openAbove: "280 K" };

  it.each([
    ["tanhAlbedo", { albedo: tanh }, "albedo.warm"],
    ["rampAlbedo", { albedo: { law: "rampAlbedo", cold: 0.3, warm: 0.31, ...ends } }, "albedo.warm"],
    [
      "quadraticAlbedo",
      { albedo: undefined, surface: { law: "quadraticAlbedo", cold: 0, warm: 0.1, ...ends } },
      "surface.warm",
    ],
    [
      "stepAlbedo",
      { albedo: { law: "stepAlbedo", cold: 0.1, warm: 0.2, threshold: "270 K" } },
      "albedo.warm",
    ],
  ])("is noted for %s, and the planet is read as it stands", (_, fields, about) => {
    const appraisal = appraisePlanet(snowy(fields));
    const [note, ...more] = appraisal.notes.filter(({ code }) => CODES.includes(code));
    expect(more).toEqual([]);
    expect(note).toMatchObject({ code: "warm-albedo-above-cold", severity: "caution", about });
    expect(appraisal.inputs.find(({ path }) => path === about)?.value).toBe(note?.value);
    expect(appraisal.states.length).toBeGreaterThan(0);
  });

  test("but not where they are equal, or as ice makes them", () => {
    expect(doubts(snowy({ albedo: { ...tanh, cold: 0.62 } }))).toEqual([]);
    expect(doubts(snowy())).toEqual([]);
  });
});
