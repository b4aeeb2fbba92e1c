// Where the flows of a ledger stand side by side, how wide they are and what is written on them.
import type { Ledger } from "../states/state.ts";
import { textWidth, wrapped } from "./lines.ts";
import { letterOf, numeral } from "./wording.ts";

/** A flow in its true direction, with its place. */
export interface LaidFlow {
  readonly from: string;
  readonly to: string;
  readonly value: number;
  /** Middle of the band, px. */
  readonly x: number;
  /** Half its width, px. */
  readonly half: number;
  readonly label: readonly string[];
}

const GAP = 8;
const WIDEST = 130;

/** What is to be placed, and the width there is for it, px. */
interface ToLay extends Pick<Ledger, "flows"> {
  /** Of the reservoirs. */
  readonly names: readonly string[];
  readonly room: number;
}

const sum = (values: readonly number[]): number => values.reduce((a, b) => a + b, 0);

/**
 * Places flows between known reservoirs. Takes the fullest labels that fit: name and number, a letter and the
 * number, a letter; what the letters mean is then said in `captions`.
 */
export function layFlows({ flows, names, room }: ToLay): {
  laid: LaidFlow[];
  lines: number;
  captions: string[];
} {
  const drawn = flows
    .filter(
      (f) => names.includes(f.from) && names.includes(f.to) && f.from !== f.to && Number.isFinite(f.value),
    )
    .map((f) => (f.value < 0 ? { ...f, from: f.to, to: f.from, value: -f.value } : f));
  const tries = [
    drawn.map((f) => [...wrapped(f.name, 105, 12).slice(0, 3), numeral(f.value, 4)]),
    drawn.map((f, i) => [letterOf(i), numeral(f.value, 4)]),
    drawn.map((_, i) => [letterOf(i)]),
  ];
  const needs = (labels: string[][]): number[] =>
    labels.map((lines) => GAP + Math.max(10, ...lines.map((line) => textWidth(line, 12) + GAP)));
  const fit = tries.findIndex((labels) => sum(needs(labels)) <= room);
  const labels = tries.at(fit) as string[][];
  const wanted = needs(labels);
  // one scale for all widths: the largest for which bands and labels stand side by side
  const slots = (scale: number): number[] =>
    drawn.map((f, i) => Math.max(wanted[i] as number, f.value * scale + 8 + GAP));
  let [low, high] = [0, WIDEST / Math.max(1e-99, ...drawn.map((f) => f.value))];
  for (let i = 0; i < 40; i++) {
    const scale = (low + high) / 2;
    [low, high] = sum(slots(scale)) > room ? [low, scale] : [scale, high];
  }
  const spare = Math.max(0, room - sum(slots(low))) / drawn.length;
  const widths = slots(low).map((slot) => slot + spare);
  return {
    laid: drawn.map(({ from, to, value }, i) => ({
      ...{ from, to, value, label: labels[i] as string[], half: Math.max(0.6, (value * low) / 2) },
      x: sum(widths.slice(0, i)) + (widths[i] as number) / 2,
    })),
    lines: Math.max(1, ...labels.map((label) => label.length)),
    captions:
      fit === 0
        ? []
        : drawn.map((f, i) => `${letterOf(i)}: ${f.name}, ${f.from} → ${f.to}, ${numeral(f.value, 4)}`),
  };
}
