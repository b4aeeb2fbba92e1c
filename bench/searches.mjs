// All states of many planets: ours, proved; and what others do on the same planets without proof.
import path from "node:path";
import { budgetsOf } from "./budgets.mjs";
import { readStates } from "./peer.mjs";
import { rowOf, WITHIN } from "./populations.mjs";
import { timed } from "./rounds.mjs";

/** Planets a round: enough for a few hundredths of a second each. */
const PLANETS = { columns: 4000, sampled: 300, single: 500, numpy: 4000, scipy: 1000 };

const part = (columns, size) =>
  Object.fromEntries(Object.entries(columns).map(([given, column]) => [given, column.subarray(0, size)]));

/** Contestants of one population, and how their states are read: temperatures by planet, or `null` where not proved. */
export function searches(core, name, columns, { c, python, folder }) {
  const loop = core.closeLoop(budgetsOf(core)[name]);
  const rows = Object.values(columns)[0].length;
  const options = { within: WITHIN };
  const singles = Array.from({ length: PLANETS.single }, (_, row) => rowOf(columns, row));

  const fromPeer = async (peer, request) => {
    const file = path.join(folder, "states");
    await peer.ask(`write ${request} ${file}`);
    return readStates(file);
  };
  const fromColumns = (proof) => {
    const found = core.findStatesFor(loop, columns, { ...options, proof });
    const proved = core.ROW_STATUS.indexOf("proved");
    const list = Array.from({ length: rows }, (_, row) =>
      proof && found.status[row] !== proved
        ? null
        : Array.from(found.temperatures.subarray(found.first[row], found.first[row + 1])),
    );
    return list;
  };
  const columnSearch = (title, proof, size) => {
    const few = part(columns, size);
    return {
      name: title,
      ours: proof,
      states: () => fromColumns(proof),
      time: () => timed(size, () => core.findStatesFor(loop, few, { ...options, proof }).temperatures.length),
    };
  };
  const peerSearch = (peer, title, method, size) => ({
    name: title,
    states: () => fromPeer(peer, `${method} ${name} ${rows}`),
    time: async () => (await peer.time(`${method} ${name} ${size}`)).each,
  });

  return [
    c && {
      name: "C -O3, monotone pieces",
      states: () => fromPeer(c, name),
      time: async () => (await c.time(name)).each,
    },
    columnSearch("findStatesFor, proved", true, PLANETS.columns),
    columnSearch("findStatesFor, sampled", false, PLANETS.sampled),
    {
      name: "findStates, proved, whole results",
      time: () =>
        timed(PLANETS.single, () => {
          let states = 0;
          for (const at of singles) states += core.findStates(loop, { within: WITHIN, at }).states.length;
          return states;
        }),
    },
    python && peerSearch(python, "NumPy, grid and Newton", "numpy", PLANETS.numpy),
    python?.scipy && peerSearch(python, "SciPy, grid and brentq", "scipy", PLANETS.scipy),
  ].filter(Boolean);
}

/** What the proved search reads on average: boxes and points a planet. */
export function workOf(core, name, columns) {
  const loop = core.closeLoop(budgetsOf(core)[name]);
  const size = 1000;
  const total = { boxes: 0, points: 0 };
  for (let row = 0; row < size; row++) {
    const { cost } = core.findStates(loop, { within: WITHIN, at: rowOf(columns, row) });
    total.boxes += cost.boxes;
    total.points += cost.points;
  }
  const each = (count) => (count / size).toFixed(1);
  return `The proved search reads ${each(total.boxes)} boxes and ${each(total.points)} points a planet.`;
}

/** How a contestant's states compare with ours where ours are proved. */
export function compareStates(states, proved) {
  const tally = { planets: 0, wrongCounts: 0, farthest: 0 };
  for (const [row, right] of proved.entries()) {
    if (right === null) continue;
    tally.planets++;
    const other = states[row];
    if (other.length !== right.length) tally.wrongCounts++;
    else
      for (const [i, x] of right.entries()) tally.farthest = Math.max(tally.farthest, Math.abs(other[i] - x));
  }
  return tally;
}
