// The examples of a document that are run: fences marked `ts run` or `js run`, each a program of its own; a fence marked
// `more` goes on where the one before it stopped. Only TypeScript is checked for types: what is wrong on purpose is JavaScript.

/** A fence of a program, with the place of its code in the document. */
export interface Fence {
  readonly language: "ts" | "js";
  readonly code: string;
  readonly offset: number;
}

/** A program of a document; its first line in the document names it. */
export interface Program {
  readonly line: number;
  readonly fences: readonly Fence[];
}

const FENCE = /^```(ts|js) (run|more)\n(.*?)^```$/gms;

export function programsOf(text: string): Program[] {
  const programs: { line: number; fences: Fence[] }[] = [];
  for (const match of text.matchAll(FENCE)) {
    const [, language, mark, code = ""] = match;
    const offset = match.index + match[0].indexOf("\n") + 1;
    const fence = { language: language as "ts" | "js", code, offset };
    const line = text.slice(0, offset).split("\n").length;
    const last = programs.at(-1);
    if (mark === "run") programs.push({ line, fences: [fence] });
    else if (last) last.fences.push(fence);
    else throw new Error(`line ${line}: \`more\` without a program before it`);
  }
  return programs;
}
