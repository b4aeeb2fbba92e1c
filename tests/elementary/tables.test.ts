// The tables: what they hold, that nothing happens before their first use, and that the order of first use
// is nothing.
import { gzipSync } from "node:zlib";
import { buildSync, transformSync } from "esbuild";
import { beforeEach, describe, expect, it, vi } from "vitest";
import { readNumbers } from "./ulps.ts";

beforeEach(() => vi.resetModules());

const modules = {
  exp: () => import("../../src/ground/elementary/exp.ts"),
  log: () => import("../../src/ground/elementary/log.ts"),
  tanh: () => import("../../src/ground/elementary/tanh.ts"),
  expm1: () => import("../../src/ground/elementary/expm1.ts"),
  log1p: () => import("../../src/ground/elementary/log1p.ts"),
  power: () => import("../../src/ground/elementary/power.ts"),
  cosSin: () => import("../../src/ground/elementary/cosSin.ts"),
};
type Name = keyof typeof modules;
const names = Object.keys(modules) as Name[];

/** Results of all functions in fresh modules, first used in this order. */
async function resultsInOrder(order: Name[]): Promise<Record<string, number[]>> {
  vi.resetModules();
  const results: Record<string, number[]> = {};
  for (const name of order) {
    for (const [key, of] of Object.entries(await modules[name]())) {
      const call = of as (x: number, y: number) => number;
      results[key] = [0.3, 1.7, 12.345, 41, 0.001, 700].map((x) => call(x, 1.3));
    }
  }
  return results;
}

describe("the tables", () => {
  const rows = readNumbers("tables");

  it("of exp: the correctly rounded double, and the rest to 2^-102", async () => {
    const { expHigh, expLow, fillExpTable } = await import("../../src/ground/elementary/expTable.ts");
    fillExpTable();
    expect([...expHigh]).toEqual(rows.map((row) => row[0]));
    const off = rows.map((row, j) => Math.abs((expLow[j] as number) - (row[1] as number)));
    expect(Math.max(...off)).toBeLessThan(2 ** -102);
  });

  it("of log: the reciprocals, the correctly rounded multiple of 2^-42, and the rest to 2^-74", async () => {
    const table = await import("../../src/ground/elementary/logTable.ts");
    table.fillLogTable();
    expect([...table.reciprocal]).toEqual(rows.map((row) => (row[2] as number) / 512));
    expect([...table.logHigh]).toEqual(rows.map((row) => row[3]));
    const off = rows.map((row, j) => Math.abs((table.logLow[j] as number) - (row[4] as number)));
    expect(Math.max(...off)).toBeLessThan(2 ** -74);
    // next to 1 the logarithm is nothing but the series: there the table must be 0 exactly
    expect([table.logHigh[0], table.logLow[0], table.logHigh[127], table.logLow[127]]).toEqual([0, 0, 0, 0]);
  });

  it("are empty until a function is called", async () => {
    const { expHigh } = await import("../../src/ground/elementary/expTable.ts");
    const { reciprocal } = await import("../../src/ground/elementary/logTable.ts");
    for (const name of names) await modules[name]();
    expect([expHigh[0], reciprocal[0]]).toEqual([0, 0]);
    (await modules.tanh()).tanh(1);
    expect([expHigh[0], reciprocal[0]]).toEqual([1, 0]);
    (await modules.log1p()).log1p(1);
    expect(reciprocal[0]).toBe(1);
  });

  it("give the same bits whichever function is called first", async () => {
    const reference = await resultsInOrder(names);
    expect(Object.keys(reference)).toHaveLength(8);
    for (const first of names) {
      const others = names.filter((name) => name !== first).reverse();
      expect(await resultsInOrder([first, ...others])).toEqual(reference);
    }
  });
});

describe("a bundler", () => {
  const bundle = (files: string[], minify: boolean): string => {
    const contents = files.map((file) => `export * from "./src/ground/elementary/${file}.ts";`).join("\n");
    const stdin = { contents, resolveDir: process.cwd() };
    const { outputFiles } = buildSync({ stdin, bundle: true, minify, format: "esm", write: false });
    return outputFiles?.[0]?.text ?? "";
  };

  it("can drop all of it: loading has no effects", () => {
    const code = bundle(names, false);
    expect(code).toContain("new Float64Array");
    const withoutExports = code.replace(/export \{[^}]*\};/, "");
    expect(transformSync(withoutExports, { treeShaking: true, format: "esm" }).code.trim()).toBe("");
  });

  it("keeps only the table that is needed", () => {
    const logTable = "67108864";
    const expTable = "184.6649652337873";
    expect(bundle(["exp", "tanh"], true)).not.toContain(logTable);
    expect(bundle(["log"], true)).not.toContain(expTable);
    expect(bundle(["cosSin", "minMax"], true)).not.toMatch(`${logTable}|${expTable}`);
    expect(bundle(["power"], true)).toMatch(
      new RegExp(`${logTable}.*${expTable}|${expTable}.*${logTable}`, "s"),
    );
  });

  it("makes exp, log and tanh at most 1750 bytes, gzipped", () => {
    expect(gzipSync(bundle(["exp", "log", "tanh"], true), { level: 9 }).length).toBeLessThanOrEqual(1750);
  });
});
