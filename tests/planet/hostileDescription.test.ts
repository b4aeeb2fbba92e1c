// What is no description at all is refused quickly and never run.
import { describe, expect, it, test } from "vitest";
import { planetSchema } from "../../src/planet/planetSchema.ts";
import { readPlanet } from "../../src/planet/readPlanet.ts";
import { refusal } from "../refusal.ts";
import { orsolne, orsolneWith, simple } from "./orsolne.ts";

const nested = (depth: number, wrap: (inner: object) => object) => {
  let value: object = {};
  for (let i = 0; i < depth; i++) value = wrap(value);
  return value;
};
const cyclic: Record<string, unknown> = {};
cyclic.self = cyclic;
class Star {
  luminosity = "1 solLum";
}
const trap = new Proxy(
  {},
  {
    ownKeys: () => {
      throw new Error("trap");
    },
  },
);

describe("refused", () => {
  it.each<readonly [string, unknown, string]>([
    ["nothing", undefined, "unreadable"],
    ["null", null, "unreadable"],
    ["a number", 3, "unreadable"],
    ["a JSON text", JSON.stringify(orsolne()), "unreadable"],
    ["a function", () => orsolne(), "unreadable"],
    ["a list", [], "unreadable"],
    ["a date", new Date(0), "unreadable"],
    ["a map", new Map(), "unreadable"],
    ["an instance", orsolneWith({ star: new Star() }), "unreadable"],
    ["a function inside", orsolneWith({ albedo: () => 0.3 }), "unreadable"],
    ["a big integer", orsolneWith({ albedo: 1n }), "unreadable"],
    ["a symbol", orsolneWith({ name: Symbol("x") }), "unreadable"],
    ["a symbol as key", { ...orsolne(), [Symbol("x")]: 1 }, "unreadable"],
    ["a hole in a list", orsolneWith({ notes: new Array(3) }), "unreadable"],
    ["a proxy that throws", orsolneWith({ star: trap }), "unreadable"],
    ["a circle", orsolneWith({ star: cyclic }), "too-large"],
    ["objects nested 10,000 deep", orsolneWith({ star: nested(10_000, (a) => ({ a })) }), "too-large"],
    ["lists nested 10,000 deep", orsolneWith({ notes: nested(10_000, (a) => [a]) }), "too-large"],
    ["10 MB of text", orsolneWith({ notes: ["x".repeat(1e7)] }), "too-large"],
    ["10 MB of short texts", orsolneWith({ notes: new Array(2_500_000).fill("four") }), "too-large"],
    [
      "200,000 fields",
      Object.fromEntries(Array.from({ length: 200_000 }, (_, i) => [`f${i}`, i])),
      "too-large",
    ],
    ["__proto__ as a field", JSON.parse('{ "__proto__": { "albedo": 0.3 } }'), "reserved-name"],
    ["constructor as a field", orsolneWith({ star: JSON.parse('{ "constructor": {} }') }), "reserved-name"],
    ["toString as a field", orsolneWith({ toString: "x" }), "reserved-name"],
  ])("%s", (_, value, code) => {
    const start = performance.now();
    expect(refusal(() => readPlanet(value)).code).toBe(code);
    // a tenth of a second or less on an idle machine; the bound leaves room for one with twenty other jobs
    expect(performance.now() - start).toBeLessThan(5000);
  });

  test("an accessor, without calling it", () => {
    let called = false;
    const value = Object.defineProperty(orsolne(), "albedo", {
      enumerable: true,
      get: () => {
        called = true;
        return 0.3;
      },
    });
    expect(refusal(() => readPlanet(value)).code).toBe("unreadable");
    expect(called).toBe(false);
  });
});

test("inherited fields are not read: Object.prototype stays as it is", () => {
  expect(
    refusal(() => readPlanet(JSON.parse('{ "star": { "__proto__": { "luminosity": "1 solLum" } } }'))).path,
  ).toBe("star.__proto__");
  expect(({} as { luminosity?: string }).luminosity).toBeUndefined();
});

test("objects without a prototype are plain data", () => {
  const bare = Object.assign(Object.create(null), simple());
  expect(readPlanet(bare).flux).toBe(1361);
});

test("the Standard Schema reports the same errors without throwing", () => {
  const { validate } = planetSchema["~standard"];
  const bad = orsolneWith({
    albedo: {
      covers: [
        { share: 0.5, albedo: 0.3 },
        { share: 0.5, albedo: 3 },
      ],
    },
  });
  expect(validate(bad)).toEqual({
    issues: [{ message: refusal(() => readPlanet(bad)).message, path: ["albedo", "covers", 1, "albedo"] }],
  });
  expect(validate(orsolne())).toEqual({ value: orsolne() });
  expect(validate(null)).toMatchObject({ issues: [{ path: [] }] });
});
