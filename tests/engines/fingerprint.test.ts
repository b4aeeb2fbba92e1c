// The comparison of engines can fail: one bit changes a fingerprint, and a changed fingerprint is named.
import { describe, expect, it } from "vitest";
import { differences } from "../../.config/engines/differences.mjs";
import { Fingerprint } from "./fingerprint.ts";

const printOf = (value: unknown): string => {
  const print = new Fingerprint();
  print.result(value);
  return print.text;
};

describe("a fingerprint", () => {
  it("begins with the published basis of FNV-1a (from memory)", () => {
    expect(printOf("")).toBe("811c9dc5");
  });

  it.each([
    ["the last bit of a number", 1, 1 + Number.EPSILON],
    ["the sign of zero", 0, -0],
    ["a text", "fold", "corner"],
    ["a name", { low: 1 }, { high: 1 }],
    ["the order of a list", [1, 2], [2, 1]],
    ["where a list ends", [[1], 2], [[1, 2]]],
    ["null and what is missing", { a: null }, {}],
    ["what lies deep", { a: { b: [{ c: 288 }] } }, { a: { b: [{ c: 288.00000000000006 }] } }],
  ])("tells %s", (_, a, b) => {
    expect(printOf(a)).not.toBe(printOf(b));
    expect(printOf(a)).toBe(printOf(structuredClone(a)));
  });

  it("takes every NaN as one, because engines choose its bits", () => {
    const other = new Float64Array(Uint32Array.of(1, 0xfff80000).buffer)[0];
    expect(printOf(Number.NaN)).toBe(printOf(other));
  });
});

describe("differences", () => {
  const report = (values: Record<string, string>, searches: Record<string, string>) => ({
    values: { prints: values },
    searches: { prints: searches },
  });

  it("are none between equal reports", () => {
    expect(differences(report({ a: "1" }, { b: "2" }), report({ a: "1" }, { b: "2" }))).toEqual([]);
  });

  it("are named, of values and of searches, also where one is missing", () => {
    const left = report({ a: "1", c: "3" }, { b: "2" });
    const right = report({ a: "9", c: "3" }, { b: "2", d: "4" });
    expect(differences(left, right)).toEqual(["a", "d"]);
  });

  it("are counted beyond a handful", () => {
    const many = (text: string) => Object.fromEntries(["a", "b", "c"].map((name) => [name, text]));
    expect(differences(report(many("1"), {}), report(many("2"), {}), 2)).toEqual([
      "a",
      "b",
      "1 more of the values",
    ]);
  });
});
