// The couplings through which temperature acts on the net flux, as boxes and lines.
import type { Feedbacks } from "../feedback/feedbacks.ts";
import { edgesOf } from "./couplingEdges.ts";
import { EDGE } from "./layout.ts";
import { clipped } from "./lines.ts";
import { drawingOf, type Item, type Layer, type Look, layerOf, type Plot } from "./plot.ts";
import { FEEDBACK, numeral, signed, unitText } from "./wording.ts";

/** The drawing of the couplings of a state; where its parts stand follows from the width it is asked for. */
export interface CouplingGraph {
  readonly picture: "couplings";
  readonly feedbacks: Feedbacks;
}

/**
 * The couplings between temperature and net flux as boxes and lines. The number at the end of a line, W m⁻² K⁻¹, is the sum
 * of λ_i over the feedback loops that run along it: what λ would lose without it. So the numbers that reach the net flux add
 * up to λ. Lines that amplify are drawn through, lines that counter are dashed.
 *
 * @example toSVG(couplingGraph(analyseFeedbacks(loop, state)))
 */
export const couplingGraph = <N extends string>(feedbacks: Feedbacks<N>): CouplingGraph =>
  Object.freeze({ picture: "couplings", feedbacks: feedbacks as unknown as Feedbacks });

/** Height of a box without the ends of lines, and of the end of a line in it, px. */
const BOX = 28;
const PORT = 18;

export function couplingPlot({ feedbacks }: CouplingGraph, width: number): Plot {
  const { names, edges } = edgesOf(feedbacks);
  const inner = width - 2 * EDGE;
  // every place has its own upright line, left of all boxes, from which lines go to other boxes
  const lane = Math.min(26, (0.3 * inner) / names.length);
  const start = names.length * lane;
  let height = 1;
  const boxes = names.map((name, place) => {
    const ends = edges.filter((edge) => edge.to === place);
    const y = height;
    height += BOX + ends.length * PORT + 16;
    return {
      name,
      y,
      ends,
      at: (edge: (typeof edges)[number]) => y + BOX + (ends.indexOf(edge) + 0.2) * PORT,
    };
  });
  const wires = boxes.flatMap(({ ends, at }) => ends.map((edge) => ({ ...edge, y: at(edge) })));
  const trunks = boxes.flatMap(({ y }, line): Item[] => {
    const lowest = Math.max(0, ...wires.filter(({ from }) => from === line).map((wire) => wire.y));
    const [x, from] = [(line + 0.5) * lane, y + BOX / 2];
    return lowest > 0
      ? [
          { x: start, y: from, line },
          { x, y: from, line },
          { x, y: lowest, line },
        ]
      : [];
  });
  const wiresOf = (name: string, look: Look, amplifies: boolean): Layer[] => {
    const own = wires.filter(({ value }) => value > 0 === amplifies);
    const lines = own.flatMap(({ from, y }, line) => [
      { x: (from + 0.5) * lane, y, line },
      { x: start - 8, y, line },
    ]);
    const heads = own.flatMap(({ y }, line) =>
      [0, -5, 5].map((up) => ({ x: start - (up === 0 ? 0 : 9), y: y + up, line })),
    );
    return [layerOf("line", look, lines, name), layerOf("line", { colour: look.colour, full: true }, heads)];
  };
  const unit = unitText(FEEDBACK);
  const ink = { colour: "ink" } as const;
  const right = Math.min(inner, start + 480);
  const room = right - start - 16;
  const words = (y: number, text: string): Item => ({
    x: start + 10,
    y: y + 4,
    text: clipped(text, room, 12),
    tip: text,
  });
  const draft = {
    title: `Couplings at ${numeral(feedbacks.temperature)} K`,
    caption: [
      `λ = ${numeral(feedbacks.feedbackParameter, 4)} ${unit}, the sum of all that reaches the net flux`,
      `Numbers in ${unit}: what λ would lose without the line`,
      !!feedbacks.others && `Not drawn: ${feedbacks.others.count} weaker loops`,
    ],
    layers: [
      layerOf("line", { ...ink, width: 1.5 }, trunks),
      ...wiresOf("amplifies", { colour: "warm" }, true),
      ...wiresOf("counters", { colour: "cool", dash: [6, 4] }, false),
      layerOf(
        "box",
        { ...ink, open: true },
        boxes.map(({ y, ends }) => ({ x: start, x2: right, y, y2: y + BOX + ends.length * PORT })),
      ),
      layerOf("text", ink, [
        ...boxes.map(({ name, y }) => words(y + BOX / 2, name)),
        ...wires.map(({ from, value, y }) =>
          words(y, `${signed(value)}${room > 300 ? ` ${unit}` : ""} from ${names[from]}`),
        ),
      ]),
    ],
  };
  return drawingOf(draft, { width: inner, height: height - 14 });
}
