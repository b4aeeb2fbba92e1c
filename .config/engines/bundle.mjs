// The program that every engine runs, as one file: the built package, and the elementary functions it is made from.
import { build } from "esbuild";

/** Bundles it into `outfile`, and returns that. */
export async function bundleProgram(outfile) {
  await build({
    entryPoints: ["tests/engines/program.ts"],
    outfile,
    alias: { thermostead: "./dist/index.js" },
    bundle: true,
    format: "esm",
    platform: "neutral",
    target: "es2022",
    logLevel: "error",
  });
  return outfile;
}
