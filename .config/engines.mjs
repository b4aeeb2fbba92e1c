// Compares the bits that the built package gives on several JavaScript engines: 10⁵ elementary values and 10³ complete
// searches for states. Fails on any difference. It installs nothing.
//   node .config/engines.mjs             every engine that is found on this machine
//   node .config/engines.mjs NAME …      these, and all of them must be found
import fs from "node:fs";
import { bundleProgram } from "./engines/bundle.mjs";
import { differences } from "./engines/differences.mjs";
import { engines } from "./engines/engines.mjs";

const named = process.argv.slice(2);
const unknown = named.filter((name) => !(name in engines));
if (unknown.length > 0) {
  console.error(`engines: ${unknown.join(", ")} unknown; known are ${Object.keys(engines).join(", ")}`);
  process.exit(2);
}

const program = await bundleProgram("node_modules/.cache/engines/program.mjs");
const tally = { passed: 0, failed: 0 };
let first;

/** Runs one engine; returns what is wrong, in lines, and what is right, in one. */
async function compare(name, { run }, command) {
  const report = JSON.parse(await run(command, program));
  if (report.error) return { wrong: [report.error] };
  const { values, searches, generates } = report;
  const how = generates ? "generated code" : "interpreter";
  const counts = `${values.count} values, ${searches.count} searches, ${searches.proved} of them proved (${how})`;
  first ??= { name, report };
  if (values.count < 1e5 || searches.count < 1e3) return { wrong: [`only ${counts}`] };
  const wrong = differences(first.report, report).map((line) => `${line}: not as on ${first.name}`);
  return { wrong, counts };
}

for (const [name, engine] of Object.entries(engines)) {
  if (named.length > 0 && !named.includes(name)) continue;
  const title = `${name.padEnd(16)} ${engine.about}`;
  const command = engine.find();
  if (!command) {
    if (named.length > 0) tally.failed++;
    console.log(`${named.length > 0 ? "FAIL" : "-   "} ${title}: not found on this machine`);
    continue;
  }
  const start = performance.now();
  const { wrong, counts } = await compare(name, engine, command).catch((error) => ({
    wrong: [error.message],
  }));
  const seconds = ((performance.now() - start) / 1000).toFixed(1);
  if (wrong.length === 0) {
    tally.passed++;
    console.log(`ok   ${title}: ${counts}, ${seconds} s`);
  } else {
    tally.failed++;
    console.log(`FAIL ${title}, ${seconds} s\n${wrong.map((line) => `       ${line}`).join("\n")}`);
  }
}
if (tally.passed + tally.failed < 2) {
  console.log("FAIL nothing to compare with: only one engine");
  tally.failed++;
}
fs.writeFileSync("node_modules/.cache/engines.json", JSON.stringify(tally));
console.log(`${tally.passed} engines in the same bits, ${tally.failed} failed`);
process.exitCode = tally.failed > 0 ? 1 : 0;
