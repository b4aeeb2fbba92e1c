// Every example of the documents is run against the package as built; with UPDATE_DOCS=1 their outputs are rewritten.
import fs from "node:fs";
import { afterAll, describe, expect, test } from "vitest";
import { programsOf } from "./programs.ts";
import { rewritten } from "./rewrite.ts";
import { type Outcome, runProgram } from "./runProgram.ts";
import { typeErrors } from "./typesOf.ts";

const documents = [
  "README.md",
  "DEVELOPERS.md",
  ...fs
    .readdirSync("docs")
    .filter((file) => file.endsWith(".md"))
    .map((file) => `docs/${file}`),
];
const texts = new Map(documents.map((file) => [file, fs.readFileSync(file, "utf8")]));
const examples = [...texts].flatMap(([file, text]) =>
  programsOf(text).map((program) => [`${file}:${program.line}`, program, file] as const),
);
const updating = process.env.UPDATE_DOCS === "1";

describe("the examples", () => {
  const outcomes = new Map<string, Outcome[]>();

  test.each(examples)("%s gives what it says", async (_, program, file) => {
    const found = await runProgram(program);
    expect(found.length).toBeGreaterThan(0);
    outcomes.set(file, [...(outcomes.get(file) ?? []), ...found]);
    if (!updating) expect(found.map((o) => o.found)).toEqual(found.map((o) => o.claim.expected));
  });

  afterAll(() => {
    if (!updating) return;
    for (const [file, found] of outcomes) {
      fs.writeFileSync(file, rewritten(texts.get(file) as string, found));
    }
  });

  test("have right types where they are TypeScript", () => {
    const [planted] = programsOf('```ts run\nimport { add } from "thermostead";\nadd("1", 2); // → 3\n```\n');
    const typed = examples.filter(([, program]) => program.fences.some((fence) => fence.language === "ts"));
    const [seen, ...errors] = typeErrors([planted as never, ...typed.map(([, program]) => program)]);
    expect(seen).toContain("not assignable");
    expect(typed.flatMap(([title], i) => (errors[i] ? [`${title} ${errors[i]}`] : []))).toEqual([]);
  }, 60_000);
});

describe("the reader of examples", () => {
  const document = [
    "```ts run",
    'import { absorbedFlux, type Law } from "thermostead";',
    "const law: Law = absorbedFlux as never;",
    "const flux = absorbedFlux({ flux: 1361, albedo: 0.3 }); // → 238",
    "```",
    "```js more",
    "[flux, law.card.name];",
    "// → [",
    "//     1,",
    "//   ]",
    "absorbedFlux({ flux: -1, albedo: 0.3 }); // → 1",
    "```",
    "",
  ].join("\n");

  test("sees a wrong value, a list over several lines, and an error", async () => {
    const [program, ...others] = programsOf(document);
    expect(others).toEqual([]);
    const outcomes = await runProgram(program as never);
    expect(outcomes.map((o) => o.claim.expected)).toEqual(["238", "[\n  1,\n]", "1"]);
    expect(outcomes.map((o) => o.found)).toEqual([
      "238.175",
      '[238.175, "absorbedFlux"]',
      "ThermosteadError: absorbedFlux.flux: out of range, received -1; allowed: 0 to 1000000000000 W m-2 (docs/errors.md#out-of-range)",
    ]);
    const corrected = rewritten(document, outcomes);
    expect(corrected).toContain('[flux, law.card.name];\n// → [238.175, "absorbedFlux"]\nabsorbedFlux');
    const again = await runProgram(programsOf(corrected)[0] as never);
    expect(again.map((o) => o.claim.expected)).toEqual(again.map((o) => o.found));
  });

  test("refuses an arrow that belongs to nothing", async () => {
    const [stray] = programsOf("```js run\n1;\n\n// → 1\n```\n");
    await expect(runProgram(stray as never)).rejects.toThrow("stands beside no statement");
  });
});
