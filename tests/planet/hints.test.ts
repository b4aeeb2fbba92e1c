// What an error tells a newcomer to write instead.
import { describe, expect, it, test } from "vitest";
import { readPlanet } from "../../src/planet/readPlanet.ts";
import { refusal } from "../refusal.ts";
import { simple } from "./orsolne.ts";

const lit = (fields: object) =>
  simple({
    star: { luminosity: "1 solLum", mass: "1 solMass" },
    orbit: { semiMajorAxis: "1 au" },
    ...fields,
  });
const allowed = (fields: object) => refusal(() => readPlanet(lit(fields))).allowed;

describe("a text that is almost a number with its unit", () => {
  it.each([
    ["a decimal comma", "1,5 au", '; write "1.5 au"'],
    ["no space", "1.5au", '; write "1.5 au"'],
    ["spaces around it", "  1.5 au ", '; write "1.5 au"'],
    ["a typographic minus", "\u22121.5 au", '; write "-1.5 au"'],
    ["a power of ten", "1,5e0au", '; write "1.5e0 au"'],
  ])("%s", (_, written, hint) => {
    expect(allowed({ orbit: { semiMajorAxis: written } })).toBe(
      `a number with its unit, as in "0.61 au"${hint}`,
    );
  });

  it("in degrees", () => {
    const clouds = { share: 0.5, emissivity: 1, temperature: "\u221220,5 °C" };
    expect(allowed({ clouds })).toContain('; write "-20.5 degC"');
  });

  it.each(["1,500 au", "about 1 au", "1.5", "au", "1,5,2 au", `1,5 ${"a".repeat(120)}`])(
    "and none for %s",
    (written) => {
      expect(allowed({ orbit: { semiMajorAxis: written } })).toBe('a number with its unit, as in "0.61 au"');
    },
  );
});

test.each([
  ["12.5 %", "0.125"],
  ["7%", "0.07"],
])("%s is written as %s", (written, plain) => {
  expect(allowed({ albedo: written })).toContain(`; write ${plain}, without quotes`);
});

test("layers that are none are refused by the field, with what a layer is", () => {
  const error = refusal(() => readPlanet(lit({ longwave: { law: "leakyStackEmission", layers: [] } })));
  expect(error).toMatchObject({ code: "unreadable", path: "longwave.layers" });
  expect(error.allowed).toBe("a list of 1 to 100 { emissivity, heating }");
});

test("two covers of ice are named as such", () => {
  const ice = { share: { law: "iceShare", frozenBelow: "250 K", openAbove: "270 K" }, albedo: 0.6 };
  const error = refusal(() => readPlanet(lit({ albedo: { covers: [ice, ice, { share: 1, albedo: 0.1 }] } })));
  expect(error).toMatchObject({ code: "repeated-name", path: "albedo.covers", value: "iceShare" });
  expect(error.allowed).toContain("the ice over all others");
});

test("a locked planet with another rotation is told that it is locked", () => {
  expect(allowed({ rotation: { locked: true, period: "1 d" } })).toMatch(
    /^rotation without locked, or 2 % around what .* \(1 au and 1 solMass\) give, 31558200$/,
  );
});

test("a star that no planet orbits is shown with its distance", () => {
  const error = refusal(() => readPlanet(lit({ star: [{ luminosity: "1 solLum", distance: "3 au" }] })));
  expect(error).toMatchObject({ code: "contradiction", path: "star[0].distance", value: "3 au" });
});

test("large numbers of a contradiction are written with powers of ten, verbs fit their number", () => {
  const star = { luminosity: "1 solLum", radius: "2 solRad", effectiveTemperature: "5772 K" };
  const far = lit({ star, orbit: { semiMajorAxis: "1 au", flux: "1400 W m-2" } });
  const { notes } = readPlanet(far, { contradictions: "note" });
  const [light, flux] = notes.filter(({ code }) => code === "inputs-contradict").map(({ text }) => text);
  expect(light).toContain("give another luminosity");
  expect(light).toContain("is used: 1.5312e+27 against 3.828e+26 W");
  expect(flux).toContain("orbit.flux (1400 W m-2) gives another flux");
});

test("an albedo that comes out of surface and sky is told as one sentence", () => {
  const ramp = { law: "rampAlbedo", cold: 0.6, warm: 0.3, frozenBelow: "255 K", openAbove: "275 K" };
  const sky = { albedo: undefined, surface: ramp, clouds: { share: 0.5, reflectance: 0.4 } };
  expect(readPlanet(lit(sky)).notes.find(({ about }) => about === "surface")?.text).toBe(
    "Bond albedo of surface, air and clouds together from rampAlbedo: it answers to temperature, so each state has its own; light goes to and fro between them any number of times",
  );
});
