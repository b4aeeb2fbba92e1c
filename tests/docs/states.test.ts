// docs/states.md names every field, kind and code that the types have.
import fs from "node:fs";
import ts from "typescript";
import { expect, test } from "vitest";

const text = fs.readFileSync("docs/states.md", "utf8");
const source = (file: string) =>
  ts.createSourceFile(file, fs.readFileSync(file, "utf8"), ts.ScriptTarget.Latest, true);

/** The members of an interface, or the texts of a union, by the name of their type. */
function namesIn(file: string, name: string): string[] {
  const found: string[] = [];
  source(file).forEachChild((node) => {
    if (ts.isInterfaceDeclaration(node) && node.name.text === name) {
      found.push(...node.members.map((member) => member.name?.getText() ?? ""));
    }
    if (ts.isTypeAliasDeclaration(node) && node.name.text === name) found.push(...textsOf(node.type));
  });
  return found;
}

const textsOf = (type: ts.TypeNode): string[] =>
  [...type.getText().matchAll(/"([\w-]+)"/g)].map((match) => match[1] as string);

function textsOfField(file: string, name: string, field: string): string[] {
  const found: string[] = [];
  source(file).forEachChild((node) => {
    if (!ts.isInterfaceDeclaration(node) || node.name.text !== name) return;
    for (const member of node.members) {
      if (ts.isPropertySignature(member) && member.name.getText() === field && member.type)
        found.push(...textsOf(member.type));
    }
  });
  return found;
}

const state = "src/states/state.ts";
const cases: readonly (readonly [string, readonly string[]])[] = [
  ["fields of a state", namesIn(state, "State")],
  ["fields of what is undecided", namesIn(state, "Undecided")],
  ["fields of a list of states", namesIn(state, "FoundStates")],
  ["kinds of doubt", textsOfField(state, "Undecided", "kind")],
  ["kinds of proof", textsOfField(state, "FoundStates", "proof")],
  ["codes of notes", namesIn("src/states/note.ts", "NoteCode")],
];

test.each(cases)("docs/states.md has all %s", (_, names) => {
  expect(names.length).toBeGreaterThan(2);
  expect(names.filter((name) => !new RegExp(`\\b${name}\\b`).test(text))).toEqual([]);
});
