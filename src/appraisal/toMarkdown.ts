// An appraisal as Markdown.
import type { Appraisal } from "./appraisal.ts";
import type { Section, Table } from "./report.ts";
import { reportOf } from "./reportOf.ts";

/**
 * The whole appraisal as Markdown with tables: for a notebook or a page. Names and texts of the description are escaped, so
 * that no markup of theirs has an effect.
 */
export function toMarkdown(appraisal: Appraisal): string {
  const { title, sections, caution } = reportOf(appraisal);
  const parts = [`# ${escaped(title)}`, ...sections.flatMap(sectionParts), `*${escaped(caution)}*`];
  return `${parts.join("\n\n")}\n`;
}

function sectionParts({ title, blocks }: Section): string[] {
  return [`## ${escaped(title)}`, ...blocks.map((b) => (typeof b === "string" ? escaped(b) : tableOf(b)))];
}

function tableOf({ head, rows, right }: Table): string {
  const line = (cells: readonly string[]) => `| ${cells.join(" | ")} |`;
  const rule = head.map((_, i) => (right.includes(i) ? "---:" : "---"));
  const cells = (row: readonly string[]) => head.map((_, i) => escaped(row[i] ?? ""));
  return [line(cells(head)), line(rule), ...rows.map((row) => line(cells(row)))].join("\n");
}

/** Characters with a meaning in Markdown or HTML lose it. */
const escaped = (text: string): string =>
  text
    .replace(/\s+/g, " ")
    .replace(/[\\`*_[\]|~]/g, "\\$&")
    .replace(/&/g, "&amp;")
    .replace(/</g, "&lt;")
    .replace(/>/g, "&gt;")
    .replace(/^(#|\+|-|\d+\.)/, "\\$1");
