// Every picture as a Vega-Lite specification: as the published schema of version 5 has it, read by versions 5 and 6 without
// a warning, drawn by Vega, and finite.
import fs from "node:fs";
import { Ajv } from "ajv";
import * as vega from "vega";
import * as version6 from "vega-lite";
import { describe, expect, test } from "vitest";
import { toVegaLite } from "../../src/chart/show.ts";
import { pictures } from "./cases.ts";

type Compiler = Pick<typeof version6, "compile">;

/** Version 5 is written for CommonJS, which cannot load vega 6; it needs functions of vega that both versions have. */
function version5(): Compiler {
  const exports = {};
  const code = fs.readFileSync("node_modules/vega-lite-v5/build/vega-lite.js", "utf8");
  new Function("exports", "module", "require", code)(exports, {}, () => vega);
  return exports as Compiler;
}

const compilers: Readonly<Record<string, Compiler>> = { 5: version5(), 6: version6 };
const schema = JSON.parse(fs.readFileSync("node_modules/vega-lite-v5/build/vega-lite-schema.json", "utf8"));
const ajv = new Ajv({
  strict: false,
  formats: { "color-hex": /^#([\da-f]{3}|[\da-f]{6})$/i, uri: /^https:/, "uri-reference": true },
});
const isValid = ajv.compile(schema);

const specOf = (name: string, width: number, theme: "light" | "dark" = "light"): version6.TopLevelSpec =>
  toVegaLite(pictures[name], { width, theme }) as never;

/** Compiles and draws; every message of Vega-Lite and Vega counts. */
async function drawn(
  compiler: Compiler,
  spec: version6.TopLevelSpec,
): Promise<{ svg: string; said: string[] }> {
  const said: string[] = [];
  const say = (...words: readonly unknown[]) => {
    said.push(words.join(" "));
    return logger;
  };
  const logger = { level: () => logger, error: say, warn: say, info: () => logger, debug: () => logger };
  const { spec: compiled } = compiler.compile(spec, { logger: logger as never });
  const view = new vega.View(vega.parse(compiled), { renderer: "none", logger: logger as never });
  const svg = await view.toSVG();
  view.finalize();
  return { svg, said };
}

describe.each(Object.keys(pictures))("%s", (name) => {
  test.each([360, 1200])("at %d px is valid, and drawn by both versions without a word", async (width) => {
    const spec = specOf(name, width);
    expect(spec.$schema).toBe("https://vega.github.io/schema/vega-lite/v5.json");
    isValid(spec);
    expect(isValid.errors ?? []).toEqual([]);
    for (const compiler of Object.values(compilers)) {
      const { svg, said } = await drawn(compiler, spec);
      expect(said).toEqual([]);
      expect(svg).not.toContain("NaN");
      expect(svg).not.toContain("undefined");
    }
  });

  test("survives JSON, so nothing in it is missing or not finite", () => {
    const spec = specOf(name, 640, "dark");
    expect(JSON.parse(JSON.stringify(spec))).toEqual(spec);
  });
});

test("the checks can fail", async () => {
  const spec = specOf("bars", 640) as unknown as { layer: { mark: object }[] };
  const wrong = { ...spec, layer: [{ ...spec.layer[0], mark: { type: "blot" } }] };
  expect(isValid(wrong)).toBe(false);
  const doubtful = {
    ...spec,
    layer: [{ ...spec.layer[2], mark: { type: "rect", color: "red", fill: "red", stroke: "red" } }],
  };
  for (const compiler of Object.values(compilers)) {
    expect((await drawn(compiler, doubtful as never)).said).toHaveLength(1);
  }
});

test("the two versions are what they are called", () => {
  const versions = Object.entries(compilers).map(([name, it]) => [
    name,
    (it as { version?: string }).version?.[0],
  ]);
  expect(versions).toEqual([
    ["5", "5"],
    ["6", "6"],
  ]);
});

test("what is drawn is what is written: all names of the legend, all points", async () => {
  const { svg } = await drawn(version6, specOf("diagram", 1200));
  for (const name of ["stable", "unstable", "couplings held, stable", "jump", "fold", "the planet now"]) {
    expect(svg).toContain(`>${name}<`);
  }
  expect(svg).toContain(">temperature (K)<");
  expect(svg).toContain(">flux (W m⁻²)<");
});
