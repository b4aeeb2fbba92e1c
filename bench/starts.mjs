// Milliseconds from closing a loop to its states: in fresh processes, and for new shapes in this warm one.
import { spawnSync } from "node:child_process";
import path from "node:path";
import { WITHIN } from "./populations.mjs";
import { processorTime } from "./rounds.mjs";
import { SHAPES, shapedBudget } from "./shapes.mjs";

const coldStart = path.join(import.meta.dirname, "coldStart.mjs");

/** Time by the clock, and processor time. */
function freshProcess(name) {
  const run = spawnSync(process.execPath, [coldStart, name], { encoding: "utf8" });
  if (run.status !== 0) throw new Error(run.stderr);
  return run.stdout.split(" ").map(Number);
}

/** Contestants for one population; this process must not have seen its shapes before. */
export function starts(core, name) {
  let shape = 0;
  const newShape = (clock) => {
    if (shape === SHAPES) throw new Error("all shapes are used up");
    const budget = shapedBudget(core, name, shape++);
    const start = clock();
    core.findStates(core.closeLoop(budget), { within: WITHIN });
    return clock() - start;
  };
  return [
    { name: "fresh process, by the clock", time: () => freshProcess(name)[0] },
    { name: "fresh process, processor time", time: () => freshProcess(name)[1] },
    { name: "new shape in a warm process, by the clock", time: () => newShape(() => performance.now()) },
    {
      name: "new shape in a warm process, processor time",
      time: () => newShape(() => processorTime() / 1e6),
    },
  ];
}
