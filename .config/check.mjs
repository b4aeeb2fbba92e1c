// Everything a change must pass besides the tests. All parts run, one line each; what a part says follows when it fails.
import { spawnSync } from "node:child_process";
import fs from "node:fs";
import { documents } from "./documents.mjs";

const bin = (name) => `node_modules/.bin/${name}`;
const node = process.execPath;
const apiReport = "docs/api-report.md";
const otherDocuments = documents.map((document) => document.file).filter((file) => file !== apiReport);
const folders = ["src", "tests", "bench", "docs", ".config"].filter((folder) => fs.existsSync(folder));
const cache = "node_modules/.cache";

const parts = {
  build: [node, ".config/setup.mjs"],
  types: [bin("tsc"), "--noEmit", "--incremental", "--tsBuildInfoFile", `${cache}/tsconfig.tsbuildinfo`],
  style: [bin("biome"), "check", "--colors=off", "--error-on-warnings", ...folders],
  package: [bin("publint"), "--strict"],
  resolution: [bin("attw"), "--pack", ".", "--no-definitely-typed", "--no-color", "--no-emoji"],
  api: [node, ".config/docs.mjs", apiReport],
  size: [node, ".config/size.mjs"],
  architecture: [
    bin("vitest"),
    "run",
    "--config",
    "tests/vitest.config.ts",
    "--reporter=dot",
    "tests/architecture.test.ts",
  ],
  documents: [node, ".config/docs.mjs", ...otherDocuments],
};

const only = process.argv.slice(2);
let failed = 0;
for (const [name, [command, ...args]] of Object.entries(parts)) {
  if (only.length > 0 && !only.includes(name)) continue;
  const start = performance.now();
  const shell = process.platform === "win32" && command !== node;
  const run = spawnSync(command, args, { encoding: "utf8", shell, env: { ...process.env, NO_COLOR: "1" } });
  const passed = run.status === 0;
  if (!passed) failed++;
  const seconds = ((performance.now() - start) / 1000).toFixed(1);
  console.log(`${passed ? "ok  " : "FAIL"} ${name.padEnd(12)} ${seconds.padStart(5)} s`);
  if (!passed) console.log([run.error?.message, run.stdout, run.stderr].filter(Boolean).join("\n"));
}
if (failed > 0) console.log(`${failed} of the checks failed`);
process.exitCode = failed > 0 ? 1 : 0;
