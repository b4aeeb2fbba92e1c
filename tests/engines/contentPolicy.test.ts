// A page with a strict content security policy: no code can be generated there, and the bits are the same.
import { expect, test } from "vitest";
import { bundleProgram } from "../../.config/engines/bundle.mjs";
import { differences } from "../../.config/engines/differences.mjs";
import { engines } from "../../.config/engines/engines.mjs";
import type { EngineReport } from "./program.ts";

const program = bundleProgram("node_modules/.cache/engines/policy.mjs");
const browser = engines.chromium.find();
if (!browser) console.log("no Chromium on this machine: the strict content security policy is not tested");

type Name = "node" | "node-interpreted" | "chromium" | "chromium-strict";
const reports = new Map<Name, Promise<EngineReport>>();

async function run(name: Name): Promise<EngineReport> {
  const engine = engines[name];
  return JSON.parse(await engine.run(engine.find() as string, await program)) as EngineReport;
}

/** Each engine runs once. */
function reportOf(name: Name): Promise<EngineReport> {
  const report = reports.get(name) ?? run(name);
  reports.set(name, report);
  return report;
}

test("where a flag of Node forbids code, the searches give the same bits", async () => {
  const open = await reportOf("node");
  const closed = await reportOf("node-interpreted");
  expect([open.generates, closed.generates]).toEqual([true, false]);
  expect(differences(open, closed)).toEqual([]);
}, 120_000);

test.runIf(browser)(
  "where the policy of a page forbids code, the searches give the same bits",
  async () => {
    const open = await reportOf("chromium");
    const closed = await reportOf("chromium-strict");
    expect([open.generates, closed.generates]).toEqual([true, false]);
    expect(differences(open, closed)).toEqual([]);
    expect(differences(await reportOf("node"), closed)).toEqual([]);
  },
  120_000,
);
