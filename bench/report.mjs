// What a run of the bench says, as text.
import os from "node:os";
import { ratioOf, spreadOf } from "./rounds.mjs";

/** The machine in general terms, and what else takes part. */
export function describeMachine(c, python) {
  const processor = `${os.cpus()[0]?.model.trim() ?? "unknown processor"}, ${os.cpus().length} cores`;
  const lines = [
    `${processor}, ${os.arch()}, ${os.type()}; Node ${process.versions.node} (V8 ${process.versions.v8})`,
    c
      ? `C: ${c.version}, \`-O3\`, libm of the system`
      : "C: no compiler on this machine, so nothing in C is compared",
    python ? `NumPy ${python.numpy}` : "NumPy: not on this machine, so it is not compared",
    python?.scipy ? `SciPy ${python.scipy}` : "SciPy: not on this machine, so it is not compared",
  ];
  return { lines, loadBefore: os.loadavg()[0], loadAfter: 0 };
}

/** A time with its unit, to three digits. */
export function shown(value, unit) {
  if (unit === "ns" && value >= 1000) return `${(value / 1000).toPrecision(3)} µs`;
  return `${value.toPrecision(3)} ${unit}`;
}

const HEAD = ["", "median", "quartiles", "least", "× the first", "wrong counts"];

/** The table of a question, head first; columns that say nothing are left out. */
export function tableOf({ title, unit, contestants, compared }) {
  const rows = contestants.map(({ name, times, checked }) => {
    const { least, quartile, median, upper } = spreadOf(times);
    const ratio = ratioOf(times, contestants[0].times);
    return [
      name,
      shown(median, unit),
      `${shown(quartile, unit)} – ${shown(upper, unit)}`,
      shown(least, unit),
      compared ? ratio.median.toPrecision(3) : "",
      checked ? `${checked.wrongCounts} of ${checked.planets}` : "",
    ];
  });
  const used = HEAD.map((_, i) => i).filter((i) => rows.some((row) => row[i]));
  return [[title, ...HEAD.slice(1)], ...rows].map((row) => used.map((i) => row[i]));
}

/** The table as text for a terminal. */
export function printQuestion(question) {
  const table = tableOf(question);
  const wide = table[0].map((_, i) => Math.max(...table.map((row) => row[i].length)));
  const line = (row) => row.map((text, i) => (i ? text.padStart(wide[i]) : text.padEnd(wide[i]))).join("  ");
  return ["", ...table.map(line), question.note].join("\n");
}
