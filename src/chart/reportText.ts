// Reports as HTML, Markdown and plain text.
import type { Page } from "./layout.ts";
import { plotFor, type Report } from "./report.ts";
import { svgPlot } from "./svgPlot.ts";
import { escaped } from "./wording.ts";

/** Pictures, then words and tables, all names escaped. */
export function reportHTML(report: Report, page: Page): string {
  const row = (cells: readonly string[], tag: string): string =>
    `<tr>${cells.map((cell) => `<${tag}>${escaped(cell)}</${tag}>`).join("")}</tr>`;
  return [
    ...report.pictures.map((picture) => `<figure>${svgPlot(plotFor(picture, page.width), page)}</figure>`),
    ...report.lines.map((line) => `<p>${escaped(line)}</p>`),
    ...report.tables.map((table) => {
      const body = table.rows.map((cells) => row(cells, "td")).join("");
      return `<table><caption>${escaped(table.title)}</caption>${row(table.head, "th")}${body}</table>`;
    }),
  ].join("\n");
}

/** Words and tables in columns, as Markdown has them. */
export function reportText(report: Report, written: (text: string) => string): string {
  const tables = report.tables.map((table) => {
    const cells = [table.head, ...table.rows].map((row) => row.map(written));
    const widths = table.head.map((_, i) => Math.max(3, ...cells.map((row) => (row[i] as string).length)));
    const row = (of: readonly string[], filling?: string) =>
      `| ${widths.map((width, i) => (of[i] ?? "").padEnd(width, filling)).join(" | ")} |`;
    const [head, ...rows] = cells.map((of) => row(of));
    return [`${written(table.title)}:\n`, head, row([], "-"), ...rows].join("\n");
  });
  return [...report.lines.map(written), ...tables].join("\n\n");
}

/** A text without meaning in Markdown. */
export const plain = (text: string): string => escaped(text).replace(/[\\`*_[\]|$~]/g, "\\$&");
