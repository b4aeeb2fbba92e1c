// What is shown of a result, before it becomes HTML, Markdown or plain text.
import { type CouplingGraph, couplingGraph, couplingPlot } from "./couplingGraph.ts";
import { diagramChart } from "./diagramChart.ts";
import { feedbackBars } from "./feedbackBars.ts";
import { type LedgerDrawing, ledgerDrawing, ledgerPlot } from "./ledgerDrawing.ts";
import { countsText } from "./planetsChart.ts";
import type { Plot } from "./plot.ts";
import { budgetChart, statesChart } from "./statesChart.ts";
import { type Table, tablesOf } from "./tables.ts";

/** A picture as data. */
export type Picture = Plot | LedgerDrawing | CouplingGraph;

/** Pictures whose parts stand where the width lets them. */
const DRAWINGS = { ledger: ledgerPlot, couplings: couplingPlot };

/** A picture for a width. */
export const plotFor = (picture: Picture, width: number): Plot =>
  picture.picture === "plot" ? picture : DRAWINGS[picture.picture](picture as never, width);

/** A result in words, tables and pictures. */
export interface Report {
  readonly lines: readonly string[];
  readonly tables: readonly Table[];
  readonly pictures: readonly Picture[];
}

/** The pictures of a result by the field by which its kind is known; the first that it has counts. */
const KINDS: Readonly<Record<string, (result: never) => Picture[]>> = {
  picture: (picture) => [picture],
  ledger: ({ ledger }) => [ledgerDrawing(ledger)],
  reservoirs: (ledger) => [ledgerDrawing(ledger)],
  starlight: ({ diagram, found }) =>
    [diagram && diagramChart({ diagram }), found && statesChart(found)].filter(Boolean),
  states: (found) => [statesChart(found)],
  reference: (feedbacks) => [feedbackBars(feedbacks), couplingGraph(feedbacks)],
  branches: (diagram) => [diagramChart({ diagram })],
  dropped: (budget) => [budgetChart({ budget })],
  // tables alone: all else that says how sure it is, and rows
  proof: () => [],
  rows: () => [],
  values: () => [],
};

/** What some results hold. */
interface Parts extends Readonly<Record<string, unknown>> {
  readonly notes?: readonly { readonly severity?: string; readonly about?: string; readonly text: string }[];
  readonly counts?: Uint8Array;
}

/** What is shown of a result. It is known by its fields, so that it may come from JSON; throws where it is of no known kind. */
export function reportOf(result: unknown): Report {
  const isRows = Array.isArray(result) && result.some((row) => "name" in row);
  const parts = (isRows ? { values: result } : result) as Parts;
  const [kind, picturesOf] = Object.entries(KINDS).find(([field]) => field in parts) as [
    string,
    (result: never) => Picture[],
  ];
  const pictures = picturesOf(parts as never);
  const plots = pictures.map((picture) => plotFor(picture, 640));
  return {
    lines: [
      ...plots.flatMap(({ title, caption }) => [title, ...caption]),
      parts.counts && countsText(parts as Required<Parts>),
      ...(parts.notes ?? []).map((note) => [note.severity, note.about, note.text].filter(Boolean).join(", ")),
    ].filter(Boolean) as string[],
    pictures,
    tables: kind === "picture" ? [] : tablesOf(parts),
  };
}

/** Anything in a few lines, whatever it is. */
export function jsonReport(result: unknown): Report {
  let text: string = typeof result;
  try {
    text = JSON.stringify(result, null, 1) ?? text;
  } catch {
    // what refuses to be read, or leads back to itself
  }
  const cut = text.length > 2000 ? `${text.slice(0, 2000)} …` : text;
  return {
    lines: ["No result that docs/charts.md lists, as JSON:", cut],
    tables: [],
    pictures: [],
  };
}
