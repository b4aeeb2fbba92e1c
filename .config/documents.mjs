// The files that are generated, and what makes each: a module whose default export returns the whole text.
// A maker may be TypeScript; it may import the package by its own name.
export const documents = [
  { file: "package.json", maker: ".config/doors.mjs" },
  { file: "docs/api-report.md", maker: ".config/apireport.mjs" },
  { file: "docs/laws.md", maker: ".config/lawsDoc.ts" },
  { file: "docs/validation.md", maker: "tests/validation/document.ts" },
];
