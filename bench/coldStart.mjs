// A fresh process: milliseconds from closing a loop to its states, once the package is imported, by the clock and in
// processor time of all threads. `node bench/coldStart.mjs ice`
import * as core from "../dist/index.js";
import { budgetsOf } from "./budgets.mjs";
import { WITHIN } from "./populations.mjs";

const budget = budgetsOf(core)[process.argv[2]];
const before = process.cpuUsage();
const start = performance.now();
core.findStates(core.closeLoop(budget), { within: WITHIN });
const elapsed = performance.now() - start;
const { user, system } = process.cpuUsage(before);
console.log(elapsed, (user + system) / 1000);
