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
    ({ domain: [low, high] }: Axis, from: number, to: number) =>
    (value: number) =>
      tenth(from + ((value - low) / (high - low)) * (to - from));
  const x = scale(plot.x, left, left + inner);
  const y = scale(plot.y, bottom, top);
  const text = (at: readonly [number, number], words: string, more: object = {}): string =>
    el("text", { x: at[0], y: at[1], fill: colours.ink, ...more }, escaped(words));
  const texts = (from: number, lines: readonly string[], more: { fontSize: number; fill?: string }): string =>
    lines.map((line, i) => text([EDGE, from + i * (more.fontSize + 4)], line, more)).join("");
  const tick = (d: string): string => el("path", { d, stroke: colours.ink, fill: "none" });
  const rect = (a: readonly number[], b: readonly number[], more: object): string => {
    const [[x1 = 0, y1 = 0], [x2 = 0, y2 = 0]] = [a, b];
    const size = { width: Math.max(1, Math.abs(x2 - x1)), height: Math.max(1, Math.abs(y2 - y1)) };
    return el("rect", { x: Math.min(x1, x2), y: Math.min(y1, y2), ...size, ...more });
  };
  const drawn = (layer: Layer): string => {
    const { mark, look, items } = layer;
    const paint = paintOf(layer, colours);
    const at = (i: Item) => [x(i.x), y(i.y)] as const;
    if (mark === "line") {
      const d = items.map((item, k) => `${k > 0 && item.line === items[k - 1]?.line ? "L" : "M"}${at(item)}`);
      return el("path", { d: d.join(""), tip: layer.name, ...paint });
    }
    const one = (item: Item): string => {
      const { tip, x2 = item.x, y2 = item.y } = item;
      if (mark === "point")
        return el("path", { d: `M${at(item)}${OUTLINES[look.shape ?? "circle"]}`, tip, ...paint });
      if (mark === "box") return rect(at(item), [x(x2), y(y2)], { tip, ...paint });
      return text(at(item), String(item.text), {
        textAnchor: look.centred ? "middle" : "start",
        tip,
        fill: paint.fill,
      });
    };
    return items.map(one).join("");
  };

  // samples of all named layers with their names, side by side as far as they fit
  let [right, down] = [EDGE, bottom + (plot.x.title ? 58 : 20)];
  const legend = plot.layers.flatMap((layer) => {
    const { mark, look, name = "" } = layer;
    if (!name) return [];
    const words = wrapped(name, width - 2 * EDGE - SAMPLE, 12);
    const room = SAMPLE + Math.max(...words.map((line) => textWidth(line, 12)));
    if (right > EDGE && right + room > width - EDGE) [right, down] = [EDGE, down + LINE + 3];
    const [start, y] = [right, down];
    right += room + 18;
    down += (words.length - 1) * LINE;
    const paint = paintOf(layer, colours);
    const sample =
      mark === "point"
        ? el("path", { d: `M${start + 13} ${y}${OUTLINES[look.shape ?? "circle"]}`, ...paint })
        : mark === "box" || look.full
          ? rect([start + 4, y - 5], [start + 22, y + 5], paint)
          : el("path", { d: `M${start} ${y}h26`, ...paint });
    return [sample, ...words.map((line, i) => text([start + SAMPLE, y + 4 + i * LINE], line))];
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
    ...plot.layers.map(drawn),
    ...legend,
    texts(end, caption, { ...small, fill: colours.faint }),
  ];
  return (
    `<svg xmlns="http://www.w3.org/2000/svg" width="${width}" height="${size.height}" ` +
    `viewBox="0 0 ${width} ${size.height}" role="img" aria-label="${escaped(plot.title)}" class="thermostead" ` +
    `font-family="system-ui, sans-serif" font-size="12">${body.join("")}</svg>`
  );
}
