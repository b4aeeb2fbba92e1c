// What is shipped: the packed tarball, installed in an empty project, imported and required through every door.
import fs from "node:fs";
import path from "node:path";
import { afterAll, beforeAll, describe, expect, test } from "vitest";
import { doors, specifierOf } from "../.config/doors.mjs";
import { compile, installPacked, runInNode } from "./package/install.ts";

const specifiers: string[] = doors.map(specifierOf);
const dependencies = ["mathjs", "zod"];
let project = "";

beforeAll(() => {
  project = installPacked();
});

afterAll(() => {
  fs.rmSync(project, { recursive: true, force: true });
});

// Runs inside the project, once for each module system, on an object of door → module.
const survey = `
  const [core, planet] = [doors["thermostead"], doors["thermostead/planet"]];
  const sameError = (() => {
    try { planet.readPlanet(null); } catch (error) { return error instanceof core.ThermosteadError; }
    return false;
  })();
  const names = Object.fromEntries(Object.entries(doors).map(([door, it]) => [door, Object.keys(it).sort()]));
  console.log(JSON.stringify({ names, sameError }));`;

interface Survey {
  readonly names: Record<string, string[]>;
  readonly sameError: boolean;
}

describe("the packed package", () => {
  let imported: Survey;
  let required: Survey;

  beforeAll(() => {
    const imports = specifiers.map((door, i) => `import * as door${i} from "${door}";`).join("\n");
    const object = specifiers.map((door, i) => `"${door}": door${i}`).join(", ");
    imported = runInNode(project, "all.mjs", `${imports}\nconst doors = { ${object} };${survey}`) as Survey;
    const requires = specifiers.map((door) => `"${door}": require("${door}")`).join(", ");
    required = runInNode(project, "all.cjs", `const doors = { ${requires} };${survey}`) as Survey;
  });

  test("opens every door, to import and to require, on the same names", () => {
    expect(Object.keys(imported.names)).toEqual(specifiers);
    for (const names of Object.values(imported.names)) expect(names.length).toBeGreaterThan(0);
    expect(required.names).toEqual(imported.names);
  });

  test("shares one copy of its code between its doors", () => {
    expect([imported.sameError, required.sameError]).toEqual([true, true]);
  });

  test("has types for every name, for import and for require, under nodenext", () => {
    const uses = specifiers
      .map((door, i) => {
        const names = imported.names[door] ?? [];
        const renamed = names.map((name) => `${name} as ${name}${i}`).join(", ");
        return `import { ${renamed} } from "${door}";\nexport const door${i} = { ${names.map((n) => n + i).join(", ")} };`;
      })
      .join("\n");
    const wrong = 'import { noSuchName } from "thermostead";\nexport const wrong = noSuchName;';
    const files = { "uses.mts": uses, "uses.cts": uses, "wrong.mts": wrong, "wrong.cts": wrong };
    const errors = compile(project, files).trim().split("\n");
    // The two planted errors, and no other, show that the declarations were read.
    expect(errors.map((line) => line.replace(/\(.*noSuchName.*/, ""))).toEqual(["wrong.cts", "wrong.mts"]);
  }, 60_000);

  test("lets its package.json be read, and holds no sources or tests", () => {
    const text = 'console.log(JSON.stringify(require("thermostead/package.json")));';
    const shipped = runInNode(project, "version.cjs", text) as Record<string, unknown>;
    expect(shipped.name).toBe("thermostead");
    expect(Object.keys(shipped.dependencies as object)).toEqual(dependencies);
    const content = fs.readdirSync(path.join(project, "node_modules/thermostead")).sort();
    expect(content).toContain("LICENSE");
    expect(content).toContain("dist");
    for (const name of ["src", "tests", "bench", "node_modules"]) expect(content).not.toContain(name);
    // errors and the README point into the manual
    const manual = fs.readdirSync(path.join(project, "node_modules/thermostead/docs"));
    expect(manual).toEqual(expect.arrayContaining(["errors.md", "planet.md", "examples"]));
    expect(manual).not.toContain("notebooks");
  });

  test("is written in ASCII: engines store a text with any other letter in twice the space", () => {
    const dist = path.join(project, "node_modules/thermostead/dist");
    const programs = fs.readdirSync(dist).filter((file) => /\.c?js$/.test(file));
    expect(programs.length).toBeGreaterThanOrEqual(2 * doors.length);
    for (const file of programs) {
      const text = fs.readFileSync(path.join(dist, file), "utf8");
      expect(text.split("\n").filter((line) => /[^\0-\x7f]/.test(line))).toEqual([]);
    }
  });

  test("is cited under the version that it has", () => {
    const shipped = path.join(project, "node_modules/thermostead");
    const { version } = JSON.parse(fs.readFileSync(path.join(shipped, "package.json"), "utf8"));
    const citation = fs.readFileSync(path.join(shipped, "CITATION.cff"), "utf8");
    expect(/^version: (.*)$/m.exec(citation)?.[1]).toBe(version);
  });
});

test("the doors open by the package's own name inside the repository, from dist", async () => {
  for (const specifier of specifiers) {
    expect(Object.keys(await import(specifier)).length).toBeGreaterThan(0);
  }
});
