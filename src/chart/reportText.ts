// Reports as HTML, Markdown and plain text.
import type { Page } from "./layout.ts";
import { plotFor, type Report } from "./report.ts";
import { svgPlot } from "./svgPlot.ts";
import { escaped } from "./wording.ts";

/** Pictures, then words and tables, all names escaped. */
export function reportHTML({ pictures, lines, tables }: Report, page: Page): string {
  const row = (cells: readonly string[], tag: string): string =>
    `<tr>${cells.map((cell) => `<${tag}>${escaped(cell)}</${tag}>`).join("")}</tr>`;
  return [
    ...pictures.map((picture) => `<figure>${svgPlot(plotFor(picture, page.width), page)}</figure>`),
    ...lines.map((line) => `<p>${escaped(line)}</p>`),
    ...tables.map(({ title, head, rows }) => {
      const body = rows.map((cells) => row(cells, "td")).join("");
      return `<table><caption>${escaped(title)}</caption>${row(head, "th")}${body}</table>`;
    }),
  ].join("\n");
}

/** Words and tables in columns, as Markdown has them. */
export function reportText({ lines, tables }: Report, written: (text: string) => string): string {
  const parts = tables.map(({ title, head, rows }) => {
    const all = [head, head.map(() => "---"), ...rows].map((cells, i) =>
      i === 1 ? cells : cells.map(written),
    );
    const widths = head.map((_, i) => Math.max(...all.map((cells) => (cells[i] as string).length)));
    const row = (cells: readonly string[]): string =>
      `| ${cells.map((cell, i) => cell.padEnd(widths[i] as number, cell === "---" ? "-" : " ")).join(" | ")} |`;
    return [`${written(title)}:\n`, ...all.map(row)].join("\n");
  });
  return [...lines.map(written), ...parts].join("\n\n");
}

/** A text without meaning in Markdown. */
export const plain = (text: string): string => escaped(text).replace(/[\\`*_[\]|$~]/g, "\\$&");
