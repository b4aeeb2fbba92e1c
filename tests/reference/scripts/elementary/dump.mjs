// The tables of the elementary functions as the program computes them, and a fingerprint of its sources.
import { createHash } from "node:crypto";
import fs from "node:fs";
import path from "node:path";
import { fileURLToPath } from "node:url";
import { load } from "../../../../.config/load.mjs";

const root = fileURLToPath(new URL("../../../..", import.meta.url));
const folder = "src/ground/elementary";

/** Changes whenever the code of any of the functions changes, comments and blanks apart. */
export function fingerprint() {
  const hash = createHash("sha256");
  for (const file of fs.readdirSync(path.join(root, folder)).sort()) {
    const text = fs.readFileSync(path.join(root, folder, file), "utf8");
    hash.update(`${file}\n`);
    hash.update(
      text
        .replace(/\/\*[\s\S]*?\*\//g, "")
        .replace(/\/\/.*$/gm, "")
        .replace(/\s+/g, ""),
    );
  }
  return hash.digest("hex").slice(0, 16);
}

async function tables() {
  const { expHigh, expLow, fillExpTable } = await load(`${folder}/expTable.ts`);
  const { reciprocal, logHigh, logLow, fillLogTable } = await load(`${folder}/logTable.ts`);
  fillExpTable();
  fillLogTable();
  const all = { expHigh, expLow, reciprocal, logHigh, logLow };
  return Object.fromEntries(Object.entries(all).map(([name, table]) => [name, Array.from(table)]));
}

if (process.argv[1] === fileURLToPath(import.meta.url)) {
  process.chdir(root);
  console.log(JSON.stringify({ fingerprint: fingerprint(), tables: await tables() }));
}
