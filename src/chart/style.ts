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
  readonly fontSize: number;
}

export function paintOf({ mark, look }: Layer, colours: Readonly<Record<Colour, string>>): Paint {
  const colour = colours[look.colour ?? "ink"];
  const isLine = mark === "line" && !look.full;
  return {
    fill: isLine ? "transparent" : look.open && mark === "point" ? colours.paper : colour,
    fillOpacity: look.open && mark === "box" ? 0.2 : 1,
    stroke: colour,
    strokeWidth: look.full || mark === "text" ? 0 : (look.width ?? (mark === "line" ? 2 : 1.5)),
    strokeDash: (mark !== "point" && look.dash) || [1, 0],
    fontSize: look.size ?? 12,
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
