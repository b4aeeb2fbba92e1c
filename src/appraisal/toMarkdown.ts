// An appraisal as Markdown.
import type { Appraisal } from "./appraisal.ts";
import type { Section, Table } from "./report.ts";
import { reportOf } from "./reportOf.ts";

/**
 * The whole appraisal as Markdown with tables: for a notebook or a page. Names and texts of the description are escaped, so
 * that no markup of theirs has an effect. Throws `unreadable` or `missing` for what is no appraisal.
 */
export function toMarkdown(appraisal: Appraisal): string {
  const { title, summary, about, sections, caution } = reportOf(appraisal);
  const head = [`# ${escaped(title)}`, block(summary), block(about)];
  const parts = [...head, ...sections.flatMap(sectionParts), block(caution)];
  return `${parts.filter(Boolean).join("\n\n")}\n`;
}

function sectionParts({ title, blocks }: Section): string[] {
  const lines = blocks.filter((b) => typeof b === "string").map((line) => `- ${escaped(line)}`);
  const tables = blocks.filter((b) => typeof b !== "string").map(tableOf);
  return [`## ${escaped(title)}`, ...tables, lines.join("\n")].filter(Boolean);
}

function tableOf({ head, rows, right }: Table): string {
  const line = (cells: readonly string[]) => `| ${cells.join(" | ")} |`;
  const rule = head.map((_, i) => (right.includes(i) ? "---:" : "---"));
  const cells = (row: readonly string[]) => head.map((_, i) => escaped(row[i] ?? ""));
  return [line(cells(head)), line(rule), ...rows.map((row) => line(cells(row)))].join("\n");
}

/** A paragraph of its own, which is no list and no heading whatever it begins with. */
const block = (text: string): string => escaped(text).replace(/^(?:[-+=]|\d+(?=[.)]))/, "&#8203;$&");

/** Characters with a meaning in Markdown or HTML lose it, and so do addresses that would become links. */
const escaped = (text: string): string =>
  text
    .replace(/&/g, "&amp;")
    .replace(/</g, "&lt;")
    .replace(/>/g, "&gt;")
    .replace(/[\\`*_[\]|~#$]/g, "\\$&")
    .replace(/:(?=\/\/)/g, "&#58;")
    .replace(/@/g, "&#64;")
    .replace(/\b(www)\./gi, "$1&#46;");
