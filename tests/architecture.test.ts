// The house stands: floors, doors, no circles, no arithmetic that differs between engines, no stray words.
// The planted faults show that each checker can fail.
import { describe, expect, it, test } from "vitest";
import { doors } from "../.config/doors.mjs";
import { arithmeticFaults } from "./architecture/arithmetic.ts";
import { sourceTexts, textsIn, topTexts } from "./architecture/files.ts";
import { cycles, importFaults, placeFaults } from "./architecture/house.ts";
import { wordFaults } from "./architecture/words.ts";

const sources = sourceTexts();
const everywhere = [
  ...topTexts(),
  ...["src", "tests", "bench", "docs", ".config"].flatMap((folder) => [...textsIn(folder)]),
];

describe("the sources", () => {
  test("are found", () => {
    expect(sources.has("index.ts")).toBe(true);
    expect(everywhere.map(([file]) => file)).toContain("tests/architecture.test.ts");
  });

  test("import downwards only, and packages on the top floor only", () => {
    expect(importFaults(sources)).toEqual([]);
  });

  test("have no circle of imports", () => {
    expect(cycles(sources)).toEqual([]);
  });

  test("stand in known rooms; the doors only re-export", () => {
    expect(placeFaults(sources)).toEqual([]);
    const atTheTop = [...sources.keys()].filter((file) => !file.includes("/"));
    expect(atTheTop).toEqual(doors.map((door: string) => `${door}.ts`).sort());
  });

  test("use no arithmetic whose bits differ between engines", () => {
    expect([...sources].flatMap(([file, text]) => arithmeticFaults(file, text))).toEqual([]);
  });

  test("are short files of one idea each: at most 9000 bytes", () => {
    // a door is a list and holds no idea: it grows with what it lists
    const rooms = [...sources].filter(([file]) => file.includes("/"));
    const long = rooms.filter(([, text]) => Buffer.byteLength(text) > 9000).map(([file]) => file);
    expect(long).toEqual([]);
  });
});

test("no text of the project has a word that does not belong there", () => {
  expect(everywhere.flatMap(([file, text]) => wordFaults(file, text))).toEqual([]);
});

describe("a planted fault is caught", () => {
  const plant = (files: Record<string, string>) => new Map(Object.entries(files));
  const empty = "export const a = 1;\n";

  it.each([
    ["an import upwards", { "law/a.ts": 'import { a } from "../loop/b.ts";', "loop/b.ts": empty }],
    [
      "an import of a type upwards",
      { "law/a.ts": 'import type { a } from "../loop/b.ts";', "loop/b.ts": empty },
    ],
    [
      "an import over several lines",
      { "law/a.ts": 'import {\n  a,\n} from\n  "../loop/b.ts";', "loop/b.ts": empty },
    ],
    ["a re-export upwards", { "law/a.ts": 'export { a } from "../loop/b.ts";', "loop/b.ts": empty }],
    ["a re-export of all", { "law/a.ts": 'export * from "../loop/b.ts";', "loop/b.ts": empty }],
    ["a type written as import()", { "law/a.ts": 'type A = import("../loop/b.ts").A;', "loop/b.ts": empty }],
    ["an import for effect", { "law/a.ts": 'import "../loop/b.ts";', "loop/b.ts": empty }],
    ["import() of a computed name", { "law/a.ts": 'const m = await import("../lo" + "op/b.ts");' }],
    [
      "an import between rooms of one floor",
      { "star/a.ts": 'export * from "../orbit/b.ts";', "orbit/b.ts": empty },
    ],
    ["a room that imports a door", { "law/a.ts": 'export * from "../index.ts";', "index.ts": empty }],
    [
      "the core door reaching floor 9",
      { "index.ts": 'export * from "./planet/a.ts";', "planet/a.ts": empty },
    ],
    ["a package below floor 9", { "loop/a.ts": 'import { z } from "zod";' }],
    ["a package in the core door", { "index.ts": 'export { z } from "zod";' }],
    ["a package the library does not have", { "planet/a.ts": 'import x from "left-over";' }],
    ["a module of Node", { "ground/a.ts": 'import fs from "node:fs";' }],
    ["an import of nothing", { "law/a.ts": 'import { a } from "./gone.ts";' }],
  ])("%s", (_, files) => {
    expect(importFaults(plant(files))).toHaveLength(1);
  });

  it("what is allowed is let through", () => {
    const allowed = plant({
      "ground/a.ts": empty,
      "law/a.ts": 'import { a } from "../ground/a.ts";\nexport * from "./b.ts";',
      "law/b.ts": empty,
      "planet/a.ts":
        'import { z } from "zod";\nimport type { Unit } from "mathjs/number";\nexport * from "../law/a.ts";',
      "planet.ts": 'export * from "./planet/a.ts";',
    });
    expect(importFaults(allowed)).toEqual([]);
    expect(placeFaults(allowed)).toEqual([]);
    expect(cycles(allowed)).toEqual([]);
  });

  it("a circle, through a type and a re-export", () => {
    const circle = plant({
      "law/a.ts": 'import type { b } from "./b.ts";',
      "law/b.ts": 'export * from "./c.ts";',
      "law/c.ts": 'import { a } from "./a.ts";',
      "law/d.ts": 'import { a } from "./a.ts";',
    });
    expect(cycles(circle)).toEqual(["law/a.ts → law/b.ts → law/c.ts → law/a.ts"]);
  });

  it.each([
    ["a room without a floor", { "attic/a.ts": empty }],
    ["an index", { "law/index.ts": empty }],
    ["a door that holds code", { "planet.ts": empty }],
  ])("%s", (_, files) => {
    expect(placeFaults(plant(files))).toHaveLength(1);
  });

  it.each([
    ["Math.exp", "const y = Math.exp(x);"],
    ["a function taken out of Math", "const { exp } = Math;"],
    ["Math by a computed name", 'const y = Math["exp"](x);'],
    ["a random number", "const y = Math.random();"],
    ["a power", "const y = x ** 4;"],
    ["a power in place", "x **= 4;"],
    ["generated code", "const code = `$" + "{a} = Math.tanh($" + "{b});`;"],
  ])("%s", (_, text) => {
    expect(arithmeticFaults("law/a.ts", text)).toHaveLength(1);
  });

  it("arithmetic that is the same everywhere is let through", () => {
    expect(arithmeticFaults("law/a.ts", 'const y = Math.sqrt(Math.abs(x)); const unit = "W.m**-2";')).toEqual(
      [],
    );
  });

  it.each([
    "TO" + "DO",
    "see ../sha" + "red/notes",
    "as in the lec" + "ture",
    "it.on" + "ly(",
    "/tm" + "p/x",
  ])("%s", (text) => {
    expect(wordFaults("a.md", `first line\n${text}`)).toHaveLength(1);
    expect(wordFaults("a.md", `first line\n${text}`)[0]).toMatch(/^a\.md:2 /);
  });

  it("ordinary words are let through", () => {
    expect(wordFaults("a.md", "The reagents, of course, are obsessions.")).toEqual([]);
  });
});
