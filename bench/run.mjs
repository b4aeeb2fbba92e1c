// Everything about speed in one run: `npm run bench`. All contestants of a question take turns, round after round.
//   node bench/run.mjs            prints
//   node bench/run.mjs --quick    fewer rounds and planets, to see that it works
//   node bench/run.mjs --write    also writes docs/performance.md
import { spawnSync } from "node:child_process";
import fs from "node:fs";
import os from "node:os";
import path from "node:path";
import { load } from "../.config/load.mjs";
import * as core from "../dist/index.js";
import { appraisals } from "./appraisals.mjs";
import { diagrams, steps } from "./branches.mjs";
import { enclosures } from "./enclosures.mjs";
import { evaluations } from "./evaluations.mjs";
import { performancePage } from "./page.mjs";
import { buildC, startPython, writeRows } from "./peer.mjs";
import { columnsOf } from "./populations.mjs";
import { describeMachine, printQuestion } from "./report.mjs";
import { consumed, interleave } from "./rounds.mjs";
import { compareStates, searches, workOf } from "./searches.mjs";
import { starts } from "./starts.mjs";
import { threeStates } from "./threeStates.mjs";

const quick = process.argv.includes("--quick");
const ROUNDS = quick ? 7 : 25;
const PLANETS = quick ? 2000 : 20000;
const EVALUATIONS = 200_000;

const folder = fs.mkdtempSync(path.join(os.tmpdir(), "thermostead-bench-"));
const names = ["ice", "vapour"];
const columns = Object.fromEntries(names.map((name) => [name, columnsOf(name, PLANETS)]));
const rowFiles = names.map((name) => path.join(folder, `${name}.rows`));
for (const [i, name] of names.entries()) writeRows(rowFiles[i], columns[name]);

const c = buildC(folder, rowFiles);
const python = await startPython(rowFiles);
const machine = describeMachine(c, python);
console.log(machine.lines.join("\n"));
const questions = [];

/** Every contestant must give the first one's result before any is timed. */
async function agree(question, contestants, tolerance) {
  const totals = await Promise.all(contestants.map((it) => it.total(4096)));
  for (const [i, total] of totals.entries()) {
    if (!(Math.abs(total - totals[0]) <= tolerance * Math.abs(totals[0])))
      throw new Error(`${question}: ${contestants[i].name} gives ${total}, not ${totals[0]}`);
  }
}

/** `compared`: the first contestant is the measure of the others. */
async function ask(title, unit, contestants, compared, note = "") {
  const question = { title, unit, compared, note, contestants: await interleave(contestants, ROUNDS) };
  questions.push(question);
  console.log(printQuestion(question));
}

try {
  const internals = await load("bench/internals.ts");
  const sums = evaluations(internals, columns.ice, c, EVALUATIONS);
  for (const [title, contestants] of Object.entries(sums)) {
    await agree(title, contestants, 1e-10);
    await ask(title, "ns", contestants, c !== null);
  }
  for (const name of names) {
    const title = `enclosures of N, ${name}`;
    await ask(title, "ns", enclosures(internals, name, columns[name], EVALUATIONS / 10), false);
  }
  for (const name of names) {
    const contestants = searches(core, name, columns[name], { c, python, folder });
    const proved = await contestants.find((it) => it.ours).states();
    for (const contestant of contestants) {
      if (contestant.states) contestant.checked = compareStates(await contestant.states(), proved);
      if (contestant.checked?.farthest > 1e-6)
        throw new Error(`${contestant.name}: states ${contestant.checked.farthest} K off`);
    }
    await ask(`all states of a planet, ${name}`, "ns", contestants, true, workOf(core, name, columns[name]));
  }
  await ask("one planet with three states, whole result", "ns", threeStates(core), false);
  await ask("one step along a branch", "ns", steps(core), false);
  await ask("whole diagram of a planet with three states", "ms", diagrams(core), false);
  await ask("one planet as a whole, with three states", "ms", appraisals(), false);
  for (const name of names)
    await ask(`from closing a loop to its states, ${name}`, "ms", starts(core, name), false);
  machine.loadAfter = os.loadavg()[0];
  console.log(
    `load ${machine.loadBefore.toFixed(1)} before, ${machine.loadAfter.toFixed(1)} after (${consumed().toExponential(2)})`,
  );
  if (process.argv.includes("--write")) {
    const page = "docs/performance.md";
    fs.writeFileSync(page, performancePage(machine, questions, { rounds: ROUNDS, planets: PLANETS }));
    spawnSync(process.execPath, ["node_modules/@biomejs/biome/bin/biome", "format", "--write", page]);
  }
} finally {
  c?.end();
  python?.end();
  fs.rmSync(folder, { recursive: true, force: true });
}
