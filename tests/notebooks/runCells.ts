// Runs the code of a notebook against the package as built, without Jupyter, and displays what each cell ends with.
import fs from "node:fs";
import ts from "typescript";
import { reporting } from "../docs/claims.ts";
import { FOLDER } from "./notebooks.ts";

/** The forms of a value by MIME type, as a notebook displays it. */
export type Displayed = Readonly<Record<string, unknown>>;

const AsyncFunction = Object.getPrototypeOf(async () => {}).constructor as new (
  ...parts: string[]
) => (
  load: (specifier: string) => unknown,
  reports: (index: number, value: () => unknown) => void,
) => Promise<void>;

/** Every cell must end with an expression; what it displays is returned by cell. */
export async function runCells(codes: readonly string[]): Promise<Displayed[]> {
  const marked = codes.map((code, i) => {
    const { code: own, claims } = reporting({ language: "ts", code: `${code} // → shown`, offset: 0 }, i);
    if (claims.length !== 1) throw new Error(`more than one arrow in:\n${code}`);
    return own;
  });
  const { outputText } = ts.transpileModule(marked.join("\n"), {
    compilerOptions: { target: ts.ScriptTarget.ES2022, module: ts.ModuleKind.ESNext },
  });
  const shown: Displayed[] = [];
  await new AsyncFunction("load", "reports", outputText)(load, (index, value) => {
    shown[index] = displayed(value());
  });
  return shown;
}

/** As JSON carries it to the notebook. */
function displayed(value: unknown): Displayed {
  const display = (value as { readonly [symbol: symbol]: unknown })[Symbol.for("Jupyter.display")];
  if (typeof display !== "function") throw new Error(`${value} does not display itself`);
  return JSON.parse(JSON.stringify(display.call(value)));
}

/** A notebook runs in its own folder, a test does not. */
const load = (specifier: string) =>
  specifier === "node:fs"
    ? { readFileSync: (file: string) => fs.readFileSync(`${FOLDER}/${file}`, "utf8") }
    : import(/* @vite-ignore */ specifier);
