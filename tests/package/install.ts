// Packs the package as it would be published and installs it, with what it depends on, in an empty project.
import { execFileSync } from "node:child_process";
import fs from "node:fs";
import os from "node:os";
import path from "node:path";
import { fileURLToPath } from "node:url";

const root = fileURLToPath(new URL("../..", import.meta.url));
const npm = process.env.npm_execpath;

function pack(folder: string): string {
  const args = ["pack", "--json", "--ignore-scripts", "--pack-destination", folder];
  const options = { cwd: root, encoding: "utf8" } as const;
  const out = npm
    ? execFileSync(process.execPath, [npm, ...args], options)
    : execFileSync("npm", args, { ...options, shell: process.platform === "win32" });
  const [packed] = Object.values(JSON.parse(out)) as [{ filename: string }];
  return path.join(folder, packed.filename);
}

/** A project that has the packed package in its node_modules; the caller removes it. */
export function installPacked(): string {
  const project = fs.mkdtempSync(path.join(os.tmpdir(), "thermostead-"));
  const modules = path.join(project, "node_modules");
  fs.mkdirSync(modules);
  execFileSync("tar", ["-xzf", pack(project), "-C", modules]);
  fs.renameSync(path.join(modules, "package"), path.join(modules, "thermostead"));
  const { dependencies } = JSON.parse(fs.readFileSync(path.join(root, "package.json"), "utf8"));
  for (const name of Object.keys(dependencies)) {
    fs.symlinkSync(path.join(root, "node_modules", name), path.join(modules, name), "junction");
  }
  fs.writeFileSync(path.join(project, "package.json"), '{ "private": true }');
  return project;
}

/** Runs a module of the project in Node and reads the JSON it prints. */
export function runInNode(project: string, file: string, text: string): unknown {
  fs.writeFileSync(path.join(project, file), text);
  return JSON.parse(execFileSync(process.execPath, [file], { cwd: project, encoding: "utf8" }));
}

/** Compiles the project's files as a user under `nodenext` would, our declarations included; returns the errors. */
export function compile(project: string, files: Record<string, string>): string {
  for (const [file, text] of Object.entries(files)) fs.writeFileSync(path.join(project, file), text);
  const compilerOptions = { module: "nodenext", target: "es2022", strict: true, noEmit: true, types: [] };
  const config = { compilerOptions, files: Object.keys(files) };
  fs.writeFileSync(path.join(project, "tsconfig.json"), JSON.stringify(config));
  try {
    const tsc = path.join(root, "node_modules/typescript/bin/tsc");
    return execFileSync(process.execPath, [tsc, "-p", "."], { cwd: project, encoding: "utf8" });
  } catch (error) {
    return (error as { stdout: string }).stdout;
  }
}
