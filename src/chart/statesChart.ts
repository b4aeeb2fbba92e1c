// The states of a loop on its curves of heating and cooling, or by themselves.
import type { BudgetCurve } from "../states/budgetCurve.ts";
import type { FoundStates, State } from "../states/state.ts";
import { around, extent, type Item, type Layer, type Look, layerOf, type Plot, plotOf } from "./plot.ts";
import { FEEDBACK, FLUX, numeral, rangeText, titled } from "./wording.ts";

/** How states are marked everywhere: filled where stable, open where unstable. */
export const MARKS: Readonly<Record<State["stability"], Look>> = {
  stable: { colour: "ink" },
  unstable: { colour: "warm", open: true },
  undecided: { colour: "faint", shape: "diamond", open: true },
};

/** One layer for each stability. */
export const byStability = (of: (stability: State["stability"], look: Look) => Layer): Layer[] =>
  Object.entries(MARKS).map(([stability, look]) => of(stability as State["stability"], look));

/** Boxes around what is not decided. */
export const undecidedLayer = (items: readonly Item[]): Layer =>
  layerOf("box", { colour: "faint", open: true, dash: [2, 2] }, items, "undecided");

/** Heating and cooling, and the states where they are known. */
export interface BudgetChartOptions {
  /** What `budgetCurve` read. */
  readonly budget: BudgetCurve;
  /** The states at the same givens. */
  readonly found?: FoundStates;
}

/**
 * Heating and cooling against temperature. Where they cross lie the states: filled where stable, open where unstable, with
 * the proved bracket in the tooltip; stretches that are not decided are boxes. Units: K and W m⁻².
 *
 * @example show(budgetChart({ budget: budgetCurve(loop, { within }), found: findStates(loop, { within }) }))
 */
export function budgetChart({ budget, found }: BudgetChartOptions): Plot {
  const { points, within, dropped } = budget;
  const curve = (name: "heating" | "cooling", look: Look): Layer =>
    layerOf(
      "line",
      look,
      points.map((p) => ({ x: p.temperature, y: p[name] })),
      name,
    );
  const curves = [curve("heating", { colour: "warm" }), curve("cooling", { colour: "cool", dash: [7, 4] })];
  /** Cooling between two points of the curve. */
  const height = ({ temperature }: State): number => {
    const next = points.findIndex((p) => p.temperature >= temperature);
    const [a, b] = [points[Math.max(0, next - 1)], points[next]];
    if (!a || !b) return 1 / 0;
    const share = (temperature - a.temperature) / (b.temperature - a.temperature || 1);
    return a.cooling + share * (b.cooling - a.cooling);
  };
  return statesPlot({
    title: "Heating and cooling",
    y: titled("flux", FLUX),
    within,
    curves,
    found,
    height,
    dropped,
  });
}

/** States by themselves: λ against temperature, K and W m⁻² K⁻¹; stable ones lie below the line at 0. */
export function statesChart(found: FoundStates): Plot {
  const { within } = found;
  const zero = layerOf(
    "line",
    { colour: "faint", width: 1 },
    within.map((x) => ({ x, y: 0 })),
  );
  const height = (state: State): number => state.feedbackParameter;
  return statesPlot({ title: "States", y: titled("λ", FEEDBACK), within, curves: [zero], found, height });
}

interface StatesPlot extends Pick<BudgetCurve, "within">, Pick<BudgetChartOptions, "found"> {
  readonly title: string;
  readonly y: string;
  readonly curves: readonly Layer[];
  readonly height: (state: State) => number;
  readonly dropped?: number;
}

/** Curves with the states on them, and boxes of what is undecided, as high as all that is drawn. */
function statesPlot({ title, y, within, curves, found, height, dropped = 0 }: StatesPlot): Plot {
  const { states = [], undecided = [], proof } = found ?? {};
  const marks = byStability((stability, look) => {
    const own = states.filter((state) => state.stability === stability);
    return layerOf(
      "point",
      look,
      own.map((s) => ({ x: s.temperature, y: height(s), tip: tipOf(s) })),
      stability,
    );
  });
  const [low, high] = around(
    extent([...curves, ...marks].flatMap((layer) => layer.items.map((item) => item.y))),
    0.05,
  );
  const boxes = undecided.map(({ interval: [x, x2], kind }) => ({
    x,
    x2,
    y: low,
    y2: Math.max(high, low + 1),
    tip: kind,
  }));
  return plotOf({
    title,
    x: { title: titled("temperature", "K"), domain: within },
    y: { title: y },
    caption: [
      !!proof && `${states.length} states at ${rangeText(within)} K, ${proof}, ${undecided.length} undecided`,
    ],
    layers: [undecidedLayer(boxes), ...curves, ...marks],
    dropped,
  });
}

const tipOf = ({ bracket, proved, feedbackParameter }: State): string =>
  `λ ${numeral(feedbackParameter)}, ${proved ? "" : "not "}proved bracket ${rangeText(bracket, 17)} K`;
