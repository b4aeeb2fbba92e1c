// The record of an appraisal is plain frozen data that leaves its description alone.
import fs from "node:fs";
import { describe, expect, it, test } from "vitest";
import { appraisePlanet } from "../../src/appraisal/appraisePlanet.ts";
import { toMarkdown } from "../../src/appraisal/toMarkdown.ts";
import { toRows } from "../../src/appraisal/toRows.ts";
import { toText } from "../../src/appraisal/toText.ts";
import { refusal } from "../refusal.ts";
import { plain, snowy, without } from "./planets.ts";

const appraisal = appraisePlanet(snowy());

test("survives JSON, and so do its reports", () => {
  const again = JSON.parse(JSON.stringify(appraisal));
  expect(again).toEqual(appraisal);
  for (const write of [toText, toMarkdown, toRows]) expect(write(again)).toEqual(write(appraisal));
});

test("survives JSON also with -0 in the description, which is 0 there", () => {
  for (const albedo of [-0, { value: -0, unit: "1", plus: -0 }]) {
    const of = appraisePlanet(plain({ albedo, internalHeat: "-0 W m-2" }));
    expect(JSON.parse(JSON.stringify(of))).toEqual(of);
  }
});

test("is frozen to its depth", () => {
  const thawed = (value: unknown, path: string): string[] =>
    typeof value === "object" && value !== null
      ? [
          ...(Object.isFrozen(value) ? [] : [path]),
          ...Object.entries(value).flatMap(([key, part]) => thawed(part, `${path}.${key}`)),
        ]
      : [];
  expect(thawed(appraisal, "appraisal")).toEqual([]);
  expect(thawed({ a: [] }, "planted")).toEqual(["planted", "planted.a"]);
});

test("holds a copy of the description, which stays as it was", () => {
  const description = snowy();
  const before = structuredClone(description);
  const { description: kept } = appraisePlanet(description);
  expect(kept).toEqual(description);
  expect(kept).not.toBe(description);
  expect(Object.isFrozen(description)).toBe(false);
  expect(Object.isFrozen(description.star)).toBe(false);
  expect(description).toEqual(before);
});

test("has the version of the package", () => {
  const { version } = JSON.parse(fs.readFileSync("package.json", "utf8"));
  expect(appraisal.version).toBe(version);
});

test("says nothing of life, and gives no score", () => {
  const text = toText(appraisal);
  expect(text).not.toMatch(/habitable(?! ?zone)|score|\blife\b|probab/i);
  expect(JSON.stringify(Object.keys(appraisal))).not.toMatch(/score|habitability/i);
});

describe("what is wrong is refused as by readPlanet", () => {
  it.each([
    ["no object", "{}", "unreadable", "description"],
    ["nothing", undefined, "unreadable", "description"],
    ["a list", [], "unreadable", "description"],
    ["another format", plain({ format: "x" }), "unreadable", "format"],
    ["a misspelt field", plain({ albdo: 0.3 }), "unknown-name", "albdo"],
    ["an albedo above 1", plain({ albedo: 1.2 }), "out-of-range", "albedo"],
    ["a null for an albedo", plain({ albedo: null }), "not-a-number", "albedo"],
    ["no orbit", without(plain(), "orbit"), "missing", "orbit"],
    ["no distance", plain({ orbit: {} }), "missing", "orbit.semiMajorAxis"],
    ["no light", plain({ star: {} }), "missing", "star.luminosity"],
  ])("%s", (_, description, code, path) => {
    expect(refusal(() => appraisePlanet(description))).toMatchObject({ code, path });
  });

  test("an accessor is not called", () => {
    let called = false;
    const description = Object.defineProperty(plain(), "albedo", {
      enumerable: true,
      get() {
        called = true;
        return 0.3;
      },
    });
    expect(refusal(() => appraisePlanet(description))).toMatchObject({ code: "unreadable", path: "albedo" });
    expect(called).toBe(false);
  });

  it.each([
    ["an unknown option", { whithin: [1, 2] }, "unknown-name"],
    ["a range that is reversed", { within: [300, 200] }, "out-of-range"],
    ["no effort", { effort: Number.NaN }, "not-a-number"],
  ])("%s", (_, options, code) => {
    expect(refusal(() => appraisePlanet(plain(), options as never))).toMatchObject({ code });
    // and so of a planet without a budget to search
    const incomplete = without(plain(), "longwave");
    expect(refusal(() => appraisePlanet(incomplete, options as never))).toMatchObject({ code });
  });
});
