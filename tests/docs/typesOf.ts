// Checks the TypeScript examples of a document with the declarations of the package as built.
import path from "node:path";
import ts from "typescript";
import type { Program } from "./programs.ts";

/** The compiler's messages for each program, in one text; "" where all is well. */
export function typeErrors(programs: readonly Program[]): string[] {
  const texts = new Map(
    programs.map(({ fences }, i) => {
      const code = fences.map((fence) => (fence.language === "ts" ? fence.code : "")).join("\n");
      return [path.resolve(`docs/example${i}.ts`), `${code}\nexport {};\n`] as const;
    }),
  );
  const options: ts.CompilerOptions = {
    strict: true,
    noEmit: true,
    skipLibCheck: true,
    target: ts.ScriptTarget.ES2022,
    module: ts.ModuleKind.NodeNext,
    moduleResolution: ts.ModuleResolutionKind.NodeNext,
    types: ["node"],
  };
  const host = ts.createCompilerHost(options);
  const { readFile, fileExists, getSourceFile } = host;
  host.fileExists = (file) => texts.has(path.normalize(file)) || fileExists(file);
  host.readFile = (file) => texts.get(path.normalize(file)) ?? readFile(file);
  host.getSourceFile = (file, version) => {
    const text = texts.get(path.normalize(file));
    return text === undefined ? getSourceFile(file, version) : ts.createSourceFile(file, text, version);
  };
  const program = ts.createProgram([...texts.keys()], options, host);
  return [...texts.keys()].map((file) =>
    ts
      .getPreEmitDiagnostics(program, program.getSourceFile(file))
      .map((found) => ts.flattenDiagnosticMessageText(found.messageText, "\n"))
      .join("\n"),
  );
}
