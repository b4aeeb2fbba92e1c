// The text of an SVG: elements, and the shapes of a layer.
import type { Layer } from "./plot.ts";
import { OUTLINES } from "./style.ts";
import { escaped, spaced } from "./wording.ts";

/** From a value to px. */
export type Scale = (value: number) => number;

type Attributes = Readonly<Record<string, unknown>>;

/** A tenth of a pixel is as exact as a picture needs. */
const tenth = (value: number): number => Math.round(value * 10) / 10;

/**
 * An element. Attributes may have the names that Vega-Lite gives them; `tip` is what is said when it is pointed at.
 */
export function el(name: string, { tip, ...attributes }: Attributes, inside = ""): string {
  const written = Object.entries(attributes).map(([key, value]) => {
    return ` ${spaced(key, "-").replace("dash", "dasharray")}="${escaped(value)}"`;
  });
  return `<${name}${written.join("")}>${tip ? `<title>${escaped(tip)}</title>` : ""}${inside}</${name}>`;
}

/** The shapes of a layer without their paint. */
export function shapesOf(layer: Layer, across: Scale, up: Scale): string {
  const outline = OUTLINES[layer.look.shape ?? "circle"];
  const shapes = layer.items.map((item, i) => {
    const [x, y] = [tenth(across(item.x)), tenth(up(item.y))];
    if (layer.mark === "text") return el("text", { x, y, tip: item.tip }, escaped(item.text));
    if (layer.mark === "line")
      return `${item.line === layer.items[i - 1]?.line && i > 0 ? "L" : "M"}${x} ${y}`;
    const box = `H${tenth(across(item.x2 as number))}V${tenth(up(item.y2 as number))}H${x}z`;
    return el("path", { d: `M${x} ${y}${layer.mark === "box" ? box : outline}`, tip: item.tip });
  });
  const all = shapes.join("");
  return layer.mark === "line" ? el("path", { d: all, tip: layer.name }) : all;
}
