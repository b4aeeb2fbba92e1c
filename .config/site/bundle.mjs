// The scripts of the live page. They are classic scripts: a browser loads no module from the file system.
import fs from "node:fs";
import path from "node:path";
import { fileURLToPath } from "node:url";
import { build } from "esbuild";

const own = path.dirname(fileURLToPath(import.meta.url));

/** The doors as built: what the page runs is what is shipped. */
const builtDoors = {
  name: "built-doors",
  setup({ onResolve }) {
    onResolve({ filter: /^thermostead(\/|$)/ }, ({ path: wanted }) => {
      return { path: path.resolve("dist", `${wanted.split("/")[1] ?? "index"}.js`) };
    });
  },
};

/** `live.js` is all that the first paint needs; it loads `library.js` after that. */
export async function bundlePage() {
  const result = await build({
    entryPoints: { live: path.join(own, "live/live.mjs"), library: path.join(own, "live/library.mjs") },
    outdir: "assets",
    plugins: [builtDoors],
    loader: { ".json": "text" },
    bundle: true,
    minify: true,
    format: "iife",
    platform: "browser",
    target: ["es2022"],
    legalComments: "none",
    metafile: true,
    write: false,
    logLevel: "error",
  });
  const scripts = result.outputFiles.map((file) => ({ name: path.basename(file.path), text: file.contents }));
  return [...scripts, { name: "licences.txt", text: licencesOf(Object.keys(result.metafile.inputs)) }];
}

/** The licences of all packages whose files are among these. */
function licencesOf(inputs) {
  const folders = inputs.map((file) => /^.*node_modules\/(@[^/]+\/)?[^/]+/.exec(file)?.[0]);
  const texts = [...new Set(folders.filter(Boolean))].sort().map((folder) => {
    const { name, version, license } = JSON.parse(fs.readFileSync(path.join(folder, "package.json"), "utf8"));
    const files = fs.readdirSync(folder).filter((file) => /^(licen[cs]e|notice)/i.test(file));
    return [
      `${name} ${version} (${license})`,
      ...files.map((file) => fs.readFileSync(path.join(folder, file), "utf8")),
    ];
  });
  return `${texts.flat().join("\n\n")}\n`;
}
