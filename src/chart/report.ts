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

/** A picture for a width. */
export function plotFor(picture: Picture, width: number): Plot {
  if (picture.picture === "plot") return picture;
  return picture.picture === "ledger" ? ledgerPlot(picture, width) : couplingPlot(picture, width);
}

/** A result in words, tables and pictures. */
export interface Report {
  readonly lines: readonly string[];
  readonly tables: readonly Table[];
  readonly pictures: readonly Picture[];
}

/** Fields by which a kind of result is known, and its pictures. The first that fits is taken. */
const KINDS: readonly (readonly [string, (result: never) => Picture[]])[] = [
  ["picture", (picture) => [picture]],
  ["ledger bracket", ({ ledger }) => [ledgerDrawing(ledger)]],
  ["reservoirs flows", (ledger) => [ledgerDrawing(ledger)]],
  ["states within proof", (found) => [statesChart(found)]],
  ["reference loops through", (feedbacks) => [feedbackBars(feedbacks), couplingGraph(feedbacks)]],
  ["branches folds along", (diagram) => [diagramChart({ diagram })]],
  ["points within dropped", (budget) => [budgetChart({ budget })]],
  ["starlight found", ({ found }) => (found ? [statesChart(found)] : [])],
  // tables alone
  ...["curves cusps", "temperatures counts first", "rise fall", "solutions unknown", "subsets hold"].map(
    (fields) => [fields, () => []] as const,
  ),
];

/** What some results hold. */
interface Parts {
  readonly notes?: readonly { readonly severity?: string; readonly about?: string; readonly text: string }[];
  readonly counts?: Uint8Array;
}

/**
 * What is shown of a result; null where it is of no known kind, or not what it seems. It is known by its fields, so that it
 * may come from JSON.
 */
export function reportOf(result: unknown): Report | null {
  try {
    const has = (fields: string, of = result): boolean =>
      fields.split(" ").every((field) => field in (of as object));
    const kind = KINDS.find(([fields]) => has(fields));
    const isRows =
      Array.isArray(result) && result.length > 0 && result.every((row) => has("name value", row));
    if (!kind && !isRows) return null;
    const pictures = kind?.[1](result as never) ?? [];
    const { notes = [], counts } = result as Parts;
    const [first] = pictures.map((picture) => plotFor(picture, 640));
    const lines = [
      ...(first ? [first.title, ...first.caption] : []),
      ...(counts ? [countsText({ counts })] : []),
      ...notes.map((note) => [note.severity, note.about, note.text].filter(Boolean).join(", ")),
    ];
    return {
      lines,
      pictures,
      tables: has("picture") ? [] : tablesOf(isRows ? { rows: result } : (result as never)),
    };
  } catch {
    return null;
  }
}
