// An appraisal as plain text of at most 80 columns.
import type { Appraisal } from "./appraisal.ts";
import type { Section, Table } from "./report.ts";
import { reportOf } from "./reportOf.ts";

const WIDTH = 80;
const TABLE_WIDTH = 100;
/** Columns of texts do not give way any further. */
const NARROWEST = 12;
const INDENT = 2;

/**
 * The whole appraisal as plain text of at most 80 columns, in tables 100: for a terminal or a log. Nothing in it is lost to
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

const GAP = 2;

function tableLines({ head, rows, right }: Table): string[] {
  const all = [head, ...rows];
  const widths = fitted(
    head.map((_, i) => Math.max(...all.map((row) => (row[i] ?? "").length))),
    right,
  );
  return all.flatMap((row) => {
    const cells = widths.map((width, i) => wrapped(row[i] ?? "", Math.max(1, width), 0));
    const height = Math.max(1, ...cells.map((lines) => lines.length));
    return Array.from({ length: height }, (_, line) =>
      widths
        .map((width, i) => {
          const text = cells[i]?.[line] ?? "";
          return right.includes(i) ? text.padStart(width) : text.padEnd(width);
        })
        .join(" ".repeat(GAP)),
    );
  });
}

/** Widths of columns in a table that is not too wide: the widest column of texts gives way, and its cells are broken. */
function fitted(widths: readonly number[], right: readonly number[]): number[] {
  const over = widths.reduce((sum, width) => sum + width + GAP, -GAP) + INDENT - TABLE_WIDTH;
  const texts = widths.map((width, i) => (right.includes(i) ? 0 : width));
  const widest = texts.indexOf(Math.max(...texts));
  const next = Math.max(NARROWEST, ...texts.filter((_, i) => i !== widest));
  const width = texts[widest] ?? 0;
  if (over <= 0 || width <= NARROWEST) return [...widths];
  const narrower = Math.max(width - over, Math.min(next, width - 1));
  return fitted(
    widths.map((old, i) => (i === widest ? narrower : old)),
    right,
  );
}
