// What the editor says: wrong names do not compile, and the message names the nearest right one.
import path from "node:path";
import ts from "typescript";
import { beforeAll, describe, expect, test } from "vitest";

const LOOP = `
  const loop = core.closeLoop(({ temperature, given, couple }) => {
    const flux = given("flux", 1361, "W m-2");
    const albedo = couple("albedo", core.tanhAlbedo({ temperature, cold: 0.7, warm: 0.3, midpoint: 265, width: 10 }));
    return {
      heating: { sunlight: core.absorbedFlux({ flux, albedo }), interior: 0.1 },
      cooling: { longwave: core.greyEmission({ temperature, emissivity: 0.6 }) },
      heatCapacity: 4.2e8,
    };
  });
  const found = core.findStates(loop, { within: [150, 400], at: { flux: 1400 } });
`;

/** Each snippet with a part of the message it must get; "" where it must compile. */
const CASES: readonly (readonly [title: string, code: string, message: string])[] = [
  ["a good loop", `${LOOP} export const a: number = found.states[0]!.couplings.albedo;`, ""],
  [
    "names inferred from the callback",
    `${LOOP} export const g: "flux" = null as unknown as core.Givens<NonNullable<typeof loop.names>>;`,
    "",
  ],
  [
    "only numbers give a number",
    "export const n: number = core.absorbedFlux({ flux: 1361, albedo: 0.3 });",
    "",
  ],
  [
    "operations on numbers give a number",
    "export const n: number = core.fourth(core.sum(1, core.mix(1, 2, 0.5)));",
    "",
  ],
  [
    "a misspelt port with a default",
    "core.equilibriumTemperature({ flux: 1, albedo: 0, redistribution: 0.25, emissivty: 1 });",
    "Did you mean to write 'emissivity'?",
  ],
  ["a misspelt port", "core.absorbedFlux({ flux: 1361, albedoo: 0.3 });", "Did you mean to write 'albedo'?"],
  ["a missing port", "core.absorbedFlux({ flux: 1361 });", "Property 'albedo' is missing"],
  [
    "a text for a number",
    'core.absorbedFlux({ flux: "1361", albedo: 0.3 });',
    "Type 'string' is not assignable to type 'Value<never>'",
  ],
  [
    "a misspelt port in a list",
    "core.mixAlbedo({ covers: [{ fraction: 1, albdo: 0.3 }] });",
    "'albdo' does not exist",
  ],
  [
    "an unknown given",
    `${LOOP} core.findStates(loop, { within: [150, 400], at: { flx: 1400 } });`,
    "Did you mean to write 'flux'?",
  ],
  [
    "an unknown coupling of a state",
    `${LOOP} found.states[0]!.couplings.emissivity;`,
    "Property 'emissivity' does not exist",
  ],
  [
    "a range of one number",
    `${LOOP} core.findStates(loop, { within: [150] });`,
    "Source has 1 element(s) but target requires 2",
  ],
  [
    "a misspelt field of a budget",
    "core.closeLoop(({ temperature }) => ({ heatin: {}, cooling: { l: core.greyEmission({ temperature, emissivity: 1 }) }, heatCapacity: 1 }));",
    "heatin",
  ],
  [
    "a quantity as a number",
    "core.closeLoop(({ temperature }) => ({ heating: {}, cooling: { l: temperature * 2 }, heatCapacity: 1 }));",
    "must be of type 'any', 'number'",
  ],
  [
    "a law of a user",
    'const f = core.defineLaw({ name: "f", output: { symbol: "y", unit: "1" }, inputs: { x: { symbol: "x", unit: "1", default: 1 } }, write: ({ x }) => core.neg(x) }); export const y: number = f({});',
    "",
  ],
  [
    "a port that the law of a user does not have",
    'const f = core.defineLaw({ name: "f", output: { symbol: "y", unit: "1" }, inputs: { x: { symbol: "x", unit: "1" } }, write: ({ z }) => core.neg(z) });',
    "Property 'z' does not exist",
  ],
];

describe("the type checker", () => {
  const messages = new Map<string, string>();
  beforeAll(() => {
    const root = path.resolve("tests/types");
    const texts = new Map(
      CASES.map(([, code], i) => [
        path.join(root, `case${i}.ts`),
        `import * as core from "../../src/index.ts";\n${code}\nexport {};`,
      ]),
    );
    const { options } = ts.parseJsonConfigFileContent(
      ts.readConfigFile("tsconfig.json", ts.sys.readFile).config,
      ts.sys,
      process.cwd(),
    );
    const host = ts.createCompilerHost(options);
    const { readFile, fileExists, getSourceFile } = host;
    host.fileExists = (file) => texts.has(path.normalize(file)) || fileExists(file);
    host.readFile = (file) => texts.get(path.normalize(file)) ?? readFile(file);
    host.getSourceFile = (file, version) => {
      const text = texts.get(path.normalize(file));
      return text === undefined ? getSourceFile(file, version) : ts.createSourceFile(file, text, version);
    };
    const program = ts.createProgram([...texts.keys()], { ...options, noUnusedLocals: false }, host);
    for (const [file] of texts) {
      const found = ts.getPreEmitDiagnostics(program, program.getSourceFile(file));
      messages.set(file, found.map((d) => ts.flattenDiagnosticMessageText(d.messageText, "\n")).join("\n"));
    }
  });
  test.each(CASES.map(([title, , message], i) => [title, i, message] as const))("%s", (_, i, message) => {
    const said = messages.get(path.resolve(`tests/types/case${i}.ts`));
    if (message === "") expect(said).toBe("");
    else expect(said).toContain(message);
  });
});
