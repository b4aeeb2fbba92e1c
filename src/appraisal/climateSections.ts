// What the report says of the states of a planet.
import type { TippingMargins } from "../branches/margins.ts";
import type { Appraisal, StateAppraisal } from "./appraisal.ts";
import { type Section, shown, signed, type Table } from "./report.ts";

const YEAR = 365.25 * 86400;
const GIGAYEAR = 1e9 * YEAR;
const kelvin = (value: number) => value.toFixed(2);

/** States, ledgers, what holds them, how far they are from an end, and their surfaces. */
export function climateSections({ found, states }: Appraisal): Section[] {
  if (!found) return [];
  const range = `${found.within.join(" and ")} K`;
  const holding = states.filter((s) => s.feedbacks !== null);
  return [
    {
      title: `Climates with the surface between ${range}`,
      blocks: [...stateBlocks(states), ...searchLines(found)],
    },
    { title: "Energy ledger of each climate that holds, W m-2", blocks: ledgerTable(holding) },
    { title: "What holds each climate, W m-2 K-1", blocks: feedbackTable(holding) },
    { title: "How far each climate is from an end of its branch", blocks: holding.flatMap(marginLines) },
    { title: "Which average over the orbit suits", blocks: averagingLines(holding) },
    { title: "Water and carbon dioxide at the surface", blocks: surfaceTable(states) },
  ];
}

function stateBlocks(states: readonly StateAppraisal[]): Table[] {
  if (states.length === 0) return [];
  const head = [
    "T surface, K",
    "",
    "lambda, W m-2 K-1",
    "e-folding, yr",
    "albedo",
    "T equilibrium, K",
    "warming, K",
  ];
  const rows = states.map(({ state, equilibriumTemperature, greenhouseWarming }) => [
    state.temperature.toFixed(3),
    state.stability,
    state.feedbackParameter.toFixed(3),
    state.eFoldingTime === null || state.eFoldingTime === 0 ? "-" : shown(state.eFoldingTime / YEAR, 4),
    state.report.albedo === undefined ? "" : state.report.albedo.toFixed(4),
    kelvin(equilibriumTemperature),
    kelvin(greenhouseWarming),
  ]);
  return [{ head, rows, right: [0, 2, 3, 4, 5, 6] }];
}

function searchLines({
  complete,
  proof,
  within,
  undecided,
  states,
}: NonNullable<Appraisal["found"]>): string[] {
  const range = `between ${within.join(" and ")} K`;
  const none = states.length === 0 ? "no state" : "no other state";
  const said = complete ? `proved: ${none} ${range}` : `${proof}: other states ${range} may exist`;
  return [
    said,
    ...undecided.map((u) => `undecided, ${u.kind}: ${u.interval.map((t) => shown(t)).join(" to ")} K`),
  ];
}

/** One column for each state; the last rows show that what goes in comes out or is stored. */
function ledgerTable(states: readonly StateAppraisal[]): Table[] {
  const ledgers = states.map((s) => s.state.ledger);
  const [first] = ledgers;
  if (!first) return [];
  const number = (value: number) => value.toFixed(4).replace(/^-(0\.0*)$/, "$1");
  const flows = first.flows.map(({ name, from, to }, i) => [
    name,
    `${from} to ${to}`,
    ...ledgers.map((ledger) => number(ledger.flows[i]?.value ?? 0)),
  ]);
  const balanced = first.reservoirs.filter((r) => r.storage !== null).map((r) => r.name);
  const sums = balanced.flatMap((name) => {
    const net = ledgers.map(({ flows }) =>
      flows.reduce((sum, f) => sum + (f.to === name ? f.value : f.from === name ? -f.value : 0), 0),
    );
    const stored = ledgers.map((l) => l.reservoirs.find((r) => r.name === name)?.storage ?? 0);
    return [
      [name, "in minus out", ...net.map(number)],
      ["", "stored", ...stored.map(number)],
    ];
  });
  const head = ["flow", "", ...states.map((s) => `at ${kelvin(s.state.temperature)} K`)];
  return [{ head, rows: [...flows, ...sums], right: states.map((_, i) => i + 2) }];
}

/** λ of each state as the sum of its parts. */
function feedbackTable(states: readonly StateAppraisal[]): Table[] {
  const rows = states.flatMap(({ feedbacks }) => {
    if (!feedbacks) return [];
    const { temperature, feedbackParameter, reference, loops, others, gain } = feedbacks;
    return [
      [`at ${kelvin(temperature)} K`, reference.kind, signed(reference.feedbackParameter), ""],
      ...loops.map((loop) => [
        "",
        loop.through.join(" to "),
        signed(loop.feedbackParameter),
        `${loop.effect}${loop.feedbackFactor === null ? "" : `, f = ${shown(loop.feedbackFactor, 4)}`}`,
      ]),
      ...(others ? [["", `${others.count} weaker loops`, signed(others.feedbackParameter), ""]] : []),
      ["", "lambda", signed(feedbackParameter), gain === null ? "" : `gain ${shown(gain, 4)}`],
    ];
  });
  return rows.length === 0 ? [] : [{ head: ["climate", "part", "W m-2 K-1", ""], rows, right: [2] }];
}

/** How far the star may brighten or fade before a state is lost, what comes then, and whether there is a way back. */
function marginLines({ state, margins }: StateAppraisal): string[] {
  if (!margins) return [];
  const lines = [margins.rise, margins.fall].map((side) => marginLine(state.temperature, margins, side));
  const basin = margins.basin && basinText(margins.basin);
  return basin ? [...lines, `at ${kelvin(state.temperature)} K, ${basin}`] : lines;
}

function marginLine(
  temperature: number,
  { along, at }: TippingMargins,
  side: TippingMargins["rise"],
): string {
  const { direction, end, relative, jump, time } = side;
  const change = `${direction === "rise" ? "+" : "-"}${(100 * (relative ?? 0)).toFixed(2)} %`;
  const start = `at ${kelvin(temperature)} K, ${along} ${change}:`;
  if (!jump) return `${start} no end of the branch in the searched range`;
  const next = jump.to
    ? `jumps to ${kelvin(jump.to.temperature)} K`
    : `leaves the range, ${jump.leaves ?? "undecided"}`;
  const years = time === null ? "" : `, in ${shown(time / GIGAYEAR, 3)} Gyr`;
  const back = jump.returnsAt === null ? "no return" : `returns at ${shown(jump.returnsAt / at)} of today`;
  return `${start} ${end.kind} at ${kelvin(end.temperature)} K${years}; ${next}; ${back}`;
}

function basinText({ coldest, hottest }: { coldest: number | null; hottest: number | null }): string {
  const edges = [
    coldest === null ? "" : `below ${kelvin(coldest)} K`,
    hottest === null ? "" : `above ${kelvin(hottest)} K`,
  ].filter(Boolean);
  return edges.length === 0 ? "" : `it is left for another climate from ${edges.join(" or ")}`;
}

/** Only where there is more than one average: the reader chose one for an eccentric orbit. */
const averagingLines = (states: readonly StateAppraisal[]): string[] =>
  states.map(({ state, averaging: { thermalInertiaRatio, text } }) => {
    const ratio =
      thermalInertiaRatio === null ? "" : `thermal inertia ratio ${shown(thermalInertiaRatio, 4)}, `;
    return `at ${kelvin(state.temperature)} K: ${ratio}${text}`;
  });

function surfaceTable(states: readonly StateAppraisal[]): Table[] {
  const rows = states.flatMap(({ state, surface }) => {
    if (!surface) return [];
    const { pressure, water, boilingTemperature, carbonDioxideFrostPoint } = surface;
    const frost = carbonDioxideFrostPoint === null ? "" : kelvin(carbonDioxideFrostPoint);
    const boils = boilingTemperature === null ? "" : kelvin(boilingTemperature);
    return [[kelvin(state.temperature), shown(pressure), water, boils, frost]];
  });
  const head = [
    "T surface, K",
    "pressure, Pa",
    "water is",
    "boils at, K",
    "CO2 of this pressure freezes at, K",
  ];
  return rows.length === 0 ? [] : [{ head, rows, right: [0, 1, 3, 4] }];
}
