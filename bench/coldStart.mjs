// A fresh process: milliseconds from closing a loop to its states, once the package is imported. `node bench/coldStart.mjs ice`
import * as core from "../dist/index.js";
import { budgetsOf } from "./budgets.mjs";
import { WITHIN } from "./populations.mjs";

const budget = budgetsOf(core)[process.argv[2]];
const start = performance.now();
const found = core.findStates(core.closeLoop(budget), { within: WITHIN });
console.log(performance.now() - start, found.states.length, found.proof);
