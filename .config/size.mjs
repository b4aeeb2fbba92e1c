// What a consumer of the core door downloads: small programs, bundled and minified against dist, gzipped.
// A budget moves only in the commit that says why.
import zlib from "node:zlib";
import { build } from "esbuild";

const operations =
  "add, sub, mul, div, neg, square, fourth, sqrt, exp, log, tanh, min, max, sum, product, mix, inUnit, defineLaw";
const law = (name) => ({ name, text: `export { ${name} } from "thermostead"` });

const budgets = [
  {
    title: "one law",
    limit: 2000,
    consumers: [law("stellarFlux"), law("greyEmission"), law("tanhAlbedo")],
  },
  {
    title: "closeLoop, findStates and the operations",
    limit: 9000,
    consumers: [{ name: "all", text: `export { closeLoop, findStates, ${operations} } from "thermostead"` }],
  },
  {
    title: "whole core door",
    limit: Number.POSITIVE_INFINITY,
    consumers: [{ name: "all", text: `export * from "thermostead"` }],
  },
];

async function measure({ name, text }) {
  const result = await build({
    stdin: { contents: text, resolveDir: process.cwd(), loader: "js" },
    alias: { thermostead: "./dist/index.js" },
    bundle: true,
    minify: true,
    format: "esm",
    platform: "browser",
    target: "es2022",
    write: false,
    metafile: true,
    logLevel: "error",
  });
  const code = result.outputFiles[0].contents;
  const inputs = Object.keys(result.metafile.inputs);
  const imports = Object.values(result.metafile.outputs).flatMap((output) => output.imports);
  const packages = [
    ...inputs.filter((file) => file.includes("node_modules")),
    ...imports.filter((entry) => entry.external).map((entry) => entry.path),
  ];
  return { name, gzipped: zlib.gzipSync(code, { level: 9 }).length, packages };
}

let failed = false;
for (const { title, limit, consumers } of budgets) {
  const sizes = [];
  for (const consumer of consumers) sizes.push(await measure(consumer));
  const largest = sizes.reduce((a, b) => (b.gzipped > a.gzipped ? b : a));
  const packages = [...new Set(sizes.flatMap((size) => size.packages))];
  const small = largest.gzipped <= limit;
  const which = consumers.length > 1 ? ` (largest of ${consumers.length}: ${largest.name})` : "";
  const budget = Number.isFinite(limit) ? `budget ${limit} B` : "no budget";
  console.log(`${small ? "ok " : "BIG"} ${title}${which}: ${largest.gzipped} B gzipped, ${budget}`);
  if (packages.length > 0)
    console.log(`BAD ${title}: the core door needs ${packages.slice(0, 5).join(", ")}`);
  failed ||= !small || packages.length > 0;
}
process.exitCode = failed ? 1 : 0;
