// What was aimed at, next to what was measured.
import { shown } from "./report.mjs";
import { ratioOf, spreadOf } from "./rounds.mjs";

const kinds = { ice: "icy planets", vapour: "planets with vapour" };
const OURS = "findStatesFor, proved";

/** Lines of a table: what, aim, measured, whether it is reached. What was not measured on this machine is left out. */
export function goalsMet(questions) {
  const timesOf = (title, name) =>
    questions.find((it) => it.title === title)?.contestants.find((it) => it.name.startsWith(name))?.times;
  const lines = [];
  const time = (what, limit, unit, times) => {
    if (!times) return;
    const { median } = spreadOf(times);
    lines.push([what, `≤ ${shown(limit, unit)}`, shown(median, unit), median <= limit]);
  };
  const ratio = (what, above, below, aim, holds) => {
    if (!above || !below) return;
    const { median } = ratioOf(above, below);
    lines.push([what, aim, `${median.toPrecision(3)} ×`, holds(median)]);
  };

  for (const [name, most, overSciPy] of [
    ["ice", 1.6, 12],
    ["vapour", 2.5, 10],
  ]) {
    const title = `all states of a planet, ${name}`;
    const ours = timesOf(title, OURS);
    const at = (peer) => timesOf(title, peer);
    ratio(`time of C, ${kinds[name]}, proved`, ours, at("C"), `≤ ${most} ×`, (it) => it <= most);
    ratio(
      `faster than SciPy, ${kinds[name]}`,
      at("SciPy"),
      ours,
      `≥ ${overSciPy} ×`,
      (it) => it >= overSciPy,
    );
    ratio(`faster than NumPy, ${kinds[name]}`, at("NumPy"), ours, "> 1 ×", (it) => it > 1);
  }
  time(
    "findStates with three states, hot",
    40_000,
    "ns",
    timesOf("one planet with three states, whole result", "findStates"),
  );
  const diagram = "whole diagram of a planet with three states";
  time("traceBranches with three states, hot", 1, "ms", timesOf(diagram, "traceBranches"));
  time("traceBranches in a fresh process", 10, "ms", timesOf(diagram, "fresh process, processor time"));
  time(
    "followState where nothing is lost, hot",
    5000,
    "ns",
    timesOf("one step along a branch", "followState"),
  );
  const whole = "one planet as a whole, with three states";
  time("appraisePlanet, hot", 1, "ms", timesOf(whole, "appraisePlanet"));
  for (const [name, fresh] of [
    ["ice", 10],
    ["vapour", 14],
  ]) {
    const title = `from closing a loop to its states, ${name}`;
    time(`fresh process, ${kinds[name]}`, fresh, "ms", timesOf(title, "fresh process, by"));
    time(
      `new shape in a warm process, ${kinds[name]}`,
      5,
      "ms",
      timesOf(title, "new shape in a warm process, by"),
    );
  }
  return lines;
}
