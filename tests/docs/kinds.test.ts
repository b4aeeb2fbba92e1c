// The manual names every kind, end and code that results may have.
import fs from "node:fs";
import { expect, test } from "vitest";
import { textsOf, textsOfField } from "./namesIn.ts";

const diagram = "src/branches/diagram.ts";
const folds = "src/branches/foldDiagram.ts";
const loss = "src/feedback/heldComparison.ts";
const cases: readonly (readonly [string, string, readonly string[]])[] = [
  ["branches.md", "ends of branches", textsOfField(diagram, "BranchEnd", "kind")],
  ["branches.md", "kinds of doubt about branches", textsOfField(diagram, "UndecidedStretch", "kind")],
  ["branches.md", "methods", textsOfField(diagram, "Diagram", "method")],
  ["branches.md", "ends of fold curves", textsOf(folds, "FoldCurveEnd")],
  ["branches.md", "kinds of doubt about folds", textsOfField(folds, "UndecidedFolds", "kind")],
  ["feedbacks.md", "codes of notes", textsOf("src/feedback/feedbackNote.ts", "FeedbackNoteCode")],
  ["feedbacks.md", "reasons of a loss", textsOfField(loss, "BranchLoss", "reason")],
  ["planet.md", "codes of notes", textsOf("src/planet/planetNote.ts", "PlanetNoteCode")],
  ["ledgers.md", "codes of notes", textsOf("src/ledger/ledgerNote.ts", "LedgerNoteCode")],
];

test.each(cases)("docs/%s has all %s", (file, _, names) => {
  const text = fs.readFileSync(`docs/${file}`, "utf8");
  expect(names.length).toBeGreaterThan(1);
  expect(names.filter((name) => !text.includes(`\`${name}\``))).toEqual([]);
});
