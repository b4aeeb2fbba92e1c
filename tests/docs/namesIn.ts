// The names that types of a source file have.
import fs from "node:fs";
import ts from "typescript";

const source = (file: string) =>
  ts.createSourceFile(file, fs.readFileSync(file, "utf8"), ts.ScriptTarget.Latest, true);

/** The members of an interface. */
export function membersOf(file: string, name: string): string[] {
  const found: string[] = [];
  source(file).forEachChild((node) => {
    if (ts.isInterfaceDeclaration(node) && node.name.text === name)
      found.push(...node.members.map((member) => member.name?.getText() ?? ""));
  });
  return found;
}

const quoted = (type: ts.TypeNode): string[] =>
  [...type.getText().matchAll(/"([\w-]+)"/g)].map((match) => match[1] as string);

/** The texts of a union. */
export function textsOf(file: string, name: string): string[] {
  const found: string[] = [];
  source(file).forEachChild((node) => {
    if (ts.isTypeAliasDeclaration(node) && node.name.text === name) found.push(...quoted(node.type));
  });
  return found;
}

/** The texts of a union that is the type of a field. */
export function textsOfField(file: string, name: string, field: string): string[] {
  const found: string[] = [];
  source(file).forEachChild((node) => {
    if (!ts.isInterfaceDeclaration(node) || node.name.text !== name) return;
    for (const member of node.members) {
      if (ts.isPropertySignature(member) && member.name.getText() === field && member.type)
        found.push(...quoted(member.type));
    }
  });
  return found;
}
