// A picture as data: what is drawn, in the units of its axes. It is read twice, as SVG and as Vega-Lite.
import { deepFreeze } from "../ground/deepFreeze.ts";
import type { Range } from "../ground/range.ts";
import type { Colour } from "./palette.ts";
import { numeral } from "./wording.ts";

/** The sign of a point. */
export type Shape = "circle" | "square" | "diamond" | "triangle-up" | "triangle-down";

/** How a layer looks. What a colour says is said by dash, shape or filling too, so that grey paper is enough. */
export interface Look {
  readonly colour: Colour;
  readonly dash?: readonly number[];
  /** Of lines, px. */
  readonly width?: number;
  readonly shape?: Shape;
  /** Outlined rather than filled. */
  readonly open?: boolean;
  /** Of lines: the outline of something full. */
  readonly full?: boolean;
  /** Of words: their middle stands at the place, rather than their start. */
  readonly centred?: boolean;
}

/** A point, the corner of a line, a box (with `x2` and `y2`) or a word. */
export interface Item {
  readonly x: number;
  readonly y: number;
  readonly x2?: number;
  readonly y2?: number;
  /** Which line of the layer it belongs to. */
  readonly line?: number;
  /** Said when it is pointed at. */
  readonly tip?: string;
  readonly text?: string;
}

/** Things of one kind and one look. */
export interface Layer {
  readonly mark: "line" | "point" | "box" | "text";
  readonly look: Look;
  readonly items: readonly Item[];
  /** What the legend calls it; without a name it is not in the legend. */
  readonly name?: string;
}

/** A layer from its parts. */
export const layerOf = (mark: Layer["mark"], look: Look, items: readonly Item[], name?: string): Layer =>
  name ? { mark, look, items, name } : { mark, look, items };

/** An axis. Without a title it has no ticks either: places on it have no meaning. */
export interface Axis {
  readonly title: string;
  readonly domain: Range;
}

/** A chart. A plain frozen object that `show`, `toSVG`, `toVegaLite` and their companions take. */
export interface Plot {
  readonly picture: "plot";
  readonly title: string;
  readonly caption: readonly string[];
  readonly x: Axis;
  readonly y: Axis;
  readonly layers: readonly Layer[];
  /** Height of the plotting area, px; follows from the width where it is null. */
  readonly height: number | null;
}

/** What a chart is made of; a domain that is not said follows from what is drawn. */
export interface Draft extends Pick<Plot, "title" | "layers"> {
  readonly caption?: readonly (string | false)[];
  readonly x: DraftAxis;
  readonly y: DraftAxis;
  readonly height?: number | null;
  /** Places left out before. */
  readonly dropped?: number;
}
type DraftAxis = Omit<Axis, "domain"> & { readonly domain?: Range };

/** Finite, and far enough from overflow for what an axis computes with it. */
const isDrawn = (value: number): boolean => Math.abs(value) < 1e100;

/** In a chart with more places than this they have no words of their own. */
const MOST_TIPS = 600;

/** Makes a chart: only finite places inside of its axes are kept, and the caption counts the rest. */
export function plotOf({ title, caption = [], x, y, layers, height = null, dropped = 0 }: Draft): Plot {
  let lost = dropped;
  const keep = (layer: Layer, isKept: (item: Item) => boolean): Layer => {
    const items = layer.items.filter(isKept);
    lost += layer.items.length - items.length;
    return { ...layer, items };
  };
  const finite = layers.map((layer) => keep(layer, (i) => [i.x, i.y, i.x2 ?? 0, i.y2 ?? 0].every(isDrawn)));
  const items = finite.flatMap((layer) => layer.items);
  const across = axisOf(
    x,
    items.flatMap((i) => [i.x, i.x2 ?? i.x]),
  );
  const up = axisOf(
    y,
    items.flatMap((i) => [i.y, i.y2 ?? i.y]),
  );
  const told = (item: Item): Item =>
    items.length > MOST_TIPS
      ? item
      : {
          ...item,
          tip: `${across.title} ${numeral(item.x)}, ${up.title} ${numeral(item.y)}; ${item.tip ?? ""}`,
        };
  const kept = finite.map((layer): Layer => {
    const inside = keep(layer, (i) => lies(i.x, across) && lies(i.y, up));
    return layer.mark === "point" ? { ...inside, items: inside.items.map(told) } : inside;
  });
  return deepFreeze({
    picture: "plot",
    title,
    caption: [...caption, lost > 0 && `Left out, as not finite or outside: ${lost}`].filter(
      (c) => c !== false,
    ),
    x: across,
    y: up,
    layers: kept.filter((layer) => layer.items.length > 0),
    height,
  });
}

/** A drawing in px, from its upper left corner; it has no axes. */
export function drawingOf(
  draft: Omit<Draft, "x" | "y">,
  { width, height }: { width: number; height: number },
): Plot {
  const turned = (items: readonly Item[]): Item[] =>
    items.map((item) => ({ ...item, y: 0 - item.y, ...(item.y2 === undefined ? {} : { y2: 0 - item.y2 }) }));
  const axis = (low: number, high: number) => ({ title: "", domain: [low, high] as const });
  const layers = draft.layers.map((layer) => ({ ...layer, items: turned(layer.items) }));
  return plotOf({ ...draft, layers, x: axis(0, width), y: axis(-height, 1), height: height + 1 });
}

const lies = (value: number, { domain: [low, high] }: Axis): boolean => value >= low && value <= high;

/** Lowest and highest of many values. */
export const extent = (values: readonly number[]): Range => [
  values.reduce((a, b) => Math.min(a, b), 1 / 0),
  values.reduce((a, b) => Math.max(a, b), -1 / 0),
];

/** A range with some room on both sides. */
export const around = ([low, high]: Range, room: number): Range => [
  low - room * (high - low),
  high + room * (high - low),
];

function axisOf({ title, domain = [1 / 0, 0] }: DraftAxis, values: readonly number[]): Axis {
  let [low, high] = domain.every(isDrawn) ? domain : around(extent(values), 0.05);
  if (!isDrawn(low)) [low, high] = [0, 1];
  const size = Math.max(Math.abs(low), Math.abs(high));
  // one value, or values that differ by rounding: ticks must still differ
  if (!(high - low > 1e-9 * size)) [low, high] = [low - (0.05 * size || 1), high + (0.05 * size || 1)];
  return { title, domain: [low, high] };
}
