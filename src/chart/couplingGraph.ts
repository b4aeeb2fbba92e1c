// The couplings through which temperature acts on the net flux, as boxes and lines.
import type { Feedbacks } from "../feedback/feedbacks.ts";
import { edgesOf } from "./couplingEdges.ts";
import { EFFECTS } from "./feedbackBars.ts";
import { EDGE } from "./layout.ts";
import { clipped } from "./lines.ts";
import { boxOf, drawingOf, type Item, layerOf, layersOf, lineOf, type Plot } from "./plot.ts";
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

/** Height of a box without the ends of lines, and of the end of a line in it; and what is between boxes, px. */
const BOX = 28;
const PORT = 18;
const GAP = 16;

export function couplingPlot({ feedbacks }: CouplingGraph, page: number): Plot {
  const { names, edges } = edgesOf(feedbacks);
  const width = page - 2 * EDGE;
  // every place has its own upright line, left of all boxes, from which lines go to other boxes
  const lane = Math.min(26, (0.3 * width) / names.length);
  const start = names.length * lane;
  const right = Math.min(width, start + 480);
  const topOf = (place: number): number =>
    0 - place * (BOX + GAP) - PORT * edges.filter((edge) => edge.to < place).length;
  // edges come in the order of their ends
  const wires = edges.map((edge, i) => ({ ...edge, y: -BOX - edge.to * (BOX + GAP) - PORT * (i + 0.2) }));
  const lines = wires.flatMap((wire, i) => {
    // those that amplify run beside those that counter
    const [kind, aside] = wire.value > 0 ? ["amplifies", 3] : ["counters", -3];
    const x = (wire.from + 0.5) * lane + aside;
    const y = topOf(wire.from) - BOX / 2 - aside;
    return lineOf(
      [
        [start, y],
        [x, y],
        [x, wire.y],
        [start - 8, wire.y],
      ],
      i,
      kind,
    );
  });
  const heads = wires.flatMap(({ y }, i) =>
    lineOf(
      [
        [start, y],
        [start - 9, y - 5],
        [start - 9, y + 5],
      ],
      i,
    ),
  );
  const room = right - start - GAP;
  const words = (y: number, tip: string): Item => ({
    ...{ x: start + 10, y: y - 4 },
    ...{ text: clipped(tip, room, 12), tip },
  });
  const unit = unitText(FEEDBACK);
  return drawingOf(
    {
      title: `Couplings at ${numeral(feedbacks.temperature)} K`,
      caption: [
        `λ = ${numeral(feedbacks.feedbackParameter, 4)}${unit}, all that reaches the net flux`,
        `Numbers in${unit}: what λ would lose without the line`,
        feedbacks.others && `Not drawn, weaker loops: ${feedbacks.others.count}`,
      ],
      layers: [
        ...layersOf("line", lines, EFFECTS),
        layerOf("line", heads, { full: true }),
        layerOf(
          "box",
          names.map((name, i) => boxOf([start, right], [topOf(i), topOf(i + 1) + GAP], name)),
          { open: true },
        ),
        layerOf("text", [
          ...names.map((name, i) => words(topOf(i) - BOX / 2, name)),
          ...wires.map((wire) =>
            words(wire.y, `${signed(wire.value)}${room > 300 ? unit : ""} from ${names[wire.from]}`),
          ),
        ]),
      ],
    },
    { width, height: -topOf(names.length) - GAP },
  );
}
