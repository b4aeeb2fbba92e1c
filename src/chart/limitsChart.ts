// Planets against published limits over the temperature of the star.
import type { Range } from "../ground/range.ts";
import { type Colour, HUES } from "./palette.ts";
import { extent, type Item, isDrawn, layerOf, type Plot, plotOf, type Shape } from "./plot.ts";
import { OUTLINES } from "./style.ts";
import { FLUX, letterOf, titled } from "./wording.ts";

/** Where a planet is. */
export interface PlacedPlanet {
  readonly name: string;
  /** Effective temperature of the star, K. */
  readonly effectiveTemperature: number;
  /** Stellar flux at the planet, W m⁻². */
  readonly flux: number;
}

/** A published limit. */
export interface LimitLine {
  /** What it is the limit of, such as `runaway greenhouse`. */
  readonly name: string;
  readonly paper: string;
  /** K and W m⁻², by rising temperature. */
  readonly points: readonly Omit<PlacedPlanet, "name">[];
}

/** What is compared. */
export interface LimitsChartOptions {
  readonly planets: readonly PlacedPlanet[];
  readonly limits: readonly LimitLine[];
}

/** Signs of planets that have a name in the legend; of more planets the names are said when pointed at. */
const SIGNS = Object.keys(OUTLINES) as Shape[];

/**
 * Planets as points and published limits as lines: stellar flux against the effective temperature of the star, K and
 * W m⁻². Each line ends in the letter that stands before its name and paper in the legend. A limit says what its paper
 * says, and nothing about whether anything lives there.
 *
 * @example limitsChart({ planets, limits: [{ name: "runaway greenhouse", paper: "Kopparapu et al. 2013", points }] })
 */
export function limitsChart({ planets, limits }: LimitsChartOptions): Plot {
  const place = (at: Omit<PlacedPlanet, "name">): Item => ({ x: at.effectiveTemperature, y: at.flux });
  const lines = limits.map((limit, i) => {
    // colours and dashes take turns of different lengths; neither is needed, as each line ends in a letter
    const dash = [
      [1, 0],
      [8, 4],
      [2, 3],
      [14, 4],
    ][i % 4] as number[];
    return layerOf(
      "line",
      limit.points.map(place),
      { colour: HUES[i % 5] as Colour, dash },
      `${letterOf(i)}: ${limit.name}, ${limit.paper}`,
    );
  });
  const points = planets.map((planet) => ({ ...place(planet), tip: planet.name }));
  const drawn = [...points, ...lines.flatMap((line) => line.items)];
  const [x, y] = (["x", "y"] as const).map((key) => extent(drawn.map((item) => item[key]))) as [Range, Range];
  // a line of text is a twentieth of the lowest chart: letters that would touch are moved up
  const step = (y[1] - y[0]) / 18;
  let lowest = -1 / 0;
  const letters = lines
    .flatMap((line, i) =>
      line.items
        .filter(isDrawn)
        .slice(-1)
        .map((end) => ({ ...end, text: letterOf(i) })),
    )
    .sort((a, b) => a.y - b.y)
    .map((end) => {
      lowest = Math.max(end.y - step / 4, lowest + step);
      return { ...end, x: end.x + 0.012 * (x[1] - x[0]), y: lowest };
    });
  return plotOf({
    title: "Published limits",
    x: { title: titled("effective temperature of the star", "K"), domain: x },
    y: { title: titled("stellar flux", FLUX), domain: y },
    caption: ["A limit says no more than its paper"],
    layers: [
      ...lines,
      layerOf("text", letters),
      ...(points.length > SIGNS.length
        ? [layerOf("point", points, {}, `${points.length} planets`)]
        : points.map((item, i) => layerOf("point", [item], { shape: SIGNS[i] as Shape }, item.tip))),
    ],
  });
}
