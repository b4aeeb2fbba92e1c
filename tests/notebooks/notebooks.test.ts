// The stored notebooks, without Jupyter: their form, and that their outputs are those of the package as built.
import os from "node:os";
import { describe, expect, test } from "vitest";
import { outputDifferences, withOutputs } from "../../.config/notebooks/outputs.mjs";
import { typeErrors } from "../docs/typesOf.ts";
import { notebooks } from "./notebooks.ts";
import { runCells } from "./runCells.ts";

test("there are four", () => {
  expect(notebooks.map(({ file }) => file)).toEqual([
    "catalogue-of-planets.ipynb",
    "feedback-loops-and-folds.ipynb",
    "planet-and-its-climates.ipynb",
    "published-energy-budgets.ipynb",
  ]);
});

describe.each(notebooks)("$file", ({ text, notebook, cells }) => {
  test("is a notebook for Deno's kernel, with text before every cell of code but the first", () => {
    expect([notebook.nbformat, notebook.nbformat_minor]).toEqual([4, 5]);
    expect(notebook.metadata.kernelspec.name).toBe("deno");
    const kinds = notebook.cells.map((cell) => cell.cell_type);
    expect(kinds[0]).toBe("markdown");
    expect(kinds.at(-1)).toBe("markdown");
    expect(kinds.join(" ")).not.toContain("code code");
    expect(new Set(notebook.cells.map(({ id }) => id)).size).toBe(kinds.length);
    expect(cells.length).toBeGreaterThanOrEqual(6);
    expect(cells.length).toBeLessThanOrEqual(12);
    // longer lines do not fit the column that readers of notebooks see
    for (const { code } of cells) expect(code).not.toMatch(/.{97}/);
    expect(JSON.stringify(notebook, null, 1)).toBe(text.trimEnd());
  });

  test("has one result under every cell of code, in order, and no error", () => {
    const code = notebook.cells.filter((cell) => cell.cell_type === "code");
    for (const [i, { outputs = [], execution_count }] of code.entries()) {
      expect(outputs).toMatchObject([{ output_type: "execute_result", execution_count: i + 1 }]);
      expect(execution_count).toBe(i + 1);
    }
    for (const { outputs } of cells) expect(outputs[0]?.["text/plain"]).toBeTruthy();
  });

  test("names no place or machine, and no colour codes", () => {
    expect(text).not.toMatch(/file:|\/(home|root|tmp|work|usr|Users)\/|[A-Z]:\\|\\u001b/);
    expect(text).not.toContain(os.hostname());
  });

  test("gives the stored outputs", async () => {
    const shown = await runCells(cells.map(({ code }) => code));
    const advice = "if the new outputs are meant: npm run notebooks -- --write";
    expect(shown, advice).toEqual(cells.map(({ outputs }) => outputs[0]));
  }, 60_000);
});

test("the code has right types", () => {
  const programs = notebooks.map(({ cells }) => ({
    line: 1,
    fences: cells.map(({ code }) => ({ language: "ts" as const, code: `${code}\n`, offset: 0 })),
  }));
  expect(typeErrors(programs)).toEqual(notebooks.map(() => ""));
}, 60_000);

describe("the comparison of outputs", () => {
  const cell = (output: object) => ({
    cells: [{ cell_type: "code", id: "a", source: "1", execution_count: 7, outputs: [output] }],
  });
  const result = (data: object, count = 1) =>
    cell({ output_type: "execute_result", execution_count: count, metadata: {}, data });
  const stored = result({ "text/plain": ["one\n", "two"], "application/json": { a: [1, 2] } });

  test("ignores counts, the order of forms, and how texts are cut", () => {
    const found = result({ "application/json": { a: [1, 2] }, "text/plain": "one\ntwo" }, 9);
    expect(outputDifferences(stored, found)).toEqual([]);
    expect(withOutputs(stored, found)).toMatchObject({
      cells: [
        { execution_count: 1, outputs: [{ execution_count: 1, data: { "text/plain": ["one\n", "two"] } }] },
      ],
    });
  });

  test.each([
    [
      "another text",
      result({ "text/plain": "one\ntwa", "application/json": { a: [1, 2] } }),
      'a, text/plain: stored "one\\ntwo", now "one\\ntwa"',
    ],
    [
      "another number",
      result({ "text/plain": "one\ntwo", "application/json": { a: [1, 3] } }),
      'a, application/json: stored "{\\"a\\":[1,2]}", now "{\\"a\\":[1,3]}"',
    ],
    [
      "a form that is gone",
      result({ "text/plain": "one\ntwo" }),
      'a, application/json: stored "{\\"a\\":[1,2]}", now "nothing"',
    ],
    ["no output", { cells: [{ ...cell({}).cells[0], outputs: [] }] }, "a has 0 outputs, stored are 1"],
    [
      "an error",
      cell({ output_type: "error", ename: "E", evalue: "no", traceback: [] }),
      "a ends with E: no",
    ],
  ])("sees %s", (_, found, line) => {
    expect(outputDifferences(stored, found)).toEqual([line]);
  });
});
