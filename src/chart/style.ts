// How a layer is painted, in names that SVG and Vega-Lite share.
import type { Colour } from "./palette.ts";
import type { Layer, Shape } from "./plot.ts";

/** Paint of a mark. */
export interface Paint {
  readonly fill: string;
  readonly fillOpacity: number;
  readonly stroke: string;
  readonly strokeWidth: number;
  readonly strokeDash: readonly number[];
}

export function paintOf(
  { mark, look }: Pick<Layer, "mark" | "look">,
  colours: Readonly<Record<Colour, string>>,
): Paint {
  const { open, full, dash = [1, 0], width = mark === "line" ? 2 : 1.5 } = look;
  const colour = colours[look.colour];
  const isLine = mark === "line" && !full;
  return {
    fill: isLine ? "transparent" : open && mark === "point" ? colours.paper : colour,
    fillOpacity: open && mark === "box" ? 0.2 : 1,
    stroke: mark === "text" ? "transparent" : colour,
    strokeWidth: full || mark === "text" ? 0 : width,
    strokeDash: mark === "point" ? [1, 0] : dash,
  };
}

/** Outlines of points around their place, px. */
export const OUTLINES: Readonly<Record<Shape, string>> = {
  circle: "m-4.5 0a4.5 4.5 0 1 0 9 0a4.5 4.5 0 1 0-9 0z",
  square: "m-4-4h8v8h-8z",
  diamond: "m0-6l6 6l-6 6l-6-6z",
  "triangle-up": "m0-5l5 9h-10z",
  "triangle-down": "m0 5l5-9h-10z",
};
