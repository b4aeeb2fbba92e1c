// Two populations of invented planets with fixed seeds: icy ones, and ones whose air also holds water vapour and CO₂.
import { randomNumbers } from "./random.mjs";

/** The temperatures between which all states are wanted, K. */
export const WITHIN = [2.7, 2000];

const absorbing = {
  flux: [900, 1800], // W m-2
  internalFlux: [0, 2], // W m-2
  cold: [0.55, 0.75],
  warm: [0.2, 0.35],
  midpoint: [255, 275], // K
  width: [5, 25], // K
};

/** What each given is drawn from, uniformly, in the order of the columns. */
export const populations = {
  ice: { seed: 20260101, ranges: { ...absorbing, emissivity: [0.55, 0.7] } },
  vapour: {
    seed: 20260202,
    ranges: {
      ...absorbing,
      dry: [0.2, 0.8], // optical depth without water vapour
      wet: [0.05, 0.6], // optical depth of water vapour at 288 K
      latent: [5200, 5600], // latent heat over the gas constant of vapour, K
      concentration: [50, 20000], // CO₂, ppm
    },
  },
};

/** One Float64Array for each given; row i of all of them is planet i, whatever the size. */
export function columnsOf(name, size) {
  const { seed, ranges } = populations[name];
  const random = randomNumbers(seed);
  const columns = Object.fromEntries(Object.keys(ranges).map((given) => [given, new Float64Array(size)]));
  for (let row = 0; row < size; row++) {
    for (const [given, [low, high]] of Object.entries(ranges))
      columns[given][row] = low + (high - low) * random();
  }
  return columns;
}

/** The givens of one planet. */
export const rowOf = (columns, row) =>
  Object.fromEntries(Object.entries(columns).map(([given, column]) => [given, column[row]]));
