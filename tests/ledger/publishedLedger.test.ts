// Ledgers of published budgets: residual, error, rounding and storage stay apart.
import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { type PublishedBudget, type PublishedLedger, publishedLedger } from "../../src/index.ts";
import { settings } from "../properties/settings.ts";
import { refusal } from "../refusal.ts";
import { published, publishedBy } from "./budgets.ts";

const balance = (ledger: PublishedLedger, place: string) => {
  const found = ledger.balances.find((b) => b.place === place);
  if (!found) throw new Error(`no balance of ${place}`);
  return found;
};

describe.each(published.map((p) => [p.budget.source, p] as const))("%s", (_, { budget, residuals }) => {
  const ledger = publishedLedger(budget);

  test.each(Object.entries(residuals))("leaves over at %s what its printed flows say", (place, residual) => {
    // sums of a dozen decimal fractions near 300
    expect(Math.abs(balance(ledger, place).residual - residual)).toBeLessThan(1e-12);
  });

  test("has the storage that was printed, and no other", () => {
    for (const { name, storage } of ledger.reservoirs) {
      expect(storage).toBe(budget.storage?.[name]?.value ?? null);
    }
    expect(balance(ledger, "top").storage).toBe(budget.storage?.top?.value);
    expect(balance(ledger, "atmosphere")).toMatchObject({ storage: null, unexplained: null });
  });

  test("is explained within its errors or its rounding", () => {
    expect(ledger.notes.filter((note) => note.code === "residual-beyond-error")).toEqual([]);
  });

  test("survives JSON", () => {
    expect(JSON.parse(JSON.stringify(ledger))).toEqual(ledger);
  });
});

describe("errors and rounding", () => {
  test("Stephens et al. print ±17 for the surface; in quadrature √300", () => {
    const surface = balance(publishedLedger(publishedBy("Stephens").budget), "surface");
    expect(surface.error).toEqual([Math.sqrt(300), Math.sqrt(300)]);
    expect(surface.unexplainedError?.[0]).toBeCloseTo(Math.sqrt(300 + 17 * 17), 12);
    expect(surface.withoutError).toEqual([]);
  });

  test("an error with two sides changes sides in a flow that leaves", () => {
    // incoming +1 −0, reflected +0 −4, outgoing +3 −3; storage +0.4 −0.4
    const top = balance(publishedLedger(publishedBy("Wild et al. 2013").budget), "top");
    expect(top.error).toEqual([3, Math.sqrt(1 + 16 + 9)]);
    expect(top.unexplainedError?.[1]).toBeCloseTo(Math.sqrt(26 + 0.16), 12);
    expect(top.unexplained).toBeCloseTo(0.4, 12);
  });

  test("Trenberth et al. state no errors: only rounding bounds what is left", () => {
    const ledger = publishedLedger(publishedBy("Trenberth").budget);
    expect(balance(ledger, "top")).toMatchObject({ error: null, unexplainedError: null });
    expect(balance(ledger, "top").rounding).toBeCloseTo(0.15, 12);
    expect(balance(ledger, "atmosphere").rounding).toBeCloseTo(2.55, 12);
    expect(ledger.notes.map((note) => [note.code, note.about])).toEqual(
      ["top", "sunlight", "atmosphere", "surface"].map((place) => ["error-not-stated", place]),
    );
  });

  test("flows without an error are named", () => {
    const ledger = publishedLedger(publishedBy("L'Ecuyer").budget);
    expect(balance(ledger, "surface").withoutError).toEqual(["sunlight up"]);
    expect(balance(ledger, "surface").error?.[0]).toBeCloseTo(Math.sqrt(25 + 25 + 16 + 16 + 16), 12);
    const note = ledger.notes.find((n) => n.about === "atmosphere");
    expect(note).toMatchObject({ code: "error-not-stated", severity: "info" });
    expect(note?.text).toContain("absorbed by air");
  });
});

const small = (change: Partial<PublishedBudget["flows"][string]>, storage?: PublishedBudget["storage"]) =>
  publishedLedger({
    source: "invented",
    flows: {
      sunlight: { from: "space", to: "surface", value: 240, error: 3 },
      longwave: { from: "surface", to: "space", value: 240, error: 4, ...change },
    },
    ...(storage ? { storage } : {}),
  });

describe("a residual beyond its error", () => {
  test.each([
    [-5, 235],
    [5, 245],
  ])("is let through at the error, √(3² + 4²): %d", (_, value) => {
    expect(small({ value }).notes).toEqual([]);
  });

  test.each([
    [5.1, 234.9],
    [-5.1, 245.1],
  ])("carries a note for every place: %d", (residual, value) => {
    const { notes } = small({ value });
    expect(notes.map((note) => [note.code, note.severity, note.about])).toEqual([
      ["residual-beyond-error", "caution", "top"],
      ["residual-beyond-error", "caution", "surface"],
    ]);
    expect(notes[0]?.value).toBeCloseTo(residual, 12);
    expect(notes[0]?.range).toEqual([-5, 5]);
    expect(notes[0]?.text).toContain("no storage was published");
  });

  test("is measured from the published storage, whose error counts", () => {
    const storage = { surface: { value: 20, error: 12 } };
    expect(small({ value: 233 }, storage).notes.map((note) => note.about)).toEqual(["top"]);
    expect(small({ value: 233 }, { surface: { value: 20.1, error: 12 } }).notes).toHaveLength(2);
  });

  test("is more uncertain below by what the storage may be above", () => {
    const storage = { surface: { value: 0, range: [-1, 9] as const } };
    const surface = balance(small({}, storage), "surface");
    expect(surface.storageError).toEqual([1, 9]);
    expect(surface.unexplainedError).toEqual([Math.sqrt(25 + 81), Math.sqrt(25 + 1)]);
  });

  test("uses the side of the error on which it lies", () => {
    const sided = (value: number) =>
      publishedLedger({
        source: "invented",
        flows: { rain: { from: "space", to: "surface", value, range: [value - 1, value + 9] } },
      });
    // 2 with 1 below it does not reach 0; −2 with 9 above it does
    expect(sided(2).notes).toHaveLength(2);
    expect(sided(-2).notes).toEqual([]);
  });

  test("is not spoken of where neither errors nor last digits are stated, and no top where nothing meets space", () => {
    const ledger = publishedLedger({
      source: "invented",
      flows: { rain: { from: "air", to: "sea", value: 80 }, vapour: { from: "sea", to: "air", value: 70 } },
    });
    expect(ledger.balances.map((b) => [b.place, b.residual])).toEqual([
      ["air", -10],
      ["sea", 10],
    ]);
    expect(ledger.notes.map((note) => note.code)).toEqual(["error-not-stated", "error-not-stated"]);
  });

  test("is let through where rounding alone can make it", () => {
    const rounded = { value: 234, error: 4, lastDigit: 12 };
    expect(small(rounded).notes).toEqual([]);
    expect(small({ ...rounded, lastDigit: 11 }).notes).toHaveLength(2);
    // 5.5 from the flow and half of 1 from the storage
    const storage = { surface: { value: 0, error: 1, lastDigit: 1 } };
    expect(small({ ...rounded, lastDigit: 11 }, storage).notes.map((note) => note.about)).toEqual(["top"]);
  });
});

test("what is left over inside sums to what is left over at the top", () => {
  const places = fc.constantFrom("space", "sunlight", "atmosphere", "surface");
  const flow = fc
    .record({ from: places, to: places, value: fc.double({ min: -500, max: 500, noNaN: true }) })
    .filter(({ from, to }) => from !== to);
  fc.assert(
    fc.property(fc.array(flow, { minLength: 1, maxLength: 20 }), (flows) => {
      const named = Object.fromEntries(flows.map((f, i) => [`flow ${i}`, f]));
      const { balances } = publishedLedger({ source: "invented", flows: named });
      const residuals = (isTop: boolean) =>
        balances.filter((b) => (b.place === "top") === isTop).reduce((sum, b) => sum + b.residual, 0);
      // twenty flows of up to 500, each in two balances
      expect(Math.abs(residuals(true) - residuals(false))).toBeLessThan(1e-11);
    }),
    settings(200),
  );
});

describe("a published ledger refuses", () => {
  const wrong = (value: unknown) => value as never;
  const flows = { rain: { from: "space", to: "surface", value: 1 } };
  test.each<[string, () => unknown, string, string]>([
    ["nothing", () => publishedLedger(wrong(undefined)), "unreadable", "publishedLedger"],
    ["no source", () => publishedLedger(wrong({ flows })), "missing", "publishedLedger.source"],
    ["no flow", () => publishedLedger({ source: "x", flows: {} }), "bad-budget", "publishedLedger.flows"],
    [
      "a flow without a value",
      () => publishedLedger({ source: "x", flows: { rain: wrong({ from: "space", to: "surface" }) } }),
      "missing",
      "publishedLedger.flows.rain.value",
    ],
    [
      "a flow that ends where it begins",
      () => publishedLedger({ source: "x", flows: { rain: { from: "space", to: "space", value: 1 } } }),
      "bad-budget",
      "publishedLedger.flows.rain",
    ],
    [
      "an unknown field",
      () => publishedLedger({ source: "x", flows: { rain: wrong({ ...flows.rain, eror: 1 }) } }),
      "unknown-name",
      "publishedLedger.flows.rain.eror",
    ],
    [
      "an error below 0",
      () => publishedLedger({ source: "x", flows: { rain: { ...flows.rain, error: -1 } } }),
      "out-of-range",
      "publishedLedger.flows.rain.error",
    ],
    [
      "a range without the value",
      () => publishedLedger({ source: "x", flows: { rain: { ...flows.rain, range: [2, 3] } } }),
      "out-of-range",
      "publishedLedger.flows.rain.value",
    ],
    [
      "an error and a range",
      () => publishedLedger({ source: "x", flows: { rain: { ...flows.rain, error: 1, range: [0, 2] } } }),
      "contradiction",
      "publishedLedger.flows.rain",
    ],
    [
      "a reservoir called top",
      () => publishedLedger({ source: "x", flows: { rain: { from: "space", to: "top", value: 1 } } }),
      "reserved-name",
      "publishedLedger.flows",
    ],
    [
      "a storage of no reservoir",
      () => publishedLedger({ source: "x", flows, storage: { surfce: { value: 1 } } }),
      "unknown-name",
      "publishedLedger.storage.surfce",
    ],
    [
      "a storage of space",
      () => publishedLedger({ source: "x", flows, storage: { space: { value: 1 } } }),
      "unknown-name",
      "publishedLedger.storage.space",
    ],
  ])("%s", (_, call, code, path) => {
    expect(refusal(call)).toMatchObject({ code, path });
  });
});
