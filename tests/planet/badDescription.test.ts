// What is wrong with a description gets its error: code, path, value, and what would be allowed.
import { describe, expect, it, test } from "vitest";
import { readPlanet } from "../../src/planet/readPlanet.ts";
import { refusal } from "../refusal.ts";
import { orsolne, orsolneWith, simple } from "./orsolne.ts";

const tanh = (fields: object) => ({ ...(orsolne().albedo as object), ...fields });
const star = (fields: object) => ({ ...orsolne().star, ...fields });
const orbit = (fields: object) => ({ ...orsolne().orbit, ...fields });
const cover = (share: unknown, albedo: unknown = 0.3) => ({ share, albedo });

type Fault = readonly [what: string, fields: Record<string, unknown>, code: string, path: string];

const FAULTS: readonly Fault[] = [
  ["a negative radius", { star: star({ radius: "-1 solRad" }) }, "out-of-range", "star.radius"],
  ["a distance of 0", { orbit: orbit({ semiMajorAxis: "0 au" }) }, "out-of-range", "orbit.semiMajorAxis"],
  [
    "a mass as a distance",
    { orbit: orbit({ semiMajorAxis: "5 kg" }) },
    "unit-mismatch",
    "orbit.semiMajorAxis",
  ],
  ["a bare distance", { orbit: orbit({ semiMajorAxis: 0.61 }) }, "unit-mismatch", "orbit.semiMajorAxis"],
  ["a value without its unit", { internalHeat: { value: 1 } }, "missing", "internalHeat.unit"],
  ["a unit without a number", { internalHeat: "W m-2" }, "unreadable", "internalHeat"],
  ["a number without a space", { internalHeat: "1W m-2" }, "unreadable", "internalHeat"],
  ["NaN in a text", { internalHeat: "NaN W m-2" }, "unreadable", "internalHeat"],
  ["a number too large for a double", { internalHeat: "1e999 W m-2" }, "not-a-number", "internalHeat"],
  ["an unknown unit", { internalHeat: "1 Wm" }, "unknown-unit", "internalHeat"],
  ["a long text", { internalHeat: `1 ${"W ".repeat(60)}` }, "unreadable", "internalHeat"],
  ["code in place of a unit", { internalHeat: "1 W m-2; process.exit(1)" }, "unreadable", "internalHeat"],
  ["a formula in place of a number", { albedo: "1 - 0.7" }, "not-a-number", "albedo"],
  ["NaN", { albedo: Number.NaN }, "not-a-number", "albedo"],
  ["infinity", { albedo: tanh({ cold: Number.POSITIVE_INFINITY }) }, "not-a-number", "albedo.cold"],
  ["null", { albedo: null }, "not-a-number", "albedo"],
  ["an albedo above 1", { albedo: 1.2 }, "out-of-range", "albedo"],
  ["an albedo below 0", { albedo: tanh({ warm: -0.1 }) }, "out-of-range", "albedo.warm"],
  ["an albedo with a unit", { albedo: { value: 0.3, unit: "m" } }, "unreadable", "albedo.unit"],
  ["a negative error", { albedo: { value: 0.3, minus: -0.1 } }, "out-of-range", "albedo.minus"],
  ["a list for an object", { star: [] }, "unreadable", "star"],
  ["a list for an albedo", { albedo: [0.3] }, "unreadable", "albedo"],
  ["a text for an object", { orbit: "0.61 au" }, "unreadable", "orbit"],
  ["a number for a name", { name: 3 }, "unreadable", "name"],
  ["a misspelt field", { albdo: 0.3 }, "unknown-name", "albdo"],
  [
    "a misspelt field of the star",
    { star: star({ luminositty: "1 solLum" }) },
    "unknown-name",
    "star.luminositty",
  ],
  ["a misspelt port", { albedo: tanh({ midpont: "266 K" }) }, "unknown-name", "albedo.midpont"],
  ["an unknown law", { albedo: tanh({ law: "tanhAlbdo" }) }, "unknown-name", "albedo.law"],
  ["a law in the wrong place", { longwave: { law: "tanhAlbedo" } }, "unknown-name", "longwave.law"],
  ["a law without its name", { longwave: { emissivity: 0.6 } }, "missing", "longwave.law"],
  ["a missing port", { longwave: { law: "greyEmission" } }, "missing", "longwave.emissivity"],
  [
    "a bound port",
    { longwave: { law: "greyEmission", emissivity: 1, temperature: "1 K" } },
    "unknown-name",
    "longwave.temperature",
  ],
  ["a width in degC", { albedo: tanh({ width: "9 degC" }) }, "unit-mismatch", "albedo.width"],
  [
    "ends in the wrong order",
    { albedo: { law: "rampAlbedo", cold: 0.6, warm: 0.3, frozenBelow: "280 K", openAbove: "270 K" } },
    "out-of-range",
    "albedo.span (openAbove − frozenBelow)",
  ],
  [
    "shares that sum to 0.97",
    { albedo: { covers: [cover(0.3), cover(0.67)] } },
    "shares-not-one",
    "albedo.covers",
  ],
  [
    "shares above 1 beside the rest",
    { albedo: { covers: [cover(0.6), cover(0.5), cover("rest")] } },
    "shares-not-one",
    "albedo.covers",
  ],
  ["two rests", { albedo: { covers: [cover("rest"), cover("rest")] } }, "repeated-name", "albedo.covers"],
  ["no covers", { albedo: { covers: [] } }, "shares-not-one", "albedo.covers"],
  ["a share that is a word", { albedo: { covers: [cover("most")] } }, "unreadable", "albedo.covers[0].share"],
  ["a cover without albedo", { albedo: { covers: [{ share: 1 }] } }, "missing", "albedo.covers[0].albedo"],
  ["an eccentricity of 1", { orbit: orbit({ eccentricity: 1 }) }, "out-of-range", "orbit.eccentricity"],
  [
    "an eccentric orbit without average",
    { orbit: orbit({ average: undefined }) },
    "missing",
    "orbit.average",
  ],
  ["an unknown average", { orbit: orbit({ average: "mean" }) }, "unreadable", "orbit.average"],
  ["a redistribution below 1/4", { redistribution: 0.2 }, "out-of-range", "redistribution"],
  ["an unknown redistribution", { redistribution: "globl" }, "unreadable", "redistribution"],
  ["a bare heat capacity", { heatCapacity: 4.2e8 }, "unit-mismatch", "heatCapacity"],
  ["another format", { format: "thermostead-planet-2" }, "unreadable", "format"],
  ["no star for a distance", { star: undefined }, "missing", "star.luminosity"],
  ["a period without the star's mass", { orbit: { period: "120 d" } }, "missing", "star.mass"],
  [
    "stellar radii without the radius",
    { star: { luminosity: "1 solLum" }, orbit: { distanceInStellarRadii: 90 } },
    "missing",
    "star.radius",
  ],
  ["an orbit without a size", { orbit: {} }, "missing", "orbit.semiMajorAxis"],
];

describe("a description is refused for", () => {
  it.each(FAULTS)("%s", (_, fields, code, path) => {
    const error = refusal(() => readPlanet(orsolneWith(fields)));
    expect({ code: error.code, path: error.path }).toEqual({ code, path });
    expect(error.allowed).not.toBe("");
  });

  it.each(["format", "orbit", "redistribution", "albedo", "longwave", "heatCapacity"])(
    "a missing %s",
    (field) => {
      expect(refusal(() => readPlanet(orsolneWith({ [field]: undefined })))).toMatchObject({
        code: "missing",
        path: field,
      });
    },
  );

  test("names of the nearest known field", () => {
    const nearest = (fields: object) => refusal(() => readPlanet(orsolneWith(fields as never))).allowed;
    expect(nearest({ star: star({ luminositty: "1 solLum" }) })).toMatch(/nearest: luminosity\)/);
    expect(nearest({ redistributon: 1 })).toMatch(/nearest: redistribution\)/);
    expect(nearest({ albedo: tanh({ law: "tanhAlbdo" }) })).toMatch(/nearest: tanhAlbedo\)/);
  });

  test("a range says value, range and unit", () => {
    const error = refusal(() => readPlanet(simple({ orbit: { flux: "-1 W m-2" } })));
    expect(error).toMatchObject({
      path: "orbit.flux",
      value: -1,
      allowed: "0 to 1000000000000",
      unit: "W m-2",
    });
  });
});

describe("contradictions carry both numbers", () => {
  it("which are noted, and the first is used, where that is asked for", () => {
    const description = orsolneWith({ orbit: orbit({ flux: "1000 W m-2" }) });
    const planet = readPlanet(description, { contradictions: "note" });
    const noted = planet.notes.filter((note) => note.code === "inputs-contradict");
    expect(noted).toMatchObject([{ about: "orbit.flux", severity: "caution", value: 1000, unit: "W m-2" }]);
    // in words with the digits that matter; the value keeps all of them
    const [text] = noted.map((note) => note.text);
    expect(text).toMatch(/: 1000 against \d{3,4}(\.\d{1,3})? W m-2$/);
    expect(planet.flux).toBe(readPlanet(orsolne()).flux);
    expect(refusal(() => readPlanet(description, { contradictions: "ignore" as never })).code).toBe(
      "unreadable",
    );
  });

  test("luminosity against radius and effective temperature", () => {
    // 4π·(0.68·6.957e8)²·5.670374419e-8·4680⁴ = 7.650095e25 W (from memory of the formula, worked out with bc)
    const error = refusal(() => readPlanet(orsolneWith({ star: star({ luminosity: "0.42 solLum" }) })));
    expect(error).toMatchObject({ code: "contradiction", path: "star.radius and star.effectiveTemperature" });
    expect(error.message).toMatch(/7\.650095\d*e\+25.* gives, 1\.60776e\+26 W/);
  });

  test("semi-major axis against period and mass", () => {
    // P² = a³/M in yr, au and solar masses: 0.46 au around 0.72 solMass takes 134 d, not 120 d
    const fields = { star: star({ mass: "0.72 solMass" }), orbit: orbit({ period: "120 d" }) };
    expect(refusal(() => readPlanet(orsolneWith(fields)))).toMatchObject({
      code: "contradiction",
      unit: "m",
    });
  });

  test("flux against star and distance", () => {
    const error = refusal(() => readPlanet(orsolneWith({ orbit: orbit({ flux: "1000 W m-2" }) })));
    expect(error).toMatchObject({ code: "contradiction", path: "orbit.flux", value: 1000 });
  });

  test("a periastron inside the star: radius stated, or from luminosity and temperature", () => {
    const orbit = { semiMajorAxis: "0.02 au", eccentricity: 0.9, average: "flux" };
    // 0.1·0.02·149597870700 m against 0.68·6.957e8 m
    const error = refusal(() => readPlanet(orsolneWith({ orbit })));
    expect(error).toMatchObject({ code: "contradiction", path: "orbit", unit: "m" });
    expect(error.value).toBeCloseTo(299195741.4, 1);
    expect(error.message).toContain("473076000");
    const hot = { luminosity: "0.2 solLum", effectiveTemperature: "4680 K" };
    expect(refusal(() => readPlanet(orsolneWith({ star: hot, orbit }))).code).toBe("contradiction");
    expect(() => readPlanet(orsolneWith({ star: { luminosity: "0.2 solLum" }, orbit }))).not.toThrow();
  });
});

const forcedBy = (concentration: unknown) => ({
  ...{ law: "co2EffectiveForcingAr6", concentration, reference: 278e-6, nitrousOxide: 273e-9 },
});
const bright = (minus: number) => ({ luminosity: { value: 0.42, unit: "solLum", minus } });

describe("an error shows what to write", () => {
  const messageOf = (fields: Record<string, unknown>) =>
    refusal(() => readPlanet(orsolneWith(fields))).message;
  const ramp = { law: "tanhAlbedo", cold: 0.6, warm: 0.3, midpoint: "266 K" };
  it.each([
    ["a width in kelvin that is missing", { albedo: ramp }, 'a number with its unit, as in "10 K"'],
    [
      "a temperature that is missing",
      { albedo: { ...ramp, midpoint: undefined, width: "9 K" } },
      'as in "288 K"',
    ],
    ["parts per million", { forcing: forcedBy("420 ppm") }, "; write 420e-6, without quotes"],
    ["a percentage", { albedo: "30 %" }, "{ law }; write 0.3, without quotes"],
    ["a number in quotes", { albedo: "0.3" }, "{ law }; write 0.3, without quotes"],
    [
      "an error below 0",
      { star: bright(-0.01) },
      "star.luminosity.minus: out of range, received -0.01; allowed: 0 or more solLum",
    ],
  ])("%s", (_, fields, told) => {
    expect(messageOf(fields)).toContain(told);
  });

  test("and none where it is not known", () => {
    expect(messageOf({ albedo: "a third" })).not.toContain("write");
    expect(messageOf({ albedo: "0.3 K" })).not.toContain("write");
    expect(() => readPlanet(orsolneWith({ star: bright(0) }))).not.toThrow();
  });

  test("a contradiction has the values as they are written", () => {
    const orbit = { semiMajorAxis: "0.46 au", period: "20 d" };
    const star = { luminosity: "0.42 solLum", mass: "0.7 solMass" };
    expect(messageOf({ star, orbit })).toContain("2 % around what orbit.semiMajorAxis (0.46 au) gives, ");
  });
});
