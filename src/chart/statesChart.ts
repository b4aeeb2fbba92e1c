// The states of a loop on its curves of heating and cooling, or by themselves.
import type { Range } from "../ground/range.ts";
import type { BudgetCurve } from "../states/budgetCurve.ts";
import type { FoundStates, State } from "../states/state.ts";
import {
  boxOf,
  type Draft,
  extent,
  type Item,
  type Layer,
  type Look,
  layerOf,
  layersOf,
  type Plot,
  plotOf,
} from "./plot.ts";
import { FEEDBACK, FLUX, numeral, rangeText, titled } from "./wording.ts";

/** How states are marked everywhere: filled where stable, open where unstable, and the dashes of lines of them. */
export const MARKS: Readonly<Record<State["stability"], Look>> = {
  stable: { dash: [1, 0] },
  unstable: { colour: "warm", dash: [6, 5], open: true },
  undecided: { colour: "faint", dash: [1, 4], open: true, shape: "diamond" },
};

/** Boxes around what is not decided. */
export const undecidedLayer = (items: readonly Item[]): Layer =>
  layerOf("box", items, { colour: "faint", dash: [2, 2], open: true }, "undecided");

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
  const { points } = budget;
  const curve = (name: "heating" | "cooling", look: Look): Layer =>
    layerOf(
      "line",
      points.map((p) => ({ x: p.temperature, y: p[name] })),
      look,
      name,
    );
  const curves = [curve("heating", { colour: "warm" }), curve("cooling", { colour: "cool", dash: [7, 4] })];
  /** Cooling between two points of the curve. */
  const height = ({ temperature: t }: State): number =>
    points.reduce((found, b, i) => {
      const a = points[i - 1] ?? b;
      const share = (t - a.temperature) / (b.temperature - a.temperature || 1);
      return share >= 0 && share <= 1 ? a.cooling + share * (b.cooling - a.cooling) : found;
    }, 1 / 0);
  const draft = {
    title: "Heating and cooling",
    y: { title: titled("flux", FLUX) },
    ...{ layers: curves, dropped: budget.dropped },
  };
  return withStates(draft, height, found, budget.within);
}

/** States by themselves: λ against temperature, K and W m⁻² K⁻¹; stable ones lie below the line at 0. */
export function statesChart(found: FoundStates): Plot {
  // the axis is around what was found, and as wide as the search only where nothing was
  const states = found.states.map((state) => state.temperature);
  return withStates(
    {
      title: "States",
      y: { title: titled("λ", FEEDBACK) },
      layers: [
        layerOf(
          "line",
          (states[0] ? states : found.within).map((x) => ({ x, y: 0 })),
          { colour: "faint", width: 1 },
        ),
      ],
    },
    (state) => state.feedbackParameter,
    found,
  );
}

/** Curves with the states on them, and boxes of what is undecided, as high as all that is drawn. */
function withStates(
  draft: Omit<Draft, "x">,
  heightOf: (state: State) => number,
  found?: FoundStates,
  domain?: Range,
): Plot {
  const { states = [], undecided = [] } = found ?? {};
  const marks = states.map((state) => ({
    x: state.temperature,
    y: heightOf(state),
    tip: `λ ${numeral(state.feedbackParameter)}, ${state.proved ? "" : "not "}proved bracket ${rangeText(state.bracket, 17)} K`,
    kind: state.stability,
  }));
  const layers = [...draft.layers, ...layersOf("point", marks, MARKS)];
  const [low, high] = extent(layers.flatMap((layer) => layer.items.map((item) => item.y)));
  const boxes = undecided.map((part) => boxOf(part.interval, [low, Math.max(high, low + 1)], part.kind));
  return plotOf({
    ...draft,
    x: { title: titled("temperature", "K"), domain } as Draft["x"],
    caption: [
      found &&
        `States at ${rangeText(found.within)} K: ${states.length}, ${found.proof}, undecided: ${undecided.length}`,
    ],
    layers: [undecidedLayer(boxes), ...layers],
  });
}
