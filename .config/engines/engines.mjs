// The engines that the bits are compared on: how each is found, and how it runs the program.
import fs from "node:fs";
import path from "node:path";
import { reportOfPage, STRICT_POLICY } from "./page.mjs";
import { outputOf } from "./processes.mjs";

/** The first of these commands that is installed. */
function onPath(...names) {
  const folders = (process.env.PATH ?? "").split(path.delimiter);
  return folders
    .flatMap((folder) => names.map((name) => path.join(folder, name)))
    .find((file) => fs.existsSync(file));
}

const ifThere = (file) => (fs.existsSync(file) ? file : undefined);
const chromium = () => onPath("chromium", "chromium-browser", "google-chrome");
const inChromium = (command, program, options) => reportOfPage("chromium", command, program, options);

/** `find`: the command, or nothing. `run`: the text of its report. */
export const engines = {
  node: {
    about: "V8",
    find: () => process.execPath,
    run: (command, program) => outputOf(command, [program]),
  },
  "node-interpreted": {
    about: "V8, code generation forbidden",
    find: () => process.execPath,
    run: (command, program) => outputOf(command, ["--disallow-code-generation-from-strings", program]),
  },
  deno: {
    about: "a newer V8",
    find: () => ifThere("node_modules/deno/bin.cjs"),
    run: (command, program) =>
      outputOf(process.execPath, [command, "run", "--no-config", "--no-remote", program], {
        env: { DENO_DIR: path.resolve("node_modules/.cache/deno"), DENO_NO_UPDATE_CHECK: "1" },
      }),
  },
  quickjs: {
    about: "QuickJS",
    find: () => ifThere("node_modules/quickjs-emscripten/package.json") && ".config/engines/quickjs.mjs",
    run: (command, program) => outputOf(process.execPath, [command, program]),
  },
  jsc: {
    about: "JavaScriptCore",
    find: () => onPath("jsc"),
    run: (command, program) => outputOf(command, ["-m", program]),
  },
  chromium: { about: "V8 in a page", find: chromium, run: inChromium },
  "chromium-strict": {
    about: `V8 in a page with Content-Security-Policy: ${STRICT_POLICY}`,
    find: chromium,
    run: (command, program) => inChromium(command, program, { policy: STRICT_POLICY }),
  },
  firefox: {
    about: "SpiderMonkey in a page",
    find: () => onPath("firefox-esr", "firefox"),
    run: (command, program) => reportOfPage("firefox", command, program),
  },
};
