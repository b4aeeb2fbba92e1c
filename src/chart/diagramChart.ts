// The diagram of temperature against one parameter.
import type { Diagram } from "../branches/diagram.ts";
import type { State } from "../states/state.ts";
import { around, extent, type Layer, type Look, layerOf, type Plot, plotOf, type Shape } from "./plot.ts";
import { byStability, undecidedLayer } from "./statesChart.ts";
import { numeral, rangeText, titled } from "./wording.ts";

/** A diagram, and what may be drawn with it. */
export interface DiagramChartOptions {
  readonly diagram: Diagram;
  /** The same planet with couplings held, along the same given. */
  readonly held?: Diagram;
  /** Where the planet is now. */
  readonly state?: State;
}

/** Dashes of branches, by stability. */
const DASHES: Readonly<Record<State["stability"], readonly number[]>> = {
  stable: [1, 0],
  unstable: [6, 5],
  undecided: [1, 4],
};

/**
 * Temperature against one given: stable branches drawn through, unstable ones dashed, folds as squares (at a kink as
 * diamonds), crossings as rings, the jumps of a slow rise and fall with their direction, the same planet with couplings held, and the planet's
 * present place. Undecided parts are boxes. Units: K and that of the given.
 *
 * @example toSVG(diagramChart({ diagram: traceBranches(loop, { along: "flux", between, within }), state }), { width: 360 })
 */
export function diagramChart({ diagram, held, state }: DiagramChartOptions): Plot {
  const { along, unit, between, within, undecided, gaps, folds, crossings, jumps, branches, proof, fixed } =
    diagram;
  const [least, most] = extent(branches.flatMap((branch) => branch.temperatures));
  const [low, high] = least <= most ? around([least, most], 0.08) : within;
  const fixedText = Object.entries(fixed).map(([name, value]) => `, ${name} ${numeral(value)}`);
  const branchLayers = (of: Diagram, look: Look, prefix = ""): Layer[] =>
    byStability((stability) => {
      const items = of.branches.flatMap((branch, line) =>
        branch.stability === stability ? branch.points.map((p) => ({ x: p.at, y: p.temperature, line })) : [],
      );
      return layerOf("line", { ...look, dash: DASHES[stability] }, items, prefix + stability);
    });
  const special = (kind: string, shape: Shape, name = kind): Layer => {
    const items = [...folds, ...crossings]
      .filter((place) => place.kind === kind)
      .map((place) => ({ x: place.at, y: place.temperature, tip: rangeText(place.atBracket, 17) }));
    return layerOf("point", { colour: "ink", open: true, shape }, items, name);
  };
  // upright lines from the lost to the reached temperature, with an arrow half way
  const warm: Look = { colour: "warm", dash: [2, 3], width: 1.5 };
  const known = jumps.flatMap(({ at: x, temperature: y, to, leaves, direction }) => {
    const goal = to ? to.temperature : leaves === "hotter" ? high : low;
    return to || leaves ? [{ x, y, goal, tip: `a slow ${direction} jumps to ${numeral(goal)}` }] : [];
  });
  const ends = known.flatMap(({ x, y, goal }, line) => [
    { x, y, line },
    { x, y: goal, line },
  ]);
  const heads = (shape: "triangle-up" | "triangle-down", side: 1 | -1): Layer => {
    const items = known.filter(({ y, goal }) => (goal - y) * side > 0);
    return layerOf(
      "point",
      { ...warm, shape },
      items.map(({ x, y, goal, tip }) => ({ x, y: (y + goal) / 2, tip })),
    );
  };
  const now = state
    ? [{ x: Number((state.givens as Readonly<Record<string, number>>)[along]), y: state.temperature }]
    : [];
  return plotOf({
    title: `Temperature along ${along}`,
    x: { title: titled(along, unit), domain: between },
    y: { title: titled("temperature", "K") },
    caption: [`${branches.length} branches, ${proof}, ${undecided.length} undecided${fixedText.join("")}`],
    layers: [
      undecidedLayer(
        undecided.map(({ parameters: [x, x2], temperatures: [y, y2], kind }) => ({
          x,
          x2,
          y,
          y2,
          tip: kind,
        })),
      ),
      layerOf(
        "box",
        { colour: "purple", open: true },
        gaps.map(({ parameters: [x, x2], too }) => ({ x, x2, y: low, y2: high, tip: `too ${too}` })),
        "no state in range",
      ),
      ...(held ? branchLayers(held, { colour: "cool", width: 1.5 }, "couplings held, ") : []),
      layerOf("line", warm, ends, "jump"),
      heads("triangle-up", 1),
      heads("triangle-down", -1),
      ...branchLayers(diagram, { colour: "ink", width: 2.5 }),
      special("fold", "square"),
      special("corner", "diamond", "fold at a kink"),
      special("transcritical", "circle", "crossing"),
      layerOf("point", { colour: "warm", shape: "diamond" }, now, "the planet now"),
    ],
  });
}
