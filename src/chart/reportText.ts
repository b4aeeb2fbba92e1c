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
    cells.splice(
      1,
      0,
      widths.map((width) => "-".repeat(width)),
    );
    const row = (of: readonly string[]) =>
      `| ${of.map((cell, i) => cell.padEnd(widths[i] as number)).join(" | ")} |`;
    return [`${written(table.title)}:\n`, ...cells.map(row)].join("\n");
  });
  return [...report.lines.map(written), ...tables].join("\n\n");
}

/** A text without meaning in Markdown. */
export const plain = (text: string): string => escaped(text).replace(/[\\`*_[\]|$~]/g, "\\$&");
