// Writes a plot as a Vega-Lite specification: version 5, and nothing that version 6 reads otherwise.
import { EDGE, LARGE, layoutOf, type Page, SMALL } from "./layout.ts";
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
  text: [{ type: "text", baseline: "alphabetic", fontSize: 12 }, { text: { field: "text" } }],
};

export function vegaPlot(plot: Plot, { width, theme }: Page): Json {
  const colours = paletteOf(theme);
  const { paper, ink, faint } = colours;
  const layout = layoutOf(plot, width);
  const isDrawing = plot.x.title === "";
  const axis = (field: "x" | "y", looks: Json): Json => {
    const { title, domain } = plot[field];
    const ticks = { title, values: layout[field].map((tick) => tick.at), ...looks };
    return { field, type, scale: { domain, nice: false, zero: false }, axis: title ? ticks : null };
  };
  const places = {
    x: axis("x", { titleAnchor: "end" }),
    // the title of the upright axis lies above it, so that it can be read without turning the head
    y: axis("y", {
      ...{ titleAngle: 0, titleAlign: "left", titleBaseline: "bottom", titleX: -layout.left, titleY: -8 },
    }),
  };
  const layers = plot.layers.map((layer) => {
    const [mark, channels] = MARKS[layer.mark];
    const { shape = "circle", centred } = layer.look;
    return {
      data: { values: layer.items.map((item, order) => ({ line: 0, ...item, order })) },
      mark: { ...mark, ...paintOf(layer, colours), shape, align: centred ? "center" : "left" },
      encoding: { ...places, ...channels, ...(layer.items[0]?.tip ? { tooltip: { field: "tip" } } : {}) },
    };
  });
  // the legend belongs to a layer of its own that is not seen, so that it is one whatever the marks are
  const named = plot.layers.filter(({ name }, i, all) => name && all.findIndex((l) => l.name === name) === i);
  const domain = named.map(({ name }) => name);
  const signs = named.map((layer) => {
    const { mark, look } = layer;
    const shape =
      mark === "point" ? (look.shape ?? "circle") : mark === "box" || look.full ? "square" : "stroke";
    const paint = paintOf(layer, colours);
    return { ...paint, shape, fill: paint.fillOpacity < 1 ? "transparent" : paint.fill };
  });
  const legend = {
    ...{ orient: "bottom", direction: "vertical", columns: 1, title: null, labelLimit: width },
    ...{ symbolLimit: 0, symbolOpacity: 1, symbolSize: 110, symbolStrokeWidth: 1.8 },
  };
  const channels = (["shape", "stroke", "fill", "strokeDash"] as const).map((key) => {
    const scale = { domain, range: signs.map((sign) => sign[key]) };
    return [key, { field: "name", type: "nominal", scale, legend }];
  });
  const key = {
    data: { values: domain.map((name) => ({ name })) },
    mark: { type: "point", opacity: 0 },
    encoding: Object.fromEntries(channels),
  };
  return {
    $schema: "https://vega.github.io/schema/vega-lite/v5.json",
    ...{ background: paper, padding: isDrawing ? EDGE : 8, width: isDrawing ? width - 2 * EDGE : width },
    ...{ height: layout.height, autosize: { type: isDrawing ? "pad" : "fit-x", contains: "padding" } },
    title: {
      ...{
        text: layout.title,
        subtitle: layout.caption,
        anchor: "start",
        frame: "bounds",
        subtitlePadding: 6,
      },
      ...{ fontSize: LARGE, fontWeight: "normal", subtitleFontSize: SMALL, color: ink, subtitleColor: faint },
      offset: plot.y.title ? 30 : EDGE,
    },
    layer: named.length > 0 ? [...layers, key] : layers,
    config: {
      font: "system-ui, sans-serif",
      view: { stroke: null },
      axis: {
        ...{ grid: false, titleFontWeight: "normal" },
        ...{ domainColor: ink, tickColor: ink, labelColor: ink, titleColor: ink },
      },
      legend: { labelColor: ink },
    },
  };
}
