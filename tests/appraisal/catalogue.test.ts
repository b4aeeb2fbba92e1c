// Rows of tables become descriptions: what is missing and what is refused is said, nothing is guessed.
import { describe, expect, it, test } from "vitest";
import { appraisePlanet } from "../../src/appraisal/appraisePlanet.ts";
import type { CatalogueMapping } from "../../src/appraisal/catalogueMapping.ts";
import { fromCatalogueRow } from "../../src/appraisal/fromCatalogueRow.ts";
import { readPlanet } from "../../src/planet/readPlanet.ts";
import { refusal } from "../refusal.ts";
import { plain } from "./planets.ts";

const mapping = {
  name: "planet",
  star: {
    name: "host",
    radius: { column: "radius", unit: "solRad", minus: "radius_minus", plus: "radius_plus" },
    effectiveTemperature: { column: "teff", unit: "K" },
    mass: { column: "mass", unit: "solMass" },
  },
  orbit: {
    semiMajorAxis: { column: "a", unit: "au" },
    period: { column: "period", unit: "d" },
    eccentricity: "e",
  },
  publishedTemperature: { column: "teq", unit: "K" },
  discovery: { column: "method", imaging: "imaging" },
} satisfies CatalogueMapping;

const row = {
  planet: "Vellamar b",
  host: "Vellamar",
  radius: "0.68",
  radius_minus: "0.02",
  radius_plus: 0.03,
  teff: "4680",
  mass: 0.72,
  a: "0.46",
  period: "",
  e: "0.05",
  teq: "251",
  method: "transit",
};
const entryOf = (fields: object = {}, more: object = {}) =>
  fromCatalogueRow({ ...row, ...fields }, { ...mapping, ...more });

test("a row says what it says, with its errors, and what is empty is named", () => {
  const { description, missing, refused, publishedTemperature } = entryOf();
  expect(description).toEqual({
    format: "thermostead-planet-1",
    name: "Vellamar b",
    star: {
      name: "Vellamar",
      radius: { value: 0.68, unit: "solRad", minus: 0.02, plus: 0.03 },
      effectiveTemperature: { value: 4680, unit: "K" },
      mass: { value: 0.72, unit: "solMass" },
    },
    orbit: {
      semiMajorAxis: { value: 0.46, unit: "au" },
      eccentricity: { value: 0.05, unit: "1" },
    },
  });
  expect({ missing, refused }).toEqual({ missing: ["orbit.period"], refused: [] });
  expect(publishedTemperature).toEqual({ value: 251, unit: "K" });
});

test("no heat capacity: no thermal inertia, and no states", () => {
  const appraisal = appraisePlanet(entryOf().description);
  expect(appraisal.states).toEqual([]);
  expect(appraisal.missing.map(({ path }) => path)).toContain("heatCapacity");
  expect(appraisal.inputs.find(({ path }) => path === "star.radius")).toMatchObject({
    minus: 0.02 * 6.957e8,
    written: "0.68 +0.03 -0.02 solRad",
  });
});

test("what you assume is added, and read by the rules of a description", () => {
  const assume = {
    redistribution: "global",
    albedo: 0.3,
    longwave: { law: "greyEmission", emissivity: 0.6 },
    heatCapacity: "4e8 J m-2 K-1",
    orbit: { average: "flux" },
    star: { brightening: "0.05 Gyr-1" },
  };
  const { description } = entryOf({}, { assume });
  expect(appraisePlanet(description).states).toHaveLength(1);
  expect(readPlanet(description).facts.stars[0]).toMatchObject({ name: "Vellamar" });
  expect(appraisePlanet(description).missing.map(({ path }) => path)).toEqual(["atmosphere.pressure"]);
});

test("what the row says stays, and what it leaves open is assumed", () => {
  const assume = { name: "Other", orbit: { eccentricity: 0 }, star: { name: "Sun" }, mass: "1 earthMass" };
  const more = { assume, mass: { column: "m", unit: "earthMass" } };
  const of = (fields: object) => entryOf(fields, more).description;
  expect(of({ e: 0.4, m: "2" })).toMatchObject({
    name: "Vellamar b",
    star: { name: "Vellamar" },
    orbit: { eccentricity: { value: 0.4, unit: "1" } },
    mass: { value: 2, unit: "earthMass" },
  });
  expect(of({ e: "<0.4", planet: "", host: "", m: "" })).toMatchObject({
    name: "Other",
    star: { name: "Sun" },
    orbit: { eccentricity: 0 },
    mass: "1 earthMass",
  });
});

test("body, rotation and internal heat have columns", () => {
  const { description, missing } = fromCatalogueRow(
    { m: 1.7, r: "1.2", day: "30", heat: "", m_err: 0.1 },
    {
      mass: { column: "m", unit: "earthMass", plus: "m_err" },
      radius: { column: "r", unit: "earthRad" },
      rotation: { period: { column: "day", unit: "d" } },
      internalHeat: { column: "heat", unit: "W m-2" },
    },
  );
  expect(description).toEqual({
    format: "thermostead-planet-1",
    orbit: {},
    mass: { value: 1.7, unit: "earthMass", plus: 0.1 },
    radius: { value: 1.2, unit: "earthRad" },
    rotation: { period: { value: 30, unit: "d" } },
  });
  expect(missing).toEqual(["internalHeat"]);
  const light = { star: plain().star, orbit: plain().orbit };
  expect(appraisePlanet({ ...description, ...light }).inputs.map(({ path }) => path)).toContain("mass");
});

test("columns that the row does not have are listed, whatever they hold", () => {
  const { absent, missing } = entryOf(
    {},
    {
      name: "plnet",
      star: { name: "hots", radius: { column: "radius", unit: "solRad", minus: "radius_mius" } },
      discovery: { column: "mehtod", imaging: "imaging" },
    },
  );
  expect(absent).toEqual(["plnet", "hots", "mehtod", "radius_mius"]);
  expect(missing).toEqual(["name", "star.name", "orbit.period"]);
  expect(entryOf()).toMatchObject({ absent: [] });
  // an empty cell is there
  expect(entryOf({ planet: "" })).toMatchObject({ absent: [], missing: ["name", "orbit.period"] });
});

test("a list of stars can be assumed where no column tells a star", () => {
  const star = [{ luminosity: "0.3 solLum" }, { luminosity: "0.1 solLum", distance: "30 au" }];
  expect(fromCatalogueRow(row, { assume: { star } }).description).toMatchObject({ star });
  expect(refusal(() => entryOf({}, { assume: { star } }))).toMatchObject({
    code: "unreadable",
    path: "mapping.assume.star",
  });
});

test("a mass that is assumed is not compared before it is appraised", () => {
  const assume = { star: { mass: "0.72 solMass" } };
  const entry = entryOf({ mass: "", period: "200" }, { assume });
  expect(entry.notes.map(({ code }) => code)).toEqual(["published-temperature"]);
  const { notes } = appraisePlanet(entry.description);
  expect(notes.some(({ code, about }) => code === "inputs-contradict" && about.includes("period"))).toBe(
    true,
  );
});

describe("a cell that cannot be used is refused and left out", () => {
  it.each([
    ["no number", { a: "0.46x" }, "a", "0.46x", "not a number"],
    ["a number in words", { a: "Infinity" }, "a", "Infinity", "not a number"],
    ["NaN", { a: Number.NaN }, "a", Number.NaN, "not a number"],
    ["hexadecimal", { a: "0x10" }, "a", "0x10", "not a number"],
    ["a distance of 0", { a: 0 }, "a", 0, /^orbit\.semiMajorAxis is out of range; allowed: /],
    ["an eccentricity above 1", { e: 1.2 }, "e", 1.2, /^orbit\.eccentricity is out of range/],
    ["a negative temperature", { teq: -5 }, "teq", -5, /^publishedTemperature is out of range/],
    ["one that overflows", { a: "1e305" }, "a", 1e305, /^orbit\.semiMajorAxis is not a number/],
    ["an error below 0", { radius_minus: "-0.1" }, "radius_minus", -0.1, "an error below 0"],
  ])("%s", (_, fields, column, value, reason) => {
    const { refused, description, missing } = entryOf(fields);
    expect(refused).toHaveLength(1);
    expect(refused[0]).toMatchObject({ column, value });
    expect(refused[0]?.reason).toMatch(reason);
    // what is refused is not missing
    expect(missing).toEqual(["orbit.period"]);
    const star = (description.star as { radius: object }).radius;
    expect(column === "radius_minus" ? star : { plus: 0.03 }).toMatchObject({ plus: 0.03 });
    expect("minus" in star).toBe(column !== "radius_minus");
  });

  it.each([["", null, undefined]])("an empty cell is missing, not refused: %j, %j, %j", (...cells) => {
    for (const a of cells)
      expect(entryOf({ a })).toMatchObject({ missing: ["orbit.semiMajorAxis", "orbit.period"], refused: [] });
    const { a: _, ...others } = row;
    expect(fromCatalogueRow(others, mapping).missing).toContain("orbit.semiMajorAxis");
  });

  test("fields of objects are no columns", () => {
    expect(
      fromCatalogueRow(row, { name: "toString", orbit: { flux: { column: "constructor", unit: "W m-2" } } }),
    ).toMatchObject({
      description: { orbit: {} },
      missing: ["name", "orbit.flux"],
      absent: ["toString", "constructor"],
    });
  });
});

describe("notes of a row", () => {
  const notesOf = (fields: object) => entryOf(fields).notes;
  test("an axis against Kepler", () => {
    expect(notesOf({ period: "200" })[0]).toMatchObject({
      code: "inputs-contradict",
      severity: "caution",
      about: "orbit.period and star.mass",
    });
    expect(notesOf({ period: "134.3" })[0]).toMatchObject({ code: "inputs-agree" });
  });

  test("a temperature that may mean either, or the planet's own glow", () => {
    expect(notesOf({})).toMatchObject([{ code: "published-temperature", severity: "info", value: 251 }]);
    expect(notesOf({ method: "imaging" })).toMatchObject([
      { code: "published-temperature", severity: "caution", text: expect.stringContaining("its own glow") },
    ]);
    expect(notesOf({ teq: "" })).toEqual([]);
  });
});

describe("a wrong mapping is refused", () => {
  it.each([
    ["no row", null, mapping, "unreadable", "row"],
    ["a list for a row", [], mapping, "unreadable", "row"],
    ["no mapping", row, undefined, "unreadable", "mapping"],
    ["a misspelt part", row, { strar: {} }, "unknown-name", "mapping.strar"],
    ["a misspelt field", row, { star: { raduis: "r" } }, "unknown-name", "mapping.star.raduis"],
    ["a column without a name", row, { orbit: { flux: { unit: "K" } } }, "unreadable", "mapping.orbit.flux"],
    [
      "an unknown unit",
      row,
      { orbit: { semiMajorAxis: { column: "a", unit: "furlong" } } },
      "unknown-unit",
      "mapping.orbit.semiMajorAxis",
    ],
    [
      "a unit of something else",
      row,
      { orbit: { semiMajorAxis: { column: "a", unit: "kg" } } },
      "unit-mismatch",
      "mapping.orbit.semiMajorAxis",
    ],
    [
      "no unit where one is needed",
      row,
      { orbit: { semiMajorAxis: "a" } },
      "unit-mismatch",
      "mapping.orbit.semiMajorAxis",
    ],
    [
      "a unit of a pure number",
      row,
      { orbit: { eccentricity: { column: "e", unit: "K" } } },
      "unit-mismatch",
      "mapping.orbit.eccentricity",
    ],
    ["a unit that is no text", row, { mass: { column: "m", unit: 5 } }, "unreadable", "mapping.mass.unit"],
    [
      "a unit is checked in empty rows",
      {},
      { mass: { column: "m", unit: "s" } },
      "unit-mismatch",
      "mapping.mass",
    ],
    [
      "a key that a column does not have",
      row,
      { orbit: { eccentricity: { column: "e", error: "x" } } },
      "unknown-name",
      "mapping.orbit.eccentricity.error",
    ],
    [
      "an error that names no column",
      row,
      { orbit: { eccentricity: { column: "e", plus: 0.1 } } },
      "unreadable",
      "mapping.orbit.eccentricity.plus",
    ],
    ["a name that names no column", row, { name: 3 }, "unreadable", "mapping.name"],
    ["a part that is a text", row, { star: "x" }, "unreadable", "mapping.star"],
    ["assumptions that are a text", row, { assume: "x" }, "unreadable", "mapping.assume"],
    ["an assumed part that is a text", row, { assume: { orbit: "x" } }, "unreadable", "mapping.assume.orbit"],
    ["half a discovery", row, { discovery: { column: "method" } }, "unreadable", "mapping.discovery.imaging"],
  ])("%s", (_, from, by, code, path) => {
    expect(refusal(() => fromCatalogueRow(from as never, by as never))).toMatchObject({ code, path });
  });
});
