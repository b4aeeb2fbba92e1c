// Where the flows of a ledger stand side by side, how wide they are and what is written on them.
import type { Ledger } from "../states/state.ts";
import { LINE } from "./layout.ts";
import { textWidth, wrapped } from "./lines.ts";
import { isNear } from "./plot.ts";
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
  /** Distance of its label from where labels begin, px. */
  readonly down: number;
}

/** Between bands or labels, and the widest band, px. */
const GAP = 16;
const WIDEST = 130;

/** What is to be placed, and the width there is for it, px. */
interface ToLay extends Pick<Ledger, "flows"> {
  /** Of the reservoirs. */
  readonly names: readonly string[];
  readonly room: number;
}

const widthOf = (lines: readonly string[]): number => Math.max(...lines.map((line) => textWidth(line, 12)));

/**
 * Places flows between known reservoirs. Takes the fullest labels that fit: name and number, a letter and the
 * number, a letter; what the letters mean is then said in `caption`. Letters need no room of their own: where flows
 * are close they stand in rows, so that any number of flows fits. A flow of nothing is not drawn.
 */
export function layFlows({ flows, names, room }: ToLay): { flows: LaidFlow[]; caption: (string | false)[] } {
  const known = flows
    .filter(
      ({ from, to, value }) =>
        names.includes(from) && names.includes(to) && isNear(value) && isNear(1 / value),
    )
    .map((flow, i) => {
      const [from, to] = flow.value < 0 ? [flow.to, flow.from] : [flow.from, flow.to];
      const value = Math.abs(flow.value);
      const [letter, number] = [letterOf(i), numeral(value, 4)];
      const texts = [[...wrapped(flow.name, 105, 12).slice(0, 3), number], [letter, number], [letter]];
      return { from, to, value, texts, tip: `${flow.name}, ${from} → ${to}, ${number}` };
    });
  const level =
    [0, 1].find(
      (k) => known.reduce((sum, flow) => sum - widthOf(flow.texts[k] as string[]) - GAP, room) >= 0,
    ) ?? 2;
  const told = known.map((flow) => {
    const lines = flow.texts[level] as string[];
    return { ...flow, lines, width: widthOf(lines) };
  });
  const gap = Math.min(GAP, room / 2 / told.length);
  const rows = level < 2 ? 1 : Math.ceil(widthOf([letterOf(told.length)]) / gap + 0.1);
  // one scale for all widths: the largest of many for which bands and labels stand side by side
  let scale = WIDEST / Math.max(...told.map((flow) => flow.value));
  const slotOf = (flow: { width: number; value: number }) =>
    Math.max(level < 2 ? flow.width : 0, flow.value * scale) + gap;
  const spare = () => told.reduce((sum, flow) => sum - slotOf(flow), room);
  // a pixel is there for rounding
  while (spare() < -1) scale *= 0.97;
  let end = 0;
  const laid = told.map((flow, i) => {
    const slot = slotOf(flow) + spare() / told.length;
    end += slot;
    return {
      ...flow,
      x: end - slot / 2,
      half: Math.max(0.6, (flow.value * scale) / 2),
      down: (i % rows) * LINE,
    };
  });
  return { flows: laid, caption: laid.map((flow, i) => level > 0 && `${letterOf(i)}: ${flow.tip}`) };
}
