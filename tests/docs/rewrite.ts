// Puts what the programs gave into the comments of a document.
import type { Outcome } from "./runProgram.ts";

const WIDTH = 110;

/** The document with every claim replaced by what was found. */
export function rewritten(text: string, outcomes: readonly Outcome[]): string {
  let result = text;
  for (const { claim, found } of [...outcomes].sort((a, b) => b.claim.start - a.claim.start)) {
    result = result.slice(0, claim.start) + commentOf(claim, found) + result.slice(claim.end);
  }
  return result;
}

function commentOf({ below, column }: Outcome["claim"], found: string): string {
  const comment = `// → ${found.replaceAll("\n", "\n//   ")}`;
  if (below) return comment;
  const fits = !found.includes("\n") && column + 1 + comment.length <= WIDTH;
  return fits ? ` ${comment}` : `\n${comment}`;
}
