// What holds for the ledgers of any climate.
import fc from "fast-check";
import { describe, expect, test } from "vitest";
import type { Ledger, State } from "../../src/index.ts";
import { bareStates, climates, kinds, layeredStates } from "./climates.ts";
import { settings } from "./settings.ts";

/** Inflow − outflow of a reservoir, in plain arithmetic. */
const gained = ({ flows }: Ledger, name: string): number =>
  flows.reduce((sum, f) => sum + (f.to === name ? f.value : 0) - (f.from === name ? f.value : 0), 0);

/** A dozen roundings of the largest flow. */
const rounding = ({ flows }: Ledger): number =>
  12 * 2 ** -53 * Math.max(...flows.map((f) => Math.abs(f.value)));

function expectClosed(state: State, reservoirs: readonly string[]): void {
  const { ledger } = state;
  expect(ledger.reservoirs.map((r) => r.name)).toEqual(reservoirs);
  for (const { name, storage } of ledger.reservoirs) {
    if (storage === null) continue;
    expect(Math.abs(gained(ledger, name) - storage), name).toBeLessThanOrEqual(rounding(ledger));
  }
  // what all reservoirs take up is what space and the interior give away
  const outside = gained(ledger, "space") + gained(ledger, "interior");
  const stored = ledger.reservoirs.reduce((sum, { storage }) => sum + (storage ?? 0), 0);
  expect(Math.abs(outside + stored)).toBeLessThanOrEqual(rounding(ledger));
}

describe("a surface alone", () => {
  const searched = fc.tuple(kinds, climates).map(([kind, climate]) => bareStates(kind, climate));

  test("the ledger closes, with the storage known apart from the flows", () => {
    fc.assert(
      fc.property(searched, (found) => {
        for (const state of found.states) expectClosed(state, ["space", "surface", "interior"]);
      }),
      settings(200),
    );
  });

  test("heat from the interior is a source: it leaves no reservoir open", () => {
    fc.assert(
      fc.property(searched, (found) => {
        for (const state of found.states) {
          const open = state.notes.filter((note) => note.code === "open-reservoir");
          expect(open.map((note) => note.about)).toEqual([]);
        }
      }),
      settings(30),
    );
  });
});

describe("a surface under a layer", () => {
  const searched = fc.tuple(kinds, climates).map(([kind, climate]) => layeredStates(kind, climate));

  test("the ledger of every reservoir closes", () => {
    fc.assert(
      fc.property(searched, (found) => {
        for (const state of found.states) {
          expectClosed(state, ["space", "surface", "layer"]);
          expect(state.notes.map((note) => note.code)).not.toContain("open-reservoir");
        }
      }),
      settings(200),
    );
  });
});
