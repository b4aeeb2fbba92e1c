// Milliseconds from closing a loop to its states: in fresh processes, and for new shapes in this warm one.
import { spawnSync } from "node:child_process";
import path from "node:path";
import { WITHIN } from "./populations.mjs";
import { SHAPES, shapedBudget } from "./shapes.mjs";

/** Contestants; a process must have seen no such loop before. */
export function starts(core, name) {
  let shape = 0;
  const search = () => {
    if (shape === SHAPES) throw new Error("all shapes are used up");
    const budget = shapedBudget(core, name, shape++);
    const start = performance.now();
    core.findStates(core.closeLoop(budget), { within: WITHIN });
    return performance.now() - start;
  };
  return [
    {
      name: `${name}, fresh process`,
      time() {
        const file = path.join(import.meta.dirname, "coldStart.mjs");
        const run = spawnSync(process.execPath, [file, name], { encoding: "utf8" });
        if (run.status !== 0) throw new Error(run.stderr);
        return Number(run.stdout.split(" ")[0]);
      },
    },
    { name: `${name}, new shape in a warm process`, time: search },
  ];
}
