// The notebooks of docs/notebooks as they are stored.
import fs from "node:fs";
import { codeCells } from "../../.config/notebooks/outputs.mjs";

export const FOLDER = "docs/notebooks";

/** A notebook in the format nbformat 4. */
export interface Notebook {
  readonly nbformat: number;
  readonly nbformat_minor: number;
  readonly metadata: { readonly kernelspec: { readonly name: string } };
  readonly cells: readonly {
    readonly cell_type: "markdown" | "code";
    readonly id: string;
    readonly source: readonly string[];
    readonly execution_count?: number | null;
    readonly outputs?: readonly { readonly output_type: string; readonly execution_count?: number }[];
  }[];
}

/** A cell with its outputs by MIME type. */
export interface CodeCell {
  readonly id: string;
  readonly code: string;
  readonly outputs: readonly Readonly<Record<string, unknown>>[];
}

export const notebooks = fs
  .readdirSync(FOLDER)
  .filter((file) => file.endsWith(".ipynb"))
  .map((file) => {
    const text = fs.readFileSync(`${FOLDER}/${file}`, "utf8");
    const notebook = JSON.parse(text) as Notebook;
    return { file, text, notebook, cells: codeCells(notebook) as CodeCell[] };
  });
