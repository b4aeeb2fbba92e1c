// Other programs that take part: they are started once, and answer one line for each line that is sent.
import { spawn, spawnSync } from "node:child_process";
import fs from "node:fs";
import path from "node:path";
import readline from "node:readline";

const here = path.join(import.meta.dirname, "peers");

class Peer {
  #process;
  #waiting = [];

  constructor(command, args) {
    this.#process = spawn(command, args, { stdio: ["pipe", "pipe", "inherit"] });
    this.#process.on("close", (status) => {
      for (const { reject } of this.#waiting) reject(new Error(`${command} ended with ${status}`));
    });
    readline.createInterface({ input: this.#process.stdout }).on("line", (line) => {
      this.#waiting.shift()?.resolve(line.split(" "));
    });
  }

  next() {
    return new Promise((resolve, reject) => this.#waiting.push({ resolve, reject }));
  }

  ask(line) {
    this.#process.stdin.write(`${line}\n`);
    return this.next();
  }

  /** Nanoseconds an item, and what was computed. */
  async time(line) {
    const [each, ...results] = (await this.ask(line)).map(Number);
    return { each, results };
  }

  end() {
    this.#process.stdin.end();
  }
}

const works = (command, ...args) => spawnSync(command, args, { stdio: "ignore" }).status === 0;

/** Files with all rows, and the C program built on the spot; `null` where there is no compiler. */
export function buildC(folder, rowFiles) {
  const command = process.env.CC ?? "cc";
  if (!works(command, "--version")) return null;
  const file = path.join(folder, "peer");
  const run = spawnSync(command, ["-O3", "-o", file, path.join(here, "peer.c"), "-lm"], { encoding: "utf8" });
  if (run.status !== 0) throw new Error(`${command} failed: ${run.stderr}`);
  const version = spawnSync(command, ["--version"], { encoding: "utf8" }).stdout.split("\n")[0];
  return Object.assign(new Peer(file, rowFiles), { version });
}

/** A Python that has NumPy: the system's own before the first on the path; `null` where there is none. */
export async function startPython(rowFiles) {
  const command = ["/usr/bin/python3", "python3"].find((name) => works(name, "-c", "import numpy"));
  if (!command) return null;
  const peer = new Peer(command, [path.join(here, "peer.py"), ...rowFiles]);
  const [numpy, scipy] = await peer.next();
  return Object.assign(peer, { numpy, scipy: scipy === "none" ? null : scipy });
}

/** Writes the columns row by row, as the peers read them. */
export function writeRows(file, columns) {
  const lists = Object.values(columns);
  const rows = lists[0].length;
  const values = new Float64Array(rows * lists.length);
  for (let row = 0; row < rows; row++) {
    for (let i = 0; i < lists.length; i++) values[row * lists.length + i] = lists[i][row];
  }
  fs.writeFileSync(file, values);
}

/** States that a peer wrote: for each row the count, then eight temperatures. */
export function readStates(file) {
  const bytes = fs.readFileSync(file);
  const values = new Float64Array(bytes.buffer.slice(bytes.byteOffset, bytes.byteOffset + bytes.byteLength));
  const rows = [];
  for (let at = 0; at < values.length; at += 9)
    rows.push(Array.from(values.subarray(at + 1, at + 1 + values[at])));
  return rows;
}
