// Many planets: temperature against flux.
import type { StateColumns } from "../states/stateColumns.ts";
import { type Item, layerOf, type Plot, plotOf } from "./plot.ts";
import { byStability } from "./statesChart.ts";
import { FLUX, titled } from "./wording.ts";

/** The states of many planets, and a column to draw them against. */
export interface PlanetsChartOptions {
  /** What `findStatesFor` found. */
  readonly states: StateColumns;
  /** A number for each row. */
  readonly values: ArrayLike<number>;
  /** What the column holds; `stellar flux` unless said. */
  readonly name?: string;
  /** W m⁻² unless said. */
  readonly unit?: string;
}

/** More points than this hide one another, and make a file that nobody opens. */
const MOST = 3000;

/** Numbers in a column of stability. */
const SIGNS = { stable: -1, unstable: 1, undecided: 0 };

/**
 * The temperature of every state of many planets against one of their givens: filled where stable, open where unstable. Of
 * more than 3000 states every n-th is drawn, and the caption says so. K and W m⁻² (or the unit that is said).
 *
 * @example planetsChart({ states: findStatesFor(loop, { flux }, { within }), values: flux })
 */
export function planetsChart({
  states,
  values,
  name = "stellar flux",
  unit = FLUX,
}: PlanetsChartOptions): Plot {
  const { temperatures, stability, first, rows } = states;
  const step = Math.ceil(temperatures.length / MOST);
  const items: (Item & { sign: number | undefined })[] = [];
  let row = 0;
  for (let i = 0; i < temperatures.length; i += step) {
    while (Number(first[row + 1]) <= i) row++;
    items.push({ x: Number(values[row]), y: Number(temperatures[i]), tip: `row ${row}`, sign: stability[i] });
  }
  return plotOf({
    title: `States of ${rows} planets`,
    x: { title: titled(name, unit) },
    y: { title: titled("temperature", "K") },
    caption: [countsText(states), step > 1 && `Drawn is one state in ${step}`],
    layers: byStability((kind, look) => {
      const own = items.filter((item) => item.sign === SIGNS[kind]);
      return layerOf("point", look, own, kind);
    }),
  });
}

/** How many planets have how many states. */
export const countsText = ({ counts }: Pick<StateColumns, "counts">): string =>
  [...new Set(counts)]
    .sort((a, b) => a - b)
    .map((count) => `planets with ${count} states: ${counts.filter((c) => c === count).length}`)
    .join(", ");
