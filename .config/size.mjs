// What a consumer of the core door downloads: small programs, bundled and minified against dist, gzipped.
// A budget moves only in the commit that says why.
import path from "node:path";
import zlib from "node:zlib";
import { build } from "esbuild";
import { doors, specifierOf } from "./doors.mjs";

const operations =
  "add, sub, mul, div, neg, square, fourth, sqrt, exp, log, tanh, min, max, sum, product, mix, inUnit, defineLaw";

// The sizes are of `export { names } from "thermostead"`; the largest of a line counts.
// `aim` is what the design asks for; `limit` is what the door weighs today, and nothing may grow beyond it unnoticed.
const budgets = [
  { title: "one law", aim: 3000, limit: 3000, consumers: ["stellarFlux", "greyEmission", "tanhAlbedo"] },
  {
    title: "closeLoop, findStates and the operations",
    aim: 13000,
    limit: 21050,
    consumers: [`closeLoop, findStates, ${operations}`],
  },
  // all of it, and the one function it shares with the core: `toSVG` alone is little less, as it knows all results
  { title: "the chart door", door: "chart", aim: 10000, limit: 10000, consumers: ["*"] },
];

async function bundle(text, options = {}) {
  const result = await build({
    stdin: { contents: text, resolveDir: process.cwd(), loader: "js" },
    alias: Object.fromEntries(doors.map((door) => [specifierOf(door), `./dist/${door}.js`])),
    charset: "utf8",
    bundle: true,
    minify: true,
    format: "esm",
    platform: "browser",
    target: "es2022",
    write: false,
    metafile: true,
    logLevel: "error",
    ...options,
  });
  const imported = Object.values(result.metafile.outputs).flatMap((output) => output.imports);
  const files = [...Object.keys(result.metafile.inputs), ...imported.map((entry) => entry.path)];
  return {
    code: result.outputFiles[0].text,
    packages: files.filter((file) => file.includes("node_modules")),
  };
}

/** Names of what a bundler keeps of the core door when nothing in it is used. */
async function keptUnused() {
  const effects = {
    name: "every-file-may-have-effects",
    setup({ onResolve }) {
      onResolve({ filter: /^\..*\.js$/ }, ({ path: file, resolveDir }) => {
        return { path: path.resolve(resolveDir, file), sideEffects: true };
      });
    },
  };
  const { code } = await bundle('import "./dist/index.js"', { alias: {}, minify: false, plugins: [effects] });
  return [...code.matchAll(/^(?:var|let|const|class|function) (\w+)/gm)].map((match) => match[1]);
}

let failed = false;
const say = (fine, text) => {
  failed ||= !fine;
  console.log(`${fine ? "ok " : "BAD"} ${text}`);
};

for (const { title, door = "index", aim, limit, consumers } of budgets) {
  const sizes = [];
  for (const names of consumers) {
    const { code } = await bundle(
      `export ${names === "*" ? names : `{ ${names} }`} from "${specifierOf(door)}"`,
    );
    sizes.push({ names, gzipped: zlib.gzipSync(code, { level: 9 }).length });
  }
  const largest = sizes.reduce((a, b) => (b.gzipped > a.gzipped ? b : a));
  const which = sizes.length > 1 ? ` (largest of ${sizes.length}: ${largest.names})` : "";
  say(
    largest.gzipped <= limit,
    `${title}${which}: ${largest.gzipped} B gzipped, limit ${limit} B, aim ${aim} B`,
  );
}

for (const door of ["index", "chart"]) {
  const { packages } = await bundle(`export * from "${specifierOf(door)}"`);
  say(packages.length === 0, `packages in the ${door} door: ${packages.slice(0, 5).join(", ") || "none"}`);
}

// A bundler drops a constant only when it can see that making it has no effect: calls are marked pure, and what they
// are given holds no spread, no arithmetic on names and no template with a gap. What has an effect stands after what
// it needs, so the end of the list tells most.
const kept = await keptUnused();
const lastKept = kept.slice(-10).join(", ");
say(
  kept.length === 0,
  `kept though unused: ${kept.length === 0 ? "nothing" : `${kept.length} names, last ${lastKept}`}`,
);

process.exitCode = failed ? 1 : 0;
