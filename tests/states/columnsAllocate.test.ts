// Columns are searched without objects: what a row takes from the heap is next to nothing.
import { execFileSync } from "node:child_process";
import { fileURLToPath } from "node:url";
import { describe, expect, test } from "vitest";

const script = fileURLToPath(new URL("heapOfRows.mjs", import.meta.url));

// In one thread the engine compiles at the same places each time; beside other work it compiles what is ready, and what a row
// takes then depends on what else the machine does. With room for what is new it does not collect in between.
const flags = ["--single-threaded", "--min-semi-space-size=64", "--max-semi-space-size=64"];

const heapOfRows = (population: string): number[] =>
  JSON.parse(execFileSync(process.execPath, [...flags, script, population], { encoding: "utf8" }));

const median = (values: number[]) => [...values].sort((a, b) => a - b)[values.length >> 1];

describe("findStatesFor", () => {
  // One object with two numbers takes about 50 bytes, and a search reads a hundred numbers and more. What is left are numbers
  // that the engine puts on the heap where it calls exp and tanh.
  test.each(["ice", "vapour"])(
    "allocates less than 1,000 bytes a row: %s",
    (population) => {
      expect(median(heapOfRows(population).slice(-20))).toBeLessThan(1000);
    },
    120_000,
  );
});
