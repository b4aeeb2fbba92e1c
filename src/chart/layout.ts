// What both readings of a plot share: where its ticks are, how high it is, and how its words break.
import { textWidth, wrapped } from "./lines.ts";
import type { Theme } from "./palette.ts";
import type { Axis, Plot } from "./plot.ts";
import { type Tick, ticksIn } from "./ticks.ts";

/** How a picture is asked for. */
export interface Page {
  readonly width: number;
  readonly theme: Theme;
}

/** Room around a picture, px. */
export const EDGE = 10;
/** Size of tick labels and captions, px; of titles; and the distance of lines. */
export const SMALL = 11;
export const LARGE = 15;
export const LINE = 15;

export interface Layout {
  readonly height: number;
  readonly x: readonly Tick[];
  readonly y: readonly Tick[];
  /** Room for the labels of the upright axis, px. */
  readonly left: number;
  readonly title: readonly string[];
  readonly caption: readonly string[];
}

export function layoutOf(plot: Plot, width: number): Layout {
  const height = plot.height ?? Math.round(Math.min(420, Math.max(220, 0.55 * width)));
  const ticks = ({ title, domain }: Axis, about: number) =>
    title ? ticksIn(domain, Math.max(2, about)) : [];
  const [x, y] = [ticks(plot.x, width / 75), ticks(plot.y, height / 50)];
  const labels = y.map((tick) => textWidth(tick.text, SMALL));
  const broken = (text: string, size: number): string[] => wrapped(text, width - 2 * EDGE, size);
  return {
    ...{ height, x, y },
    left: labels.length > 0 ? Math.ceil(Math.max(...labels)) + 8 : 0,
    title: broken(plot.title, LARGE),
    caption: plot.caption.flatMap((line) => broken(line, SMALL)),
  };
}
