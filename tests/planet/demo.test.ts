// The demo as a user runs it: from the built package, as text and as JSON.
import { spawnSync } from "node:child_process";
import fs from "node:fs";
import os from "node:os";
import path from "node:path";
import { fileURLToPath } from "node:url";
import { describe, expect, it, test } from "vitest";
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

describe("the page", () => {
  const { stdout, stderr, status } = run();
  it("is plain text of at most 80 columns", () => {
    expect({ stderr, status }).toEqual({ stderr: "", status: 0 });
    for (const line of stdout.split("\n")) expect([...line].length).toBeLessThanOrEqual(80);
    expect(stdout).not.toContain(String.fromCharCode(27));
    expect(stdout).not.toMatch(/NaN|Infinity|undefined|\[object|invalid:/);
  });
  it.each([
    ["inputs with units", /orbit\.semiMajorAxis +0\.46 au/],
    ["the flux", /stellar flux S = 1290\.7 W m-2/],
    ["the redistribution", /f = 0\.25/],
    ["the icy state", /^ +245\.9\d+ +stable .* 0\.61\d+ +216\.23$/m],
    ["the unstable state", /^ +263\.\d+ +unstable /m],
    ["the temperate state", /^ +287\.\d+ +stable /m],
    ["what the equilibrium temperature is not", /not surface/],
    ["the ledger of each stable state", /sunlight +space to surface +123\.\d+ +231\.\d+/],
    [
      "the albedo as a number, with one state",
      /plain number\n.*\n +surface 287\.567 K, stable.*\n +equilibrium/,
    ],
    ["the proof", /proved: no other state between 50 and 1000 K/],
    ["what holds each state", /at 246\.00 K +Planck response +-2\.016\n +albedo +\+0\.279 +amplifies/],
    [
      "the end of the icy branch and when",
      /rise by \+8\.99 %: fold at 255\.81 K, in 2\.00 Gyr; jumps to 294\.04/,
    ],
    ["the way back", /returns at 0\.88104 of today/],
    ["notes", /^Notes$/m],
    ["sources", /tanhAlbedo: Kaper & Engler 2013/],
    ["what it is", /screening estimates from a zero-dimensional model/],
  ])("shows %s", (_, pattern) => {
    expect(stdout).toMatch(pattern);
  });
});

test("--json prints the same as data", () => {
  const { planet, found, fixed } = JSON.parse(run("--json").stdout);
  expect(planet.description.name).toBe("Orsolne");
  expect(found.states.map((state: { stability: string }) => state.stability)).toEqual([
    "stable",
    "unstable",
    "stable",
  ]);
  expect(fixed.found.states).toHaveLength(1);
});

test("reads another description, with one state and its equilibrium temperature", () => {
  const { stdout, status } = runOn(JSON.stringify(simple()));
  expect(status).toBe(0);
  expect(stdout).toMatch(/equilibrium temperature 254\.58 K, with albedo 0\.3, f = 0\.25/);
  expect(stdout).not.toContain("plain number");
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
