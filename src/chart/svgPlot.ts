// Draws a plot as SVG.
import { layoutOf, type Page, SMALL } from "./layout.ts";
import { paletteOf } from "./palette.ts";
import { type Axis, type Layer, layerOf, lineOf, type Plot } from "./plot.ts";
import { paintOf } from "./style.ts";
import { el, type Scale, shapesOf } from "./svg.ts";
import { escaped } from "./wording.ts";

/** Colours turned round, and back to their hues: one rule makes a whole picture dark. */
const DARK_RULE =
  "<style>@media(prefers-color-scheme:dark){.thermostead{filter:invert(.9) hue-rotate(180deg)}}</style>";

const scaleOf =
  ({ domain: [low, high] }: Axis, from: number, to: number): Scale =>
  (value) =>
    from + ((value - low) / (high - low)) * (to - from);
const px: Scale = (value) => value;

export function svgPlot(plot: Plot, page: Page): string {
  const colours = paletteOf(page.theme);
  const { width: right, height: bottom, padding, layers: around, ...ticks } = layoutOf(plot, page.width);
  const [x, y] = [scaleOf(plot.x, 0, right), scaleOf(plot.y, bottom, 0)];
  const across = ticks.x.map((tick) => ({ x: x(tick.at), y: bottom + 18, text: tick.text }));
  const up = ticks.y.map((tick) => ({ x: -8, y: y(tick.at) + 4, text: tick.text }));
  const lines: [number, number][][] = [
    plot.x.title
      ? [
          [0, plot.y.title ? 0 : bottom],
          [0, bottom],
          [right, bottom],
        ]
      : [],
    ...across.map((tick): [number, number][] => [
      [tick.x, bottom],
      [tick.x, bottom + 5],
    ]),
    ...up.map((tick): [number, number][] => [
      [0, tick.y - 4],
      [-5, tick.y - 4],
    ]),
  ];
  const axes = [
    layerOf(
      "line",
      lines.flatMap((corners, i) => lineOf(corners, i)),
      { width: 1 },
    ),
    layerOf("text", across, { size: SMALL, anchor: "middle" }),
    layerOf("text", up, { size: SMALL, anchor: "end" }),
  ];
  const drawn = (layers: readonly Layer[], across: Scale, up: Scale): string =>
    layers
      .map((layer) =>
        el(
          "g",
          { ...paintOf(layer, colours), textAnchor: layer.look.anchor ?? "start" },
          shapesOf(layer, across, up),
        ),
      )
      .join("");
  const height = bottom + padding.top + padding.bottom;
  return (
    `<svg xmlns="http://www.w3.org/2000/svg" width="${page.width}" height="${height}" ` +
    `viewBox="${-padding.left} ${-padding.top} ${page.width} ${height}" role="img" aria-label="${escaped(plot.title)}" ` +
    `class="thermostead" font-family="system-ui, sans-serif">` +
    (page.theme === "auto" ? DARK_RULE : "") +
    el("rect", { x: -padding.left, y: -padding.top, width: page.width, height, fill: colours.paper }) +
    drawn(plot.layers, x, y) +
    drawn([...axes, ...around], px, px) +
    "</svg>"
  );
}
