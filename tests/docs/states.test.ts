// docs/states.md names every field, kind and code that the types have.
import fs from "node:fs";
import { expect, test } from "vitest";
import { membersOf, textsOf, textsOfField } from "./namesIn.ts";

const text = fs.readFileSync("docs/states.md", "utf8");
const state = "src/states/state.ts";
const cases: readonly (readonly [string, readonly string[]])[] = [
  ["fields of a state", membersOf(state, "State")],
  ["fields of what is undecided", membersOf(state, "Undecided")],
  ["fields of a list of states", membersOf(state, "FoundStates")],
  ["kinds of doubt", textsOfField(state, "Undecided", "kind")],
  ["kinds of proof", textsOfField(state, "FoundStates", "proof")],
  ["codes of notes", textsOf("src/states/note.ts", "NoteCode")],
];

test.each(cases)("docs/states.md has all %s", (_, names) => {
  expect(names.length).toBeGreaterThan(2);
  expect(names.filter((name) => !new RegExp(`\\b${name}\\b`).test(text))).toEqual([]);
});
