// What a door exports, read from the sources: each name with the statement that declares it.
import fs from "node:fs";
import path from "node:path";
import ts from "typescript";

const parsed = new Map();

function parse(file) {
  if (!parsed.has(file)) {
    const text = fs.readFileSync(file, "utf8");
    parsed.set(file, ts.createSourceFile(file, text, ts.ScriptTarget.Latest, true));
  }
  return parsed.get(file);
}

/** The exports of `src/<door>.ts` as `{ name, file, nodes }`: several nodes where a function has overloads. */
export function exportsOf(door) {
  return parse(`src/${door}.ts`).statements.flatMap(({ exportClause, moduleSpecifier }) => {
    const file = path.posix.join("src", moduleSpecifier.text);
    const declared = declaredIn(file);
    if (!exportClause) return [...declared].map(([name, nodes]) => ({ name, file, nodes }));
    return exportClause.elements.map((element) => {
      const nodes = declared.get((element.propertyName ?? element.name).text);
      if (!nodes) throw new Error(`${file} declares no ${element.name.text}`);
      return { name: element.name.text, file, nodes };
    });
  });
}

/** Exported declarations of a file by name. */
function declaredIn(file) {
  const found = new Map();
  for (const statement of parse(file).statements) {
    if (!ts.getCombinedModifierFlags(statement) && !statement.modifiers?.some(isExport)) continue;
    const nodes = ts.isVariableStatement(statement) ? statement.declarationList.declarations : [statement];
    for (const node of nodes) found.set(node.name.text, [...(found.get(node.name.text) ?? []), node]);
  }
  return found;
}

const isExport = ({ kind }) => kind === ts.SyntaxKind.ExportKeyword;
