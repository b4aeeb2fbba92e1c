// Reads what a source file imports: statements, re-exports, types, `import()` in code and in types.
import ts from "typescript";

export interface Import {
  readonly specifier: string;
  readonly line: number;
}

export function parse(file: string, text: string): ts.SourceFile {
  return ts.createSourceFile(file, text, ts.ScriptTarget.Latest, true);
}

export function lineOf(node: ts.Node): number {
  const source = node.getSourceFile();
  return source.getLineAndCharacterOfPosition(node.getStart(source)).line + 1;
}

/** The node that holds the specifier, where `node` imports anything. */
function specifierOf(node: ts.Node): ts.Node | undefined {
  if (ts.isImportDeclaration(node) || ts.isExportDeclaration(node)) return node.moduleSpecifier;
  if (ts.isExternalModuleReference(node)) return node.expression;
  if (ts.isImportTypeNode(node) && ts.isLiteralTypeNode(node.argument)) return node.argument.literal;
  const isDynamic = ts.isCallExpression(node) && node.expression.kind === ts.SyntaxKind.ImportKeyword;
  return isDynamic ? node.arguments[0] : undefined;
}

export function importsOf(source: ts.SourceFile): Import[] {
  const found: Import[] = [];
  const visit = (node: ts.Node): void => {
    const specifier = specifierOf(node);
    // What is not a plain text cannot be checked, so it is reported as it stands and refused later.
    if (specifier) {
      const text = ts.isStringLiteralLike(specifier) ? specifier.text : specifier.getText();
      found.push({ specifier: text, line: lineOf(node) });
    }
    ts.forEachChild(node, visit);
  };
  visit(source);
  return found;
}
