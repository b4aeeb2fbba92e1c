// The reader of descriptions on the live page: JSON as `JSON.parse` reads it, with the place of every field.
import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { JsonProblem, placeOf, readJson } from "../../.config/site/live/readJson.mjs";

const seed = { seed: 20260417, numRuns: 500 };

/** What a reader makes of a text: the value, or that it is refused. */
function attempt(read: (text: string) => unknown, text: string): unknown {
  try {
    return { value: read(text) };
  } catch {
    return "refused";
  }
}
const own = (text: string): unknown => readJson(text).value;

describe("readJson", () => {
  test("reads what JSON.stringify writes", () => {
    const spaces = fc.constantFrom(0, 2, "\t");
    fc.assert(
      fc.property(fc.jsonValue(), spaces, (value, space) => {
        const text = JSON.stringify(value, null, space);
        expect(own(text)).toEqual(JSON.parse(text));
      }),
      seed,
    );
  });

  test("refuses what JSON.parse refuses, whatever letter is put in or taken out", () => {
    const text = '{ "a": [1, -2.5e3, true, null], "b": { "c": "x\\u0041\\n" }, "d": "" }';
    let refused = 0;
    fc.assert(
      fc.property(
        fc.nat(text.length),
        fc.nat(1),
        fc.constantFrom(...'{}[]",:\\0.e-+ \n\tu', ""),
        (at, cut, letter) => {
          const other = text.slice(0, at) + letter + text.slice(at + cut);
          const expected = attempt(JSON.parse, other);
          if (expected === "refused") refused++;
          expect(attempt(own, other), other).toEqual(expected);
        },
      ),
      seed,
    );
    expect(refused).toBeGreaterThan(100);
  });

  test("knows where every field begins", () => {
    const text =
      '{\n  "star": { "luminosity": "1 solLum" },\n  "covers": [\n    { "share": 1 },\n    2\n  ]\n}';
    const { places } = readJson(text);
    const found = [...places].map(([path, at]) => [path, text.slice(at as number).split("\n")[0]]);
    expect(found).toEqual([
      ["", "{"],
      ["star", '"star": { "luminosity": "1 solLum" },'],
      ["star.luminosity", '"luminosity": "1 solLum" },'],
      ["covers", '"covers": ['],
      ["covers[0]", '{ "share": 1 },'],
      ["covers[0].share", '"share": 1 },'],
      ["covers[1]", "2"],
    ]);
    const lineOf = (path: string) => text.slice(0, placeOf(path, places)).split("\n").length;
    // a field that is not there stands with what should hold it
    expect(["covers[0].share", "covers[0].albedo", "star.mass", "orbit", "description"].map(lineOf)).toEqual([
      4, 4, 2, 1, 1,
    ]);
  });

  test.each([
    ['{\n  "a": 1\n  "b": 2\n}', 2, '"," or "}" wanted'],
    ['{ "a": }', 1, "a value wanted, found }"],
    ["{ a: 1 }", 1, "a field's name in quotes wanted"],
    ['{ "a": 1, "a": 2 }', 1, "the field a is there twice"],
    ['{ "a": 1 } 2', 1, "nothing more wanted"],
    ["", 1, "a value wanted, found the end"],
    ["[".repeat(200), 1, "nested too deeply"],
  ])("says what is wrong with %j", (text, line, message) => {
    try {
      readJson(text);
      expect.unreachable();
    } catch (error) {
      expect(error).toBeInstanceOf(JsonProblem);
      const { at, message: said } = error as InstanceType<typeof JsonProblem>;
      expect(said).toContain(message);
      expect(text.slice(0, at).split("\n").length).toBe(line);
    }
  });
});
