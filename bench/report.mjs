// What a run of the bench says, as text and as docs/performance.md.
import os from "node:os";
import { ratioOf, spreadOf } from "./rounds.mjs";

/** The machine in general terms, and what else takes part. */
export function describeMachine(c, python) {
  const processor = os.cpus()[0]?.model.trim() ?? "unknown processor";
  const lines = [
    `${processor}, ${os.cpus().length} cores in use, ${os.arch()}, ${os.type()}; Node ${process.versions.node} (V8 ${process.versions.v8})`,
    c ? `C: ${c.version}, -O3` : "C: no compiler on this machine, so nothing in C is compared",
    python ? `NumPy ${python.numpy}` : "NumPy: not on this machine",
    python?.scipy ? `SciPy ${python.scipy}` : "SciPy: not on this machine",
  ];
  return { lines, text: lines.join("\n"), loadBefore: os.loadavg()[0], loadAfter: 0 };
}

const shown = (value, unit) => {
  if (unit === "ns" && value >= 1000) return `${(value / 1000).toPrecision(3)} µs`;
  return `${value.toPrecision(3)} ${unit}`;
};

/** One row for each contestant: name, median, quartiles, least, ratio to the first, wrong counts. */
function rowsOf({ unit, contestants }) {
  const [reference] = contestants;
  return contestants.map(({ name, times, checked }) => {
    const { least, quartile, median, upper } = spreadOf(times);
    const ratio = ratioOf(times, reference.times);
    return {
      name,
      median: shown(median, unit),
      quartiles: `${shown(quartile, unit)} – ${shown(upper, unit)}`,
      least: shown(least, unit),
      ratio:
        contestants.length > 1
          ? `${ratio.median.toPrecision(3)} (${ratio.quartile.toPrecision(3)} – ${ratio.upper.toPrecision(3)})`
          : "",
      wrong: checked ? `${checked.wrongCounts} of ${checked.planets}` : "",
    };
  });
}

export function printQuestion(question) {
  const rows = rowsOf(question);
  const columns = ["name", "median", "quartiles", "least", "ratio", "wrong"].filter((key) =>
    rows.some((row) => row[key]),
  );
  const head = {
    name: question.title,
    median: "median",
    quartiles: "quartiles",
    least: "least",
    ratio: "ratio to first",
    wrong: "wrong counts",
  };
  const wide = columns.map((key) => Math.max(...[head, ...rows].map((row) => row[key].length)));
  const line = (row) =>
    columns.map((key, i) => (i ? row[key].padStart(wide[i]) : row[key].padEnd(wide[i]))).join("  ");
  return `\n${[head, ...rows].map(line).join("\n")}`;
}

export const performancePage = () => "";
