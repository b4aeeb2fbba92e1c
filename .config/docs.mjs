// Checks that the generated files are fresh, or refreshes them.
//   node .config/docs.mjs [--write] [file …]      without files: all of them
import { spawnSync } from "node:child_process";
import fs from "node:fs";
import path from "node:path";
import { documents } from "./documents.mjs";
import { load } from "./load.mjs";

const args = process.argv.slice(2);
const writing = args.includes("--write");
const named = args.filter((arg) => arg !== "--write");
for (const file of named) {
  if (!documents.some((document) => document.file === file))
    throw new Error(`${file} is not a generated file`);
}

/** Markdown in the project's format, so that makers need not care about it. */
function formatted(file, text) {
  if (!file.endsWith(".md")) return text;
  const args = ["format", "--colors=off", `--stdin-file-path=${file}`];
  const shell = process.platform === "win32";
  const run = spawnSync("node_modules/.bin/biome", args, { input: text, encoding: "utf8", shell });
  if (run.status !== 0) throw new Error(`${file} could not be formatted: ${run.stderr}`);
  return run.stdout;
}

const stale = [];
for (const { file, maker } of documents) {
  if (named.length > 0 && !named.includes(file)) continue;
  const make = (await load(maker)).default;
  const text = formatted(file, await make());
  if (fs.existsSync(file) && fs.readFileSync(file, "utf8") === text) continue;
  stale.push(file);
  if (!writing) continue;
  fs.mkdirSync(path.dirname(file), { recursive: true });
  fs.writeFileSync(file, text);
}

if (writing) console.log(stale.length > 0 ? `updated ${stale.join(", ")}` : "all current");
else if (stale.length > 0) {
  console.error(`${stale.join(", ")}: not as generated; read the change, then \`npm run docs:update\``);
  process.exit(1);
}
