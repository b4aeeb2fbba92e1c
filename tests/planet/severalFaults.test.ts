// A description with several mistakes: the error is that of the first, and carries those of the others.
import { describe, expect, it, test } from "vitest";
import { planetSchema } from "../../src/planet/planetSchema.ts";
import { readPlanet } from "../../src/planet/readPlanet.ts";
import { refusal } from "../refusal.ts";
import { simple } from "./orsolne.ts";

const lit = (fields: object) =>
  simple({ star: { luminosity: "0.42 solLum" }, orbit: { semiMajorAxis: "0.61 au" }, ...fields });
const tanh = { law: "tanhAlbedo", cold: 0.6, warm: 0.3, midpoint: "266 K", width: "9 K" };

type Case = readonly [what: string, description: unknown, faults: readonly string[]];

const CASES: readonly Case[] = [
  [
    "two units",
    lit({ star: { luminosity: "0.42 solum" }, orbit: { semiMajorAxis: "0.61 kg" } }),
    ["unknown-unit star.luminosity", "unit-mismatch orbit.semiMajorAxis"],
  ],
  [
    "a misspelt field, a unit beside it and a value elsewhere",
    lit({ star: { luminosty: "1 solLum", radius: "1 W" }, albedo: 1.3 }),
    ["unknown-name star.luminosty", "unit-mismatch star.radius", "out-of-range albedo"],
  ],
  [
    "two misspelt fields, of which one is then missing",
    simple({ redistribution: undefined, redistributon: 1, nme: "x" }),
    ["unknown-name redistributon", "unknown-name nme"],
  ],
  [
    "a misspelt law, and fields that are missing",
    simple({ longwave: { law: "greyEmision", emissivity: 2 }, heatCapacity: undefined, orbit: undefined }),
    ["missing orbit", "unknown-name longwave.law", "missing heatCapacity"],
  ],
  [
    "several values of one law",
    simple({ albedo: { ...tanh, cold: 2, warm: "x", midpont: "1 K", width: "9 degC" } }),
    [
      "unknown-name albedo.midpont",
      "not-a-number albedo.warm",
      "out-of-range albedo.cold",
      "unit-mismatch albedo.width",
    ],
  ],
  [
    "parts of the wrong kind",
    simple({ star: 5, redistribution: [], albedo: null, mass: 3 }),
    ["unreadable star", "unreadable redistribution", "not-a-number albedo", "unit-mismatch mass"],
  ],
  [
    "values in a list",
    simple({
      albedo: { covers: [{ share: 2, albedo: 0.3 }, { share: "most", albedo: 0.3 }, { share: 0.1 }] },
    }),
    [
      "unreadable albedo.covers[1].share",
      "missing albedo.covers[2].albedo",
      "out-of-range albedo.covers[0].share",
    ],
  ],
  [
    "a value without its unit, which is one fault",
    simple({ internalHeat: { value: 1 } }),
    ["missing internalHeat.unit"],
  ],
  [
    "fields that need each other, and a value",
    simple({ clouds: { share: 1.5 }, rotation: {} }),
    ["missing clouds.emissivity", "missing rotation.period", "out-of-range clouds.share"],
  ],
  [
    "numbers that contradict each other",
    lit({
      star: { luminosity: "0.42 solLum", radius: "1 solRad", effectiveTemperature: "300 K" },
      orbit: { semiMajorAxis: "0.61 au", eccentricity: 0.2 },
      albedo: { covers: [{ share: 0.3, albedo: 0.2 }] },
    }),
    [
      "missing orbit.average",
      "shares-not-one albedo.covers",
      "contradiction star.radius and star.effectiveTemperature",
    ],
  ],
];

describe("all faults are told of", () => {
  it.each(CASES)("%s", (_, description, faults) => {
    const error = refusal(() => readPlanet(description));
    const all = [error, ...error.others];
    expect(all.map(({ code, path }) => `${code} ${path}`)).toEqual(faults);
    const more = error.others.map(({ path }) => `; also: ${path}`).join("");
    expect(error.message.endsWith(`(docs/errors.md#${error.code})${more}`)).toBe(true);
    for (const { message, others } of error.others)
      expect([message.includes("; also"), others]).toEqual([false, []]);
  });

  it.each(CASES)("and by the Standard Schema one by one: %s", (_, description) => {
    const error = refusal(() => readPlanet(description));
    const result = planetSchema["~standard"].validate(description);
    const messages = "issues" in result ? result.issues.map(({ message }) => message) : [];
    expect(messages).toEqual([
      error.message.replace(/; also: .*/, ""),
      ...error.others.map((o) => o.message),
    ]);
  });
});

test("a description with hundreds of faults carries twenty of them", () => {
  const many = Object.fromEntries(Array.from({ length: 300 }, (_, i) => [`f${i}`, i]));
  expect(refusal(() => readPlanet(simple(many))).others).toHaveLength(20);
});
