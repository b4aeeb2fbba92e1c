// Shows results in notebooks and pages.
import type { Page } from "./layout.ts";
import type { Theme } from "./palette.ts";
import type { Plot } from "./plot.ts";
import { jsonReport, plotFor, type Report, reportOf } from "./report.ts";
import { plain, reportHTML, reportText } from "./reportText.ts";
import { svgPlot } from "./svgPlot.ts";
import { type Json, vegaPlot } from "./vegaPlot.ts";
import { clean } from "./wording.ts";

/** How wide a picture is, and in which colours. */
export interface ShowOptions {
  /** Width of pictures, px: at least 240, at most 4000; 640 unless said. */
  readonly width?: number;
  /** `auto` (unless said) is light, and turns dark where the reader's system asks for it; in Vega-Lite it is light. */
  readonly theme?: Theme;
}

/** A result that shows itself: through the Jupyter display protocol, and as text where it is printed. */
export interface Shown {
  /** Under `Symbol.for("Jupyter.display")`: makes the forms of a result by MIME type. */
  readonly [symbol: symbol]: () => Readonly<Record<string, unknown>>;
  toString(): string;
}

/**
 * Makes any result show itself in a notebook: states, a state, a ledger, feedbacks, a diagram, margins, solutions, columns
 * of many planets, an appraisal, flat rows, or a picture of this door. Results are known by their fields, so they may come
 * from JSON. The forms are `text/plain`, and as far as there is something to tell `text/html`, `text/markdown`,
 * `image/svg+xml` and `application/vnd.vegalite.v5+json`. It never throws: what it does not know it shows as JSON, cut short.
 *
 * @example show(findStates(loop, { within: [150, 400] }))
 */
export function show(result: unknown, options?: ShowOptions): Shown {
  const forms = () => {
    // of what is not known only the first, plain text
    const count = read(result, ({ tables, pictures }) => (tables[0] || pictures[0] ? 5 : 1));
    return Object.fromEntries(
      Object.entries(FORMS)
        .slice(0, count)
        .map(([type, make]) => [type, make(result, options)] as const)
        .filter(([, form]) => form !== null),
    );
  };
  return Object.freeze({ [Symbol.for("Jupyter.display")]: forms, toString: () => toText(result) });
}

/** Reads the report of a result; where that cannot be done, what JSON holds of it. */
function read<T>(
  result: unknown,
  form: (report: Report, page: Page) => T,
  { width, theme = "auto" }: ShowOptions = {},
): T {
  const page = { width: Math.min(4000, Math.max(240, Number(width) || 640)), theme };
  try {
    return form(reportOf(result), page);
  } catch {
    return form(jsonReport(result), page);
  }
}

/** The main picture of a report. */
const first =
  <T>(draw: (plot: Plot, page: Page) => T) =>
  ({ pictures: [picture] }: Report, page: Page): T | null =>
    picture ? draw(plotFor(picture, page.width), page) : null;

/** A result as HTML: pictures, then words and tables. What is not known is JSON, cut short. Never throws. */
export const toHTML = (result: unknown, options?: ShowOptions): string => read(result, reportHTML, options);

/** A result as Markdown: words and tables. Never throws. */
export const toMarkdown = (result: unknown): string => read(result, (report) => reportText(report, plain));

/** A result as plain text: words and tables in columns. Never throws. */
export const toText = (result: unknown): string => read(result, (report) => reportText(report, clean));

/** The main picture of a result as SVG text; `null` where it has none. Never throws. */
export const toSVG = (result: unknown, options?: ShowOptions): string | null =>
  read(result, first(svgPlot), options);

/**
 * The main picture of a result as a Vega-Lite 5 specification, which Vega-Lite 6 reads too; `null` where it has none.
 * Never throws.
 */
export const toVegaLite = (result: unknown, options?: ShowOptions): Json | null =>
  read(result, first(vegaPlot), options);

const FORMS = {
  "text/plain": toText,
  "text/html": toHTML,
  "text/markdown": toMarkdown,
  "image/svg+xml": toSVG,
  "application/vnd.vegalite.v5+json": toVegaLite,
};
