// Columns, single searches, and searches box by box: the same bits.
import { describe, expect, test } from "vitest";
import { budgetsOf } from "../../bench/budgets.mjs";
import { columnsOf, rowOf, WITHIN } from "../../bench/populations.mjs";
import * as core from "../../src/index.ts";
import { allowGeneration } from "../../src/reading/generation.ts";
import { atOnce, endsOf } from "../../src/search/enclosed.ts";
import { enumerateZeros } from "../../src/search/enumerateZeros.ts";
import { enclosedBalance } from "../../src/states/enclosedBalance.ts";
import { enumerateBalance } from "../../src/states/provedSearch.ts";
import { StateCollector } from "../../src/states/stateColumns.ts";

const within = WITHIN as [number, number];
const ROWS = 400;

test("a row may have more states than are made room for at once", () => {
  const collector = new StateCollector(2);
  const found = Array.from({ length: 100 }, (_, i) => ({
    at: 200 + i,
    slope: 0.5 - (i % 2),
    slopeSign: 1 - 2 * (i % 2),
  }));
  collector.add(0, "proved", found, 100);
  collector.add(1, "proved", found, 1);
  const { temperatures, feedbackParameters, stability, first } = collector.columns();
  expect([...first]).toEqual([0, 100, 101]);
  expect([...temperatures]).toEqual([...found.map((f) => f.at), 200]);
  expect([...feedbackParameters]).toEqual([...found.map((f) => f.slope), 0.5]);
  expect([...stability]).toEqual([...found.map((f) => f.slopeSign), 1]);
});

test("the ends of a declared range belong to it", () => {
  const loop = core.closeLoop(({ temperature, given }) => ({
    heating: { sunlight: given("heat", 240, "W m-2", { within: [100, 300] }) },
    cooling: { longwave: core.greyEmission({ temperature, emissivity: 1 }) },
    heatCapacity: 1,
  }));
  const heat = [100, 300, 100 - 1e-12, 300 + 1e-12];
  const { counts, reasons } = core.findStatesFor(loop, { heat }, { within });
  expect([...counts]).toEqual([1, 1, 0, 0]);
  expect(reasons.map((r) => [r.row, r.code])).toEqual([
    [2, "out-of-range"],
    [3, "out-of-range"],
  ]);
});

describe.each(["ice", "vapour"] as const)("%s", (name) => {
  const loop = core.closeLoop(budgetsOf(core)[name]);
  const columns = columnsOf(name, ROWS);
  const found = core.findStatesFor(loop, columns, { within });
  const rowsOf = (it: core.StateColumns, row: number) => {
    const [start, end] = [it.first[row], it.first[row + 1]];
    return [it.temperatures, it.feedbackParameters, it.stability].map((list) => [
      ...list.subarray(start, end),
    ]);
  };

  test("rows give what findStates gives", () => {
    const signs = { stable: -1, undecided: 0, unstable: 1 };
    for (let row = 0; row < ROWS; row++) {
      const { states, complete } = core.findStates(loop, { within, at: rowOf(columns, row) });
      expect(complete).toBe(true);
      expect(rowsOf(found, row)).toEqual([
        states.map((s) => s.temperature),
        states.map((s) => s.feedbackParameter),
        states.map((s) => signs[s.stability]),
      ]);
    }
  });

  test("a row does not depend on its neighbours", () => {
    const turned = Object.fromEntries(
      Object.entries(columns).map(([given, column]) => [given, column.slice().reverse()]),
    );
    const again = core.findStatesFor(loop, turned, { within });
    for (let row = 0; row < ROWS; row++) expect(rowsOf(again, ROWS - 1 - row)).toEqual(rowsOf(found, row));
  });

  test("reading ends first gives the brackets of reading whole boxes, and so does the interpreter", () => {
    const balance = enclosedBalance(loop);
    allowGeneration(false);
    const interpreted = enclosedBalance(loop);
    allowGeneration(true);
    for (let row = 0; row < ROWS / 4; row++) {
      const givens = loop.givens.map((g) => rowOf(columns, row)[g.name] as number);
      for (const it of [balance, interpreted]) it.set(givens, givens);
      const by = enumerateBalance(balance, within, 500);
      const whole = endsOf(atOnce(balance.net));
      expect(enumerateZeros(whole, within, balance.limits)).toEqual(by);
      expect(enumerateBalance(interpreted, within, 500)).toEqual(by);
    }
  });
});
