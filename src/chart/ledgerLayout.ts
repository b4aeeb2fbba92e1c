// Where the flows of a ledger stand side by side, how wide they are and what is written on them.
import type { Ledger } from "../states/state.ts";
import { textWidth, wrapped } from "./lines.ts";
import { letterOf, numeral } from "./wording.ts";

/** A flow in its true direction, with its place. */
export interface LaidFlow {
  readonly from: string;
  readonly to: string;
  readonly value: number;
  /** All that is known of it, in words. */
  readonly tip: string;
  readonly lines: readonly string[];
  /** Width of the label, px. */
  readonly width: number;
  /** Middle of the band, px. */
  readonly x: number;
  /** Half its width, px. */
  readonly half: number;
}

/** On both sides of a band or label, and the widest band, px. */
const GAP = 8;
const WIDEST = 130;

/** What is to be placed, and the width there is for it, px. */
interface ToLay extends Pick<Ledger, "flows"> {
  /** Of the reservoirs. */
  readonly names: readonly string[];
  readonly room: number;
}

const sum = (values: readonly number[]): number => values.reduce((a, b) => a + b, 0);
const widthOf = (lines: readonly string[]): number => Math.max(...lines.map((line) => textWidth(line, 12)));

/**
 * Places flows between known reservoirs. Takes the fullest labels that fit: name and number, a letter and the
 * number, a letter; what the letters mean is then said in `caption`.
 */
export function layFlows({ flows, names, room }: ToLay): { flows: LaidFlow[]; caption: string[] } {
  const known = flows
    .filter(
      (flow) => [flow.from, flow.to].every((name) => names.includes(name)) && Number.isFinite(flow.value),
    )
    .map((flow, i) => {
      const [from, to] = flow.value < 0 ? [flow.to, flow.from] : [flow.from, flow.to];
      const value = Math.abs(flow.value);
      const [letter, number] = [letterOf(i), numeral(value, 4)];
      const texts = [[...wrapped(flow.name, 105, 12).slice(0, 3), number], [letter, number], [letter]];
      return { from, to, value, texts, tip: `${flow.name}, ${from} → ${to}, ${number}` };
    });
  const level =
    [0, 1].find((k) => sum(known.map((flow) => widthOf(flow.texts[k] as string[]) + 2 * GAP)) <= room) ?? 2;
  const told = known.map((flow) => {
    const lines = flow.texts[level] as string[];
    return { ...flow, lines, width: widthOf(lines) };
  });
  // one scale for all widths: the largest of many for which bands and labels stand side by side
  let scale = WIDEST / Math.max(1e-99, ...told.map((flow) => flow.value));
  const slots = () => told.map((flow) => Math.max(flow.width, flow.value * scale) + 2 * GAP);
  for (let i = 0; i < 200 && sum(slots()) > room; i++) scale *= 0.97;
  const spare = Math.max(0, room - sum(slots())) / told.length;
  let end = 0;
  const laid = told.map((flow, i) => {
    const slot = (slots()[i] as number) + spare;
    end += slot;
    return { ...flow, x: end - slot / 2, half: Math.max(0.6, (flow.value * scale) / 2) };
  });
  return { flows: laid, caption: level > 0 ? laid.map((flow, i) => `${letterOf(i)}: ${flow.tip}`) : [] };
}
