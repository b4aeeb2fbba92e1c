// Runs the notebooks of docs/notebooks with Debian's Jupyter and npm's Deno, and compares what they give with the outputs that
// are stored in them. It installs nothing.
//   node .config/notebooks.mjs [NAME …]     all, or those whose file begins so; fails on a difference
//   … --write                               stores what they give
//   … --optional                            where a tool is missing, says so and does not fail
//   … --tools                               only says whether the tools are there
import { spawn } from "node:child_process";
import { once } from "node:events";
import fs from "node:fs";
import { outputDifferences, withOutputs } from "./notebooks/outputs.mjs";
import { findTools, kernelEnvironment } from "./notebooks/tools.mjs";

const source = "docs/notebooks";
const cache = "node_modules/.cache/notebooks";
const args = process.argv.slice(2);
const flags = ["--write", "--optional", "--tools"];
const [writing, optional, asking] = flags.map((flag) => args.includes(flag));
const named = args.filter((arg) => !flags.includes(arg));
const files = fs
  .readdirSync(source)
  .filter((file) => file.endsWith(".ipynb"))
  .filter((file) => named.length === 0 || named.some((name) => file.startsWith(name)));
const tally = { passed: 0, failed: 0 };
const conclude = (line) => {
  fs.mkdirSync(cache, { recursive: true });
  fs.writeFileSync(`${cache}.json`, JSON.stringify(tally));
  console.log(line);
  process.exit(tally.failed > 0 ? 1 : 0);
};

const { python, deno, missing } = findTools();
if (asking) {
  console.log(missing.length > 0 ? `missing: ${missing.join("; ")}` : "all there");
  process.exit(missing.length > 0 ? 1 : 0);
}
if (missing.length > 0) {
  if (!optional) tally.failed = files.length;
  conclude(`notebooks: skipped, not run; missing: ${missing.join("; ")}`);
}
if (files.length === 0) {
  tally.failed++;
  conclude(`notebooks: none in ${source} is named so`);
}

fs.mkdirSync(cache, { recursive: true });
for (const file of files) fs.rmSync(`${cache}/${file}`, { force: true });
const run = spawn(python, [".config/notebooks/run.py", cache, ...files.map((file) => `${source}/${file}`)], {
  env: { ...process.env, ...kernelEnvironment(deno, cache) },
  stdio: ["ignore", "pipe", "pipe"],
});
let [lines, said] = ["", ""];
run.stdout.on("data", (part) => {
  lines += part;
});
run.stderr.on("data", (part) => {
  said += part;
});
const [status] = await once(run, "close");
if (status !== 0) console.error(said);
const seconds = Object.fromEntries(
  lines
    .trim()
    .split("\n")
    .filter(Boolean)
    .map((line) => JSON.parse(line))
    .map(({ file, seconds }) => [file, seconds]),
);

for (const file of files) {
  const [old, fresh] = [`${source}/${file}`, `${cache}/${file}`];
  if (!(file in seconds)) {
    tally.failed++;
    console.log(`FAIL ${file}: not run to its end`);
    continue;
  }
  const [stored, found] = [old, fresh].map((name) => JSON.parse(fs.readFileSync(name, "utf8")));
  const differences = outputDifferences(stored, found);
  const broken = found.cells.some((cell) => cell.outputs?.some((it) => it.output_type === "error"));
  if (writing && !broken) fs.writeFileSync(old, `${JSON.stringify(withOutputs(stored, found), null, 1)}\n`);
  const failed = differences.length > 0 && (broken || !writing);
  tally[failed ? "failed" : "passed"]++;
  const changes = failed || !writing ? "" : `, ${differences.length} new or different`;
  console.log(`${failed ? "FAIL" : "ok  "} ${file}, ${seconds[file].toFixed(1)} s${changes}`);
  for (const line of failed ? differences : []) console.log(`       ${line}`);
}
conclude(`${tally.passed} notebooks ${writing ? "stored" : "as stored"}, ${tally.failed} failed`);
