// Writes a plot as a Vega-Lite specification: version 5, and nothing that version 6 reads otherwise.
import { layoutOf, type Page } from "./layout.ts";
import { paletteOf } from "./palette.ts";
import type { Layer, Plot } from "./plot.ts";
import { paintOf } from "./style.ts";

/** A JSON object. */
export type Json = { readonly [key: string]: unknown };

const type = "quantitative";

/** For each kind of mark: what Vega-Lite calls it, and channels besides the place. */
const MARKS: Readonly<Record<Layer["mark"], readonly [Json, Json]>> = {
  line: [{ type: "line" }, { detail: { field: "line" }, order: { field: "order", type } }],
  box: [{ type: "rect" }, { x2: { field: "x2" }, y2: { field: "y2" } }],
  point: [{ type: "point", size: 70, opacity: 1 }, {}],
  text: [{ type: "text", baseline: "alphabetic" }, { text: { field: "text" } }],
};

/** Where words stand. */
const ALIGNS = { start: "left", middle: "center", end: "right" };

export function vegaPlot(plot: Plot, page: Page): Json {
  const colours = paletteOf(page.theme);
  const { width, height, padding, layers: around, ...ticks } = layoutOf(plot, page.width);
  const axis = (field: "x" | "y"): Json => {
    const { title, domain } = plot[field];
    const values = ticks[field].map((tick) => tick.at);
    // its title is one of the words around
    return { field, type, title, scale: { domain }, axis: title ? { title: null, values } : null };
  };
  const layersOf = (layers: readonly Layer[], places: Json): Json[] =>
    layers.map((layer) => {
      const [mark, channels] = MARKS[layer.mark];
      const { shape = "circle", anchor = "start" } = layer.look;
      return {
        data: { values: layer.items.map((item, order) => ({ line: 0, ...item, order })) },
        mark: { ...mark, ...paintOf(layer, colours), shape, align: ALIGNS[anchor] },
        encoding: { ...places, ...channels, ...(layer.items[0]?.tip && { tooltip: { field: "tip" } }) },
      };
    });
  const px = { type, scale: null, axis: null };
  return {
    $schema: "https://vega.github.io/schema/vega-lite/v5.json",
    ...{ description: plot.title, background: colours.paper, autosize: "none", padding, width, height },
    layer: [
      ...layersOf(plot.layers, { x: axis("x"), y: axis("y") }),
      ...layersOf(around, { x: { field: "x", ...px }, y: { field: "y", ...px } }),
    ],
    config: {
      font: "system-ui, sans-serif",
      view: { stroke: null },
      axis: { grid: false, domainColor: colours.ink, tickColor: colours.ink, labelColor: colours.ink },
    },
  };
}
