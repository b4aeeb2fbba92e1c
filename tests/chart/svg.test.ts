// Every picture as SVG: well-formed, finite, inside of itself, and no words on other words, on a telephone and on a desk.
import { describe, expect, test } from "vitest";
import { diagramChart } from "../../src/chart/diagramChart.ts";
import { toSVG } from "../../src/chart/show.ts";
import { diagram, HARM, pictures } from "./cases.ts";
import { all, overlapping, parsed, wordsOf } from "./svgText.ts";

const WIDTHS = [360, 1200];
const drawn = Object.keys(pictures).flatMap((name) => WIDTHS.map((width) => [name, width] as const));
const svgOf = (name: string, width: number, theme?: "light" | "dark"): string =>
  toSVG(pictures[name], theme ? { width, theme } : { width }) as string;

describe.each(drawn)("%s at %d px", (name, width) => {
  const text = svgOf(name, width);
  const svg = parsed(text);

  test("is well-formed and finite, with a name for those who cannot see it", () => {
    expect(svg.name).toBe("svg");
    expect(svg.attributes.width).toBe(String(width));
    expect(svg.attributes["aria-label"]).toMatch(/\w/);
    expect(text).not.toMatch(/NaN|Infinity|undefined|\[object/);
  });

  test("keeps its words apart and inside", () => {
    const words = wordsOf(svg);
    expect(words.length).toBeGreaterThan(0);
    expect(overlapping(words)).toEqual([]);
    expect(words.filter((w) => w.left < 0 || w.right > width).map((w) => w.text)).toEqual([]);
    const height = Number(svg.attributes.height);
    expect(words.filter((w) => w.top < 0 || w.bottom > height).map((w) => w.text)).toEqual([]);
  });
});

test("axes have titles with units", () => {
  const texts = wordsOf(parsed(svgOf("diagram", 640))).map((w) => w.text);
  expect(texts).toContain("temperature (K)");
  expect(texts).toContain("flux (W m⁻²)");
});

test("long titles of axes take more lines, and captions break at spaces before they break names", () => {
  const along = "atmosphere.incomingStellarFluxAtTheTopOfAllOfIt";
  const units = [{ name: along, unit: "W m-2" }];
  const long = diagramChart({ diagram: { ...diagram, along, units, fixed: { "orbit.semiMajorAxis": 1 } } });
  const words = wordsOf(parsed(toSVG(long, { width: 360 }) as string));
  expect(words.filter((w) => w.left < 0 || w.right > 360)).toEqual([]);
  expect(overlapping(words)).toEqual([]);
  expect(
    words
      .map((w) => w.text)
      .join("")
      .replace(/ /g, ""),
  ).toContain(`${along}(Wm⁻²)`);
  expect(words.some((w) => w.text.includes("orbit.semiMajorAxis"))).toBe(true);
});

test("names are words, whatever they hold", () => {
  const svg = parsed(svgOf("names with markup", 640));
  expect(all(svg, "script")).toEqual([]);
  const legend = all(svg, "text").map((element) => element.text);
  // the control character and the lone surrogate are spaces; nothing else is lost
  expect(legend.join(" ")).toContain(HARM.slice(0, 30));
});

test("auto follows the reader's system, light and dark do not", () => {
  expect(svgOf("bars", 640)).toContain("prefers-color-scheme:dark");
  const [light, dark] = (["light", "dark"] as const).map((theme) => svgOf("bars", 640, theme)) as [
    string,
    string,
  ];
  expect(light + dark).not.toContain("<style");
  const paper = (text: string): string | undefined => all(parsed(text), "rect")[0]?.attributes.fill;
  expect([paper(light), paper(dark)]).toEqual(["#fff", "#17191c"]);
});

describe("the palette", () => {
  /** Relative luminance of WCAG 2.1. */
  const luminance = (code: string): number => {
    const hex = code.length === 4 ? code.replace(/[\da-f]/g, "$&$&") : code;
    const [r, g, b] = [1, 3, 5].map((i) => {
      const c = Number.parseInt(hex.slice(i, i + 2), 16) / 255;
      return c <= 0.04045 ? c / 12.92 : ((c + 0.055) / 1.055) ** 2.4;
    }) as [number, number, number];
    return 0.2126 * r + 0.7152 * g + 0.0722 * b;
  };
  const contrast = (a: string, b: string): number => {
    const [low, high] = [luminance(a), luminance(b)].sort((x, y) => x - y) as [number, number];
    return (high + 0.05) / (low + 0.05);
  };

  test.each(["light", "dark"] as const)("of %s has words one can read", (theme) => {
    const svg = parsed(svgOf("limits", 640, theme));
    const paper = all(svg, "rect")[0]?.attributes.fill as string;
    const inks = new Set(wordsOf(svg).map((words) => words.fill));
    expect(inks.size).toBeGreaterThan(1);
    // 4.5 is what WCAG 2.1 asks of small words, 3 of lines and points; the purple of Okabe & Ito has 2.9 on white
    for (const ink of inks) expect(contrast(ink as string, paper)).toBeGreaterThan(4.5);
    for (const { attributes } of all(svg, "g").filter((g) => g.attributes.stroke?.startsWith("#"))) {
      expect(contrast(attributes.stroke as string, paper)).toBeGreaterThan(2.8);
    }
  });
});
