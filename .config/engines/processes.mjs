// Runs a command until it ends, or stops it and what it started.
import { spawn } from "node:child_process";

/** Stops a process that was started as the leader of its own group. */
export function stop(child) {
  try {
    process.kill(-child.pid, "SIGKILL");
  } catch {
    child.kill("SIGKILL");
  }
}

/** The standard output of a command; fails with its error output. */
export function outputOf(command, args, { env = {}, seconds = 300 } = {}) {
  return new Promise((resolve, reject) => {
    const child = spawn(command, args, {
      env: { ...process.env, ...env },
      stdio: ["ignore", "pipe", "pipe"],
      detached: process.platform !== "win32",
    });
    const timer = setTimeout(() => stop(child), seconds * 1000);
    const texts = ["", ""];
    for (const [i, stream] of [child.stdout, child.stderr].entries()) {
      stream.setEncoding("utf8");
      stream.on("data", (part) => {
        texts[i] += part;
      });
    }
    child.on("error", reject);
    child.on("close", (status) => {
      clearTimeout(timer);
      if (status === 0) resolve(texts[0]);
      else reject(new Error(`${command} ended with ${status}: ${texts[1] || texts[0]}`));
    });
  });
}
