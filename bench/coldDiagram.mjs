// A fresh process: milliseconds from closing a loop to its diagram, once the package is imported, by the clock and in processor
// time of all threads. `node bench/coldDiagram.mjs`
import * as core from "../dist/index.js";
import { checkedDiagram, DIAGRAM } from "./branches.mjs";
import { threeStatesLoop } from "./threeStates.mjs";

const before = process.cpuUsage();
const start = performance.now();
const diagram = core.traceBranches(threeStatesLoop(core), DIAGRAM);
const elapsed = performance.now() - start;
const { user, system } = process.cpuUsage(before);
checkedDiagram(diagram);
console.log(elapsed, (user + system) / 1000);
