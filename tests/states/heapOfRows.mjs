// Prints what one row of findStatesFor takes from the heap, bytes, again and again: `node heapOfRows.mjs <population>`.
import * as core from "thermostead";
import { budgetsOf } from "../../bench/budgets.mjs";
import { columnsOf, WITHIN } from "../../bench/populations.mjs";

const ROWS = 2000;
const ROUNDS = 60;

const [name] = process.argv.slice(2);
const loop = core.closeLoop(budgetsOf(core)[name]);
const columns = columnsOf(name, ROWS);

const bytes = [];
for (let round = 0; round < ROUNDS; round++) {
  const before = process.memoryUsage().heapUsed;
  core.findStatesFor(loop, columns, { within: WITHIN });
  bytes.push((process.memoryUsage().heapUsed - before) / ROWS);
}
process.stdout.write(JSON.stringify(bytes));
