// Imports a module of the repository that may be TypeScript: it is bundled first, its packages are left as they are.
import path from "node:path";
import { pathToFileURL } from "node:url";
import { build } from "esbuild";
import { doors, specifierOf } from "./doors.mjs";

/** The package's own doors, as built: from inside node_modules/.cache its name would not resolve. */
const ownDoors = {
  name: "own-doors",
  setup({ onResolve }) {
    onResolve({ filter: /^thermostead(\/|$)/ }, (wanted) => {
      const door = doors.find((name) => specifierOf(name) === wanted.path);
      return door && { path: pathToFileURL(path.resolve("dist", `${door}.js`)).href, external: true };
    });
  },
};

export async function load(file) {
  if (!file.endsWith(".ts")) return import(pathToFileURL(path.resolve(file)).href);
  const outfile = path.resolve("node_modules/.cache/load", file.replace(/\.ts$/, ".mjs"));
  await build({
    entryPoints: [file],
    outfile,
    bundle: true,
    format: "esm",
    platform: "node",
    target: "node20",
    packages: "external",
    plugins: [ownDoors],
    logLevel: "error",
  });
  return import(`${pathToFileURL(outfile).href}?${Date.now()}`);
}
