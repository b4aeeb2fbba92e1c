// Columns are searched without objects: what one row more takes from the heap is next to nothing.
import v8 from "node:v8";
import vm from "node:vm";
import { describe, expect, test } from "vitest";
import { budgetsOf } from "../../bench/budgets.mjs";
import { columnsOf, WITHIN } from "../../bench/populations.mjs";
import * as core from "../../src/index.ts";

v8.setFlagsFromString("--expose-gc");
const collect = vm.runInNewContext("gc") as () => void;

const part = (columns: Readonly<Record<string, Float64Array>>, from: number, rows: number) =>
  Object.fromEntries(
    Object.entries(columns).map(([name, column]) => [name, column.subarray(from, from + rows)]),
  );

describe("findStatesFor", () => {
  // One object with two numbers takes about 50 bytes, and a search reads a hundred numbers and more. What is left are numbers
  // that the engine puts on the heap where it calls exp and tanh.
  test.each(["ice", "vapour"] as const)(
    "allocates less than 1,000 bytes a row: %s",
    (name) => {
      const loop = core.closeLoop(budgetsOf(core)[name]);
      const columns = columnsOf(name, 20_000);
      const within = WITHIN as [number, number];
      const heapOf = (rows: number, from: number): number => {
        const few = part(columns, from, rows);
        collect();
        const before = process.memoryUsage().heapUsed;
        core.findStatesFor(loop, few, { within });
        return process.memoryUsage().heapUsed - before;
      };
      // Until the engine has compiled everything, it allocates for each operation; and now and then it collects in between. So
      // what counts are three measurements in a row.
      let inRow = 0;
      let last = Number.NaN;
      for (let attempt = 0; attempt < 300 && inRow < 3; attempt++) {
        core.findStatesFor(loop, part(columns, (attempt % 10) * 2000, 2000), { within });
        const from = attempt * 60;
        last = (heapOf(60, from) - heapOf(10, from)) / 50;
        inRow = Math.abs(last) < 1000 ? inRow + 1 : 0;
      }
      expect({ inRow, last }).toMatchObject({ inRow: 3 });
    },
    120_000,
  );
});
