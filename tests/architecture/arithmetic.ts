// Finds arithmetic whose bits differ between JavaScript engines: most of Math, and powers.
import ts from "typescript";
import { lineOf, parse } from "./imports.ts";

/** What every engine computes in the same bits (exact, or correctly rounded by the standard), and constants. */
const sameBits = new Set(
  "abs ceil clz32 floor fround imul max min round sign sqrt trunc PI E LN2 LN10 LOG2E LOG10E SQRT2 SQRT1_2".split(
    " ",
  ),
);

function faultOf(node: ts.Node): string | null {
  if (node.kind === ts.SyntaxKind.AsteriskAsteriskToken) return "uses a power; multiply";
  if (node.kind === ts.SyntaxKind.AsteriskAsteriskEqualsToken) return "uses a power; multiply";
  if (ts.isStringLiteralLike(node) || ts.isTemplateHead(node) || ts.isTemplateMiddleOrTemplateTail(node)) {
    // Code that is generated as text obeys the same rule.
    const other = [...node.text.matchAll(/\bMath\.(\w+)/g)].find((match) => !sameBits.has(match[1] ?? ""));
    return other ? `writes ${other[0]} into generated code` : null;
  }
  if (!ts.isIdentifier(node) || node.text !== "Math") return null;
  const whole = node.parent;
  if (!ts.isPropertyAccessExpression(whole) || whole.expression !== node)
    return "uses Math other than by name";
  return sameBits.has(whole.name.text) ? null : `uses Math.${whole.name.text}`;
}

export function arithmeticFaults(file: string, text: string): string[] {
  const faults: string[] = [];
  const visit = (node: ts.Node): void => {
    const fault = faultOf(node);
    if (fault !== null) faults.push(`${file}:${lineOf(node)} ${fault}`);
    ts.forEachChild(node, visit);
  };
  visit(parse(file, text));
  return faults;
}
