// Margins in time for a star whose luminosity is tabled or grows at a rate.
import { describe, expect, it, test } from "vitest";
import { appraisePlanet } from "../../src/appraisal/appraisePlanet.ts";
import { toMarkdown } from "../../src/appraisal/toMarkdown.ts";
import { toRows } from "../../src/appraisal/toRows.ts";
import { toText } from "../../src/appraisal/toText.ts";
import tables from "../reference/computed/brightening_tables.json" with { type: "json" };
import { firstOf, snowy } from "./planets.ts";

const GYR = 31557600e9;
const column = (value: readonly number[], unit: string) => ({ value, unit });
/** The budget of the folds in the reference table, at its flux. */
const textbook = (brightening: unknown) => ({
  format: "thermostead-planet-1",
  star: { brightening },
  orbit: { flux: `${tables.flux} W m-2` },
  redistribution: "global",
  albedo: { law: "tanhAlbedo", cold: 0.7, warm: 0.3, midpoint: "265 K", width: "10 K" },
  longwave: { law: "greyEmission", emissivity: 0.6 },
  heatCapacity: "unknown",
});

describe.each(tables.rows)("the track that $track, today at $now Gyr", (row) => {
  const { states } = appraisePlanet(
    textbook({
      time: column(row.time, "Gyr"),
      luminosity: column(row.luminosity, "1"),
      now: `${row.now} Gyr`,
    }),
  );
  // The folds of the table are those for σ = 5.670374419e-8, ours lie 3e-11 of the flux away: where the light grows by no more
  // than a tenth in 1 Gyr, as after the pause, that is 4e-10 Gyr.
  it.each(["rise", "fall"] as const)("meets the fold of its %s when NumPy says, or never", (direction) => {
    const ended = states.map(({ margins }) => margins?.[direction]).find((margin) => margin?.jump);
    expect(ended).toBeDefined();
    const expected = row[direction];
    if (expected === null) expect(ended?.time).toBeNull();
    else expect((ended?.time as number) / GYR).toBeCloseTo(expected, 9);
  });
});

test("the tracks of the reference table meet folds in both directions, and miss some", () => {
  const met = (direction: "rise" | "fall") => tables.rows.filter((row) => row[direction] !== null).length;
  expect([met("rise"), met("fall")]).toEqual([7, 2]);
  expect(tables.rows).toHaveLength(10);
});

const TIMES = [0.1, 2, 4, 6, 8];
const track = (luminosity: readonly number[], fields: object = {}) =>
  snowy({
    star: {
      ...(snowy().star as object),
      brightening: {
        time: { ...column(TIMES.slice(0, luminosity.length), "Gyr"), source: "an invented track" },
        luminosity: { ...column(luminosity, "solLum"), source: "an invented track" },
        now: "4 Gyr",
        ...fields,
      },
    },
  });

describe("a table that goes beyond the fold", () => {
  const appraisal = appraisePlanet(track([0.17, 0.18, 0.2, 0.215, 0.23]));
  // from 4 to 8 Gyr it gains 0.0075 solLum in 1 Gyr, and 0.2 solLum grow by the relative margin
  const rise = firstOf(appraisal).margins?.rise;
  const [relative, time] = [rise?.relative as number, rise?.time as number];

  it("has its time in the record, the text and the rows", () => {
    expect(time / GYR).toBeCloseTo((0.2 * relative) / 0.0075, 9);
    const text = toText(appraisal).replace(/\s+/g, " ");
    expect(text).toContain(`if the star brightens by 8.99 %, in ${(time / GYR).toFixed(2)} Gyr, it ends`);
    expect(toRows(appraisal)).toContainEqual({ name: "states[0].margins.rise.time", value: time, unit: "s" });
    expect(appraisal.notes.map(({ code }) => code)).not.toContain("beyond-table");
    expect(appraisal.missing.map(({ path }) => path)).not.toContain("star.brightening");
    expect(appraisal.brightening).toEqual({
      rate: null,
      table: {
        lasts: expect.closeTo(4 * GYR, -3),
        least: 1,
        most: expect.closeTo(1.15, 12),
        last: expect.closeTo(1.15, 12),
      },
    });
  });

  it("stands in the inputs by column, in rows by value, and once in the sources", () => {
    const text = toText(appraisal);
    expect(text).toMatch(
      /star\.brightening\.time +0\.1, 2, 4, 6, 8 Gyr \(5 values\) +3\.156e\+15 \.\.\. 2\.525e\+17 s/,
    );
    expect(text).toMatch(/star\.brightening\.now +4 Gyr +1\.262e\+17 s/);
    expect(text).not.toContain("value[");
    expect(toMarkdown(appraisal)).toContain("| star.brightening.time | 0.1, 2, 4, 6, 8 Gyr (5 values) |");
    const rows = toRows(appraisal).filter(({ name }) => /^star\.brightening/.test(name));
    expect(rows).toHaveLength(11);
    expect(rows[1]).toEqual({ name: "star.brightening.time.value[1]", value: 2 * GYR, unit: "s" });
    const [source] = appraisal.sources.filter(({ of }) => of.includes("star.brightening.time"));
    expect(source?.of).toEqual(["star.brightening.time", "star.brightening.luminosity"]);
  });

  it("is the same from JSON, and the record survives it", () => {
    const again = JSON.parse(JSON.stringify(appraisal));
    expect(appraisePlanet(again.description)).toEqual(appraisal);
    expect(toText(again)).toBe(toText(appraisal));
  });

  it("is shown by its ends where it is long", () => {
    const long = Array.from({ length: 40 }, (_, i) => i / 4);
    const star = {
      time: column(long, "Gyr"),
      luminosity: column(
        long.map((t) => 0.16 + t / 100),
        "1",
      ),
    };
    const text = toText(appraisePlanet(track([], star)));
    expect(text).toMatch(/star\.brightening\.time +0 \.\.\. 9\.75 Gyr \(40 values\)/);
    expect(text).toMatch(/star\.brightening\.luminosity +0\.16 \.\.\. 0\.2575 \(40 values\)\n/);
  });
});

describe("a table that ends before the fold", () => {
  const appraisal = appraisePlanet(track([0.17, 0.18, 0.2, 0.205]));

  it("has no time, and says how far the table goes", () => {
    const margins = firstOf(appraisal).margins;
    expect(margins?.rise.time).toBeNull();
    const text = toText(appraisal).replace(/\s+/g, " ");
    const said = "if the star brightens by 8.99 %, beyond the star's table, which ends in 2.00 Gyr,";
    expect(text.split(said)).toHaveLength(3);
    const [note, ...others] = appraisal.notes.filter(({ code }) => code === "beyond-table");
    expect(others).toEqual([]);
    expect(note).toMatchObject({ severity: "info", about: "star.brightening", unit: "s" });
    expect(note?.value).toBeCloseTo(2 * GYR, -3);
    expect(note?.text).toBe(
      "until its end the table comes to 1.025 times today's light, and the climate at 246.00 K ends at 1.09 times: when is not told",
    );
    expect(text).toContain("star.brightening 2.00 Gyr: until its end the table comes to 1.025");
    const rows = toRows(appraisal).filter(({ name }) => name.endsWith("laterThan"));
    expect(rows).toEqual([
      { name: "states[0].margins.rise.laterThan", value: expect.closeTo(2 * GYR, -3), unit: "s" },
    ]);
  });

  it("says so also where it ends today", () => {
    const text = toText(appraisePlanet(track([0.17, 0.18, 0.2]))).replace(/\s+/g, " ");
    expect(text).toContain(
      "brightens by 8.99 %, beyond the star's table, which ends today, it ends in a fold",
    );
  });

  it("speaks of fading where the table fades", () => {
    const fading = appraisePlanet(track([0.17, 0.18, 0.2, 0.19]));
    const told = fading.notes.filter(({ code }) => code === "beyond-table").map(({ text }) => text);
    expect(told).toHaveLength(2);
    expect(told[1]).toContain(
      "comes to 0.95 times today's light, and the climate at 287.57 K ends at 0.881 times",
    );
  });
});

test("a star that fades has a time to the end of a climate that it leaves in the cold", () => {
  const star = { ...(snowy().star as object), brightening: "-0.1 Gyr-1" };
  const { states } = appraisePlanet(snowy({ star }));
  const [cold, , warm] = states.map(({ margins }) => margins);
  expect(cold?.rise.time).toBeNull();
  expect((warm?.fall.time as number) / GYR).toBeCloseTo((warm?.fall.relative as number) / 0.1, 9);
});

test("short times are told in years", () => {
  const star = { ...(snowy().star as object), brightening: "3000 Gyr-1" };
  // 8.99 % at 3 ppm a year
  expect(toText(appraisePlanet(snowy({ star })))).toContain("by 8.99 %, in 30000 yr,");
});

test("without a brightening nothing is said of one", () => {
  const { brightening, notes } = appraisePlanet(snowy({ star: { luminosity: "0.2 solLum" } }));
  expect(brightening).toBeNull();
  expect(notes.map(({ code }) => code)).not.toContain("beyond-table");
  expect(appraisePlanet(snowy()).brightening?.table).toBeNull();
});
