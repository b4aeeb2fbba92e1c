// Errors in ulps against tables made with mpmath (tests/reference/scripts/make_elementary.py), in five
// regimes each. The bounds are the proved ones (tests/reference/scripts/prove_elementary.py).
import { createHash } from "node:crypto";
import fs from "node:fs";
import { describe, expect, it, test } from "vitest";
import proof from "../reference/elementary/bounds.json" with { type: "json" };
import { fingerprint } from "../reference/scripts/elementary/dump.mjs";
import { every } from "./every.ts";
import { errorInUlps, next, previous, readTable } from "./ulps.ts";

const bounds: Record<string, { normal: number; subnormal?: number }> = proof.bounds;
/** The tables give the exact result to within this many ulps. */
const TABLE_ERROR = 0.5e-5;

const cases = Object.entries(every).flatMap(([name, evaluate]) =>
  [...readTable(name)].map(([regime, rows]) => ({ name, regime, rows, evaluate })),
);

test("every function has a table of five regimes", () => {
  expect(cases).toHaveLength(5 * Object.keys(every).length);
  for (const { name, rows } of cases) expect(rows).toHaveLength(name === "power" ? 120 : 200);
});

test.each(cases)("$name: $regime", ({ name, regime, rows, evaluate }) => {
  const { normal, subnormal } = bounds[name] ?? { normal: 0 };
  const bound = regime === "subnormal results" ? (subnormal ?? 0) : normal;
  const worst = Math.max(...rows.map((row) => errorInUlps(evaluate(row.arguments), row)));
  expect(worst).toBeLessThan(bound + TABLE_ERROR);
  // the best that a double can do is half an ulp: a measure that finds much less has not measured
  expect(worst).toBeGreaterThan(0.4);
});

describe("the measure", () => {
  const rows = cases.flatMap((it) => it.rows);

  it("sees one step to either side", () => {
    const shifted = rows.flatMap((row) =>
      [next(row.result), previous(row.result)].map((x) => errorInUlps(x, row)),
    );
    expect(Math.min(...shifted)).toBeGreaterThan(0.49);
  });

  it("finds a rounded result within half an ulp", () => {
    const errors = rows.map((row) => errorInUlps(row.result, row));
    expect(Math.max(...errors)).toBeLessThan(0.5 + TABLE_ERROR);
  });

  it("counts in the smaller steps below a power of two", () => {
    const below = { arguments: [], result: 1, missing: -0.25 };
    expect(errorInUlps(1, below)).toBe(0.25);
    expect(errorInUlps(previous(1), below)).toBe(0.75);
    expect(errorInUlps(next(1), below)).toBe(2.25);
    expect(errorInUlps(next(1), { ...below, missing: 0.25 })).toBe(0.75);
    expect(errorInUlps(next(-1), { arguments: [], result: -1, missing: 0.25 })).toBe(0.75);
  });
});

test("the proved bounds belong to these sources", () => {
  // otherwise run python3 tests/reference/scripts/prove_elementary.py --write, and bring docs/elementary.md
  // up to date
  expect(proof.sources).toBe(fingerprint());
});

test("the manual states the proved bounds", () => {
  const manual = fs
    .readFileSync(new URL("../../docs/elementary.md", import.meta.url), "utf8")
    .replace(/ +/g, " ");
  for (const [name, { normal, subnormal }] of Object.entries(bounds)) {
    expect(manual).toContain(`| \`${name}\` | ${normal} | ${subnormal ?? "–"} |`);
  }
});

test("the bits are those that were released", () => {
  // the same on every engine; a change of any of them belongs in the changelog
  const hash = createHash("sha256");
  for (const { rows, evaluate } of cases) {
    hash.update(Float64Array.from(rows, (row) => evaluate(row.arguments)));
  }
  expect(hash.digest("hex").slice(0, 16)).toBe("3ec7c7ac752bac9f");
});
