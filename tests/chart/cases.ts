// Results and pictures that the tests of the chart door look at: an invented planet with several climates and couplings.

import { tanhAlbedo } from "../../src/albedo/tanhAlbedo.ts";
import type { Diagram } from "../../src/branches/diagram.ts";
import { solveFor } from "../../src/branches/solveFor.ts";
import { tippingMargins } from "../../src/branches/tippingMargins.ts";
import { traceBranches } from "../../src/branches/traceBranches.ts";
import { couplingGraph } from "../../src/chart/couplingGraph.ts";
import { diagramChart } from "../../src/chart/diagramChart.ts";
import { feedbackBars } from "../../src/chart/feedbackBars.ts";
import { ledgerDrawing } from "../../src/chart/ledgerDrawing.ts";
import { limitsChart } from "../../src/chart/limitsChart.ts";
import { planetsChart } from "../../src/chart/planetsChart.ts";
import type { Picture } from "../../src/chart/report.ts";
import { budgetChart, statesChart } from "../../src/chart/statesChart.ts";
import { analyseFeedbacks } from "../../src/feedback/analyseFeedbacks.ts";
import { compareHeld } from "../../src/feedback/compareHeld.ts";
import { inUnit, mul } from "../../src/graph/operations.ts";
import { greyEmission } from "../../src/greenhouse/greyEmission.ts";
import { closeLoop } from "../../src/loop/closeLoop.ts";
import { holdFixed } from "../../src/loop/holdFixed.ts";
import { absorbedFlux } from "../../src/star/absorbedFlux.ts";
import { budgetCurve } from "../../src/states/budgetCurve.ts";
import { findStates } from "../../src/states/findStates.ts";
import { findStatesFor } from "../../src/states/findStatesFor.ts";
import type { FoundStates, Ledger } from "../../src/states/state.ts";

/** A planet with ice, and with a haze that follows the albedo: three states, three feedback loops, one of them a chain. */
export const loop = closeLoop(({ temperature, given, couple }) => {
  const flux = given("flux", 1361, "W m-2", { within: [0, 1e5] });
  const emissivity = given("emissivity", 0.6, "1", { within: [0.01, 1] });
  const albedo = couple(
    "albedo",
    tanhAlbedo({ temperature, cold: 0.7, warm: 0.3, midpoint: 265, width: 10 }),
  );
  const haze = couple("haze", mul(0.05, albedo));
  return {
    heating: { sunlight: absorbedFlux({ flux, albedo }), hazeGlow: inUnit(mul(20, haze), "W m-2") },
    cooling: { longwave: greyEmission({ temperature, emissivity }) },
    heatCapacity: 4.2e8,
  };
});

export const within = [150, 400] as const;
export const found = findStates(loop, { within });
export const state = found.states.at(-1) as (typeof found.states)[number];
export const budget = budgetCurve(loop, { within });
export const feedbacks = analyseFeedbacks(loop, state);
const along = { along: "flux", between: [900, 1900], within } as const;
export const diagram = traceBranches(loop, along);
export const held = traceBranches(holdFixed(loop, ["albedo"], state), along);
export const flux = Float64Array.from({ length: 60 }, (_, i) => 900 + 17 * i);
export const columns = findStatesFor(loop, { flux }, { within });

const flow = (name: string, from: string, to: string, value: number) => ({
  name,
  from,
  to,
  value,
  standardName: null,
});

/** An invented planet whose air takes part; its surface keeps a little. */
export const airy: Ledger = {
  reservoirs: [
    { name: "space", storage: null },
    { name: "surface", storage: 1 },
    { name: "air", storage: 0 },
    { name: "interior", storage: null },
  ],
  flows: [
    flow("starlight to the ground", "space", "surface", 150),
    flow("starlight to the air", "space", "air", 70),
    flow("longwave of the ground", "surface", "air", 340),
    flow("window", "surface", "space", 30),
    flow("rising warmth", "surface", "air", 91),
    flow("longwave to space", "air", "space", 190),
    flow("back radiation", "air", "surface", 311),
    flow("inner heat", "interior", "surface", 1),
  ],
};

/** So many branches, as a catalogue of kinks could have; some are undecided, and so is a part of the plane. */
export function manyBranches(count: number): Diagram {
  const range = (i: number): [number, number] => [200 + i / 10, 200.05 + i / 10];
  const end = (at: number, temperature: number) => ({
    ...{ kind: "between" as const, at, atBracket: [at, at] as const },
    ...{ temperature, temperatureBracket: [temperature, temperature] as const },
  });
  return {
    ...{ ...diagram, folds: [], jumps: [], gaps: [], crossings: [], complete: false, proof: "partial" },
    undecided: [{ temperatures: [250, 252], parameters: [1000, 1100], kind: "continuum" }],
    branches: Array.from({ length: count }, (_, i) => ({
      stability: (["stable", "unstable", "undecided"] as const)[i % 3] as "stable",
      ...{
        parameters: [900, 1900],
        temperatures: range(i),
        low: end(900, range(i)[0]),
        high: end(1900, range(i)[1]),
      },
      points: range(i).map((temperature, k) => ({ at: 900 + 1000 * k, temperature, feedbackParameter: -1 })),
    })),
  };
}

/** Text that would do harm if it were not escaped. */
export const HARM = `<script>alert("1")</script>|*_\`$&'\u0000\ud800`;

export const points = (level: number) =>
  Array.from({ length: 12 }, (_, i) => ({
    effectiveTemperature: 2600 + 400 * i,
    flux: level * (800 + 30 * i),
  }));

export const limits = [
  { name: "runaway greenhouse", paper: "Imagined & Other 2031", points: points(1.2) },
  { name: "runaway, slow rotators", paper: "Imagined & Other 2033", points: points(1.5) },
  { name: "maximum greenhouse", paper: "Imagined & Other 2031", points: points(0.4) },
  { name: "early dryness", paper: "Nobody et al. 2029", points: points(0.39) },
];
const planets = [
  { name: "Orsolne", effectiveTemperature: 4100, flux: 1530 },
  { name: "Velumbra", effectiveTemperature: 5600, flux: 800 },
];

const nothing: FoundStates = {
  ...found,
  states: [],
  undecided: [{ interval: [200, 210], kind: "flat", counts: null, enclosure: null, distances: null }],
  proof: "partial",
  complete: false,
};

/** Every kind of picture, and what goes to its limits. */
export const pictures: Readonly<Record<string, Picture>> = {
  ledger: ledgerDrawing(state.ledger),
  "ledger with air": ledgerDrawing(airy),
  "ledger without flows": ledgerDrawing({ reservoirs: [], flows: [] }),
  budget: budgetChart({ budget, found }),
  "budget by itself": budgetChart({ budget }),
  states: statesChart(found),
  "no states": statesChart(nothing),
  "one state": statesChart({ ...found, states: [state] }),
  diagram: diagramChart({ diagram, held, state }),
  "a thousand branches": diagramChart({ diagram: manyBranches(1000) }),
  "no branches": diagramChart({ diagram: manyBranches(0) }),
  bars: feedbackBars(feedbacks),
  couplings: couplingGraph(feedbacks),
  limits: limitsChart({ planets, limits }),
  "many limits": limitsChart({
    planets: Array.from({ length: 40 }, (_, i) => ({
      name: `P${i}`,
      effectiveTemperature: 3000 + 90 * i,
      flux: 400 + 20 * i,
    })),
    limits: Array.from({ length: 30 }, (_, i) => ({
      name: `limit ${i}`,
      paper: "N 2029",
      points: points(1 + i / 9),
    })),
  }),
  "no limits": limitsChart({ planets: [], limits: [] }),
  planets: planetsChart({ states: columns, values: flux }),
  "names with markup": limitsChart({
    planets: [{ name: HARM, effectiveTemperature: 4000, flux: 900 }],
    limits: [{ name: HARM, paper: HARM, points: points(1) }],
  }),
};

/** Every kind of result. */
export const results: Readonly<Record<string, unknown>> = {
  found,
  state,
  ledger: state.ledger,
  budget,
  feedbacks,
  diagram,
  margins: tippingMargins(loop, state, along),
  solutions: solveFor(loop, { unknown: "emissivity", temperature: 288, within: [0.1, 1] }),
  comparison: compareHeld(loop, { from: state, change: { flux: 1400 }, hold: ["albedo"] }),
  columns,
  rows: [
    { name: "flux", value: 1361, unit: "W m-2" },
    { name: "shape", value: "round", unit: "1" },
  ],
};
