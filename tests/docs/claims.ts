// What an example claims: a statement followed by `// → value`, at the end of its line or on the lines below.
import ts from "typescript";
import type { Fence } from "./programs.ts";

/** A claim of a program: where its comment stands in the document, and what it says. */
export interface Claim {
  readonly start: number;
  readonly end: number;
  /** True where the comment has a line of its own. */
  readonly below: boolean;
  /** The column at which a comment at the end of the line begins. */
  readonly column: number;
  readonly expected: string;
}

/** A fence as code that reports what each claim is about through `reports(index, value)`. */
export interface Reporting {
  readonly code: string;
  readonly claims: readonly Claim[];
}

const BESIDE = /^[ \t]*\/\/ → (.*)$/m;
const BELOW = /^\n\/\/ → (.*(?:\n\/\/ {3}.*)*)/;

/** `first`: the index of the fence's first claim in its program. Imports become calls of `load`. */
export function reporting({ code, offset }: Fence, first: number): Reporting {
  const source = ts.createSourceFile("example.ts", code, ts.ScriptTarget.Latest, true);
  const claims: Claim[] = [];
  const statements = source.statements.map((statement) => {
    const claim = claimAfter(code, statement.end, offset);
    if (claim) claims.push(claim);
    return reported(statement, claim && first + claims.length - 1);
  });
  const arrows = code.split("// → ").length - 1;
  if (arrows > claims.length) throw new Error(`an arrow stands beside no statement in:\n${code}`);
  return { code: statements.join("\n"), claims };
}

function claimAfter(code: string, end: number, offset: number): Claim | undefined {
  const rest = code.slice(end);
  const column = end - (code.lastIndexOf("\n", end) + 1);
  const beside = BESIDE.exec(rest.slice(0, `${rest}\n`.indexOf("\n")));
  const found = beside ?? BELOW.exec(rest);
  if (!found) return undefined;
  const below = !beside;
  const start = offset + end + (below ? 1 : 0);
  const expected = (found[1] as string).replaceAll("\n//   ", "\n");
  return { start, end: offset + end + found[0].length, below, column, expected };
}

function reported(statement: ts.Statement, index: number | undefined): string {
  const text = statement.getText();
  if (ts.isImportDeclaration(statement)) return loaded(statement);
  if (index === undefined) return text;
  if (ts.isExpressionStatement(statement)) {
    return `await reports(${index}, () => (${statement.expression.getText()}));`;
  }
  const name = ts.isVariableStatement(statement) && statement.declarationList.declarations[0]?.name;
  if (!name || !ts.isIdentifier(name)) throw new Error(`a claim needs an expression or one name: ${text}`);
  return `${text}\nawait reports(${index}, () => ${name.text});`;
}

/** `import { a as b } from "x"` becomes `const { a: b } = await load("x")`. */
function loaded({ importClause, moduleSpecifier }: ts.ImportDeclaration): string {
  const named = importClause?.namedBindings;
  if (importClause?.phaseModifier !== undefined) return "";
  if (!named || !ts.isNamedImports(named)) throw new Error("examples import by name");
  const names = named.elements
    .filter((element) => !element.isTypeOnly)
    .map(({ name, propertyName }) => (propertyName ? `${propertyName.text}: ${name.text}` : name.text));
  return `const { ${names.join(", ")} } = await load(${moduleSpecifier.getText()});`;
}
