// Planets against published limits over the temperature of the star.
import type { Colour } from "./palette.ts";
import { around, extent, type Item, layerOf, type Plot, plotOf, type Shape } from "./plot.ts";
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

/** Dashes and colours of the lines, in turn: neither is needed to tell them apart, as each ends in a letter. */
const DASHES = [
  [1, 0],
  [8, 4],
  [2, 3],
  [8, 3, 2, 3],
  [14, 4],
];
const COLOURS = ["ink", "cool", "warm", "purple", "green"] as const;

/** Signs of planets that have a name in the legend; of more planets the names are said when pointed at. */
const SIGNS: readonly Shape[] = ["circle", "square", "diamond", "triangle-up", "triangle-down"];

/**
 * Planets as points and published limits as lines: stellar flux against the effective temperature of the star, K and
 * W m⁻². Each line ends in the letter that stands before its name and paper in the legend. A limit says what its paper
 * says, and nothing about whether anything lives there.
 *
 * @example limitsChart({ planets, limits: [{ name: "runaway greenhouse", paper: "Kopparapu et al. 2013", points }] })
 */
export function limitsChart({ planets, limits }: LimitsChartOptions): Plot {
  const place = ({ effectiveTemperature, flux }: Omit<PlacedPlanet, "name">, tip?: string): Item => ({
    ...{ x: effectiveTemperature, y: flux },
    ...(tip ? { tip } : {}),
  });
  const lines = limits.map(({ name, paper, points }, i) => {
    const dash = DASHES[(2 * i + Math.floor(i / 5)) % 5] as number[];
    const look = { colour: COLOURS[i % 5] as Colour, dash, width: 1.8 };
    return layerOf(
      "line",
      look,
      points.map((p) => place(p)),
      `${letterOf(i)}: ${name}, ${paper}`,
    );
  });
  const points = planets.map((planet) => place(planet, planet.name));
  const drawn = [...points, ...lines.flatMap((line) => line.items)].filter(isPlace);
  const x = around(extent(drawn.map((item) => item.x)), 0.08);
  const y = around(extent(drawn.map((item) => item.y)), 0.08);
  const ends = lines.flatMap(({ items }, i) =>
    items
      .filter(isPlace)
      .slice(-1)
      .map((end) => ({ ...end, text: letterOf(i) })),
  );
  // a line of text is a twentieth of the lowest chart: letters that would touch are moved up
  let lowest = -1 / 0;
  const letters = ends
    .sort((a, b) => a.y - b.y)
    .map((end) => {
      lowest = Math.max(end.y - 0.015 * (y[1] - y[0]), lowest + 0.055 * (y[1] - y[0]));
      return { x: end.x + 0.012 * (x[1] - x[0]), y: lowest, text: end.text };
    });
  return plotOf({
    title: "Stellar flux and published limits",
    x: { title: titled("effective temperature of the star", "K"), domain: x },
    y: { title: titled("stellar flux", FLUX), domain: y },
    caption: ["A limit says no more than its paper"],
    layers: [
      ...lines,
      layerOf("text", { colour: "ink" }, letters),
      ...(points.length > SIGNS.length
        ? [layerOf("point", { colour: "ink" }, points, `${points.length} planets`)]
        : points.map((item, i) =>
            layerOf("point", { colour: "ink", shape: SIGNS[i] as Shape }, [item], item.tip),
          )),
    ],
  });
}

const isPlace = ({ x, y }: Item): boolean => Number.isFinite(x - y);
