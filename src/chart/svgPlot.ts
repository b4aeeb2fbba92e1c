// Draws a plot as SVG.
import { EDGE, LARGE, LINE, layoutOf, type Page, SMALL } from "./layout.ts";
import { textWidth, wrapped } from "./lines.ts";
import { paletteOf } from "./palette.ts";
import type { Axis, Item, Layer, Plot } from "./plot.ts";
import { OUTLINES, paintOf } from "./style.ts";
import { el, tenth } from "./svg.ts";
import { escaped } from "./wording.ts";

/** Colours turned round, and back to their hues: one rule makes a whole picture dark. */
const DARK_RULE =
  "<style>@media(prefers-color-scheme:dark){.thermostead{filter:invert(.9) hue-rotate(180deg)}}</style>";

/** Width of a sample in the legend with its distance, px. */
const SAMPLE = 34;

export function svgPlot(plot: Plot, { width, theme }: Page): string {
  const colours = paletteOf(theme);
  const { height, title, caption, ...ticks } = layoutOf(plot, width);
  const left = EDGE + ticks.left;
  const top = title.length * 19 + (plot.y.title ? 36 : 8);
  const bottom = top + height;
  const inner = width - left - EDGE - Math.ceil(textWidth(ticks.x.at(-1)?.text ?? "", SMALL) / 2);
  const scale =
    ({ domain: [low, high] }: Axis, from: number, to: number): Scale =>
    (value) =>
      tenth(from + ((value - low) / (high - low)) * (to - from));
  const [x, y] = [scale(plot.x, left, left + inner), scale(plot.y, bottom, top)];
  const text = (at: readonly [number, number], words: string, more: object = {}): string =>
    el("text", { x: at[0], y: at[1], fill: colours.ink, ...more }, escaped(words));
  const texts = (from: number, lines: readonly string[], more: { fontSize: number; fill?: string }): string =>
    lines.map((line, i) => text([EDGE, from + i * (more.fontSize + 4)], line, more)).join("");
  const tick = (d: string): string => el("path", { d, stroke: colours.ink, fill: "none" });
  const drawn = (layer: Layer, across: Scale, up: Scale): string =>
    el(
      "g",
      { ...paintOf(layer, colours), textAnchor: layer.look.centred ? "middle" : "start" },
      shapesOf(layer, across, up),
    );

  // samples of all named layers with their names, side by side as far as they fit
  let [right, down] = [EDGE, bottom + (plot.x.title ? 58 : 20)];
  const legend = plot.layers.flatMap(({ name, ...layer }) => {
    if (!name) return [];
    const words = wrapped(name, width - 2 * EDGE - SAMPLE, 12);
    const room = SAMPLE + Math.max(...words.map((line) => textWidth(line, 12)));
    if (right > EDGE && right + room > width - EDGE) [right, down] = [EDGE, down + LINE + 3];
    const [x1, y1] = [right, down];
    right += room + 18;
    down += (words.length - 1) * LINE;
    const mark = layer.look.full ? "box" : layer.mark;
    const items =
      mark === "line"
        ? [x1, x1 + 26].map((end) => ({ x: end, y: y1 }))
        : [mark === "box" ? { x: x1 + 4, y: y1 - 5, x2: x1 + 22, y2: y1 + 5 } : { x: x1 + 13, y: y1 }];
    const sample = drawn({ ...layer, mark, items }, tenth, tenth);
    return [sample, ...words.map((line, i) => text([x1 + SAMPLE, y1 + 4 + i * LINE], line))];
  });
  const end = down + (legend.length > 0 ? 23 : -6);
  const size = { width, height: end + caption.length * LINE };
  const small = { fontSize: SMALL };
  const centred = { ...small, textAnchor: "middle" };
  const atEnd = { textAnchor: "end" };
  const body = [
    theme === "auto" ? DARK_RULE : "",
    el("rect", { ...size, fill: colours.paper }),
    texts(20, title, { fontSize: LARGE }),
    plot.x.title ? tick(`M${left} ${plot.y.title ? top : bottom}V${bottom}H${left + inner}`) : "",
    ...ticks.x.map((t) => tick(`M${x(t.at)} ${bottom}v5`) + text([x(t.at), bottom + 18], t.text, centred)),
    ...ticks.y.map(
      (t) => tick(`M${left} ${y(t.at)}h-5`) + text([left - 8, y(t.at) + 4], t.text, { ...small, ...atEnd }),
    ),
    text([left + inner, bottom + 36], plot.x.title, atEnd),
    text([EDGE, top - 12], plot.y.title),
    ...plot.layers.map((layer) => drawn(layer, x, y)),
    ...legend,
    texts(end, caption, { ...small, fill: colours.faint }),
  ];
  return (
    `<svg xmlns="http://www.w3.org/2000/svg" width="${width}" height="${size.height}" ` +
    `viewBox="0 0 ${width} ${size.height}" role="img" aria-label="${escaped(plot.title)}" ` +
    `class="${theme === "auto" ? "thermostead" : ""}" ` +
    `font-family="system-ui, sans-serif" font-size="12">${body.join("")}</svg>`
  );
}

/** From a value to px. */
type Scale = (value: number) => number;

/** The shapes of a layer without their paint. */
function shapesOf({ mark, look, items, name }: Layer, x: Scale, y: Scale): string {
  const at = (item: Item): string => `${x(item.x)} ${y(item.y)}`;
  if (mark === "line") {
    const d = items.map((item, k) => (k > 0 && item.line === items[k - 1]?.line ? "L" : "M") + at(item));
    return el("path", { d: d.join(""), tip: name });
  }
  const shape = (item: Item): string => {
    const { tip, x2 = item.x, y2 = item.y } = item;
    if (mark === "point") return el("path", { d: `M${at(item)}${OUTLINES[look.shape ?? "circle"]}`, tip });
    if (mark === "text") return el("text", { x: x(item.x), y: y(item.y), tip }, escaped(item.text));
    return el("path", { d: `M${at(item)}H${x(x2)}V${y(y2)}H${x(item.x)}z`, tip });
  };
  return items.map(shape).join("");
}
