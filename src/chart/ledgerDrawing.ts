// The energy ledger as a drawing of flows.
import type { Ledger } from "../states/state.ts";
import { EDGE, LINE } from "./layout.ts";
import { layFlows } from "./ledgerLayout.ts";
import { clipped, textWidth } from "./lines.ts";
import { boxOf, drawingOf, layerOf, layersOf, lineOf, type Plot, stacked } from "./plot.ts";
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

/** Flows by where they go. */
const BANDS = {
  "from space": { colour: "warm" },
  "to space": { colour: "cool" },
  inside: { colour: "green" },
} as const;
/** Storage that is rounding, W m⁻². */
const NOTHING = 1e-6;

export function ledgerPlot({ ledger }: LedgerDrawing, page: number): Plot {
  const width = page - 2 * EDGE;
  const level = (name: string): number => Math.abs(STACK.indexOf(name));
  const stack = [...ledger.reservoirs].sort((a, b) => level(a.name) - level(b.name));
  const names = stack.map((reservoir) => reservoir.name);
  const gutter = 14 + Math.min(0.24 * page, Math.max(...names.map((name) => textWidth(name, 12))));
  const { flows: laid, caption } = layFlows({ flows: ledger.flows, names, room: width - gutter - 8 });
  const pitch = BOX + Math.max(64, ...laid.map((flow) => 2 * flow.down + flow.lines.length * LINE + 32));
  const topOf = (name: string): number => 0 - names.indexOf(name) * pitch;

  const drawn = laid.map((flow, line) => {
    const x = gutter + flow.x;
    const down = topOf(flow.from) > topOf(flow.to);
    const start = topOf(flow.from) - (down ? BOX : 0);
    const end = topOf(flow.to) - (down ? 0 : BOX);
    const neck = end + (down ? HEAD : -HEAD);
    const [left, right] = [x - flow.half, x + flow.half];
    // labels stand in the gap where a flow begins, so that flows across a layer do not write on it
    const room = flow.lines.length * LINE;
    const y = start + (down ? -10 - flow.down : 12 + room + flow.down);
    return {
      line: lineOf(
        [
          [left, start],
          [left, neck],
          [left - 4, neck],
          [x, end],
          [right + 4, neck],
          [right, neck],
          [right, start],
        ],
        line,
        flow.from === "space" ? "from space" : flow.to === "space" ? "to space" : "inside",
      ),
      box: boxOf([x - flow.width / 2 - 2, x + flow.width / 2 + 2], [y, y - room - 2], flow.tip),
      text: stacked(flow.lines, { x, y: y - 12 }, -LINE),
    };
  });
  const labels = stack.flatMap((reservoir) => {
    const kept = reservoir.storage ?? 0;
    const lines = [reservoir.name, ...(Math.abs(kept) > NOTHING ? [`${signed(kept)} kept`] : [])].map(
      (text) => clipped(text, gutter - 8, 12),
    );
    return stacked(lines, { x: 6, y: topOf(reservoir.name) - 29 + 7 * lines.length }, -LINE);
  });
  return drawingOf(
    {
      title: "Energy flows",
      caption: [...caption, `Widths to scale;${unitText(FLUX)} of the whole area`],
      layers: [
        layerOf(
          "box",
          names.map((name) => boxOf([0, width], [topOf(name), topOf(name) - BOX], name)),
          { open: true },
        ),
        ...layersOf(
          "line",
          drawn.flatMap((flow) => flow.line),
          BANDS,
          { full: true },
        ),
        layerOf(
          "box",
          drawn.map((flow) => flow.box),
          { colour: "paper" },
        ),
        layerOf(
          "text",
          drawn.flatMap((flow) => flow.text),
          { anchor: "middle" },
        ),
        layerOf("text", labels),
      ],
    },
    { width, height: Math.max(0, names.length - 1) * pitch + BOX },
  );
}
