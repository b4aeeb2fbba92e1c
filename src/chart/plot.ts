// A picture as data: what is drawn, in the units of its axes. It is read twice, as SVG and as Vega-Lite.
import { deepFreeze } from "../ground/deepFreeze.ts";
import type { Range } from "../ground/range.ts";
import type { Colour } from "./palette.ts";
import { numeral } from "./wording.ts";

/** The sign of a point. */
export type Shape = "circle" | "square" | "diamond" | "triangle-up" | "triangle-down";

/** How a layer looks. What a colour says is said by dash, shape or filling too, so that grey paper is enough. */
export interface Look {
  /** `ink` unless said. */
  readonly colour?: Colour;
  readonly dash?: readonly number[];
  /** Of lines, px. */
  readonly width?: number;
  readonly shape?: Shape;
  /** Outlined rather than filled. */
  readonly open?: boolean;
  /** Of lines: the outline of something full. */
  readonly full?: boolean;
  /** Of words: what of them stands at the place; their start unless said. */
  readonly anchor?: "middle" | "end";
  /** Of words, px; 12 unless said. */
  readonly size?: number;
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
  /** Of which kind it is, where the kinds are layers. */
  readonly kind?: string;
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
export const layerOf = (
  mark: Layer["mark"],
  items: readonly Item[],
  look: Look = {},
  name?: string,
): Layer => ({
  ...{ mark, items, look },
  ...(name && { name }),
});

/** A layer for each kind of items, named after it; `own` look and `prefix` are common to all. */
export const layersOf = (
  mark: Layer["mark"],
  items: readonly Item[],
  looks: Readonly<Record<string, Look>>,
  own: Look = {},
  prefix = "",
): Layer[] =>
  Object.entries(looks).map(([kind, look]) =>
    layerOf(
      mark,
      items.filter((item) => item.kind === kind),
      { ...look, ...own },
      prefix + kind,
    ),
  );

/** The corners of a line. */
export const lineOf = (corners: readonly (readonly [number, number])[], line = 0, kind = ""): Item[] =>
  corners.map(([x, y]) => ({ x, y, line, kind }));

/** A box over two ranges. */
export const boxOf = ([x, x2]: Range, [y, y2]: Range, tip: string): Item => ({ x, y, x2, y2, tip });

/** Lines of text one below the other; `step` is signed as the upright axis is. */
export const stacked = (lines: readonly string[], first: Item, step: number): Item[] =>
  lines.map((text, i) => ({ x: first.x, y: first.y + i * step, text }));

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
  readonly caption?: readonly (string | false | null | undefined)[];
  readonly x: DraftAxis;
  readonly y: DraftAxis;
  readonly height?: number | null;
  /** Places left out before. */
  readonly dropped?: number;
}
type DraftAxis = Omit<Axis, "domain"> & { readonly domain?: Range };

/** In a chart with more places than this they have no words of their own. */
const MOST_TIPS = 600;

/** Finite, and far enough from overflow for what an axis computes with it. */
export const isNear = (value: number): boolean => Math.abs(value) < 1e100;

/** Whether a place can be drawn somewhere. */
export const isDrawn = ({ x, y, x2 = x, y2 = y }: Item): boolean => [x, y, x2, y2].every(isNear);

/** Makes a chart: only finite places inside of its axes are kept, and the caption counts the rest. */
export function plotOf(draft: Draft): Plot {
  const all = draft.layers.flatMap((layer) => layer.items);
  const places = all.filter(isDrawn);
  const [x, y] = (["x", "y"] as const).map((way) =>
    axisOf(
      draft[way],
      places.flatMap((item) => [item[way], item[`${way}2`] as number]),
    ),
  ) as [Axis, Axis];
  let lost = (draft.dropped ?? 0) + all.length;
  const layers = draft.layers.map((layer): Layer => {
    const items = layer.items.filter((item) => isDrawn(item) && lies(item.x, x) && lies(item.y, y));
    lost -= items.length;
    const isTold = layer.mark === "point" && all.length <= MOST_TIPS;
    return {
      ...layer,
      items: isTold
        ? items.map((item) => ({
            ...item,
            tip: `${x.title} ${numeral(item.x)}, ${y.title} ${numeral(item.y)}; ${item.tip ?? ""}`,
          }))
        : items,
    };
  });
  return deepFreeze({
    picture: "plot",
    title: draft.title,
    caption: [...(draft.caption ?? []), lost > 0 && `Left out, as not finite or outside: ${lost}`].filter(
      Boolean,
    ) as string[],
    ...{ x, y },
    layers: layers.filter((layer) => layer.items.length > 0),
    height: draft.height ?? null,
  });
}

/** A drawing in px, from 0 to the right and from 0 down to −height; it has no axes. */
export const drawingOf = (draft: Omit<Draft, "x" | "y">, size: { width: number; height: number }): Plot =>
  plotOf({
    ...draft,
    x: { title: "", domain: [0, size.width] },
    y: { title: "", domain: [-size.height, 1] },
    height: size.height + 1,
  });

const lies = (value: number, axis: Axis): boolean => value >= axis.domain[0] && value <= axis.domain[1];

/**
 * Lowest and highest of the values that can be drawn, with some room on both sides but not across 0; infinite if there
 * are none.
 */
export function extent(values: readonly number[]): Range {
  const sorted = Float64Array.from(values.filter(isNear)).sort();
  const [low, high] = [sorted.at(0) ?? 1 / 0, sorted.at(-1) ?? -1 / 0];
  const room = (high - low) / 16;
  return [Math.max(low - room, low < 0 ? -1 / 0 : 0), high + room];
}

function axisOf(axis: DraftAxis, values: readonly number[]): Axis {
  let [low, high] = axis.domain ?? extent(values);
  if (![low, high].every(isNear)) [low, high] = [0, 1];
  const room = 0.05 * Math.max(Math.abs(low), Math.abs(high)) || 1;
  // one value, or values that differ by rounding: ticks must still differ
  if (!(high - low > 1e-8 * room)) [low, high] = [low - room, high + room];
  return { title: axis.title, domain: [low, high] };
}
