// Builds the site: the manual, the reference and the live page, as files that need no server.
//   node .config/site/build.mjs [folder]      into `site` unless said
import fs from "node:fs";
import path from "node:path";
import { fileURLToPath, pathToFileURL } from "node:url";
import { apiPages } from "./apiPages.mjs";
import { bundlePage } from "./bundle.mjs";
import { livePage } from "./livePage.mjs";
import { manualPages } from "./manualPages.mjs";
import { contentsOf } from "./pages.mjs";
import { whole } from "./shell.mjs";

const own = path.dirname(fileURLToPath(import.meta.url));

/** Writes the whole site into a folder, which is emptied first, and returns the names of its files. */
export async function buildSite(folder) {
  const [bundles, api] = await Promise.all([bundlePage(), apiPages()]);
  const contents = contentsOf(api);
  const manual = manualPages(contents);
  const pages = [...manual.pages, ...api, livePage()];

  fs.rmSync(folder, { recursive: true, force: true });
  const write = (file, text) => {
    const target = path.join(folder, file);
    fs.mkdirSync(path.dirname(target), { recursive: true });
    fs.writeFileSync(target, text);
    return file;
  };
  const files = [
    ...pages.map((page) => write(page.file, whole(page, contents))),
    ...[...manual.files].map(([file, source]) => write(file, fs.readFileSync(source))),
    ...["site.css", "live.css", "icon.svg"].map((name) =>
      write(`assets/${name}`, fs.readFileSync(path.join(own, "assets", name))),
    ),
  ];
  for (const { name, text } of bundles) files.push(write(`assets/${name}`, text));
  return files;
}

if (process.argv[1] && import.meta.url === pathToFileURL(process.argv[1]).href) {
  const folder = process.argv[2] ?? "site";
  const files = await buildSite(folder);
  console.log(`${files.length} files; open ${path.join(folder, "index.html")}`);
}
