// Shows results in notebooks and pages.
import { fail } from "../ground/errors.ts";
import type { Page } from "./layout.ts";
import type { Theme } from "./palette.ts";
import { plotFor, type Report, reportOf } from "./report.ts";
import { plain, reportHTML, reportText } from "./reportText.ts";
import { svgPlot } from "./svgPlot.ts";
import { type Json, vegaPlot } from "./vegaPlot.ts";

/** How wide a picture is, and in which colours. */
export interface ShowOptions {
  /** Width of pictures, px: 240 to 4000; 640 unless said. */
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
  const text = () => attempt(() => toText(result)) ?? "";
  const forms = () => {
    const made = Object.entries(reportOf(result) ? FORMS : {}).map(([type, make]) => [
      type,
      attempt(() => make(result, options)),
    ]);
    return { "text/plain": text(), ...Object.fromEntries(made.filter(([, form]) => form !== null)) };
  };
  return Object.freeze({ [Symbol.for("Jupyter.display")]: forms, toString: text });
}

/** A result as HTML: pictures, then words and tables. What is not known is JSON, cut short. Throws `out-of-range` for a width. */
export function toHTML(result: unknown, options?: ShowOptions): string {
  const page = pageOf(options);
  return attempt(() => reportHTML(told(result), page)) ?? reportHTML(unknown(result), page);
}

/** A result as Markdown: words and tables. Never throws. */
export const toMarkdown = (result: unknown): string => reportText(told(result), plain);

/** A result as plain text: words and tables in columns. Never throws. */
export const toText = (result: unknown): string =>
  reportText(told(result), (text) => text.replace(/\p{Cc}/gu, " "));

/** The main picture of a result as SVG text; `null` where it has none. Throws `out-of-range` for a width. */
export const toSVG = (result: unknown, options?: ShowOptions): string | null =>
  pictured(result, pageOf(options), svgPlot);

/**
 * The main picture of a result as a Vega-Lite 5 specification, which Vega-Lite 6 reads too; `null` where it has none.
 * Throws `out-of-range` for a width.
 */
export const toVegaLite = (result: unknown, options?: ShowOptions): Json | null =>
  pictured(result, pageOf(options), vegaPlot);

const FORMS = {
  "text/html": toHTML,
  "text/markdown": toMarkdown,
  "image/svg+xml": toSVG,
  "application/vnd.vegalite.v5+json": toVegaLite,
};

function pictured<T>(
  result: unknown,
  page: Page,
  read: (plot: ReturnType<typeof plotFor>, page: Page) => T,
): T | null {
  return attempt(() => {
    const [picture] = told(result).pictures;
    return picture ? read(plotFor(picture, page.width), page) : null;
  });
}

const told = (result: unknown): Report => reportOf(result) ?? unknown(result);

/** Anything in a few lines, whatever it is. */
const unknown = (result: unknown): Report => {
  const text = attempt(() => JSON.stringify(result, null, 1)) ?? `${typeof result}, which JSON cannot hold`;
  return { lines: [text.length > 2000 ? `${text.slice(0, 2000)} …` : text], tables: [], pictures: [] };
};

/** What a form gives; null where it fails, as with a result that is not what it seems. */
function attempt<T>(make: () => T): T | null {
  try {
    return make();
  } catch {
    return null;
  }
}

function pageOf({ width = 640, theme = "auto" }: ShowOptions = {}): Page {
  if (width >= 240 && width <= 4000) return { width, theme };
  return fail("out-of-range", { path: "width", value: width, allowed: "240 to 4000", unit: "px" });
}
