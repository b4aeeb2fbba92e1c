// Makes a clone ready: node_modules as package-lock.json says, dist as src says. Does nothing when all is current.
//   node .config/setup.mjs          install and build
//   node .config/setup.mjs install  install only
// Node's own modules only, because it runs before anything is installed. It reports on stderr, so that the
// output of what runs next (`npm run --silent demo -- --json`) can be piped.
import { spawnSync } from "node:child_process";
import { createHash } from "node:crypto";
import fs from "node:fs";
import path from "node:path";
import { fileURLToPath } from "node:url";

process.chdir(fileURLToPath(new URL("..", import.meta.url)));

const [major, minor] = process.versions.node.split(".").map(Number);
if (major < 20 || (major === 20 && minor < 19)) {
  console.error(`setup: working on thermostead needs Node 20.19 or newer, this is ${process.version}`);
  process.exit(1);
}

const read = (file) => (fs.existsSync(file) ? fs.readFileSync(file, "utf8") : "");

const write = (file, text) => {
  fs.mkdirSync(path.dirname(file), { recursive: true });
  fs.writeFileSync(file, text);
};

const filesIn = (folder) =>
  (fs.existsSync(folder) ? fs.readdirSync(folder, { withFileTypes: true, recursive: true }) : [])
    .filter((entry) => entry.isFile())
    .map((entry) => path.join(entry.parentPath, entry.name))
    .sort();

const hashOf = (files) => {
  const hash = createHash("sha256");
  for (const file of files) hash.update(`${file}\0`).update(fs.readFileSync(file)).update("\0");
  return hash.digest("hex");
};

function npm(...args) {
  console.error(`setup: npm ${args.join(" ")}`);
  const script = process.env.npm_execpath; // npm's own file, when npm started us
  const [command, first] = script ? [process.execPath, [script]] : ["npm", []];
  const shell = !script && process.platform === "win32"; // there npm is npm.cmd
  const run = spawnSync(command, [...first, ...args], { stdio: ["ignore", 2, 2], shell });
  if (run.error) throw run.error;
  if (run.status !== 0) throw new Error(`setup: npm ${args[0]} failed`);
}

function install() {
  const stamp = "node_modules/.setup-stamp";
  const wanted = [hashOf(["package-lock.json"]), process.platform, process.arch, major].join(" ");
  if (read(stamp) === wanted) return;
  npm("ci", "--include=dev", "--no-audit", "--no-fund", "--prefer-offline");
  write(stamp, wanted);
}

function build() {
  const stamp = "node_modules/.cache/build-stamp";
  const sources = hashOf([...filesIn("src"), "tsconfig.json", "package.json", "package-lock.json"]);
  // dist is part of the stamp: a build by hand, or one that broke off, is noticed.
  const current = () => `${sources} ${hashOf(filesIn("dist"))}`;
  if (read(stamp) === current()) return;
  npm("run", "--silent", "build");
  write(stamp, current());
}

const isRunning = (pid) => {
  try {
    process.kill(pid, 0);
    return true;
  } catch (error) {
    return error.code === "EPERM";
  }
};

/** One set-up at a time in a clone: `npm ci` removes node_modules. */
function withLock(work) {
  const lock = ".setup.lock";
  const owner = path.join(lock, "pid");
  const pause = new Int32Array(new SharedArrayBuffer(4));
  for (let attempt = 0; ; attempt++) {
    try {
      fs.mkdirSync(lock);
      break;
    } catch (error) {
      if (error.code !== "EEXIST") throw error;
      const pid = Number(read(owner));
      // Without a pid the owner has only just made the folder, or died just then: give it five seconds.
      if (pid ? !isRunning(pid) : attempt > 50) fs.rmSync(lock, { recursive: true, force: true });
      else Atomics.wait(pause, 0, 0, 100);
    }
  }
  try {
    fs.writeFileSync(owner, String(process.pid));
    work();
  } finally {
    fs.rmSync(lock, { recursive: true, force: true });
  }
}

try {
  withLock(() => {
    install();
    if (process.argv[2] !== "install") build();
  });
} catch (error) {
  console.error(error.message);
  process.exit(1);
}
