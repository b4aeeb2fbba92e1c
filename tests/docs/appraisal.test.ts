// docs/appraisal.md names every field and code that the types have.
import fs from "node:fs";
import { expect, test } from "vitest";
import { membersOf, textsOf } from "./namesIn.ts";

const text = fs.readFileSync("docs/appraisal.md", "utf8");

const cases: readonly (readonly [string, readonly string[]])[] = [
  ["fields of an appraisal", membersOf("src/appraisal/appraisal.ts", "Appraisal")],
  ["fields of a climate", membersOf("src/appraisal/appraisedState.ts", "StateAppraisal")],
  ["codes of notes", textsOf("src/appraisal/appraisalNote.ts", "AppraisalNoteCode")],
];

test.each(cases)("docs/appraisal.md has all %s", (_, names) => {
  expect(names.length).toBeGreaterThan(5);
  expect(names.filter((name) => !text.includes(`\`${name}\``))).toEqual([]);
});
