// A star whose luminosity is tabled: what is read of the table, and what is refused.
import { describe, expect, it, test } from "vitest";
import { planetSchema } from "../../src/planet/planetSchema.ts";
import type { PlanetDescription } from "../../src/planet/planetShape.ts";
import { readPlanet } from "../../src/planet/readPlanet.ts";
import { refusal } from "../refusal.ts";
import { simple } from "./orsolne.ts";

const TIMES = [0.5, 2, 4.6, 8];
const LIGHTS = [0.3, 0.36, 0.42, 0.55];
const column = (value: unknown, unit: unknown = "Gyr") => ({ value, unit });
const table = (fields: object = {}) => ({
  time: column(TIMES),
  luminosity: column(LIGHTS, "solLum"),
  now: "4600 Myr",
  ...fields,
});
const lit = (brightening: unknown, star: object = {}) =>
  simple({
    star: { luminosity: "0.42 solLum", brightening, ...star },
    orbit: { semiMajorAxis: "0.61 au" },
  });
// the Julian year and the solar luminosity of IAU 2015 B3
const GYR = 31557600e9;
const SUN = 3.828e26;

describe("a table", () => {
  const planet = readPlanet(lit(table()));

  it("is a fact in SI, in the form that tippingMargins takes", () => {
    const [star] = planet.facts.stars;
    expect(star?.brightening).toBeNull();
    expect(star?.brighteningTable?.now).toBeCloseTo(4.6 * GYR, -3);
    expect(star?.brighteningTable?.table).toEqual(
      TIMES.map((time, i) => ({
        time: expect.closeTo(time * GYR, -3),
        luminosity: expect.closeTo((LIGHTS[i] as number) * SUN, -15),
      })),
    );
  });

  it("has each value as an input under its path, as it is written", () => {
    const own = planet.inputs.filter(({ path }) => path.includes("brightening"));
    expect(own.map(({ path, written }) => `${path}: ${written}`)).toEqual([
      ...TIMES.map((time, i) => `star.brightening.time.value[${i}]: ${time} Gyr`),
      ...LIGHTS.map((light, i) => `star.brightening.luminosity.value[${i}]: ${light} solLum`),
      "star.brightening.now: 4600 Myr",
    ]);
    expect(planet.loop.givens.filter(({ name }) => name.includes("brightening"))).toEqual([]);
    expect(planet.notes.filter(({ code }) => code === "input-unused")).toEqual([]);
    expect(planet.units).toContainEqual({ name: "star.brightening.time.value[1]", unit: "Gyr", size: GYR });
  });

  it("survives JSON, is taken by the schema, and does not change the planet", () => {
    const description = lit(table());
    expect(planet.description).toEqual(description);
    expect(readPlanet(JSON.parse(JSON.stringify(planet.description))).facts).toEqual(planet.facts);
    expect(planetSchema["~standard"].validate(description)).toEqual({ value: description });
    const { brightening: _, ...bare } = planet.description.star as { brightening: unknown };
    expect(readPlanet({ ...planet.description, star: bare }).loop.givens).toEqual(planet.loop.givens);
  });

  it("may have shares of any one luminosity, which are compared with none", () => {
    const relative = { luminosity: column([0.5, 0.7, 1.3, 2], "1") };
    const { facts, notes } = readPlanet(lit(table(relative)));
    expect(facts.stars[0]?.brighteningTable?.table.map(({ luminosity }) => luminosity)).toEqual([
      0.5, 0.7, 1.3, 2,
    ]);
    expect(notes.filter(({ about }) => about.includes("brightening"))).toEqual([]);
  });

  it("agrees with the luminosity of the star, or is refused, or noted where that is asked", () => {
    expect(planet.notes).toContainEqual(
      expect.objectContaining({ code: "inputs-agree", about: "star.brightening", unit: "W" }),
    );
    // half way between 2 and 4.6 Gyr it has 0.39 solLum, 7 % less than 0.42
    const other = lit(table({ now: "3.3 Gyr" }));
    const error = refusal(() => readPlanet(other));
    expect(error).toMatchObject({ code: "contradiction", path: "star.brightening", unit: "W" });
    expect(error.value).toBeCloseTo(0.39 * SUN, -15);
    expect(error.allowed).toContain('shares of any one, with the unit "1", or 2 % around');
    const { notes } = readPlanet(other, { contradictions: "note" });
    expect(notes.find(({ code }) => code === "inputs-contradict")?.text).toBe(
      "star.brightening (its table, today) gives another luminosity than star.luminosity (0.42 solLum), which is used: 1.49292e+26 against 1.60776e+26 W",
    );
  });

  it("stands at a star of a list, and a note says that several stars have no margins", () => {
    const star = [
      { luminosity: "0.42 solLum", brightening: table() },
      { luminosity: "0.1 solLum", brightening: "0.05 Gyr-1" },
    ];
    const { facts, notes } = readPlanet(simple({ star, orbit: { semiMajorAxis: "0.61 au" } }));
    expect(facts.stars.map((one) => one.brighteningTable?.table.length ?? null)).toEqual([4, null]);
    const idle = notes.filter(({ code }) => code === "input-unused");
    expect(idle.map(({ about }) => about)).toEqual(["star[0].brightening", "star[1].brightening"]);
    expect(idle[0]?.text).toContain("several stars shine");
  });
});

type Case = readonly [what: string, brightening: unknown, code: string, path: string, allowed: string];
const at = (path: string) => `star.brightening${path}`;
const UNSORTED = "a time above the one before it, 4.6 Gyr";
const CASES: readonly Case[] = [
  [
    "times that fall",
    table({ time: column([0.5, 4.6, 2, 8]) }),
    "out-of-range",
    at(".time.value[2]"),
    UNSORTED,
  ],
  [
    "a time twice",
    table({ time: column([0.5, 4.6, 4.6, 8]) }),
    "out-of-range",
    at(".time.value[2]"),
    UNSORTED,
  ],
  [
    "one row",
    table({ time: column([4.6]), luminosity: column([0.42], "solLum") }),
    "unreadable",
    at(".time.value"),
    "a list of 2 to 1000 numbers",
  ],
  ["no rows", table({ time: column([]) }), "unreadable", at(".time.value"), "a list of 2 to 1000 numbers"],
  [
    "columns of different lengths",
    table({ luminosity: column([0.3, 0.42], "solLum") }),
    "contradiction",
    at(".luminosity.value"),
    "4, one for each time",
  ],
  [
    "a luminosity of 0",
    table({ luminosity: column([0, 0.36, 0.42, 0.55], "solLum") }),
    "out-of-range",
    at(".luminosity.value[0]"),
    "1 to 1e+40",
  ],
  [
    "a share below 0",
    table({ luminosity: column([0.3, 0.36, 0.42, -1], "1") }),
    "out-of-range",
    at(".luminosity.value[3]"),
    "1e-9 to 1000000000",
  ],
  [
    "today before the table",
    table({ now: "400 Myr" }),
    "out-of-range",
    at(".now"),
    "the time of today inside the table, 0.5 Gyr to 8 Gyr",
  ],
  [
    "today after the table",
    table({ now: "9 Gyr" }),
    "out-of-range",
    at(".now"),
    "the time of today inside the table, 0.5 Gyr to 8 Gyr",
  ],
  ["today as a bare number", table({ now: 4.6 }), "unreadable", at(".now"), 'as in "4.6 Gyr"'],
  ["no time of today", table({ now: undefined }), "missing", at(".now"), 'as in "4.6 Gyr"'],
  ["no luminosities", table({ luminosity: undefined }), "missing", at(".luminosity"), "{ value, unit }"],
  ["a bare list", table({ time: TIMES }), "unreadable", at(".time"), "{ value, unit }: a list of numbers"],
  [
    "a text among numbers",
    table({ time: column([0.5, "2", 4.6, 8]) }),
    "not-a-number",
    at(".time.value[1]"),
    "a number",
  ],
  [
    "NaN",
    table({ time: column([0.5, 2, 4.6, Number.NaN]) }),
    "not-a-number",
    at(".time.value[3]"),
    "a number",
  ],
  ["a column without a unit", table({ time: { value: TIMES } }), "missing", at(".time.unit"), '"Gyr"'],
  [
    "a unit of another kind",
    table({ time: column(TIMES, "K") }),
    "unit-mismatch",
    at(".time.unit"),
    "s, as in",
  ],
  [
    "an unknown unit",
    table({ luminosity: column(LIGHTS, "Lsun") }),
    "unknown-unit",
    at(".luminosity.unit"),
    "solLum",
  ],
  [
    "errors of a column",
    table({ time: { ...column(TIMES), plus: 1 } }),
    "unknown-name",
    at(".time.plus"),
    "value, unit",
  ],
  [
    "rows in place of columns",
    { table: [{ time: 0, luminosity: 1 }], now: "0 Gyr" },
    "unknown-name",
    at(".table"),
    "time, luminosity, now",
  ],
  ["a list", [1, 2], "unreadable", at(""), "or a table { time, luminosity, now }"],
  ["a bare rate", 0.05, "unit-mismatch", at(""), 'as in "0.05 Gyr-1"'],
];

describe("is refused for", () => {
  it.each(CASES)("%s", (_, brightening, code, path, allowed) => {
    const error = refusal(() => readPlanet(lit(brightening)));
    expect({ code: error.code, path: error.path }).toEqual({ code, path });
    expect(error.allowed).toContain(allowed);
  });

  test("all faults of a table are told at once, a wrong unit of a column once", () => {
    const error = refusal(() =>
      readPlanet(
        lit(
          table({
            time: column(TIMES, "Lsun"),
            luminosity: column([0, 0.36, 0.42, 0], "solLum"),
            now: "1 K",
          }),
          { radius: "-1 solRad" },
        ),
      ),
    );
    expect([error, ...error.others].map(({ path }) => path)).toEqual([
      "star.radius",
      "star.brightening.time.unit",
      "star.brightening.luminosity.value[0]",
      "star.brightening.luminosity.value[3]",
      "star.brightening.now",
    ]);
  });

  test("beside a fault of the shape the rest of a table is read", () => {
    const wrong = lit(table({ time: column([0.5, "2", 4.6, 8]), luminosity: column(LIGHTS, "K") }));
    const error = refusal(() => readPlanet(wrong));
    expect([error, ...error.others].map(({ path }) => path)).toEqual([
      "star.brightening.time.value[1]",
      "star.brightening.luminosity.unit",
    ]);
  });
});

test("a table is typed", () => {
  const star: PlanetDescription["star"] = {
    luminosity: "0.42 solLum",
    brightening: {
      time: { value: [0, 4.6], unit: "Gyr" },
      luminosity: { value: [0.3, 0.42], unit: "solLum", source: "invented" },
      now: { value: 4.6, unit: "Gyr" },
    },
  };
  expect(readPlanet(simple({ star, orbit: { semiMajorAxis: "0.61 au" } })).inputs.at(1)?.value).toBe(0);
  // @ts-expect-error a table without the time of today
  const timeless: PlanetDescription["star"] = { brightening: { time: { value: [0], unit: "s" } } };
  expect(() => readPlanet(simple({ star: timeless }))).toThrow();
});
