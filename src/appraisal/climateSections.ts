// What the report says of the states of a planet.
import { REDISTRIBUTION_GLOBAL } from "../greenhouse/equilibriumTemperature.ts";
import type { Appraisal } from "./appraisal.ts";
import type { StateAppraisal } from "./appraisedState.ts";
import { feedbackTable } from "./feedbackTable.ts";
import { ledgerTable } from "./ledgerTable.ts";
import { marginLines } from "./marginLines.ts";
import { ECCENTRICITY } from "./missingFacts.ts";
import { kelvin, type Section, shown, signed, type Table, YEAR } from "./report.ts";
import { sensitivityTable } from "./sensitivityTable.ts";

/** States, ledgers, what holds and what would change them, how far they are from an end, and their surfaces. */
export function climateSections({
  found,
  states,
  diagram,
  brightening,
  starlight,
  equilibrium,
  assumptions,
  missing,
}: Appraisal): Section[] {
  if (!found) return [];
  const range = `${found.within.join(" and ")} K`;
  const holding = states.filter((s) => s.feedbacks !== null);
  return [
    {
      title: `Climates with the surface between ${range}`,
      blocks: [...stateBlocks(states), ...sideLines(assumptions, states), ...searchLines(found)],
    },
    {
      title: "Equilibrium temperatures of places in each climate, K",
      blocks: equilibrium.places ? [] : placeTable(states),
    },
    { title: "Energy ledger of each climate that holds, W m-2", blocks: ledgerTable(holding) },
    { title: "What holds each climate", blocks: feedbackTable(holding) },
    { title: "What would change each climate, to first order", blocks: sensitivityTable(holding) },
    {
      title: "How far each climate is from an end of its branch",
      blocks: marginLines(holding, { diagram, brightening }),
    },
    {
      title: "Which average over the orbit suits",
      blocks: [...(starlight.eccentricity === 0 ? [circleText(missing)] : []), ...averagingLines(holding)],
    },
    { title: "Water and carbon dioxide at the surface", blocks: surfaceBlocks(states) },
  ];
}

const circleText = (missing: Appraisal["missing"]): string =>
  missing.some(({ path }) => path === ECCENTRICITY)
    ? "the orbit is taken to be a circle, so that all averages are the same"
    : "the orbit is a circle, so that all averages are the same";

function stateBlocks(states: readonly StateAppraisal[]): Table[] {
  if (states.length === 0) return [];
  const head = [
    "T surface, K",
    "",
    "lambda, W m-2 K-1",
    "e-folding, yr",
    "albedo",
    "T equilibrium, K",
    "greenhouse, K",
  ];
  const rows = states.map(({ state, equilibriumTemperature, greenhouseWarming }) => [
    state.temperature.toFixed(3),
    state.stability,
    state.feedbackParameter.toFixed(3),
    state.eFoldingTime === null || state.eFoldingTime === 0 ? "-" : shown(state.eFoldingTime / YEAR, 4),
    state.report.albedo === undefined ? "" : state.report.albedo.toFixed(4),
    kelvin(equilibriumTemperature),
    // what is left of two temperatures that are the same
    Math.abs(greenhouseWarming) < ROUNDING ? "0" : signed(greenhouseWarming),
  ]);
  return [{ head, rows, right: [0, 2, 3, 4, 5, 6] }];
}

/** K. */
const ROUNDING = 1e-6;

const LEGEND =
  "lambda is what one kelvin more adds to the net flux, below 0 where the climate holds; greenhouse is T surface - T equilibrium";

/** A share other than that of the whole sphere makes states of a part of the planet. */
function sideLines(assumptions: Appraisal["assumptions"], states: readonly StateAppraisal[]): string[] {
  const share = assumptions?.redistribution ?? REDISTRIBUTION_GLOBAL;
  if (share === REDISTRIBUTION_GLOBAL || states.length === 0) return [];
  const part = share < REDISTRIBUTION_GLOBAL ? "night side" : "day side or a part of it";
  return [`these are climates of the ${part}, not of the whole planet: f = ${shown(share)}`];
}

function searchLines(found: NonNullable<Appraisal["found"]>): string[] {
  const { complete, proof, within, undecided, states } = found;
  const range = `between ${within.join(" and ")} K`;
  const none = states.length === 0 ? "no state" : "no other state";
  const legend = states.length === 0 ? [] : [LEGEND];
  const open = proof === "sampled" ? "found by sampling, not proved" : "not all is decided";
  return [
    ...legend,
    complete ? `proved: ${none} ${range}` : `${open}: other states ${range} may exist`,
    ...undecided.map(
      ({ kind, interval }) => `undecided (${kind}) from ${interval.map((t) => shown(t, 8)).join(" to ")} K`,
    ),
  ];
}

/** Where the albedo answers to temperature, each climate has its own. */
function placeTable(states: readonly StateAppraisal[]): Table[] {
  const rows = states.flatMap(({ state, places }) =>
    places
      ? [
          [
            ...[state.temperature, places.substellar, places.day.still, places.day.spread],
            ...[places.night.still, places.night.spread],
          ].map(kelvin),
        ]
      : [],
  );
  const head = ["T surface", "substellar", "day, still", "day, spread", "night, still", "night, spread"];
  return rows.length === 0 ? [] : [{ head, rows, right: head.map((_, i) => i) }];
}

const averagingLines = (states: readonly StateAppraisal[]): string[] =>
  states.map(({ state, averaging: { thermalInertiaRatio, text } }) => {
    const ratio =
      thermalInertiaRatio === null
        ? ""
        : `thermal time / orbital period = ${shown(thermalInertiaRatio, 4)}: `;
    return `at ${kelvin(state.temperature)} K: ${ratio}${text}`;
  });

function surfaceBlocks(states: readonly StateAppraisal[]): (string | Table)[] {
  const or = (value: number | null) => (value === null ? "-" : kelvin(value));
  const rows = states.flatMap(({ state, surface }) => {
    if (!surface) return [];
    const { pressure, water, boilingTemperature, carbonDioxideFrostPoint, carbonDioxideFreezes } = surface;
    const frost = carbonDioxideFreezes === null ? "-" : carbonDioxideFreezes ? "yes" : "no";
    return [
      [
        ...[kelvin(state.temperature), shown(pressure), water, or(boilingTemperature)],
        ...[or(carbonDioxideFrostPoint), frost],
      ],
    ];
  });
  if (rows.length === 0) return [];
  const head = ["T surface, K", "pressure, Pa", "water is", "boils at, K", "CO2 freezes at, K", "CO2 frost"];
  return [
    { head, rows, right: [0, 1, 3, 4] },
    "pure water at the mean temperature; carbon dioxide as if the whole pressure were its own, less of it freezes at a lower temperature",
  ];
}
