// What both readings of a plot share: where its axes and ticks are, and titles, legend and caption as layers in px.
import { textWidth, wrapped } from "./lines.ts";
import type { Theme } from "./palette.ts";
import { type Axis, boxOf, type Layer, layerOf, lineOf, type Plot, stacked } from "./plot.ts";
import { type Tick, ticksIn } from "./ticks.ts";

/** How a picture is asked for. */
export interface Page {
  readonly width: number;
  readonly theme: Theme;
}

/** Room around a picture, px. */
export const EDGE = 10;
/** Size of tick labels and captions, and the distance of lines, px. */
export const SMALL = 11;
export const LINE = 15;
/** Width of a sample in the legend with its distance, px. */
const SAMPLE = 34;

/** Where everything stands, px from the upper left corner of the plotting area. */
export interface Layout {
  /** Of the plotting area. */
  readonly width: number;
  readonly height: number;
  /** From the plotting area to the edges of the picture. */
  readonly padding: Readonly<Record<"left" | "top" | "right" | "bottom", number>>;
  readonly x: readonly Tick[];
  readonly y: readonly Tick[];
  /** Titles, legend and caption. */
  readonly layers: readonly Layer[];
}

const ticksOf = (axis: Axis, about: number): Tick[] =>
  axis.title ? ticksIn(axis.domain, Math.max(2, about)) : [];

/** Room for the widest label with its distance, px. */
const widest = (ticks: readonly Tick[]): number =>
  Math.ceil(Math.max(0, ...ticks.map((tick) => textWidth(`${tick.text} `, SMALL))));

export function layoutOf(plot: Plot, width: number): Layout {
  const room = width - 2 * EDGE;
  const height = Math.round(plot.height ?? Math.min(420, Math.max(220, 0.55 * width)));
  const [x, y] = [ticksOf(plot.x, width / 75), ticksOf(plot.y, height / 50)];
  const left = EDGE + widest(y);
  const right = EDGE + Math.ceil(widest(x) / 2);
  const title = wrapped(plot.title, room, 15);
  const across = wrapped(plot.x.title, room, 12);
  const caption = plot.caption.flatMap((line) => wrapped(line, room, SMALL));
  const top = title.length * 19 + (plot.y.title ? 36 : 8);

  // samples of all named layers with their names, side by side as far as they fit
  const start = EDGE - left;
  let [along, down] = [start, height + 20 + LINE * across.length + (across[0] ? 23 : 0)];
  const legend = plot.layers.flatMap((layer) => {
    if (!layer.name) return [];
    const lines = wrapped(layer.name, room - SAMPLE, 12);
    const wide = SAMPLE + Math.max(...lines.map((line) => textWidth(line, 12)));
    if (along > start && along + wide > start + room) [along, down] = [start, down + LINE + 3];
    const [x, y] = [along, down];
    along += wide + 18;
    down += (lines.length - 1) * LINE;
    const samples = {
      line: lineOf([
        [x, y],
        [x + 26, y],
      ]),
      box: [boxOf([x + 4, x + 22], [y - 5, y + 5], layer.name)],
      point: [{ x: x + 13, y }],
    };
    const mark = layer.look.full ? "box" : (layer.mark as keyof typeof samples);
    return [
      layerOf(mark, samples[mark], layer.look),
      layerOf("text", stacked(lines, { x: x + SAMPLE, y: y + 4 }, LINE)),
    ];
  });
  const end = down + (along > start ? 23 : -6);
  return {
    ...{ width: width - left - right, height },
    padding: { left, top, right, bottom: end - height + caption.length * LINE },
    ...{ x, y },
    layers: [
      layerOf("text", stacked(across, { x: start, y: height + 36 }, LINE)),
      // the title of the upright axis lies above it, so that it can be read without turning the head
      layerOf("text", [{ x: start, y: -12, text: plot.y.title }]),
      layerOf("text", stacked(title, { x: start, y: 20 - top }, 19), { size: 15 }),
      ...legend,
      layerOf("text", stacked(caption, { x: start, y: end }, LINE), { size: SMALL, colour: "faint" }),
    ],
  };
}
