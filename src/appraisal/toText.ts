// An appraisal as plain text of at most 80 columns.
import type { Appraisal } from "./appraisal.ts";
import type { Section, Table } from "./report.ts";
import { reportOf } from "./reportOf.ts";

const WIDTH = 80;
const INDENT = 2;

/**
 * The whole appraisal as plain text of at most 80 columns, tables apart: for a terminal or a log. Nothing in it is lost to
 * rounding that a reader would miss; `JSON.stringify(appraisal)` has every digit. Throws `unreadable` or `missing` for what is no
 * appraisal.
 */
export function toText(appraisal: Appraisal): string {
  const { title, summary, about, sections, caution } = reportOf(appraisal);
  const head = [title, summary, about].flatMap((text) => wrapped(text, WIDTH, 0));
  return [...head, ...sections.flatMap(sectionLines), "", ...wrapped(caution, WIDTH, 0), ""].join("\n");
}

function sectionLines({ title, blocks }: Section): string[] {
  const lines = blocks.flatMap((block) =>
    typeof block === "string" ? wrapped(block, WIDTH - INDENT, INDENT) : tableLines(block),
  );
  return ["", title, ...lines.map((line) => `${" ".repeat(INDENT)}${line}`.trimEnd())];
}

/** Breaks a text at spaces, and words that are too long anywhere; lines after the first are indented by `hang`. */
function wrapped(text: string, width: number, hang: number): string[] {
  const lines: string[] = [];
  let line = "";
  const most = new RegExp(`.{1,${width - hang}}`, "gu");
  for (const word of text.split(" ").flatMap((long) => long.match(most) ?? [])) {
    if (line.trim() !== "" && line.length + 1 + word.length > width) {
      lines.push(line);
      line = " ".repeat(hang) + word;
    } else line += (line.trim() === "" ? "" : " ") + word;
  }
  return line === "" ? lines : [...lines, line];
}

function tableLines({ head, rows, right }: Table): string[] {
  const all = [head, ...rows];
  const widths = head.map((_, i) => Math.max(...all.map((row) => (row[i] ?? "").length)));
  return all.map((row) =>
    widths
      .map((width, i) => (right.includes(i) ? (row[i] ?? "").padStart(width) : (row[i] ?? "").padEnd(width)))
      .join("  "),
  );
}
