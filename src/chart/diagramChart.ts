// The diagram of temperature against one parameter.
import type { Diagram, GivenUnit } from "../branches/diagram.ts";
import type { Range } from "../ground/range.ts";
import type { State } from "../states/state.ts";
import {
  boxOf,
  extent,
  type Layer,
  type Look,
  layerOf,
  layersOf,
  lineOf,
  type Plot,
  plotOf,
} from "./plot.ts";
import { MARKS, undecidedLayer } from "./statesChart.ts";
import { numeral, rangeText, titled, unitText } from "./wording.ts";

/** A diagram, and what may be drawn with it. */
export interface DiagramChartOptions {
  readonly diagram: Diagram;
  /** The same planet with couplings held, along the same given. */
  readonly held?: Diagram;
  /** Where the planet is now. */
  readonly state?: State;
  /** In which units givens are shown, such as the `units` of a planet, in which they are written; those of the diagram unless said. */
  readonly units?: readonly GivenUnit[];
}

/** Folds and crossings, and what the legend calls them. */
const PLACES = {
  fold: { shape: "square" },
  "fold at a kink": { shape: "diamond" },
  crossing: { shape: "circle" },
} as const;
const NAMES: Readonly<Record<string, string>> = { corner: "fold at a kink", transcritical: "crossing" };

/**
 * Temperature against one given: stable branches drawn through, unstable ones dashed, folds as squares (at a kink as
 * diamonds), crossings as rings, the jumps of a slow rise and fall with their direction, the same planet with couplings held, and the planet's
 * present place. Undecided parts are boxes. Units: K and that of the given, which is the one in which it was written where
 * `units` has it; the diagram of an appraisal brings its own.
 *
 * @example toSVG(diagramChart({ diagram: traceBranches(loop, { along: "flux", between, within }), state }), { width: 360 })
 */
export function diagramChart({ diagram, held, state, units = diagram.units }: DiagramChartOptions): Plot {
  const { along, branches, undecided } = diagram;
  const seen = branches.flatMap((branch) => branch.temperatures);
  const range = extent(seen[0] ? seen : diagram.within);
  const known = (given: string) => units?.find((one) => one.name === given);
  const { unit, size = 1 } = (known(along) ?? diagram) as GivenUnit;
  const shown = (at: number): number => at / size;
  const branchLayers = (of: Diagram, look: Look, prefix?: string): Layer[] => {
    return layersOf(
      "line",
      of.branches.flatMap((branch, line) =>
        lineOf(
          branch.points.map((point) => [shown(point.at), point.temperature]),
          line,
          branch.stability,
        ),
      ),
      MARKS,
      look,
      prefix,
    );
  };
  // upright lines from the lost to the reached temperature, or to the edge of the picture, with an arrow half way
  const warm: Look = { colour: "warm", dash: [2, 3], width: 1.5 };
  const ways = diagram.jumps
    .filter((jump) => jump.to || jump.leaves)
    .map((jump, i) => {
      const { to, temperature, leaves } = jump;
      const goal = to?.temperature ?? range[leaves === "hotter" ? 1 : 0];
      const x = shown(jump.at);
      const end = to ? `jumps to ${numeral(goal)} K` : `leaves the searched range, ${leaves}`;
      const sign = { x, y: (temperature + goal) / 2, tip: `a slow ${jump.direction} ${end}` };
      return {
        line: lineOf(
          [
            [x, temperature],
            [x, goal],
          ],
          i,
        ),
        arrow: layerOf("point", [sign], {
          ...warm,
          shape: goal > temperature ? "triangle-up" : "triangle-down",
        }),
      };
    });
  return plotOf({
    title: `Temperature along ${along}`,
    x: { title: titled(along, unit), domain: diagram.between.map(shown) as unknown as Range },
    y: { title: titled("temperature", "K") },
    caption: [
      [
        `Branches: ${branches.length}`,
        diagram.proof,
        `undecided: ${undecided.length}`,
        ...Object.entries(diagram.fixed).map(([name, value]) => {
          const { unit = "1", size = 1 }: Partial<GivenUnit> = known(name) ?? {};
          return `${name} ${numeral(value / size)}${unitText(unit)}`;
        }),
      ].join(", "),
    ],
    layers: [
      undecidedLayer(
        undecided.map((part) =>
          boxOf(part.parameters.map(shown) as unknown as Range, part.temperatures, part.kind),
        ),
      ),
      layerOf(
        "box",
        diagram.gaps.map((gap) =>
          boxOf(gap.parameters.map(shown) as unknown as Range, range, `too ${gap.too}`),
        ),
        { colour: "purple", open: true },
        "no state in range",
      ),
      ...(held ? branchLayers(held, { colour: "cool", width: 1.5 }, "couplings held, ") : []),
      layerOf(
        "line",
        ways.flatMap((way) => way.line),
        warm,
        "jump",
      ),
      ...ways.map((way) => way.arrow),
      ...branchLayers(diagram, { colour: "ink", width: 2.5 }),
      ...layersOf(
        "point",
        [...diagram.folds, ...diagram.crossings].map((place) => ({
          x: shown(place.at),
          y: place.temperature,
          tip: rangeText(place.atBracket, 17) + unitText(diagram.unit),
          kind: NAMES[place.kind] ?? place.kind,
        })),
        PLACES,
        { open: true },
      ),
      layerOf(
        "point",
        state
          ? [
              {
                x: shown((state.givens as Readonly<Record<string, number>>)[along] as number),
                y: state.temperature,
              },
            ]
          : [],
        { colour: "warm", shape: "diamond" },
        "the planet now",
      ),
    ],
  });
}
