// Many planets: temperature against flux.
import type { StateColumns } from "../states/stateColumns.ts";
import { type Item, layersOf, type Plot, plotOf } from "./plot.ts";
import { MARKS } from "./statesChart.ts";
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

/** What 0, 1 and, as the last, −1 in a column of stability mean. */
const KINDS = ["undecided", "unstable", "stable"];

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
  const { temperatures } = states;
  const step = Math.ceil(temperatures.length / MOST);
  const items: Item[] = [];
  let row = 0;
  for (let i = 0; i < temperatures.length; i += step) {
    while ((states.first[row + 1] as number) <= i) row++;
    items.push({
      x: values[row] as number,
      y: temperatures[i] as number,
      tip: `row ${row}`,
      kind: KINDS.at(states.stability[i] as number) as string,
    });
  }
  return plotOf({
    title: `States along ${name}`,
    x: { title: titled(name, unit) },
    y: { title: titled("temperature", "K") },
    caption: [countsText(states), step > 1 && `Drawn is one state in ${step}`],
    layers: layersOf("point", items, MARKS),
  });
}

/** How many planets have how many states. */
export const countsText = ({ counts }: Pick<StateColumns, "counts">): string =>
  `planets by number of states: ${[...new Set(counts)]
    .sort((a, b) => a - b)
    .map((count) => `${counts.filter((c) => c === count).length} with ${count}`)
    .join(", ")}`;
