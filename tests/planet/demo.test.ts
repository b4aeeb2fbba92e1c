// The demo as a user runs it: from the built package, as text and as JSON.
import { spawn, spawnSync } from "node:child_process";
import fs from "node:fs";
import os from "node:os";
import path from "node:path";
import { fileURLToPath } from "node:url";
import { describe, expect, it, test } from "vitest";
import { appraisePlanet } from "../../src/planet.ts";
import { simple } from "./orsolne.ts";

const script = fileURLToPath(new URL("../../docs/examples/demo.mjs", import.meta.url));
const run = (...args: string[]) => spawnSync(process.execPath, [script, ...args], { encoding: "utf8" });

/** Runs the demo on a file with this text. */
function runOn(text: string, ...args: string[]) {
  const folder = fs.mkdtempSync(path.join(os.tmpdir(), "thermostead-demo-"));
  try {
    const file = path.join(folder, "planet.json");
    fs.writeFileSync(file, text);
    return run(file, ...args);
  } finally {
    fs.rmSync(folder, { recursive: true, force: true });
  }
}

test("a reader that stops early, as `head` does, is no failure", async () => {
  const child = spawn(process.execPath, [script, "--json"]);
  child.stdout.destroy();
  let stderr = "";
  child.stderr.on("data", (part) => {
    stderr += part;
  });
  const status = await new Promise((resolve) => child.on("close", resolve));
  expect({ stderr, status }).toEqual({ stderr: "", status: 0 });
});

describe("the appraisal of the example", () => {
  const { stdout, stderr, status } = run();
  it("is plain text, of at most 80 columns outside of tables, 100 in them", () => {
    expect({ stderr, status }).toEqual({ stderr: "", status: 0 });
    // a table is told by gaps of two spaces between columns
    for (const line of stdout.split("\n"))
      expect([...line].length).toBeLessThanOrEqual(/\S {2,}\S/.test(line) ? 100 : 80);
    expect(stdout).not.toContain(String.fromCharCode(27));
    expect(stdout).not.toMatch(/NaN|Infinity|undefined|\[object|null/);
  });
  it.each([
    ["inputs with units", /orbit\.semiMajorAxis +0\.46 au/],
    ["the flux", /mean over the orbit +1290\.7 +0\.9483/],
    ["equilibrium temperatures with their assumptions", /A = 0\.3, f = 0\.25 \(the whole sphere\) +251\.02/],
    ["the redistribution", /redistribution 0\.25: heat is spread over the whole sphere/],
    ["the icy climate", /^ +245\.9\d+ +stable .* 0\.61\d+ +216\.23 +\+29\.76$/m],
    ["the unstable state", /^ +263\.\d+ +unstable /m],
    ["the temperate climate", /^ +287\.\d+ +stable /m],
    ["what the equilibrium temperature is not", /temperature of re-radiation, not of the surface/],
    ["the ledger of each climate that holds", /sunlight +space to surface +123\.\d+ +231\.\d+/],
    ["that it closes", /surface +in minus out +0\.0000 +0\.0000\n +stored +0\.0000 +0\.0000/],
    ["the proof", /proved: no other state between 50 and 2500 K/],
    ["what holds each climate", /at 246\.00 K +Planck response +-2\.016\n +albedo +\+0\.2794 +amplifies/],
    ["what would change it", /albedo\.warm +-0\.297 +-3\.18 \+2\.12/],
    [
      "the end of the icy branch and when",
      /brightens by 8\.99 %, in 2\.00 Gyr, it ends in a fold\s+at 255\.81 K and jumps to 294\.04 K/,
    ],
    ["the way back", /the way back is at 0\.881 times today/],
    ["which average over the orbit suits", /thermal time \/ orbital period = 10\.49: slow/],
    ["water at the surface", /287\.57 +120000 +liquid/],
    ["published limits and the place among them", /runaway greenhouse +1 +Kopparapu 2014 .* crosses it/],
    ["the limit for its mass", /runaway greenhouse \* +1\.6 +Kopparapu 2014/],
    ["own limits", /fold of the climate at 287\.57 K, star fainter +273\.72/],
    ["assumptions", /^Assumptions$/m],
    ["sources", /tanhAlbedo: Kaper & Engler 2013/],
    ["what it is", /screening estimates from a zero-dimensional model/],
    [
      "the same planet with its albedo a number, with one state",
      /its albedo held as a number\n.*\n +T surface 287\.567 K, stable.*\n +T equilibrium.*\n +proved: no other state/,
    ],
  ])("shows %s", (_, pattern) => {
    expect(stdout).toMatch(pattern);
  });
  it("has no part that is empty for want of an input", () => {
    expect(stdout).not.toMatch(/^Not given$/m);
  });
});

test("--json prints the record", () => {
  const { stdout } = run("--json");
  const appraisal = JSON.parse(stdout);
  const description = JSON.parse(fs.readFileSync(new URL("orsolne.json", `file://${script}`), "utf8"));
  expect(appraisal).toEqual(appraisePlanet(description));
  expect(appraisal.found.states.map((state: { stability: string }) => state.stability)).toEqual([
    "stable",
    "unstable",
    "stable",
  ]);
});

test("reads another description, with one state and its equilibrium temperature", () => {
  const { stdout, status } = runOn(JSON.stringify(simple()));
  expect(status).toBe(0);
  expect(stdout).toMatch(/as described: A = 0\.3, f = 0\.25 +254\.58/);
  expect(stdout).not.toContain("held as a number");
});

test.each([
  [
    "a fault of the description",
    JSON.stringify(simple({ albedo: 1.2 })),
    /^albedo: out of range, received 1\.2/,
  ],
  ["a text that is no JSON", "{", /JSON/],
])("%s is one line and an exit code", (_, text, message) => {
  const { stdout, stderr, status } = runOn(text);
  expect({ stdout, status, lines: stderr.trim().split("\n").length }).toEqual({
    stdout: "",
    status: 1,
    lines: 1,
  });
  expect(stderr).toMatch(message);
});

test("several faults of a description are a line each", () => {
  const { stderr, status } = runOn(JSON.stringify(simple({ albedo: 1.2, redistribution: 7 })));
  expect(status).toBe(1);
  expect(
    stderr
      .trim()
      .split("\n")
      .map((line) => line.split(":")[0]),
  ).toEqual(["redistribution", "albedo"]);
});
