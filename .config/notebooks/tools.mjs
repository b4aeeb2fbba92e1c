// What runs notebooks: a Python with nbclient, and Deno as their kernel.
import { spawnSync } from "node:child_process";
import fs from "node:fs";
import path from "node:path";

const runs = (command, ...args) => spawnSync(command, args, { stdio: "ignore" }).status === 0;

/** Debian's Python first: another one on the path may not have Debian's packages. */
const python = () =>
  ["/usr/bin/python3", "python3"].find((command) => runs(command, "-c", "import nbclient, nbformat"));

function deno() {
  const wrapper = "node_modules/deno/bin.cjs";
  if (!fs.existsSync(wrapper) || !runs(process.execPath, wrapper, "--version")) return undefined;
  const file = `node_modules/deno/deno${process.platform === "win32" ? ".exe" : ""}`;
  return fs.existsSync(file) ? path.resolve(file) : undefined; // the wrapper puts it there
}

/** The tools, and in words those that are not there. */
export function findTools() {
  const tools = { python: python(), deno: deno() };
  const missing = [
    ...(tools.python ? [] : ["a Python with nbclient (Debian: apt-get install jupyter-nbconvert)"]),
    ...(tools.deno ? [] : ["the npm package deno"]),
  ];
  return { ...tools, missing };
}

/** Describes Deno's kernel to Jupyter in a folder of ours; returns the environment that leads there. */
export function kernelEnvironment(deno, folder) {
  const [at, kernel] = [path.resolve(folder), path.resolve(folder, "kernels/deno")];
  fs.mkdirSync(kernel, { recursive: true });
  fs.writeFileSync(
    path.join(kernel, "kernel.json"),
    JSON.stringify({
      argv: [deno, "jupyter", "--kernel", "--conn", "{connection_file}"],
      display_name: "Deno",
      language: "typescript",
      env: { DENO_DIR: path.join(at, "deno"), DENO_NO_UPDATE_CHECK: "1", NO_COLOR: "1" },
    }),
  );
  return {
    JUPYTER_PATH: at,
    JUPYTER_CONFIG_DIR: path.join(at, "config"),
    JUPYTER_RUNTIME_DIR: path.join(at, "runtime"),
  };
}
