// Branches of the smooth loop with three states: its whole diagram, hot and in a fresh process, and one step along a branch.
import { spawnSync } from "node:child_process";
import path from "node:path";
import { timed } from "./rounds.mjs";
import { threeStatesLoop } from "./threeStates.mjs";

export const DIAGRAM = { along: "flux", between: [900, 1800], within: [150, 400] };
const coldDiagram = path.join(import.meta.dirname, "coldDiagram.mjs");
const DIAGRAMS = 20;
const STEPS = 5000;

/** Throws for anything but the diagram that every contestant must give. */
export function checkedDiagram({ branches, folds, complete }) {
  if (branches.length !== 3 || folds.length !== 2 || !complete) throw new Error("another diagram");
  return folds[0].at;
}

/** Milliseconds of a whole diagram. */
export function diagrams(core) {
  const loop = threeStatesLoop(core);
  const hot = () =>
    timed(DIAGRAMS * 1e6, () => {
      let total = 0;
      for (let i = 0; i < DIAGRAMS; i++) total += checkedDiagram(core.traceBranches(loop, DIAGRAM));
      return total;
    });
  return [
    { name: "traceBranches, hot", time: hot },
    { name: "fresh process, by the clock", time: () => freshProcess()[0] },
    { name: "fresh process, processor time", time: () => freshProcess()[1] },
  ];
}

/** Nanoseconds of a step of one per mille in the flux along the warmest branch. */
export function steps(core) {
  const loop = threeStatesLoop(core);
  const fluxes = [1361, 1362.361];
  const starts = fluxes.map(
    (flux) => core.findStates(loop, { within: DIAGRAM.within, at: { flux } }).states[2],
  );
  const time = () =>
    timed(STEPS, () => {
      let total = 0;
      for (let i = 0; i < STEPS; i++) {
        const { state } = core.followState(loop, starts[i % 2], { to: { flux: fluxes[(i + 1) % 2] } });
        total += state.temperature;
      }
      return total;
    });
  return [{ name: "followState, proved", time }];
}

/** Time by the clock, and processor time. */
function freshProcess() {
  const run = spawnSync(process.execPath, [coldDiagram], { encoding: "utf8" });
  if (run.status !== 0) throw new Error(run.stderr);
  return run.stdout.split(" ").map(Number);
}
