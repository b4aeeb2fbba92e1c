// The energy ledger as a drawing of flows.
import type { Ledger } from "../states/state.ts";
import { EDGE, LINE } from "./layout.ts";
import { layFlows } from "./ledgerLayout.ts";
import { clipped, textWidth } from "./lines.ts";
import type { Colour } from "./palette.ts";
import { drawingOf, type Item, type Layer, layerOf, type Plot } from "./plot.ts";
import { FLUX, signed, unitText } from "./wording.ts";

/** The drawing of a ledger; where its parts stand follows from the width it is asked for. */
export interface LedgerDrawing {
  readonly picture: "ledger";
  readonly ledger: Ledger;
}

/**
 * The ledger as a drawing: reservoirs as boxes, space on top and the interior below, and flows as bands whose widths are to
 * one scale, each with its number. W m⁻² of the planet's whole area.
 *
 * @example toSVG(ledgerDrawing(state.ledger), { width: 360 })
 */
export const ledgerDrawing = (ledger: Ledger): LedgerDrawing => Object.freeze({ picture: "ledger", ledger });

const BOX = 36;
/** Length of an arrow's head, px. */
const HEAD = 9;
/** From top to bottom: what is none of these is a layer, and stands in the second place. */
const STACK = ["space", "", "surface", "interior"];

export function ledgerPlot({ ledger: { reservoirs, flows } }: LedgerDrawing, width: number): Plot {
  const inner = width - 2 * EDGE;
  const level = ({ name }: { name: string }): number => Math.abs(STACK.indexOf(name));
  const stack = [...reservoirs].sort((a, b) => level(a) - level(b));
  const names = stack.map((reservoir) => reservoir.name);
  const gutter = 14 + Math.min(0.24 * width, Math.max(40, ...names.map((name) => textWidth(name, 12))));
  const { laid, lines, captions } = layFlows({ flows, names, room: inner - gutter - 6 });
  const pitch = BOX + Math.max(64, lines * LINE + 32);
  const topOf = (name: string): number => names.indexOf(name) * pitch;

  const drawn = laid.map(({ from, to, x, half, label }, line) => {
    const down = topOf(to) > topOf(from);
    const side = down ? 1 : -1;
    const start = topOf(from) + (down ? BOX : 0);
    const end = topOf(to) + (down ? 0 : BOX);
    const at = (dx: number, y: number): Item => ({ x: gutter + x + dx, y, line });
    const neck = end - side * HEAD;
    const [wide, kind] = [half + 4, from === "space" ? 0 : to === "space" ? 1 : 2];
    // labels stand in the gap where a flow begins, so that flows across a layer do not write on it
    const y = start + (down ? 10 : -12 - label.length * LINE);
    const room = Math.max(0, ...label.map((words) => textWidth(words, 12))) / 2;
    return {
      kind,
      band: [
        at(-half, start),
        at(-half, neck),
        at(-wide, neck),
        at(0, end),
        at(wide, neck),
        at(half, neck),
        at(half, start),
      ],
      card: { ...at(-room, y), x2: gutter + x + room, y2: y + label.length * LINE + 2 },
      words: label.map((text, i) => ({ ...at(0, y + 12 + i * LINE), text })),
    };
  });
  const bands = (name: string, colour: Colour, kind: number): Layer =>
    layerOf(
      "line",
      { colour, full: true },
      drawn.filter((d) => d.kind === kind).flatMap((d) => d.band),
      name,
    );
  const height = Math.max(0, stack.length - 1) * pitch + BOX + 1;
  const least = 1e-6 * Math.max(0, ...laid.map((flow) => flow.value));
  const boxes = stack.map(({ name }) => ({
    x: 0,
    x2: inner,
    y: topOf(name),
    y2: topOf(name) + BOX,
    tip: name,
  }));
  const labels = stack.flatMap(({ name, storage }) => {
    const words = Math.abs(Number(storage)) > least ? [name, `${signed(Number(storage))} kept`] : [name];
    const first = topOf(name) + (words.length > 1 ? 15 : 22);
    return words.map((text, i) => ({ x: 6, y: first + i * LINE, text: clipped(text, gutter - 8, 12) }));
  });
  const caption = [...captions, `Widths to scale; ${unitText(FLUX)} of the whole area`];
  const layers = [
    layerOf("box", { colour: "ink", open: true }, boxes),
    bands("from space", "warm", 0),
    bands("to space", "cool", 1),
    bands("inside", "green", 2),
    layerOf(
      "box",
      { colour: "paper" },
      drawn.map((d) => d.card),
    ),
    layerOf(
      "text",
      { colour: "ink", centred: true },
      drawn.flatMap((d) => d.words),
    ),
    layerOf("text", { colour: "ink" }, labels),
  ];
  return drawingOf({ title: "Energy flows", caption, layers }, { width: inner, height });
}
