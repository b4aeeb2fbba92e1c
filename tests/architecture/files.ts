// The texts of the repository, by path from its root.
import fs from "node:fs";
import path from "node:path";
import { fileURLToPath } from "node:url";

const root = fileURLToPath(new URL("../..", import.meta.url));
const isText = (file: string): boolean =>
  /\.(ts|mts|cts|mjs|cjs|js|json|md|ipynb|py|c|cpp|cff|csv)$/.test(file);

export function textsIn(folder: string, base = root): Map<string, string> {
  const top = path.join(root, folder);
  if (!fs.existsSync(top)) return new Map();
  return new Map(
    fs
      .readdirSync(top, { withFileTypes: true, recursive: true })
      .filter((entry) => entry.isFile() && isText(entry.name))
      .map((entry) => path.join(entry.parentPath, entry.name))
      .sort()
      .map((file): [string, string] => [
        path.relative(base, file).split(path.sep).join("/"),
        fs.readFileSync(file, "utf8"),
      ]),
  );
}

/** The sources, by path from src. */
export function sourceTexts(): Map<string, string> {
  return textsIn("src", path.join(root, "src"));
}

/** Texts at the top of the repository; the lock file is npm's. */
export function topTexts(): Map<string, string> {
  const names = fs.readdirSync(root).filter((name) => isText(name) && name !== "package-lock.json");
  return new Map(
    names.map((name): [string, string] => [name, fs.readFileSync(path.join(root, name), "utf8")]),
  );
}
